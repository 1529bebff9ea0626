using Lyonium.Quantities;

namespace Lyonium.Recipes;

/// <summary>A volume or mass of water.</summary>
public sealed class WaterPart : Part
{
    internal WaterPart(Measure taken, string? id)
        : base(taken, id)
    {
    }

    private protected override bool HoldsTheSame(Part other) => true;
}
