using System;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// The change of pKa from 25 °C against enthalpies and heat capacities that were read in abstracts of other papers than the table rests on:
/// cells at high temperature (P. Benezeth 1997, R. M. Kettler 1992 and 1995), cells (R. G. Bates and G. F. Allen 1960) and calorimetry (2011).
/// </summary>
public sealed class ReactionQuantitiesTests(ITestOutputHelper output)
{
    [Fact]
    public void ShiftTo_From0To50Celsius_AgreesWithPublishedEnthalpies()
    {
        var table = new DeviationTable(output, "change of pKa from 25 degC, published enthalpies and heat capacities", CourseComparison.ReasonForTolerance);
        foreach (var row in PublishedRow.ReadAll("reaction-quantities.csv"))
        {
            var hasBoth = row.Has("heat_capacity_J_per_mol_K");
            foreach (var celsius in hasBoth ? [0.0, 10, 37, 50] : new[] { 10.0, 37 })
            {
                Compare(table, row, hasBoth ? row.Number("heat_capacity_J_per_mol_K") : 0, celsius);
            }
        }

        table.AssertHolds(30);
    }

    private static void Compare(DeviationTable table, PublishedRow row, double heatCapacity, double celsius)
    {
        var step = CourseComparison.Step(row.Text("step"));
        var what = FormattableString.Invariant($"{step.Id}, 25 to {celsius} degC");
        var expected = CourseComparison.ChangeOf(1000 * row.Number("enthalpy_kJ_per_mol"), heatCapacity, 25, celsius);
        var obtained = CourseComparison.Change(step, 25, celsius);
        if (row.Caution.Length > 0)
        {
            table.Report(row, what, expected, obtained);
        }
        else
        {
            table.Check(row, what, expected, obtained, CourseComparison.Tolerance(25, celsius));
        }
    }
}
