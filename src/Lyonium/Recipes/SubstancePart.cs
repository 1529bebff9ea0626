using System;
using Lyonium.Quantities;

namespace Lyonium.Recipes;

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
