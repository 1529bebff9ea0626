using System.Linq;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Calcium hydroxide saturated at 25 °C, 0.0203 mol/kg: R. G. Bates, V. E. Bower and E. R. Smith, J. Res. NBS 56 (1956) 305, pH 12.45,
/// read. They hold some of the calcium to be bound as CaOH⁺ (log10 K = 1.3; Davies and Hoyle 1951, Gimblett and Monk 1954, known from
/// memory). The pair takes up hydroxide; a model without it must come out above the published value.
/// </summary>
public sealed class BatesBowerSmith1956Tests(ITestOutputHelper output)
{
    [Fact]
    public void Predict_CalciumHydroxideWithoutItsIonPair_LiesAbovePublishedPH()
    {
        var obtained = StandardSolution.ById("Ca(OH)2").OnOneKilogramOfWater().PH;
        var published = PublishedRow.ReadAll("bates-bower-smith-1956.csv")
            .Concat(PublishedRow.ReadAll("ph-eur-2-2-3.csv"))
            .Concat(PublishedRow.ReadAll("nbs-standards-25C.csv"))
            .Where(row => row.Text("id") == "Ca(OH)2")
            .ToArray();
        var table = new DeviationTable(output, "Ca(OH)2, 0.0203 mol/kg, davies, without CaOH+", "none; the direction is judged");
        foreach (var row in published)
        {
            table.Report(row, "0.0203 mol/kg, 25 degC, davies", row.Number("pH"), obtained);
        }

        table.AssertHolds(0);
        Assert.Equal(3, published.Length);
        Assert.All(published, row => Assert.True(obtained > row.Number("pH"), $"{obtained} is not above {row.Text("pH")}"));
    }
}
