using System;
using Lyonium.Equilibria;

namespace Lyonium.Activity;

/// <summary>The Bates–Guggenheim convention, applied to every ion: log10 γ = −A z² √I / (1 + 1.5 √I).</summary>
/// <remarks>
/// The convention fixes the coefficient of the chloride ion at ionic strengths up to 0.1 mol/kg, and with it the pH scale of the primary
/// standards. Here every single ion takes the coefficient that the same equation gives to its charge; neutral species take one. Flagged
/// above 0.1 mol/kg. Stateless and thread-safe.
/// </remarks>
public sealed class BatesGuggenheimModel : IActivityModel
{
    /// <inheritdoc/>
    public string Name => "bates-guggenheim";

    /// <inheritdoc/>
    public double HighestIonicStrengthMolPerKg => 0.1;

    /// <inheritdoc/>
    public IonData Uses => IonData.None;

    /// <inheritdoc/>
    public string Source => "R. G. Bates and E. A. Guggenheim, Pure Appl. Chem. 1 (1960) 163; IUPAC Recommendations 2002 (Buck et al.), Pure Appl. Chem. 74 (2002) 2169";

    /// <inheritdoc/>
    public void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas)
    {
        var root = Math.Sqrt(ionicStrengthMolPerKg);
        SquareChargeLaw.Fill(equilibrium, root / (1 + (1.5 * root)), log10Gammas);
    }
}
