using Lyonium.Provenance;
using Lyonium.Substances;

namespace Lyonium.Recipes;

/// <summary>What one part of a recipe brings into the vessel.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed record PreparedPart
{
    /// <summary>The part.</summary>
    public required Part Part { get; init; }

    /// <summary>The substance; <see langword="null"/> for water.</summary>
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

    /// <summary>The density of the solution that was found in the table, in kg/L; <see langword="null"/> where none was needed.</summary>
    public SourcedValue? TableDensity { get; init; }
}
