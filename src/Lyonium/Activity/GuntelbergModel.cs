using System;
using Lyonium.Equilibria;

namespace Lyonium.Activity;

/// <summary>The Güntelberg equation: log10 γ = −A z² √I / (1 + √I).</summary>
/// <remarks>
/// The Debye–Hückel equation with one size for all ions, about 3.04 Å at 25 °C; flagged above 0.1 mol/kg. Each single ion takes the
/// coefficient that its charge gives; neutral species take one. Stateless and thread-safe.
/// </remarks>
public sealed class GuntelbergModel : IActivityModel
{
    /// <inheritdoc/>
    public string Name => "guntelberg";

    /// <inheritdoc/>
    public double HighestIonicStrengthMolPerKg => 0.1;

    /// <inheritdoc/>
    public IonData Uses => IonData.None;

    /// <inheritdoc/>
    public string Source => "E. Güntelberg, Z. phys. Chem. 123 (1926) 199; the limit of 0.1 mol/kg is common practice";

    /// <inheritdoc/>
    public void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas)
    {
        var root = Math.Sqrt(ionicStrengthMolPerKg);
        SquareChargeLaw.Fill(equilibrium, root / (1 + root), log10Gammas);
    }
}
