using System;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// The change of pKa from 25 °C against published equations pK(T) = a/T + b + c T + d ln T that the table does not use: mostly cells of the
/// National Bureau of Standards and of Harned, known from memory; the sources stand in the rows.
/// </summary>
/// <remarks>
/// Most of these steps have the enthalpy and the heat capacity of Goldberg, Kishore and Lennen 2002, a review that weighs these cells
/// together with calorimetry. So the check is not wholly independent: it shows that the figures of the review, carried with the integrated
/// van 't Hoff equation, give the measurements back.
/// </remarks>
public sealed class PKaEquationsTests(ITestOutputHelper output)
{
    [Fact]
    public void ShiftTo_From0To50Celsius_AgreesWithPublishedEquations()
    {
        var table = new DeviationTable(output, "change of pKa from 25 degC, published equations", CourseComparison.ReasonForTolerance);
        foreach (var row in PublishedRow.ReadAll("pka-equations.csv"))
        {
            Compare(table, row);
        }

        table.AssertHolds(249);
    }

    private static void Compare(DeviationTable table, PublishedRow row)
    {
        var step = CourseComparison.Step(row.Text("step"));
        var last = Math.Min(50, row.Number("to_C"));
        for (var celsius = row.Number("from_C"); celsius <= last; celsius += 5)
        {
            if (celsius == 25 || step.ValidRange!.Beyond(celsius + 273.15) > 0)
            {
                continue;
            }

            var what = FormattableString.Invariant($"{step.Id}, 25 to {celsius} degC");
            var expected = PK(row, celsius) - PK(row, 25);
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

    private static double PK(PublishedRow row, double celsius)
    {
        var kelvin = celsius + 273.15;
        return (row.Number("over_T") / kelvin) + row.Number("constant") + (row.Number("times_T") * kelvin) + (row.Number("times_lnT") * Math.Log(kelvin));
    }
}
