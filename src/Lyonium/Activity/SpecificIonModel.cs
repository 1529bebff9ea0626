using System;
using Lyonium.Equilibria;

namespace Lyonium.Activity;

/// <summary>
/// Specific ion interaction theory: log10 γᵢ = −A zᵢ² √I / (1 + 1.5 √I) + Σⱼ ε(i, j) mⱼ.
/// </summary>
/// <remarks>
/// The sum goes over the species with which an interaction coefficient ε is listed; one that is not listed is zero, and a prediction lists
/// such pairs. Without any coefficient it is the Bates–Guggenheim convention for every ion. Single-ion convention: each ion takes the
/// coefficient that the equation gives it, with the published coefficients, which are for pairs of opposite charge. Flagged above 3.5 mol/kg.
/// Stateless and thread-safe.
/// </remarks>
public sealed class SpecificIonModel : IActivityModel
{
    /// <inheritdoc/>
    public string Name => "specific-ion";

    /// <inheritdoc/>
    public double HighestIonicStrengthMolPerKg => 3.5;

    /// <inheritdoc/>
    public IonData Uses => IonData.Interactions;

    /// <inheritdoc/>
    public string Source => "L. Ciavatta, Ann. Chim. (Rome) 70 (1980) 551; I. Grenthe et al., Chemical Thermodynamics of Uranium (NEA), North-Holland (1992), appendix B";

    /// <inheritdoc/>
    public void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas)
    {
        var root = Math.Sqrt(ionicStrengthMolPerKg);
        SquareChargeLaw.Fill(equilibrium, root / (1 + (1.5 * root)), log10Gammas);
        foreach (var pair in equilibrium.Interactions)
        {
            log10Gammas[pair.First] += pair.KgPerMol * molalities[pair.Second];
            log10Gammas[pair.Second] += pair.KgPerMol * molalities[pair.First];
        }
    }
}
