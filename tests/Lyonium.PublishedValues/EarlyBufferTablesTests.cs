using System;
using System.Globalization;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Substances;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Buffers of the early tables, read in copies: S. P. L. Sørensen (1909), G. S. Walpole (1914), T. C. McIlvaine (1921), G. Gomori (1955).
/// What is on the Sørensen scale becomes paH by 0.04 (R. G. Bates, Determination of pH, 1973; memory).
/// </summary>
public sealed class EarlyBufferTablesTests(ITestOutputHelper output)
{
    private const double FromSorensenScale = 0.04;

    private static readonly Predictor Davies = new(SubstanceTable.Default, null, new DaviesModel());

    [Fact]
    public void Predict_PhosphateOfSorensen_AgreesWithPrintedPH()
    {
        var table = new DeviationTable(
            output,
            "Sorensen 1909, phosphate of 1/15 mol/L at 20 degC, printed pH and 0.04, davies",
            "0.04: 0.02 for the Davies equation, 0.01 for the scale, 0.01 for volumes printed to 0.1 mL");
        foreach (var row in PublishedRow.ReadAll("sorensen-1909-phosphate.csv"))
        {
            var recipe = Start().At("20 Cel")
                .Pour(row.Text("disodium_mL") + " mL", Stock.Of("disodium hydrogen phosphate", "0.0666667 mol/L"))
                .Pour(row.Text("monopotassium_mL") + " mL", Stock.Of("potassium dihydrogen phosphate", "0.0666667 mol/L"));
            table.Check(row, row.Text("disodium_mL") + " mL of the disodium salt in 100", row.Number("pH") + FromSorensenScale, Predict(recipe), 0.04);
        }

        table.AssertHolds(12);
    }

    [Fact]
    public void Predict_AcetateOfWalpole_AgreesWithPrintedPH()
    {
        var table = new DeviationTable(
            output,
            "Walpole 1914, acetate of 0.1 mol/L at 25 degC, printed pH and 0.04, davies",
            "0.05: pH printed in steps of 0.2 with volumes to 1 mL, which is 0.024 at 19 mL; 0.02 for the Davies equation");
        foreach (var row in PublishedRow.ReadAll("walpole-1914-acetate.csv"))
        {
            var salt = 200 - row.Number("acetic_acid_mL");
            var recipe = Start()
                .Pour(row.Text("acetic_acid_mL") + " mL", Stock.Of("acetic acid", "0.1 mol/L"))
                .Pour(Text(salt) + " mL", Stock.Of("sodium acetate", "0.1 mol/L"));
            table.Check(row, row.Text("acetic_acid_mL") + " mL of acetic acid in 200", row.Number("pH") + FromSorensenScale, Predict(recipe), 0.05);
        }

        table.AssertHolds(11);
    }

    // Stress cases: up to 0.6 mol/kg of ionic strength, and citrate with three charges.
    [Fact]
    public void Predict_CitrateOfGomori_StaysWithinThePublishedTolerance()
    {
        var table = new DeviationTable(
            output, "Gomori 1955, citric acid and trisodium citrate, davies", "0.4, the tolerance published for such tables (0.2 to 0.4)");
        foreach (var row in PublishedRow.ReadAll("gomori-1955-citrate.csv"))
        {
            var recipe = Start()
                .Pour(row.Text("x_mL") + " mL", Stock.Of("citric acid", "0.1 mol/L"))
                .Pour(Text(50 - row.Number("x_mL")) + " mL", Stock.Of("trisodium citrate dihydrate", "0.1 mol/L"))
                .MakeUpTo("100 mL");
            table.Check(row, $"x = {row.Text("x_mL")} mL", row.Number("pH"), Predict(recipe), 0.4);
        }

        table.AssertHolds(17);
    }

    // At both ends the table is missed, by up to 0.22, and those rows are reported: its glycine lies above what the pKa of 2.35, on which
    // the other sources agree, gives by the closed formula. In the middle it holds.
    [Fact]
    public void Predict_GlycineOfGomori_AgreesWithPrintedPH()
    {
        var table = new DeviationTable(
            output,
            "Gomori 1955, 50 mL of 0.2 mol/L glycine and x mL of 0.2 mol/L hydrochloric acid to 200 mL, davies",
            "0.07: 0.05 as the source states for its tables at 23 degC, 0.02 for the Davies equation");
        foreach (var row in PublishedRow.ReadAll("gomori-1955-glycine.csv"))
        {
            var recipe = Start()
                .Pour("50 mL", Stock.Of("glycine", "0.2 mol/L"))
                .Pour(row.Text("x_mL") + " mL", Stock.Of("hydrochloric acid", "0.2 mol/L"))
                .MakeUpTo("200 mL");
            var inputs = $"x = {row.Text("x_mL")} mL";
            if (row.Caution.Length > 0)
            {
                table.Report(row, inputs, row.Number("pH"), Predict(recipe));
            }
            else
            {
                table.Check(row, inputs, row.Number("pH"), Predict(recipe), 0.07);
            }
        }

        table.AssertHolds(5);
    }

    [Fact]
    public void Predict_CitratePhosphateOfMcIlvaine_StaysWithinThePublishedTolerance()
    {
        var table = new DeviationTable(
            output,
            "McIlvaine 1921, x mL of 0.2 mol/L disodium phosphate and 0.1 mol/L citric acid to 20 mL, printed pH and 0.04, davies",
            "0.4, the tolerance published for such tables (0.2 to 0.4)");
        foreach (var row in PublishedRow.ReadAll("mcilvaine-1921.csv"))
        {
            var recipe = Start()
                .Pour(row.Text("x_mL") + " mL", Stock.Of("disodium hydrogen phosphate", "0.2 mol/L"))
                .Pour(Text(20 - row.Number("x_mL")) + " mL", Stock.Of("citric acid", "0.1 mol/L"));
            table.Check(row, $"x = {row.Text("x_mL")} mL", row.Number("pH") + FromSorensenScale, Predict(recipe), 0.4);
        }

        table.AssertHolds(30);
    }

    private static RecipeBuilder Start() => Recipe.Named("buffer").At("25 Cel").PreparedAt("25 Cel");

    private static double Predict(RecipeBuilder recipe) => Davies.Predict(recipe.Build()).PH;

    private static string Text(double millilitres) => Math.Round(millilitres, 6).ToString("R", CultureInfo.InvariantCulture);
}
