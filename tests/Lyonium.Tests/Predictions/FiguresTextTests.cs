using System.Globalization;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Predictions;

/// <summary>Figures as text, and where there are none.</summary>
public sealed class FiguresTextTests
{
    [Fact]
    public void ToString_is_the_same_in_every_culture()
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = new CultureInfo("") { NumberFormat = { NumberDecimalSeparator = "," } };
            var buffer = new BufferFigures
            {
                CapacityMolPerL = 0.05,
                DilutionValue = double.NaN,
                TemperatureCoefficientPerK = -0.0025,
                TemperatureCoefficientLeavesOut = ["a:1", "b:2"],
            };

            Assert.Equal("capacity 0.05 mol/L, dilution value unknown, temperature coefficient -0.0025 1/K without a:1, b:2", buffer.ToString());
            Assert.Equal("0.012 in pH, from 25 published solutions at 0.01 to 0.1 mol/kg", new ModelUncertainty(0.012, 25, 0.01, 0.1).ToString());
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    // The limiting law far beyond its range: the figures of some such mixtures said that base lowers their pH.
    [Fact]
    public void Buffer_has_a_capacity_above_zero_or_is_not_there()
    {
        var predictor = new Predictor(SubstanceTable.Default, null, new DebyeHuckelLimitingModel());
        var without = 0;
        foreach (var acid in new[] { "phosphoric acid", "citric acid", "EDTA" })
        {
            for (var tenths = 1; tenths <= 40; tenths++)
            {
                var moles = (0.1m * tenths).ToString(CultureInfo.InvariantCulture) + " mol";
                var recipe = Recipe.Named("strong").Add("1 mol", acid).Add(moles, "NaOH").PourWater("1 kg").TryBuild().Value;
                var attempt = predictor.TryPredict(recipe);
                Assert.True(!attempt.Success || attempt.Value.Buffer is null or { CapacityMolPerL: > 0 }, acid + " " + moles);
                without += attempt.Success && attempt.Value.Buffer is null ? 1 : 0;
            }
        }

        Assert.InRange(without, 1, 119);
    }
}
