using System.Collections.Generic;
using Lyonium.Provenance;

namespace Lyonium.Substances;

/// <summary>A species that other species form together: an ion pair, a dimer, a polymer.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed record PairedSpecies
{
    /// <summary>The id, for ever, such as <c>calcium-hydroxide-pair</c>.</summary>
    public required string Id { get; init; }

    /// <summary>The formula.</summary>
    public required ChemicalFormula Formula { get; init; }

    /// <summary>
    /// The species it is formed from, with their counts, by id (<c>family:protons</c>; <c>water:2</c> and <c>water:0</c> are the ions of water). Water
    /// that is set free or taken up is not counted.
    /// </summary>
    public required IReadOnlyList<KeyValuePair<string, int>> FormedFrom { get; init; }

    /// <summary>log10 of the formation constant at infinite dilution, molality scale.</summary>
    public required SourcedValue Log10K { get; init; }

    /// <summary>The reaction enthalpy in kJ/mol; <see langword="null"/> where it is not known.</summary>
    public SourcedValue? EnthalpyKJPerMol { get; init; }

    /// <summary>Whether the table says how the constant changes with temperature.</summary>
    public bool ChangesWithTemperature => EnthalpyKJPerMol is not null;

    /// <summary>By how much log10 K differs at another temperature, by the van 't Hoff equation with a constant enthalpy; 0 where none is known.</summary>
    /// <param name="temperatureK">The temperature in K, above 0.</param>
    /// <returns>The difference in log10 K.</returns>
    public double ShiftTo(double temperatureK) => EnthalpyKJPerMol is { } enthalpy
        ? VantHoff.Log10Shift(1000 * enthalpy.Value, heatCapacityJPerMolK: 0, Log10K.TemperatureK ?? VantHoff.StandardK, temperatureK)
        : 0;
}
