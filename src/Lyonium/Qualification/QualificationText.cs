using System;
using System.Linq;
using System.Text;

namespace Lyonium.Qualification;

/// <summary>The report as text for people: where it ran, what failed, every check by set, the sum.</summary>
internal sealed class QualificationText(QualificationReport report)
{
    private readonly StringBuilder _text = new();

    public override string ToString()
    {
        _text.Clear();
        Line(QualificationWords.Title);
        Line();
        Wrapped(QualificationWords.WhatItIs);
        Line();
        WriteEnvironment();
        foreach (var set in QualificationWords.BySet(report))
        {
            Line();
            WriteSet(set.ToArray());
        }

        Line();
        WriteModelErrors();
        Line();
        Wrapped(QualificationWords.WhatMemoryMeans);
        foreach (var failed in report.Outcomes.Where(one => one.Verdict == CheckVerdict.Fails))
        {
            Line("FAILS  " + failed.Check.Id + "  " + failed.Check.Title + "  " + string.Join("  ", QualificationWords.Cells(failed)) + (failed.Failure.Length == 0 ? "" : "  " + failed.Failure));
        }

        Line(QualificationWords.Sum(report));
        return _text.ToString();
    }

    private void WriteEnvironment()
    {
        var environment = report.Environment;
        var table = environment.Table;
        (string Name, string Value)[] lines =
        [
            ("library", $"Lyonium {environment.Software.Version}, {environment.Software.Target}"),
            ("assembly", environment.AssemblySha256.Length > 0 ? "SHA-256 " + environment.AssemblySha256 : "part of a single file"),
            ("module", environment.ModuleVersionId),
            ("runtime", environment.Runtime),
            ("system", environment.OperatingSystem),
            ("processor", environment.Processor),
            ("culture", environment.Culture),
            ("table", $"edition {table.Edition}, SHA-256 {table.Sha256}"),
            .. table.Layers.Select(layer => ("own table", $"{layer.Name}, edition {layer.Edition}, SHA-256 {layer.Sha256}")),
            ("method", environment.Method),
            ("activity", environment.ActivityModel),
            ("ion pairs", environment.PairSets is null ? "the defaults of the activity model" : environment.PairSets.Count == 0 ? "none" : string.Join(", ", environment.PairSets)),
        ];
        foreach (var (name, value) in lines)
        {
            Line("  " + name.PadRight(11) + value);
        }
    }

    private void WriteSet(CheckOutcome[] set)
    {
        var first = set[0].Check;
        Line(QualificationWords.Heading(first));
        Wrapped("source: " + first.Source, "  ");
        foreach (var reason in QualificationWords.Reasons(set))
        {
            Wrapped(reason, "  ");
        }

        Table(set.Select(QualificationWords.Cells).Prepend(QualificationWords.Headings.ToArray()).ToArray());
    }

    private void WriteModelErrors()
    {
        Line("Error of the activity model in pH, root mean square deviation, 0 to 50 Cel");
        Table(report.ModelErrors
            .Select(one => new[] { FormattableString.Invariant($"{one.LowMolPerKg} to {one.HighMolPerKg} mol/kg"), FormattableString.Invariant($"{one.RootMeanSquareDeviation:F4}"), FormattableString.Invariant($"{one.Solutions} solutions") })
            .Prepend(["ionic strength", "error", "from"])
            .ToArray());
    }

    private void Table(string[][] rows)
    {
        var widths = Enumerable.Range(0, rows[0].Length).Select(column => rows.Max(row => row[column].Length)).ToArray();
        foreach (var row in rows)
        {
            Line(("  " + string.Join("  ", row.Select((cell, column) => cell.PadRight(widths[column])))).TrimEnd());
        }
    }

    private void Wrapped(string text, string indent = "")
    {
        const int width = 100;
        var line = indent;
        foreach (var word in text.Split(' '))
        {
            if (line.Length + word.Length >= width)
            {
                Line(line.TrimEnd());
                line = indent;
            }

            line += word + " ";
        }

        Line(line.TrimEnd());
    }

    private void Line(string text = "") => _text.Append(text).Append('\n');
}
