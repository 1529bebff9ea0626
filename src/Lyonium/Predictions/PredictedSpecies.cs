using UnitsNet;

namespace Lyonium.Predictions;

/// <summary>One species of the answer.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
/// <param name="Id">The id, <c>family:protons</c>, such as <c>citrate:3</c>.</param>
/// <param name="Family">The id of its family.</param>
/// <param name="Display">The formula, such as <c>HPO₄²⁻</c>.</param>
/// <param name="Charge">The charge number.</param>
/// <param name="MolalityMolPerKg">The molality, in mol per kg of water.</param>
/// <param name="ConcentrationMolPerL">The amount concentration at the temperature of preparation, in mol/L.</param>
/// <param name="Fraction">The share of its family that it makes up, 0 to 1; <see langword="null"/> for the ions of water.</param>
/// <param name="ActivityCoefficient">The activity coefficient, molality scale.</param>
public sealed record PredictedSpecies(
    string Id,
    string Family,
    string Display,
    int Charge,
    double MolalityMolPerKg,
    double ConcentrationMolPerL,
    double? Fraction,
    double ActivityCoefficient)
{
    /// <summary>The molality.</summary>
    public Molality Molality => Molality.FromMolesPerKilogram(MolalityMolPerKg);

    /// <summary>The amount concentration at the temperature of preparation.</summary>
    public Molarity Concentration => Molarity.FromMolesPerLiter(ConcentrationMolPerL);
}
