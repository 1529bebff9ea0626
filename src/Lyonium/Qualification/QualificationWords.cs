using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Provenance;
using Lyonium.Quantities;

namespace Lyonium.Qualification;

/// <summary>The words and figures that the report's text and page share.</summary>
internal static class QualificationWords
{
    public const string Title = "Qualification against published values";

    public const string WhatItIs =
        "Evidence towards installation qualification (which build runs, with which table) and operational qualification (it gives the "
        + "published figures). It does not replace the qualification of the system around the library, of the instrument, or of the "
        + "laboratory's own samples.";

    public const string WhatMemoryMeans =
        "\"agrees, value not read\": the published figure was recalled and not seen in its source, so its agreement is less than a proof.";

    public static IEnumerable<IGrouping<string, CheckOutcome>> BySet(QualificationReport report) =>
        report.Outcomes.GroupBy(one => one.Check.Id.Substring(0, one.Check.Id.IndexOf(':')), StringComparer.Ordinal);

    /// <summary>Such as <c>25 Cel, 85.0 mL</c>: the inputs without their names where those say nothing more.</summary>
    public static string Inputs(PublishedCheck check) => check.Inputs.Count == 0
        ? "as stated"
        : string.Join(", ", check.Inputs.Select(one => one.Key == "temperature" ? one.Value : one.Key + " " + one.Value));

    public static string Verdict(CheckOutcome outcome) =>
        outcome.AgreesValueNotRead ? "agrees, value not read" : Word(outcome.Verdict);

    public static string Word(CheckVerdict verdict) => verdict switch
    {
        CheckVerdict.Holds => "holds",
        CheckVerdict.Fails => "fails",
        _ => "reported",
    };

    /// <summary>Of each outcome: inputs, known, expected, obtained, deviation, tolerance, verdict.</summary>
    public static string[] Cells(CheckOutcome outcome)
    {
        const int fewestDecimals = 4;
        var check = outcome.Check;
        var expected = Plain(check.Expected);
        var point = expected.IndexOf('.');
        var decimals = Math.Max(fewestDecimals, point < 0 ? 0 : expected.Length - point);
        var format = "F" + decimals.ToString(CultureInfo.InvariantCulture);
        return
        [
            Inputs(check),
            KnownText.Of(check.Known),
            expected,
            double.IsNaN(outcome.Obtained) ? "nothing" : outcome.Obtained.ToString(format, CultureInfo.InvariantCulture),
            double.IsNaN(outcome.Obtained) ? "" : Signed(outcome.Deviation, format),
            check.Tolerance is double tolerance ? Plain(tolerance) : "",
            Verdict(outcome),
        ];
    }

    public static IReadOnlyList<string> Headings { get; } = ["inputs", "known", "expected", "obtained", "deviation", "tolerance", "verdict"];

    /// <summary>The reasons of a set, each once, for its tolerances and for having none.</summary>
    public static IEnumerable<string> Reasons(IEnumerable<CheckOutcome> set) => set
        .Select(one => one.Check.Tolerance is null ? one.Check.Reason : "tolerance: " + one.Check.Reason)
        .Distinct(StringComparer.Ordinal);

    /// <summary>Such as <c>buffer-capacity, mol/L: borax 0.01 mol/kg</c>.</summary>
    public static string Heading(PublishedCheck check) => check.Quantity + (check.Unit == "1" ? "" : ", " + check.Unit) + ": " + check.Title;

    public static string Sum(QualificationReport report) => FormattableString.Invariant(
        $"{report.Outcomes.Count} checks: {report.Holds} hold, {report.HoldsAgainstDerived} hold against a derived value, {report.AgreesValueNotRead} agree with a value not read, {report.Fails} fail, {report.Reported} are reported without a tolerance.");

    private static string Plain(double value) => NumberText.Shortest(value);

    // Minus zero is zero.
    private static string Signed(double value, string format)
    {
        var text = value.ToString(format, CultureInfo.InvariantCulture);
        return text.Trim('-', '0', '.').Length == 0 ? text.TrimStart('-') : text[0] == '-' ? text : "+" + text;
    }
}
