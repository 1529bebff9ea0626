using Lyonium.Provenance;
using Lyonium.Substances;

namespace Lyonium.Recipes;

/// <summary>What one part of a recipe brings into the vessel.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed record PreparedPart
{
    /// <summary>The part.</summary>
    public required Part Part { get; init; }

    /// <summary>
    /// The recipe inside the recipe that this part belongs to, whose water, volume and mass include it; <see langword="null"/> for a part
    /// of the recipe itself.
    /// </summary>
    public RecipePart? Inside { get; init; }

    /// <summary>The substance; <see langword="null"/> for water and for a recipe.</summary>
    public Substance? Substance { get; init; }

    /// <summary>The amount of the substance, in mol.</summary>
    public double AmountMol { get; init; }

    /// <summary>The water, crystal water included, in kg.</summary>
    public required double WaterKg { get; init; }

    /// <summary>The volume at the temperature of preparation, in L.</summary>
    public required double VolumeL { get; init; }

    /// <summary>The mass, in kg.</summary>
    public required double MassKg { get; init; }

    /// <summary>By how much <see cref="WaterKg"/> may be off because the volume of the solute was estimated, in kg; 0 where it was not.</summary>
    public double EstimatedWaterKg { get; init; }

    /// <summary>By how much <see cref="VolumeL"/> may be off because the volume of the solute was estimated, in L; 0 where it was not.</summary>
    public double EstimatedVolumeL { get; init; }

    /// <summary>The same part, as much of it as a share of the whole holds.</summary>
    internal PreparedPart Scaled(double share, RecipePart inside) => this with
    {
        Inside = inside,
        AmountMol = AmountMol * share,
        WaterKg = WaterKg * share,
        VolumeL = VolumeL * share,
        MassKg = MassKg * share,
        EstimatedWaterKg = EstimatedWaterKg * share,
        EstimatedVolumeL = EstimatedVolumeL * share,
    };

    /// <summary>The density of the solution that was found in the table, in kg/L; <see langword="null"/> where none was needed.</summary>
    public SourcedValue? TableDensity { get; init; }
}
