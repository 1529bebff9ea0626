using Lyonium.Water;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// pKw at 0.1 MPa as the CRC Handbook prints it by IAPWS R11-07, read. By how much R11-24 lies above R11-07 stands in the rows, derived
/// from the two published equations at Kell's density, outside of the library.
/// </summary>
public sealed class CrcPKwTests(ITestOutputHelper output)
{
    [Fact]
    public void PKw_At100KPa_AgreesWithTheHandbook()
    {
        var table = new DeviationTable(
            output, "pKw less the difference of the two releases, against the handbook", "half of the third decimal, and half of the fifth of the difference");
        foreach (var row in PublishedRow.ReadAll("crc-pkw-2007.csv"))
        {
            var obtained = WaterIonization.PKw(row.Number("t_C") + 273.15) - row.Number("r1124_less_r1107");
            table.Check(row, row.Text("t_C") + " degC", row.Number("pKw"), obtained, 0.000505);
        }

        table.AssertHolds(5);
    }
}
