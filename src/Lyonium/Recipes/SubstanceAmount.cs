using Lyonium.Substances;

namespace Lyonium.Recipes;

/// <summary>How much of a substance is in a mixture.</summary>
/// <param name="Substance">The substance.</param>
/// <param name="AmountMol">The amount, in mol.</param>
public sealed record SubstanceAmount(Substance Substance, double AmountMol);
