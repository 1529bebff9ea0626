using System;
using System.Collections.Generic;
using System.Text;

namespace Lyonium.Faults;

/// <summary>Something in the input that is refused: where, what was found there, and the remedy.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed class Fault
{
    private const int LongestFound = 120;
    private const int LongestArgument = 500;

    private Fault(
        FaultKind kind,
        string path,
        string found,
        IReadOnlyDictionary<string, string> arguments,
        IReadOnlyList<(double PH, double Correction)> iterates)
    {
        Iterates = iterates;
        Kind = kind;
        Path = path;
        Found = found;
        Arguments = arguments;
    }

    /// <summary>The kind of fault, with its texts before they are filled in.</summary>
    public FaultKind Kind { get; }

    /// <summary>The stable code, such as <c>LYO0101</c>.</summary>
    public string Code => Kind.Code;

    /// <summary>The place, as a JSON path (<c>$.parts[0].volume</c>); the fluent builder names places the same way.</summary>
    public string Path { get; }

    /// <summary>What was found there, as it was written; empty where nothing was.</summary>
    public string Found { get; }

    /// <summary>What fills the placeholders of the texts, by name.</summary>
    public IReadOnlyDictionary<string, string> Arguments { get; }

    /// <summary>The estimates of a method that did not settle, each with its correction; empty for other faults.</summary>
    public IReadOnlyList<(double PH, double Correction)> Iterates { get; }

    /// <summary>What is wrong, in a sentence.</summary>
    public string Message => Fill(Kind.Message);

    /// <summary>What to do about it.</summary>
    public string Remedy => Fill(Kind.Remedy);

    /// <summary>Makes a fault of a kind.</summary>
    /// <param name="kind">The kind.</param>
    /// <param name="path">The place, as a JSON path.</param>
    /// <param name="found">What was found there.</param>
    /// <param name="arguments">What fills the placeholders of the kind's texts, by name.</param>
    /// <returns>The fault.</returns>
    /// <exception cref="ArgumentNullException">A parameter is <see langword="null"/>.</exception>
    public static Fault Of(FaultKind kind, string path, string found, params (string Name, string Value)[] arguments)
    {
        _ = kind ?? throw new ArgumentNullException(nameof(kind));
        _ = path ?? throw new ArgumentNullException(nameof(path));
        _ = found ?? throw new ArgumentNullException(nameof(found));
        _ = arguments ?? throw new ArgumentNullException(nameof(arguments));
        var shown = Shown(found, LongestFound);
        var values = new SortedDictionary<string, string>(StringComparer.Ordinal) { ["found"] = shown };
        foreach (var (name, value) in arguments)
        {
            values[name] = Shown(value ?? "", LongestArgument);
        }

        return new Fault(kind, Shown(path, LongestArgument), shown, values, []);
    }

    /// <summary>The same fault with the estimates of a method that did not settle.</summary>
    /// <param name="iterates">The estimates in pH, each with its correction.</param>
    /// <returns>A new fault.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="iterates"/> is <see langword="null"/>.</exception>
    public Fault WithIterates(IReadOnlyList<(double PH, double Correction)> iterates) =>
        new(Kind, Path, Found, Arguments, iterates ?? throw new ArgumentNullException(nameof(iterates)));

    /// <summary>The fault on one line: code, place, message and remedy.</summary>
    /// <returns>One line of text.</returns>
    public override string ToString() => $"{Code} at {Path}: {Message} Remedy: {Remedy}.";

    // What a hostile client sends must not fill a host's log, break its lines or steer its terminal.
    private static string Shown(string text, int longest)
    {
        var cut = text.Length <= longest ? text.Length : longest - 1;
        if (cut < text.Length && char.IsHighSurrogate(text[cut - 1]))
        {
            cut--;
        }

        var line = new StringBuilder(cut + 1);
        for (var i = 0; i < cut; i++)
        {
            var isPair = char.IsHighSurrogate(text[i]) && i + 1 < cut && char.IsLowSurrogate(text[i + 1]);
            if (isPair)
            {
                line.Append(text[i]).Append(text[++i]);
            }
            else if (char.IsSurrogate(text[i]))
            {
                line.Append('\ufffd');
            }
            else
            {
                line.Append(char.IsControl(text[i]) || text[i] is '\u2028' or '\u2029' ? ' ' : text[i]);
            }
        }

        return cut < text.Length ? line.Append('…').ToString() : line.ToString();
    }

    // In one pass, so that what was found is never taken for a placeholder.
    private string Fill(string template)
    {
        var filled = new StringBuilder(template.Length * 2);
        var at = 0;
        while (at < template.Length)
        {
            var end = template[at] == '{' ? template.IndexOf('}', at) : -1;
            if (end > 0 && Arguments.TryGetValue(template.Substring(at + 1, end - at - 1), out var value))
            {
                filled.Append(value);
                at = end + 1;
            }
            else
            {
                filled.Append(template[at++]);
            }
        }

        return filled.ToString();
    }
}
