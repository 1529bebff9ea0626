using System.Collections.Generic;
using Lyonium.Quantities;
using UnitsNet;

namespace Lyonium.Predictions;

/// <summary>How firmly a mixture holds its pH: against strong base, against dilution, against temperature.</summary>
/// <remarks>
/// As R. G. Bates defines them (Determination of pH, 2nd ed., Wiley, New York 1973, chapter 5). They belong to the equilibrium with activity
/// coefficients, whatever the method of the prediction. Immutable; safe to share between threads.
/// </remarks>
public sealed record BufferFigures
{
    /// <summary>
    /// The buffer capacity β (Bates: buffer value), db/dpH with b the strong base added, in mol per litre of mixture at the temperature of
    /// preparation and for one unit of pH. The base brings a singly charged cation and no water.
    /// </summary>
    public required double CapacityMolPerL { get; init; }

    /// <summary>The buffer capacity, in mol/L for one unit of pH.</summary>
    public Molarity Capacity => Molarity.FromMolesPerLiter(CapacityMolPerL);

    /// <summary>
    /// The dilution value ΔpH½: the pH after adding an equal volume of water, less the pH before; <see cref="double.NaN"/> where the diluted
    /// mixture has no exact answer.
    /// </summary>
    public required double DilutionValue { get; init; }

    /// <summary>
    /// The temperature coefficient dpH/dT in 1/K, molalities held; without what the constants in
    /// <see cref="TemperatureCoefficientLeavesOut"/> would add, and <see cref="double.NaN"/> where one of them bears on the pH: more than a
    /// thousandth of its family stands on either side of the step.
    /// </summary>
    public required double TemperatureCoefficientPerK { get; init; }

    /// <summary>The ids of the dissociation steps whose change with temperature the table does not give; empty where it gives all.</summary>
    public required IReadOnlyList<string> TemperatureCoefficientLeavesOut { get; init; }

    /// <summary>The figures in words, the same in every culture.</summary>
    /// <returns>Such as <c>capacity 0.0577 mol/L, dilution value 0.08, temperature coefficient -0.0028 1/K</c>.</returns>
    public override string ToString() =>
        $"capacity {NumberText.Shortest(CapacityMolPerL)} mol/L, dilution value {Text(DilutionValue)}, temperature coefficient {Text(TemperatureCoefficientPerK)}"
        + (double.IsNaN(TemperatureCoefficientPerK) ? "" : " 1/K")
        + (TemperatureCoefficientLeavesOut.Count == 0 ? "" : " without " + string.Join(", ", TemperatureCoefficientLeavesOut));

    private static string Text(double value) => double.IsNaN(value) ? "unknown" : NumberText.Shortest(value);
}
