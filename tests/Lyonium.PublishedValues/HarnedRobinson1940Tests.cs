using Lyonium.Water;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// pKw from cells without liquid junction: H. S. Harned and R. A. Robinson, Trans. Faraday Soc. 36 (1940) 973, as in Harned and Owen;
/// known from memory.
/// </summary>
public sealed class HarnedRobinson1940Tests(ITestOutputHelper output)
{
    [Fact]
    public void PKw_From0To60Celsius_AgreesWithTheTable()
    {
        var table = new DeviationTable(
            output,
            "pKw against Harned and Robinson 1940",
            "0.01: what Marshall and Franck 1981 claim for the measurements of which these are a part (abstract, read)");
        foreach (var row in PublishedRow.ReadAll("harned-robinson-1940-pkw.csv"))
        {
            table.Check(row, row.Text("t_C") + " degC", row.Number("pKw"), WaterIonization.PKw(row.Number("t_C") + 273.15), 0.01);
        }

        table.AssertHolds(13);
    }
}
