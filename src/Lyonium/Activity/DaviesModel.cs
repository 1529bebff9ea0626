using System;
using Lyonium.Equilibria;

namespace Lyonium.Activity;

/// <summary>The Davies equation: log10 γ = −A z² (√I / (1 + √I) − 0.3 I).</summary>
/// <remarks>
/// The constant is 0.3, as Davies gave it in 1962 (0.2 in 1938). Each single ion takes the coefficient that its charge gives; neutral
/// species take one. Flagged above 0.5 mol/kg. Stateless and thread-safe.
/// </remarks>
public sealed class DaviesModel : IActivityModel
{
    /// <inheritdoc/>
    public string Name => "davies";

    /// <inheritdoc/>
    public double HighestIonicStrengthMolPerKg => 0.5;

    /// <inheritdoc/>
    public IonData Uses => IonData.None;

    /// <inheritdoc/>
    public string Source => "C. W. Davies, Ion Association, Butterworths, London (1962)";

    /// <inheritdoc/>
    public void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas)
    {
        var root = Math.Sqrt(ionicStrengthMolPerKg);
        SquareChargeLaw.Fill(equilibrium, (root / (1 + root)) - (0.3 * ionicStrengthMolPerKg), log10Gammas);
    }
}
