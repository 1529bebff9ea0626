using System;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Solvers;
using Lyonium.Substances;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Predictions;

/// <summary>What exceeds a listed solubility is told, and its pH is not given as a clean number.</summary>
public sealed class SolubilityTests
{
    private const string Code = "within-listed-solubility";

    [Theory]
    [InlineData("benzoic acid", "10 g", true)]
    [InlineData("benzoic acid", "1 g", false)]
    [InlineData("potassium hydrogen tartrate", "10 g", true)]
    [InlineData("potassium hydrogen tartrate", "6 g", false)]
    [InlineData("calcium hydroxide", "5 g", true)]
    [InlineData("calcium hydroxide", "1 g", false)]
    [InlineData("borax", "100 g", true)]
    [InlineData("borax", "3.8 g", false)]
    [InlineData("potassium perchlorate", "30 g", true)]
    [InlineData("potassium perchlorate", "10 g", false)]
    [InlineData("sodium chloride", "400 g", true)]
    [InlineData("sodium chloride", "300 g", false)]
    [InlineData("tyrosine", "1 g", true)]
    [InlineData("tyrosine", "0.3 g", false)]
    [InlineData("boric acid", "70 g", true)]
    [InlineData("boric acid", "40 g", false)]
    public void Predict_weighed_intoALitre_toldAboveTheSolubilityOnly(string substance, string mass, bool told)
    {
        var prediction = new Predictor().Predict(Water().Weigh(mass, substance).Build());

        var check = prediction.Assumptions.Where(one => one.Code == Code).ToArray();
        Assert.Equal(told, prediction.OutsideTheModel.Contains("may not dissolve"));
        Assert.Equal(told ? 1 : 0, check.Length);
        Assert.All(check, one => Assert.True(one is { Held: false, Limit: 1, Figure: > 1 }, one.ToString()));
        Assert.All(check, one => Assert.StartsWith("may not dissolve: listed solubility ", one.Basis, StringComparison.Ordinal));
    }

    // 10 g / 122.12 g/mol = 0.0819 mol/kg; some 3 % of it is dissociated; 0.0266 mol/kg dissolve undissociated: three times.
    [Fact]
    public void Predict_benzoicAcid_figureByHand()
    {
        var check = new Predictor().Predict(Water().Weigh("10 g", "benzoic acid").Build()).Assumptions.Single(one => one.Code == Code);

        Assert.Equal("C₆H₅COOH of benzoate", check.Of);
        Assert.Equal(3.0, check.Figure!.Value, 0.05);
        Assert.Contains(" at 25 Cel, ", check.Basis, StringComparison.Ordinal);
    }

    // 0.05 mol in 1 kg against 0.0203 mol/kg.
    [Fact]
    public void Predict_lime_figureIsAmountOverSolubility()
    {
        var check = new Predictor().Predict(Water().Add("0.05 mol", "calcium hydroxide").Build()).Assumptions.Single(one => one.Code == Code);

        Assert.Equal("calcium hydroxide", check.Of);
        Assert.Equal(0.05 / 0.0203, check.Figure!.Value, 1e-6);
    }

    [Fact]
    public void Predict_benzoateAndAcid_toldByTheFormThatComesOut()
    {
        var acidified = Water().Weigh("15 g", "sodium benzoate").Pour("100 mL", Stock.Of("HCl", "1 mol/L")).Build();
        var salt = Water().Weigh("15 g", "sodium benzoate").Build();

        Assert.Equal("C₆H₅COOH of benzoate", new Predictor().Predict(acidified).Assumptions.Single(one => one.Code == Code).Of);
        Assert.Empty(new Predictor().Predict(salt).OutsideTheModel);
    }

    // 0.1 mol of carbon dioxide in a kilogram of water; 0.034 mol/kg stay at 101 kPa.
    [Fact]
    public void Predict_carbonateAndAcid_gasTold()
    {
        var recipe = Water().Add("0.1 mol", "sodium carbonate").Add("0.2 mol", "HCl").Build();

        var check = new Predictor().Predict(recipe).Assumptions.Single(one => one.Code == Code);
        Assert.Equal("H₂CO₃ of carbonate", check.Of);
        Assert.InRange(check.Figure!.Value, 2.9, 3.0);
    }

