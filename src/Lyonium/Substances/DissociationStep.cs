using System.Collections.Generic;
using Lyonium.Provenance;

namespace Lyonium.Substances;

/// <summary>One dissociation step of a family: one proton given up.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed record DissociationStep
{
    /// <summary>The id, <c>family:number</c>, such as <c>citrate:1</c>.</summary>
    public required string Id { get; init; }

    /// <summary>The number of the step; 1 is the most acidic.</summary>
    public required int Number { get; init; }

    /// <summary>The chosen pKa.</summary>
    public required SourcedValue PKa { get; init; }

    /// <summary>The standard reaction enthalpy in kJ/mol, at 25 °C unless it says otherwise; <see langword="null"/> where it is not known.</summary>
    public SourcedValue? EnthalpyKJPerMol { get; init; }

    /// <summary>The standard reaction heat capacity in J/(mol K); <see langword="null"/> where it is not known.</summary>
    public SourcedValue? HeatCapacityJPerMolK { get; init; }

    /// <summary>A published equation for the pKa against temperature; <see langword="null"/> where none is listed.</summary>
    public PKaEquation? Equation { get; init; }

    /// <summary>
    /// From which temperature to which the pKa may be carried; <see langword="null"/> where nothing is known of its change with temperature.
    /// </summary>
    public TemperatureRange? ValidRange { get; init; }

    /// <summary>Other published values of the pKa.</summary>
    public IReadOnlyList<SourcedValue> Alternatives { get; init; } = [];

    /// <summary>Why <see cref="PKa"/> was chosen among them; empty where there was no choice.</summary>
    public string Reason { get; init; } = "";

    /// <summary>The temperature at which <see cref="PKa"/> holds, in K; 25 °C where it does not say.</summary>
    public double PublishedAtK => PKa.TemperatureK ?? VantHoff.StandardK;

    /// <summary>Whether the table says how the pKa changes with temperature.</summary>
    public bool ChangesWithTemperature => Equation is not null || EnthalpyKJPerMol is not null;

    /// <summary>By how much the pKa differs at another temperature from <see cref="PKa"/>.</summary>
    /// <remarks>
    /// The difference of the published equation between the two temperatures where there is one; otherwise the integrated van 't Hoff
    /// equation with a constant heat capacity,
    /// ln K(T) = ln K(T₀) − ΔrH°(T₀)/R · (1/T − 1/T₀) + ΔrCp°/R · (T₀/T − 1 + ln(T/T₀)), with ΔrCp° zero where it is not known
    /// (IUPAC Green Book, 3rd ed., 2.11; the three-term form as in R. N. Goldberg, N. Kishore and R. M. Lennen, J. Phys. Chem. Ref. Data
    /// 31 (2002) 231). Zero where nothing is known.
    /// </remarks>
    /// <param name="temperatureK">The temperature in K, above 0. Outside <see cref="ValidRange"/> it is an extrapolation.</param>
    /// <returns>The difference in pKa.</returns>
    public double ShiftTo(double temperatureK)
    {
        var from = PublishedAtK;
        if (Equation is not null)
        {
            return Equation.At(temperatureK) - Equation.At(from);
        }

        if (EnthalpyKJPerMol is not { } enthalpy)
        {
            return 0;
        }

        var heatCapacity = HeatCapacityJPerMolK?.Value ?? 0;
        var enthalpyJPerMol = (1000 * enthalpy.Value) + (heatCapacity * (from - (enthalpy.TemperatureK ?? VantHoff.StandardK)));
        return -VantHoff.Log10Shift(enthalpyJPerMol, heatCapacity, from, temperatureK);
    }

    /// <summary>The pKa at another temperature, at the ionic strength at which it was published.</summary>
    internal double PKaAt(double temperatureK) => PKa.Value + ShiftTo(temperatureK);
}
