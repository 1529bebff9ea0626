using Lyonium.Quantities;

namespace Lyonium.Recipes;

/// <summary>A volume or mass of a solution.</summary>
public sealed class SolutionPart : Part
{
    internal SolutionPart(Stock stock, Measure taken, string? id)
        : base(taken, id) => Stock = stock;

    /// <summary>The solution.</summary>
    public Stock Stock { get; }

    private protected override bool HoldsTheSame(Part other) => Stock.Equals(((SolutionPart)other).Stock);
}
