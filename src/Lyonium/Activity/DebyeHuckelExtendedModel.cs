using System;
using Lyonium.Equilibria;

namespace Lyonium.Activity;

/// <summary>The extended Debye–Hückel equation: log10 γ = −A z² √I / (1 + B å √I), with a size å for each ion.</summary>
/// <remarks>
/// The sizes are those of Kielland. An ion whose size is not listed takes 1/B, about 3.04 Å at 25 °C, for which the equation is
/// Güntelberg's; a prediction lists such ions, and what another size would do to the pH. Single-ion convention: Kielland's, who took the
/// sizes from several properties of the ions. Neutral species take one. Flagged above 0.1 mol/kg. Stateless and thread-safe.
/// </remarks>
public sealed class DebyeHuckelExtendedModel : IActivityModel
{
    /// <inheritdoc/>
    public string Name => "debye-huckel-extended";

    /// <inheritdoc/>
    public double HighestIonicStrengthMolPerKg => 0.1;

    /// <inheritdoc/>
    public IonData Uses => IonData.Sizes;

    /// <inheritdoc/>
    public string Source => "P. Debye and E. Hückel, Phys. Z. 24 (1923) 185; ion sizes and range: J. Kielland, J. Am. Chem. Soc. 59 (1937) 1675";

    /// <inheritdoc/>
    public void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas)
    {
        _ = equilibrium ?? throw new ArgumentNullException(nameof(equilibrium));
        var root = Math.Sqrt(ionicStrengthMolPerKg);
        var limitingLaw = -equilibrium.Solvent.DebyeHuckelA * root;
        var charges = equilibrium.Charges;
        var sizes = equilibrium.IonSizesAngstrom;
        for (var i = 0; i < charges.Length; i++)
        {
            var relativeSize = double.IsNaN(sizes[i]) ? 1 : equilibrium.Solvent.DebyeHuckelB * sizes[i];
            log10Gammas[i] = limitingLaw * charges[i] * charges[i] / (1 + (relativeSize * root));
        }
    }
}
