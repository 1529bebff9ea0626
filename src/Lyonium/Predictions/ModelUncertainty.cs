using Lyonium.Quantities;

namespace Lyonium.Predictions;

/// <summary>How far predictions with an activity model lie from published pH values, at about the ionic strength of a prediction.</summary>
/// <remarks>
/// The root mean square deviation from published values between 0 and 50 °C, each solution counted once. Its scope is the homogeneous aqueous model: constants,
/// activity coefficients and the single-ion convention, with the published values' own uncertainty. A comparison with a glass electrode
/// has a liquid-junction term on top. Immutable; safe to share between threads.
/// </remarks>
/// <param name="StandardUncertainty">The standard uncertainty, in pH.</param>
/// <param name="Solutions">How many solutions with published values it rests on.</param>
/// <param name="LowMolPerKg">From which ionic strength on, in mol/kg.</param>
/// <param name="HighMolPerKg">Up to which ionic strength, in mol/kg.</param>
public sealed record ModelUncertainty(double StandardUncertainty, int Solutions, double LowMolPerKg, double HighMolPerKg)
{
    /// <summary>What it covers and what it leaves out, in words.</summary>
    public const string Scope = "homogeneous aqueous model; a comparison with a glass electrode has a liquid-junction term on top";

    /// <summary>The uncertainty in words, the same in every culture.</summary>
    /// <returns>Such as <c>0.012 in pH, from 25 published solutions at 0.01 to 0.1 mol/kg</c>.</returns>
    public override string ToString() =>
        $"{NumberText.Shortest(StandardUncertainty)} in pH, from {NumberText.Shortest(Solutions)} published solutions at {NumberText.Shortest(LowMolPerKg)} to {NumberText.Shortest(HighMolPerKg)} mol/kg";
}
