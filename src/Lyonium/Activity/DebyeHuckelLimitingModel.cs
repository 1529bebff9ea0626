using System;
using Lyonium.Equilibria;

namespace Lyonium.Activity;

/// <summary>The limiting law of Debye and Hückel: log10 γ = −A z² √I.</summary>
/// <remarks>
/// Exact as the ionic strength goes to zero; flagged above 0.01 mol/kg. Each single ion takes the coefficient that its charge gives; neutral
/// species take one. Stateless and thread-safe.
/// </remarks>
public sealed class DebyeHuckelLimitingModel : IActivityModel
{
    /// <inheritdoc/>
    public string Name => "debye-huckel-limiting";

    /// <inheritdoc/>
    public double HighestIonicStrengthMolPerKg => 0.01;

    /// <inheritdoc/>
    public IonData Uses => IonData.None;

    /// <inheritdoc/>
    public string Source => "P. Debye and E. Hückel, Phys. Z. 24 (1923) 185; the limit of 0.01 mol/kg is common practice";

    /// <inheritdoc/>
    public void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas)
    {
        var root = Math.Sqrt(ionicStrengthMolPerKg);
        SquareChargeLaw.Fill(equilibrium, root, log10Gammas);
    }
}
