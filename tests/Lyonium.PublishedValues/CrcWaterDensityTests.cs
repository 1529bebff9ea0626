using Lyonium.Water;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>The density of water at 101.325 kPa as handbooks print it (CRC Handbook of Chemistry and Physics), read.</summary>
public sealed class CrcWaterDensityTests(ITestOutputHelper output)
{
    [Fact]
    public void KgPerL_TabulatedTemperatures_AgreesWithTheHandbook()
    {
        var table = new DeviationTable(
            output,
            "Density of water in kg/L",
            "5e-6: the handbook's densest water is 0.999972, that of the standard isotopic composition 0.999975 (3e-6), it is at 101.325 kPa "
            + "(0.7e-6), SR6-08 states 1e-6 for itself, and the last digit is printed");
        var rows = PublishedRow.ReadAll("crc-water-density.csv");
        foreach (var row in rows)
        {
            var obtained = WaterDensity.KgPerL(row.Number("t_C") + 273.15);
            table.Check(row, row.Text("t_C") + " degC", row.Number("density_kg_L"), obtained, 5e-6);
        }

        table.AssertHolds(8);
    }
}
