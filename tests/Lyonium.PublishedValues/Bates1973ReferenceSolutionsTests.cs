using System;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Solutions of known pH at 25 °C: R. G. Bates, Determination of pH (1973), known from memory. Water in equilibrium with air (5.65) waits
/// for carbon dioxide from the air to be built.
/// </summary>
public sealed class Bates1973ReferenceSolutionsTests(ITestOutputHelper output)
{
    [Fact]
    public void Predict_ReferenceSolutionByAmount_AgreesWithPrintedPH()
    {
        var table = new DeviationTable(
            output,
            "Bates 1973, reference solutions, 25 degC, davies",
            "0.02, as a careful calculation reproduces the standards (0.013 is the miss of the Davies equation for the mean coefficient of HCl), "
            + "and half a digit of the printed decimals; hydrochloric acid in potassium chloride is reported: 2.07 asks for 0.851 as the coefficient "
            + "of the hydrogen ion, and 1.09 of the same book for 0.813 in hydrochloric acid of the same ionic strength");
        foreach (var row in PublishedRow.ReadAll("bates-1973-reference-solutions.csv"))
        {
            var builder = Recipe.Named("reference").PourWater("1 kg");
            foreach (var part in row.Several("parts_mol_kg"))
            {
                builder.Add(part.Split('=')[1] + " mol", part.Split('=')[0]);
            }

            var obtained = new Predictor().Predict(builder.Build()).PH;
            if (row.Text("parts_mol_kg").Contains("potassium chloride", StringComparison.Ordinal))
            {
                table.Report(row, row.Text("parts_mol_kg"), row.Number("pH"), obtained);
            }
            else
            {
                var halfDigit = row.Text("pH").Split('.')[1].Length == 2 ? 0.005 : 0.0005;
                table.Check(row, row.Text("parts_mol_kg"), row.Number("pH"), obtained, 0.02 + halfDigit);
            }
        }

        table.AssertHolds(4);
    }

    // Pure water, 6.998, derived from the pKw of 13.995 to 13.9965 that handbooks print; 13.9944 by IAPWS R11-24 makes it 6.9972.
    [Fact]
    public void Predict_PureWater_IsHalfOfPKw() =>
        Assert.Equal(6.998, new Predictor().Predict(Recipe.Named("water").PourWater("1 kg").Build()).PH, 0.001);
}
