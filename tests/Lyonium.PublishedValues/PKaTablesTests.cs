using System;
using System.Collections.Generic;
using System.Linq;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// pKa against temperature, published as tables that were read: R. N. Roy 1981 for ADA, D. H. Everett and W. F. K. Wynne-Jones 1941 for the
/// amines, entries of the IUPAC compilations, abstracts for zwitterionic buffers.
/// </summary>
/// <remarks>
/// The values for ADA are those that the review of Goldberg, Kishore and Lennen 2002 prints beside its own enthalpy and heat capacity, so
/// they check the carrying and not the figures. With a reference temperature the change from it is compared, else the pKa.
/// </remarks>
public sealed class PKaTablesTests(ITestOutputHelper output)
{
    [Fact]
    public void ShiftTo_From0To55Celsius_AgreesWithPublishedTables()
    {
        var table = new DeviationTable(output, "pKa against temperature, published tables", CourseComparison.ReasonForTolerance);
        var rows = PublishedRow.ReadAll("pka-tables.csv");
        foreach (var row in rows)
        {
            Compare(table, row, rows);
        }

        table.AssertHolds(18);
    }

    private static void Compare(DeviationTable table, PublishedRow row, IEnumerable<PublishedRow> rows)
    {
        var step = CourseComparison.Step(row.Text("step"));
        var celsius = row.Number("t_C");
        var from = row.Has("reference_C") ? row.Number("reference_C") : 25;
        if (row.Has("reference_C") && celsius == from)
        {
            return;
        }

        var there = row.Has("reference_C") ? rows.Single(one => one.Text("step") == step.Id && one.Number("t_C") == from).Number("pKa") : 0;
        var obtained = row.Has("reference_C") ? CourseComparison.Change(step, from, celsius) : step.PKa.Value + step.ShiftTo(celsius + 273.15);
        var what = FormattableString.Invariant($"{step.Id}, {(row.Has("reference_C") ? from + " to " : "at ")}{celsius} degC");
        if (row.Caution.Length > 0)
        {
            table.Report(row, what, row.Number("pKa") - there, obtained);
        }
        else
        {
            table.Check(row, what, row.Number("pKa") - there, obtained, CourseComparison.Tolerance(from, celsius));
        }
    }
}
