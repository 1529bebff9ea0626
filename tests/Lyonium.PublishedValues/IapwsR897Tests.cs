using Lyonium.Water;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>The check values of IAPWS R8-97 (static dielectric constant of water), known as read and from memory, see the rows.</summary>
public sealed class IapwsR897Tests(ITestOutputHelper output)
{
    [Fact]
    public void Relative_CheckPointsOfTheRelease_AgreesWithCheckValues()
    {
        var table = new DeviationTable(
            output,
            "IAPWS R8-97 check values, as a ratio of obtained to published",
            "1e-5: the density is printed to 0.01 kg/m3 at 373 K, up to 0.5e-5, and the permittivity goes with its power of about 1.2; the rest "
            + "is for coefficients partly known from memory");
        foreach (var row in PublishedRow.ReadAll("iapws-r8-97-check.csv"))
        {
            var obtained = WaterPermittivity.Relative(row.Number("T_K"), row.Number("density_kg_m3") / 1000);
            var inputs = $"{row.Text("T_K")} K, {row.Text("density_kg_m3")} kg/m3, published {row.Text("permittivity")}";
            table.Check(row, inputs, 1, obtained / row.Number("permittivity"), 1e-5);
        }

        table.AssertHolds(2);
    }
}
