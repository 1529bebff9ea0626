using System;
using System.Linq;
using Lyonium.Substances;

namespace Lyonium.PublishedValues;

/// <summary>How the pKa of the built-in table change with temperature, against published courses.</summary>
internal static class CourseComparison
{
    /// <summary>
    /// What 0.4 kJ/mol in the enthalpy and 30 J/(mol K) in the heat capacity do between the two temperatures (common practice for how far
    /// cells and calorimetry agree), and 0.002 for the published figures themselves.
    /// </summary>
    public const string ReasonForTolerance =
        "0.002 and what 0.4 kJ/mol and 30 J/(mol K) do from the first temperature to the second: how far cells and calorimetry agree, common practice";

    private const double GasConstant = 8.31446261815324;

    public static DissociationStep Step(string id) => SubstanceTable.Default.Families.SelectMany(family => family.Steps).Single(step => step.Id == id);

    public static double Change(DissociationStep step, double fromCelsius, double toCelsius) =>
        step.ShiftTo(toCelsius + 273.15) - step.ShiftTo(fromCelsius + 273.15);

    public static double Tolerance(double fromCelsius, double toCelsius) =>
        0.002 + Math.Abs(ChangeOf(400, 0, fromCelsius, toCelsius)) + Math.Abs(ChangeOf(0, 30, fromCelsius, toCelsius));

    /// <summary>The change of pK by way of the Gibbs energy, ΔG(T) = ΔH(T) − T ΔS(T), not by the equation that the library integrates.</summary>
    public static double ChangeOf(double enthalpyJPerMol, double heatCapacityJPerMolK, double fromCelsius, double toCelsius)
    {
        var (from, to) = (fromCelsius + 273.15, toCelsius + 273.15);
        var enthalpy = enthalpyJPerMol + (heatCapacityJPerMolK * (to - from));
        var entropy = (enthalpyJPerMol / from) + (heatCapacityJPerMolK * Math.Log(to / from)); // so that ΔG is zero at the first temperature
        return (enthalpy - (to * entropy)) / (GasConstant * to * Math.Log(10));
    }
}
