using System;
using System.Linq;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Mean activity coefficients at 25 °C, molality scale: W. J. Hamer and Y.-C. Wu, J. Phys. Chem. Ref. Data 1 (1972) 1047, known from
/// memory; up to 0.1 mol/kg.
/// </summary>
public sealed class HamerWu1972Tests(ITestOutputHelper output)
{
    [Theory]
    [InlineData("NaCl", "Na⁺")]
    [InlineData("KCl", "K⁺")]
    [InlineData("HCl", "H⁺")]
    public void ActivityCoefficient_UpTo100MillimolPerKg_AgreesWithMeanCoefficient(string electrolyte, string cation)
    {
        var table = new DeviationTable(
            output,
            $"Mean activity coefficient of {electrolyte}, davies",
            "2 %: the equation is commonly held to miss 1:1 electrolytes by about 2 % at 0.1 mol/L (of Davies 1962, read in secondary sources)");
        foreach (var row in PublishedRow.ReadAll("hamer-wu-1972.csv").Where(row => row.Text("electrolyte") == electrolyte))
        {
            var recipe = Recipe.Named(electrolyte).PourWater("1 kg").Add(row.Text("molality") + " mol", electrolyte).Build();
            var species = new Predictor().Predict(recipe).Species;
            var mean = Math.Sqrt(
                species.Single(one => one.Display == cation).ActivityCoefficient * species.Single(one => one.Display == "Cl⁻").ActivityCoefficient);
            var published = row.Number("gamma_pm");
            table.Check(row, row.Text("molality") + " mol/kg", published, mean, 0.02 * published);
        }

        table.AssertHolds(7);
    }
}
