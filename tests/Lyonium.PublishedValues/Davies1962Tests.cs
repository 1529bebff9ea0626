using System;
using System.Globalization;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Substances;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// The Davies equation, C. W. Davies, Ion Association (1962): log10 γ = −A z² (√I / (1 + √I) − 0.3 I); form and constant known as read
/// and from memory. A is 0.50978 at 25 °C, derived from IAPWS with CODATA 2018, molality basis.
/// </summary>
public sealed class Davies1962Tests(ITestOutputHelper output)
{
    private const double A = 0.50978;

    // Worked out by hand: √I / (1 + √I) − 0.3 I.
    [Theory]
    [InlineData("0.0001", 0.0098710)]
    [InlineData("0.01", 0.0879091)]
    [InlineData("0.04", 0.1546667)]
    [InlineData("0.09", 0.2037692)]
    [InlineData("0.16", 0.2377143)]
    [InlineData("0.25", 0.2583333)]
    public void Log10Gammas_SodiumChloride_AgreesWithTheEquation(string molality, double bracket)
    {
        var recipe = Recipe.Named("salt").PourWater("1 kg").Add(molality + " mol", "sodium chloride").Build();
        var prediction = new Predictor(SubstanceTable.Default, null, new DaviesModel()).Predict(recipe);
        foreach (var ion in prediction.Species.Where(one => one.Charge != 0))
        {
            // Half of the last digit of A and of the bracket, and the ions of water in the ionic strength (1e-7 mol/kg).
            var log10Gamma = Math.Log10(ion.ActivityCoefficient);
            output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{ion.Display} at {molality} mol/kg: {log10Gamma:F6}, by hand {-A * bracket:F6}"));
            Assert.Equal(-A * bracket, log10Gamma, 5e-6);
        }

        Assert.Equal(4, prediction.Species.Count(one => one.Charge != 0));
    }

    // Trisodium citrate, 0.01 mol/kg: charges to three; the ionic strength is that of the prediction, the formula stands here.
    [Fact]
    public void Log10Gammas_EveryCharge_GoesWithItsSquare()
    {
        var recipe = Recipe.Named("citrate").PourWater("1 kg").Add("0.01 mol", "trisodium citrate dihydrate").Build();
        var prediction = new Predictor(SubstanceTable.Default, null, new DaviesModel()).Predict(recipe);
        var root = Math.Sqrt(prediction.IonicStrengthMolPerKg);
        var bracket = (root / (1 + root)) - (0.3 * root * root);
        foreach (var species in prediction.Species)
        {
            var expected = -A * species.Charge * species.Charge * bracket;
            output.WriteLine(string.Create(
                CultureInfo.InvariantCulture,
                $"{species.Id} charge {species.Charge}: {Math.Log10(species.ActivityCoefficient):F6}, by the equation {expected:F6}"));
            Assert.Equal(expected, Math.Log10(species.ActivityCoefficient), 2e-5);
        }

        Assert.Contains(prediction.Species, one => one.Charge == -3);
        Assert.Contains(prediction.Species, one => one.Charge == -2);
        Assert.Contains(prediction.Species, one => one.Charge == 0);

        // 0.01 mol/kg of a 3:1 salt in 1 kg of water and 0.00036 kg of crystal water; 0.2 % of the citrate takes up a proton at most.
        Assert.Equal(0.06, prediction.IonicStrengthMolPerKg, 0.0003);
    }

    [Fact]
    public void HighestIonicStrength_IsWhereDaviesIsFlagged() => Assert.Equal(0.5, new DaviesModel().HighestIonicStrengthMolPerKg);
}
