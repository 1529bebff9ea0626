using System.Linq;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Substances;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Salts of reagent grade: the range in which the pH of 5 g in 100 mL of water must lie, ACS Reagent Chemicals and USP; read and from
/// memory, see the rows.
/// </summary>
public sealed class ReagentSolutionPHTests(ITestOutputHelper output)
{
    [Fact]
    public void Predict_FivePercentOfASalt_LiesInTheSpecifiedRange()
    {
        var table = new DeviationTable(
            output,
            "5 g of a salt in 100 mL of water, 25 degC, davies; expected is the middle of the specified range",
            "half of the specified range. Above 0.5 mol/kg, the range of the Davies equation, a row is reported");
        foreach (var row in PublishedRow.ReadAll("reagent-solution-ph.csv"))
        {
            var recipe = Recipe.Named("reagent").At("25 Cel").PreparedAt("25 Cel").PourWater("100 mL").Weigh("5 g", row.Text("substance")).Build();
            var prediction = new Predictor(SubstanceTable.Default, null, new DaviesModel()).Predict(recipe);
            var middle = (row.Number("low") + row.Number("high")) / 2;
            var inputs = $"{row.Text("substance")}, {row.Text("low")} to {row.Text("high")}";
            if (row.Caution.Length == 0 && prediction.Assumptions.Single(one => one.Code == "ionic-strength-in-range").Held)
            {
                table.Check(row, inputs, middle, prediction.PH, (row.Number("high") - row.Number("low")) / 2);
            }
            else
            {
                table.Report(row, inputs, middle, prediction.PH);
            }
        }

        table.AssertHolds(3);
    }
}
