using System.Collections.Generic;
using System.Linq;
using Lyonium.Provenance;

namespace Lyonium.Substances;

/// <summary>A substance of the table: its names, its formula, and what it brings into solution.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed record Substance
{
    /// <summary>The id, for ever.</summary>
    public required string Id { get; init; }

    /// <summary>The name.</summary>
    public required string Name { get; init; }

    /// <summary>Other names.</summary>
    public IReadOnlyList<string> Synonyms { get; init; } = [];

    /// <summary>The formula.</summary>
    public required ChemicalFormula Formula { get; init; }

    /// <summary>Other ways of writing the formula.</summary>
    public IReadOnlyList<string> OtherFormulas { get; init; } = [];

    /// <summary>The molar mass in g/mol, crystal water included, from the formula and the table's atomic weights.</summary>
    public required double MolarMassGPerMol { get; init; }

    /// <summary>What it brings into solution.</summary>
    public required IReadOnlyList<BroughtFamily> Brings { get; init; }

    /// <summary>The protons it brings beside the base forms; negative where it takes some.</summary>
    public required int Protons { get; init; }

    /// <summary>The density of the pure substance, in kg/L; <see langword="null"/> where it is not known.</summary>
    public SourcedValue? DensityKgPerL { get; init; }

    /// <summary>The molar volume of the dissolved anhydrous solute, in mL/mol; <see langword="null"/> where it is not known.</summary>
    public SourcedValue? MolarVolumeMLPerMol { get; init; }

    /// <summary>The density of its solutions; <see langword="null"/> where none is known.</summary>
    public SolutionDensities? SolutionDensities { get; init; }

    /// <summary>
    /// How much of it dissolves in pure water, in mol per kg of water, crystal water counted with the water; <see langword="null"/> where
    /// none is listed.
    /// </summary>
    public SourcedValue? SolubilityMolPerKg { get; init; }

    /// <summary>The groups by which cautions find it.</summary>
    public IReadOnlyList<string> Groups { get; init; } = [];

    /// <summary>The mass of crystal water per amount of substance, in g/mol.</summary>
    public required double CrystalWaterGPerMol { get; init; }

    /// <summary>The name of the user's table that it comes from; <see langword="null"/> for the library's own.</summary>
    public string? Layer { get; init; }

    /// <summary>The same substance bringing the families of another table.</summary>
    internal Substance With(IReadOnlyList<Family> families) => this with
    {
        Brings = Brings.Select(one => one with { Family = families.First(family => family.Id == one.Family.Id) }).ToArray(),
    };
}
