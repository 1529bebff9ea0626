using Lyonium.Water;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>IAPWS R11-24, ionization constant of water (2024): its check values, read, and the values at 0.1 MPa derived from it.</summary>
public sealed class IapwsR1124Tests(ITestOutputHelper output)
{
    [Fact]
    public void PKw_CheckPointsOfTheRelease_AgreesToTheLastDigit()
    {
        var table = new DeviationTable(output, "IAPWS R11-24 check values", "1e-6: they are printed to six or seven decimals");
        foreach (var row in PublishedRow.ReadAll("iapws-r11-24-check.csv"))
        {
            var obtained = WaterIonization.PKw(row.Number("T_K"), row.Number("density_kg_L"));
            table.Check(row, $"{row.Text("T_K")} K, {row.Text("density_kg_L")} kg/L", row.Number("pKw"), obtained, 1e-6);
        }

        table.AssertHolds(6);
    }

    [Fact]
    public void PKw_At100KPa_AgreesWithDerivedTable()
    {
        var table = new DeviationTable(
            output, "pKw by R11-24 with the density of SR6-08 at 0.1 MPa, computed elsewhere", "0.00005: four decimals are given");
        foreach (var row in PublishedRow.ReadAll("iapws-r11-24-pkw.csv"))
        {
            var kelvin = row.Number("t_C") + 273.15;
            table.Check(row, row.Text("t_C") + " degC", row.Number("pKw"), WaterIonization.PKw(kelvin), 0.0000501);
        }

        table.AssertHolds(21);
    }
}