    // What turns into something else dissolves: slaked lime in acid, cream of tartar in lye.
    [Theory]
    [InlineData("calcium hydroxide", "0.1 mol", "HCl", "0.2 mol", false)]
    [InlineData("calcium hydroxide", "0.1 mol", "HCl", "0.02 mol", true)]
    [InlineData("potassium hydrogen tartrate", "0.05 mol", "NaOH", "0.05 mol", false)]
    [InlineData("potassium hydrogen tartrate", "0.05 mol", "NaOH", "0.005 mol", true)]
    [InlineData("borax", "0.3 mol", "NaOH", "0.6 mol", false)]
    public void Predict_restTurnsItIntoSomethingElse_toldWhileItLasts(string solid, string amount, string other, string otherAmount, bool told)
    {
        var prediction = new Predictor().Predict(Water().Add(amount, solid).Add(otherAmount, other).Build());

        Assert.Equal(told, prediction.Assumptions.Any(one => one.Code == Code && one.Of == solid));
    }

    // The standards that are saturated are at the solubility, and within it.
    [Theory]
    [InlineData("potassium hydrogen tartrate", "0.0341 mol")]
    [InlineData("calcium hydroxide", "0.0203 mol")]
    public void Predict_saturatedStandard_notTold(string substance, string amount) =>
        Assert.Empty(new Predictor().Predict(Water().Add(amount, substance).Build()).OutsideTheModel);

    [Fact]
    public void Predict_everyListedSubstance_toldTwiceAboveAndNotHalfBelow()
    {
        var listed = SubstanceTable.Default.Substances.Where(one => one.SolubilityMolPerKg is not null).ToArray();
        Assert.True(listed.Length >= 60, $"{listed.Length} are listed");
        foreach (var substance in listed)
        {
            Assert.Contains(Predict(substance, 2).Assumptions, one => one.Code == Code && one.Of == substance.Name && Math.Abs(one.Figure!.Value - 2) < 0.15);
            Assert.DoesNotContain(Predict(substance, 0.5).Assumptions, one => one.Code == Code && one.Of == substance.Name);
        }
    }

    [Fact]
    public void Predict_everyMethodAndModel_toldAlike()
    {
        var recipe = Water().Weigh("10 g", "benzoic acid").Weigh("10 g", "calcium hydroxide").Build();
        foreach (var method in Methods.All)
        {
            var attempt = new Predictor(SubstanceTable.Default, method, new IdealModel()).TryPredict(recipe);
            Assert.True(!attempt.Success || attempt.Value.OutsideTheModel.Contains("may not dissolve"), method.Name);
        }
    }

    [Fact]
    public void Told_textAndRecordAndComparisonSayIt()
    {
        var recipe = Water().Weigh("10 g", "benzoic acid").Build();
        var prediction = new Predictor().Predict(recipe);
        var record = RecordJson.Write(prediction);

        Assert.Equal($"pH {prediction.Reported}, of the homogeneous model only: may not dissolve", prediction.ToString());
        Assert.Contains("\"rule\": \"two decimals; homogeneous model only: may not dissolve\"", record, StringComparison.Ordinal);
        Assert.Contains($"\"pH\": \"{prediction.Reported}\"", record, StringComparison.Ordinal);
        Assert.Equal(["may not dissolve"], new Predictor().TryCompare(recipe).GetValueOrThrow().OutsideTheModel);
        Schemas.Record.Hold(record);
    }

    [Fact]
    public void Clean_textAndRecordSayNothing()
    {
        var prediction = new Predictor().Predict(Water().Weigh("1 g", "benzoic acid").Build());

        Assert.Equal("pH " + prediction.Reported, prediction.ToString());
        Assert.Contains("\"rule\": \"two decimals\"", RecordJson.Write(prediction), StringComparison.Ordinal);
    }

    [Fact]
    public void Examples_areWithinTheModel()
    {
        foreach (var file in Repository.Examples())
        {
            Assert.Empty(new Predictor().Predict(RecipeJson.Read(System.IO.File.ReadAllText(file))).OutsideTheModel);
        }
    }

    private static RecipeBuilder Water() => Recipe.Named("beaker").PourWater("1 kg");

    // Crystal water joins the water, so that a hydrate is given less of it; soda brings more than there should be, and comes out at 1.9.
    private static Prediction Predict(Substance substance, double times)
    {
        var mol = times * substance.SolubilityMolPerKg!.Value;
        var water = 1 - (mol * substance.CrystalWaterGPerMol * 1e-3);
        static string Text(double value, string unit) => value.ToString("R", System.Globalization.CultureInfo.InvariantCulture) + " " + unit;
        var recipe = water > 0
            ? Recipe.Named("beaker").PourWater(Text(water, "kg")).Add(Text(mol, "mol"), substance.Id)
            : Recipe.Named("beaker").PourWater("0.01 kg").Add(Text(mol, "mol"), substance.Id);
        return new Predictor().Predict(recipe.Build());
    }
}
