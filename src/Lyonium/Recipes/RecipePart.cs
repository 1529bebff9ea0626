using Lyonium.Quantities;

namespace Lyonium.Recipes;

/// <summary>A volume or mass of what another recipe makes, or all of it.</summary>
public sealed class RecipePart : Part
{
    internal RecipePart(Recipe recipe, Measure taken, string? id)
        : base(taken, id) => Recipe = recipe;

    /// <summary>The recipe that is poured.</summary>
    public Recipe Recipe { get; }

    /// <summary>Whether all that the recipe makes is poured.</summary>
    public bool IsAll => Taken.Dimension == Dimension.MassFraction;

    internal static Measure All { get; } = Measure.Parse("100 %", Dimension.MassFraction);

    private protected override bool HoldsTheSame(Part other) => Recipe.Equals(((RecipePart)other).Recipe);
}
