using System;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Substances;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Mean activity coefficients at 25 °C to 2 mol/kg, molality scale, with specific ion interaction theory: W. J. Hamer and Y.-C. Wu, J. Phys.
/// Chem. Ref. Data 1 (1972) 1047, known from memory.
/// </summary>
public sealed class HamerWu1972Tests(ITestOutputHelper output)
{
    private static readonly Predictor SpecificIon = new(SubstanceTable.Default, null, new SpecificIonModel());

    [Theory]
    [InlineData("HCl", "water:2", "chloride:0")]
    [InlineData("NaCl", "sodium:0", "chloride:0")]
    [InlineData("KCl", "potassium:0", "chloride:0")]
    [InlineData("NaOH", "sodium:0", "water:0")]
    public void ActivityCoefficient_WithSpecificInteraction_AgreesWithMeanCoefficient(string electrolyte, string cation, string anion)
    {
        var table = new DeviationTable(
            output,
            $"Mean activity coefficient of {electrolyte}, specific-ion",
            "4 %: one coefficient for each pair of ions, the same at every ionic strength; its own uncertainty of 0.01 kg/mol (95 %) is 5 % at 2 mol/kg");
        foreach (var row in PublishedRow.ReadAll("hamer-wu-1972.csv").Where(row => row.Text("electrolyte") == electrolyte))
        {
            var recipe = Recipe.Named(electrolyte).At("25 Cel").PourWater("1 kg").Add(row.Text("molality") + " mol", electrolyte).Build();
            var species = SpecificIon.Predict(recipe).Species;
            var mean = Math.Sqrt(species.Single(one => one.Id == cation).ActivityCoefficient * species.Single(one => one.Id == anion).ActivityCoefficient);
            table.Check(row, row.Text("molality") + " mol/kg", row.Number("gamma_pm"), mean, 0.04 * row.Number("gamma_pm"));
        }

        table.AssertHolds(11);
    }
}
