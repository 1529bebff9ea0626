using System;
using Lyonium.Quantities;

namespace Lyonium.Recipes;

/// <summary>One thing that goes into the vessel.</summary>
/// <remarks>Immutable; equal by value; safe to share between threads.</remarks>
public abstract class Part : IEquatable<Part>
{
    private protected Part(Measure taken, string? id)
    {
        Taken = taken;
        Id = id;
    }

    /// <summary>The id of the part in its recipe; <see langword="null"/> where it has none.</summary>
    public string? Id { get; }

    /// <summary>How much is taken: a volume, a mass, an amount of substance, or (of a recipe) the whole as 100 %.</summary>
    public Measure Taken { get; }

    /// <inheritdoc/>
    public bool Equals(Part? other) =>
        other is not null
        && GetType() == other.GetType()
        && string.Equals(Id, other.Id, StringComparison.Ordinal)
        && Taken.Equals(other.Taken)
        && HoldsTheSame(other);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => Equals(obj as Part);

    /// <inheritdoc/>
    public override int GetHashCode() => Taken.GetHashCode();

    private protected abstract bool HoldsTheSame(Part other);
}

/// <summary>A volume or mass of a solution.</summary>
public sealed class SolutionPart : Part
{
    internal SolutionPart(Stock stock, Measure taken, string? id)
        : base(taken, id) => Stock = stock;

    /// <summary>The solution.</summary>
    public Stock Stock { get; }

    private protected override bool HoldsTheSame(Part other) => Stock.Equals(((SolutionPart)other).Stock);
}

/// <summary>A mass or amount of a pure substance.</summary>
public sealed class SubstancePart : Part
{
    internal SubstancePart(string substance, Measure taken, Measure? purity, string? id)
        : base(taken, id)
    {
        Substance = substance;
        Purity = purity;
    }

    /// <summary>The id of the substance.</summary>
    public string Substance { get; }

    /// <summary>The mass fraction of the substance in what was weighed; <see langword="null"/> where it was not stated (100 %).</summary>
    public Measure? Purity { get; }

    private protected override bool HoldsTheSame(Part other) =>
        string.Equals(Substance, ((SubstancePart)other).Substance, StringComparison.Ordinal) && Equals(Purity, ((SubstancePart)other).Purity);
}

/// <summary>A volume or mass of water.</summary>
public sealed class WaterPart : Part
{
    internal WaterPart(Measure taken, string? id)
        : base(taken, id)
    {
    }

    private protected override bool HoldsTheSame(Part other) => true;
}

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
