using System;
using System.Collections.Generic;
using System.Linq;

namespace Lyonium.Predictions;

/// <summary>
/// What the model leaves out: it knows one solution in which nothing but protons is exchanged. These are the checks that tell a mixture
/// which does more, and the words for it.
/// </summary>
internal static class ModelScope
{
    public const string WithinListedSolubility = "within-listed-solubility";
    public const string NoReactionButProtonExchange = "no-reaction-but-proton-exchange";
    public const string IonicStrengthInRange = "ionic-strength-in-range";
    public const string WaterIsTheSolvent = "water-is-the-solvent";
    public const string ConstantCarriedToInfiniteDilution = "constant-carried-to-infinite-dilution";
    public const string ConstantAtItsTemperature = "constant-at-its-temperature";
    public const string ConstantWithinItsTemperatureRange = "constant-within-its-temperature-range";
    public const string MayNotDissolve = "may not dissolve";

    private const double FarOut = 10;
    private const double HighestOfAny = 5; // mol/kg
    private static readonly string[] NeededByTheChecks = [IonicStrengthInRange, WaterIsTheSolvent, ConstantAtItsTemperature, ConstantWithinItsTemperatureRange];

    /// <summary>Why a number is of the homogeneous model only; empty where it is not.</summary>
    public static IReadOnlyList<string> Reasons(IEnumerable<Assumption> assumptions) =>
        assumptions.Where(one => !one.Held).Select(ReasonOf).OfType<string>().Distinct(StringComparer.Ordinal).ToArray();

    /// <summary>Whether the mixture takes something for granted that no published check has tried.</summary>
    public static bool IsBeyondWhatWasChecked(IReadOnlyList<Assumption> assumptions) =>
        Reasons(assumptions).Count > 0
        || assumptions.Any(one => one.Code == ConstantCarriedToInfiniteDilution || (!one.Held && NeededByTheChecks.Contains(one.Code, StringComparer.Ordinal)));

    private static string? ReasonOf(Assumption one) => one.Code switch
    {
        WithinListedSolubility => MayNotDissolve,
        NoReactionButProtonExchange => "consumes itself",
        IonicStrengthInRange when one.Figure > Math.Max(FarOut * (one.Limit ?? 0), HighestOfAny) => "ionic strength far beyond the activity model",
        _ => null,
    };
}
