using Lyonium.Water;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// pKw at saturated vapour pressure, molality scale: W. L. Marshall and E. U. Franck, J. Phys. Chem. Ref. Data 10 (1981) 295, read. Its
/// abstract (read) claims 0.01 for many of the measurements up to 200 °C.
/// </summary>
public sealed class MarshallFranck1981Tests(ITestOutputHelper output)
{
    [Fact]
    public void PKw_From0To100Celsius_AgreesWithTheTable()
    {
        var table = new DeviationTable(
            output,
            "pKw against Marshall and Franck 1981",
            "0.019: 0.01 claimed by the table, and the standard uncertainty 0.016 of the equation revised in 2020 (Arcis et al., J. Phys. Chem. "
            + "Ref. Data 49, read), as the root of the sum of squares; the pressures differ by less than 0.1 MPa, 0.0004");
        foreach (var row in PublishedRow.ReadAll("marshall-franck-1981-pkw.csv"))
        {
            table.Check(row, row.Text("t_C") + " degC", row.Number("pKw"), WaterIonization.PKw(row.Number("t_C") + 273.15), 0.019);
        }

        table.AssertHolds(21);
    }
}
