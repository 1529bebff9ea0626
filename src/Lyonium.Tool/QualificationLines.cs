using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Qualification;
using Spectre.Console;

namespace Lyonium.Tool;

/// <summary>The report of the published checks on a terminal: the sum and what fails first, and every line within the width.</summary>
internal sealed class QualificationLines(QualificationReport report)
{
    // Where the report itself breaks its prose.
    private const int ReportWidth = 100;
    private const string Failed = "FAILS  ";

    public void Print(IAnsiConsole console)
    {
        var lines = report.ToText().TrimEnd('\n').Split('\n');

        // The report ends with its failures and the sum; a reader at a terminal wants them first.
        var failures = lines.Take(lines.Length - 1).Reverse().TakeWhile(line => line.StartsWith(Failed, StringComparison.Ordinal)).Reverse().ToArray();
        console.MarkupLineInterpolated($"[bold]{lines[^1]}[/]");
        foreach (var line in failures)
        {
            Print(console, line);
        }

        console.WriteLine();
        foreach (var line in Unbroken(lines.Take(lines.Length - 1 - failures.Length)))
        {
            Print(console, line);
        }
    }

    // Continued under its own beginning.
    private static void Print(IAnsiConsole console, string line)
    {
        var text = line.TrimStart();
        if (text.Length == 0)
        {
            console.WriteLine();
            return;
        }

        console.Write(new Padder(new Text(text), new Padding(Indent(line), 0, 0, 0)));
    }

    // A line of prose was broken where the next word had no room any more: such lines are one. The columns of a table stand two blanks apart.
    private static IEnumerable<string> Unbroken(IEnumerable<string> lines)
    {
        string? whole = null;
        var lastLength = 0;
        foreach (var line in lines)
        {
            var word = line.TrimStart().Split(' ')[0];
            if (whole is not null && IsProse(whole) && IsProse(line) && Indent(line) == Indent(whole) && lastLength + 1 + word.Length >= ReportWidth)
            {
                whole += " " + line.TrimStart();
            }
            else
            {
                if (whole is not null)
                {
                    yield return whole;
                }

                whole = line;
            }

            lastLength = line.Length;
        }

        if (whole is not null)
        {
            yield return whole;
        }
    }

    private static bool IsProse(string line) => line.Trim() is { Length: > 0 } text && !text.Contains("  ", StringComparison.Ordinal);

    private static int Indent(string line) => line.Length - line.TrimStart().Length;
}
