using System.Globalization;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Substances;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Approximate pH of acids, bases and salts at round normalities: CRC Handbook, and a laboratory handbook; read and from memory, see the
/// rows. Normality becomes mol/L by the equivalents of the row, for acids and bases the protons given or taken, for salts the charges.
/// </summary>
public sealed class HandbookApproximatePHTests(ITestOutputHelper output)
{
    [Fact]
    public void Predict_SolutionOfRoundNormality_AgreesWithPrintedPH()
    {
        var table = new DeviationTable(
            output,
            "Approximate pH at round normalities, 25 degC, davies",
            "0.2: such tables are approximate, and for one solution the two at hand differ by up to 0.2 (ammonia 0.1 N: 11.1 and 11.3). Above 0.5 mol/kg, "
            + "the range of the Davies equation, a row is reported");
        foreach (var row in PublishedRow.ReadAll("handbook-approximate-ph.csv"))
        {
            var molPerL = row.Number("normality") / row.Number("equivalents");
            var inputs = string.Create(CultureInfo.InvariantCulture, $"{row.Text("substance")} {row.Text("normality")} N, {molPerL:G4} mol/L");
            var strength = molPerL.ToString("R", CultureInfo.InvariantCulture) + " mol/L";
            var recipe = Recipe.Named("reagent").At("25 Cel").PreparedAt("25 Cel").Pour("1 L", Stock.Of(row.Text("substance"), strength)).Build();
            var prediction = new Predictor(SubstanceTable.Default, null, new DaviesModel()).Predict(recipe);
            if (row.Caution.Length > 0 || prediction.IonicStrengthMolPerKg > 0.5)
            {
                table.Report(row, inputs, row.Number("pH"), prediction.PH);
            }
            else
            {
                table.Check(row, inputs, row.Number("pH"), prediction.PH, 0.2);
            }
        }

        table.AssertHolds(30);
    }
}
