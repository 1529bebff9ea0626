namespace Lyonium.Modelling;

/// <summary>What a species of the numeric problem is to a chemist.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
/// <param name="Id">The id, <c>family:protons</c>, such as <c>citrate:3</c>; the ions of water are <c>water:2</c> and <c>water:0</c>.</param>
/// <param name="Family">The id of its family.</param>
/// <param name="Display">The formula, such as <c>HPO₄²⁻</c>.</param>
/// <param name="Charge">The charge number.</param>
/// <param name="FamilyTotalMolPerKg">The total of its family, in mol/kg; <see langword="null"/> for the ions of water.</param>
public sealed record ModelledSpecies(string Id, string Family, string Display, int Charge, double? FamilyTotalMolPerKg);
