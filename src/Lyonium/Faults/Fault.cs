using System;
using System.Collections.Generic;

namespace Lyonium.Faults;

/// <summary>Something in the input that is refused: where, what was found there, and the remedy.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed class Fault
{
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
        var shown = Shorten(found);
        var values = new SortedDictionary<string, string>(StringComparer.Ordinal) { ["found"] = shown };
        foreach (var (name, value) in arguments)
        {
            values[name] = value;
        }

        return new Fault(kind, path, shown, values, []);
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

    // What a hostile client sends must not fill a host's log.
    private static string Shorten(string found)
    {
        const int longest = 120;
        var line = found.Length > longest ? found.Substring(0, longest - 1) + "…" : found;
        return line.Replace('\r', ' ').Replace('\n', ' ');
    }

    private string Fill(string template)
    {
        foreach (var argument in Arguments)
        {
            template = template.Replace("{" + argument.Key + "}", argument.Value);
        }

        return template;
    }
}
