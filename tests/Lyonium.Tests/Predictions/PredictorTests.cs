using System;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Solvers;
using Lyonium.Substances;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Predictions;

/// <summary>Predictions that hand arithmetic reaches, and the plug-in points.</summary>
public sealed class PredictorTests
{
    private const string Kilogram = "{ \"substance\": \"water\", \"mass\": \"1 kg\" }";

    private static Prediction Of(string parts, string more = "") => new Predictor().Predict(RecipeJson.Read(RecipeText.With(parts, more)));

    private static Prediction Ideal(string parts) => new Predictor().With(new IdealModel()).Predict(RecipeJson.Read(RecipeText.With(parts)));

    // Neutral is half of pKw: 13.995 / 2 at 25 °C (Marshall and Franck); IAPWS R11-24 has 13.99 to 14.00.
    [Theory]
    [InlineData(Kilogram)]
    [InlineData("{ \"substance\": \"water\", \"volume\": \"1 uL\" }")]
    [InlineData("{ \"substance\": \"NaCl\", \"amount\": \"0.1 mol\" }, " + Kilogram)]
    [InlineData("{ \"substance\": \"KCl\", \"mass\": \"10 g\" }, { \"substance\": \"NaCl\", \"mass\": \"10 g\" }, " + Kilogram)]
    [InlineData("{ \"substance\": \"HCl\", \"concentration\": \"1 mol/L\", \"volume\": \"0 mL\" }, " + Kilogram)]
    [InlineData("{ \"substance\": \"NaOH\", \"mass\": \"0 g\" }, { \"substance\": \"tris\", \"amount\": \"0 mol\" }, " + Kilogram)]
    [InlineData("{ \"substance\": \"HCl\", \"amount\": \"0.1 mol\" }, { \"substance\": \"NaOH\", \"amount\": \"0.1 mol\" }, " + Kilogram)]
    public void Predict_onlyWaterOrOnlySaltsOrNothingPoured_isNeutral(string parts) => Assert.Equal(6.9975, Of(parts).PH, 0.003);

    [Fact]
    public void Predict_strongAcidIdeal_isMinusLogOfItsMolality()
    {
        Assert.Equal(2, Ideal("{ \"substance\": \"HCl\", \"amount\": \"0.01 mol\" }, " + Kilogram).PH, 1e-9);
        Assert.Equal(0, Ideal("{ \"substance\": \"HCl\", \"amount\": \"1 mol\" }, " + Kilogram).PH, 1e-9);
        Assert.Equal(-1, Ideal("{ \"substance\": \"HCl\", \"amount\": \"10 mol\" }, " + Kilogram).PH, 1e-9);
    }

    [Fact]
    public void Predict_strongAcid_isMinusLogOfItsActivity()
    {
        // I = 0.01: √I = 0.1; log γ = −0.5098 · 0.1/1.15 = −0.04433. A from IAPWS density and permittivity.
        var prediction = Of("{ \"substance\": \"HCl\", \"amount\": \"0.01 mol\" }, " + Kilogram);

        Assert.Equal(2.04433, prediction.PH, 1e-4);
        Assert.Equal(0.01, prediction.IonicStrengthMolPerKg, 1e-9);
        Assert.Equal(0.9030, prediction.Species[0].ActivityCoefficient, 2e-4); // 10^−0.04433
    }

    [Fact]
    public void PHydrogenConcentration_usesTheVolumeOfPreparation()
    {
        // 0.01 mol in 1 kg of water: HCl takes 17.83 mL/mol, so 1.001796 + 0.000178 L at 20 °C: −log10(0.01 / 1.001974) = 2.000857.
        var prediction = Of("{ \"substance\": \"HCl\", \"amount\": \"0.01 mol\" }, " + Kilogram);

        Assert.Equal(2.000857, prediction.PHydrogenConcentration, 1e-5);
    }

    [Fact]
    public void Predict_weakAcidIdeal_solvesItsQuadratic()
    {
        // Acetic acid, pKa as the table has it: h² + K h − K c = 0 (water is 1e-10 of it).
        var prediction = Ideal("{ \"substance\": \"acetic acid\", \"amount\": \"0.1 mol\" }, " + Kilogram);
        var k = Math.Pow(10, -SubstanceTable.Default.Find("acetic acid").Value.Brings[0].Family.Steps[0].PKa.Value);
        var h = (-k + Math.Sqrt((k * k) + (0.4 * k))) / 2;

        Assert.Equal(-Math.Log10(h), prediction.PH, 1e-7);
        Assert.Equal(2.88, prediction.PH, 0.01);
    }

    [Fact]
    public void Predict_bufferIdeal_isItsPKaWhereBothAreEqual()
    {
        var pKa = SubstanceTable.Default.Find("tris").Value.Brings[0].Family.Steps[0].PKa.Value;

        Assert.Equal(8.07, pKa, 0.02);
        Assert.Equal(pKa, Ideal("{ \"substance\": \"tris\", \"amount\": \"0.5 mol\" }, { \"substance\": \"tris hydrochloride\", \"amount\": \"0.5 mol\" }, " + Kilogram).PH, 1e-4);
    }

    [Theory]
    [InlineData(-0.004, "0.00")]
    [InlineData(-0.005, "-0.01")]
    [InlineData(-0.0049999, "0.00")]
    [InlineData(0, "0.00")]
    [InlineData(7.005, "7.01")]
    [InlineData(1.005, "1.01")]
    [InlineData(2.675, "2.68")]
    [InlineData(7.004999999999999, "7.00")]
    [InlineData(1.0049999999999997, "1.00")]
    [InlineData(6.995, "7.00")]
    [InlineData(9.9949, "9.99")]
    [InlineData(13.996, "14.00")]
    [InlineData(-1.115, "-1.12")]
    [InlineData(1e-300, "0.00")]
    public void Reported_isTheShownPHRoundedHalfAwayFromZero(double pH, string reported)
    {
        var prediction = new Predictor().With(new FixedAnswer(pH)).Predict(RecipeJson.Read(RecipeText.With(Kilogram)));

        Assert.Equal(pH, prediction.PH);
        Assert.Equal(reported, prediction.Reported);
        Assert.StartsWith("pH " + reported, prediction.ToString(), StringComparison.Ordinal);
    }

    // 20 mol/kg of a trivalent salt with the Davies equation, which is stated to 0.5 mol/kg: a number, and no clean one.
    [Fact]
    public void Predict_farBeyondTheModel_saysSoInTheFirstLine()
    {
        var predictor = new Predictor().With(new DaviesModel());
        var prediction = predictor.Predict(RecipeJson.Read(RecipeText.With("{ \"substance\": \"tripotassium phosphate\", \"amount\": \"20 mol\" }, " + Kilogram)));

        Assert.Contains("ionic strength far beyond the activity model", prediction.OutsideTheModel);
        Assert.Contains("far beyond", prediction.ToString(), StringComparison.Ordinal);
        Assert.Null(prediction.ModelUncertainty);
    }

    [Theory]
    [InlineData("-0.1 Cel")]
    [InlineData("100.1 Cel")]
    [InlineData("273.1 K")]
    public void Predict_whereWaterIsNoLiquid_isRefused(string temperature)
    {
        var faults = RecipeJson.TryRead(RecipeText.With(Kilogram, $"\"temperature\": \"{temperature}\""), SubstanceTable.Default).Faults;

        var fault = Assert.Single(faults);
        Assert.Equal(("LYO0108 $.temperature", temperature), (fault.Code + " " + fault.Path, fault.Found));
        FaultText.Check([fault]);
    }

    // pKw as the CRC Handbook tabulates it (IAPWS R11-07), which R11-24 follows within 0.002.
    [Theory]
    [InlineData("0 Cel", 14.946)]
    [InlineData("50 Cel", 13.264)]
    [InlineData("100 Cel", 12.252)]
    public void Predict_pureWater_isHalfOfPKwAtItsTemperature(string temperature, double pKw) =>
        Assert.Equal(pKw / 2, Of(Kilogram, $"\"temperature\": \"{temperature}\"").PH, 0.001);

    [Theory]
    [InlineData("25 Cel")]
    [InlineData("298.15 K")]
    public void Predict_at25Celsius_isAnswered(string temperature) =>
        Assert.Equal(6.9975, Of(Kilogram, $"\"temperature\": \"{temperature}\"").PH, 0.003);

    [Fact]
    public void Predict_withAnotherTable_saysWhatItLacks()
    {
        var recipe = RecipeJson.Read(RecipeText.With("{ \"substance\": \"tris\", \"mass\": \"1 g\" }, " + Kilogram));
        var fault = Assert.Single(new Predictor(Substances.UserTable.Sound()).TryPredict(recipe).Faults);

        Assert.Equal("LYO0502 $.parts[0]", fault.Code + " " + fault.Path);
    }

    [Fact]
    public void Predict_withAUsersTable_usesItsConstants()
    {
        var table = Substances.UserTable.Sound();
        var recipe = Recipe.Named("own").Add("0.1 mol", "oxalic acid").Add("0.15 mol", "NaOH").PourWater("1 kg").Build(table);
        var prediction = new Predictor(table, activityModel: new IdealModel()).Predict(recipe);

        // Half of the second proton is gone: pH is near the table's 4.27.
        Assert.Equal(4.27, prediction.PH, 0.01);
        Assert.Equal(table.Identity.Sha256, prediction.Evidence.Table.Sha256);
    }

    [Fact]
    public void With_changesOnePluginAndKeepsTheRest()
    {
        var predictor = new Predictor(Substances.UserTable.Sound(), new FixedAnswer(1), new IdealModel());

        Assert.Equal(("exact", "ideal"), (predictor.With(new ExactSolver()).Method.Name, predictor.With(new ExactSolver()).ActivityModel.Name));
        Assert.Equal(("fixed", "davies"), (predictor.With(new DaviesModel()).Method.Name, predictor.With(new DaviesModel()).ActivityModel.Name));
        Assert.Same(predictor.Table, predictor.With(new DaviesModel()).Table);
        Assert.Equal(("exact", "bates-guggenheim"), (new Predictor().Method.Name, new Predictor().ActivityModel.Name));
    }

    [Fact]
    public void Predict_null_throws()
    {
        var predictor = new Predictor();
        Assert.Throws<ArgumentNullException>(() => predictor.Predict((Recipe)null!));
        Assert.Throws<ArgumentNullException>(() => predictor.TryPredict((Mixture)null!));
        Assert.Throws<ArgumentNullException>(() => predictor.With((ISolver)null!));
        Assert.Throws<ArgumentNullException>(() => predictor.With((IActivityModel)null!));
        Assert.Throws<ArgumentNullException>(() => new Predictor(null!));
    }

    [Fact]
    public void Predict_ofTheMixture_isThatOfTheRecipe()
    {
        var recipe = RecipeJson.Read(RecipeText.OfTheContract);
        var mixture = Mixture.Prepare(recipe, SubstanceTable.Default);

        Assert.Equal(new Predictor().Predict(recipe).PH, new Predictor().Predict(mixture).PH);
    }

    [Fact]
    public void Predict_fromManyThreads_givesOneAnswer()
    {
        var predictor = new Predictor();
        var recipe = RecipeJson.Read(RecipeText.OfTheContract);

        Assert.Single(Enumerable.Range(0, 64).AsParallel().Select(_ => predictor.Predict(recipe).PH).Distinct());
    }

    [Fact]
    public void Species_balanceMassAndCharge()
    {
        var prediction = Of("{ \"substance\": \"trisodium citrate dihydrate\", \"amount\": \"0.05 mol\" }, { \"substance\": \"HCl\", \"amount\": \"0.06 mol\" }, " + Kilogram);

        var charge = prediction.Species.Sum(one => one.Charge * one.MolalityMolPerKg);
        var size = prediction.Species.Sum(one => Math.Abs(one.Charge) * one.MolalityMolPerKg);
        Assert.InRange(Math.Abs(charge) / size, 0, 1e-9);
        // 0.05 mol in 1 kg and the 0.1 mol of crystal water, 1.8015 g.
        Assert.Equal(0.05 / 1.0018015, prediction.Species.Where(one => one.Family == "citrate").Sum(one => one.MolalityMolPerKg), 1e-12);
        Assert.Equal(1, prediction.Species.Where(one => one.Family == "citrate").Sum(one => one.Fraction!.Value), 1e-12);
        Assert.All(prediction.Species, one => Assert.True(one.Fraction is null or (>= 0 and <= 1), one.Id));
        var ionicStrength = prediction.Species.Sum(one => 0.5 * one.Charge * one.Charge * one.MolalityMolPerKg);
        Assert.Equal(ionicStrength, prediction.IonicStrengthMolPerKg, 1e-9);
    }

    private sealed class FixedAnswer(double pH) : ISolver
    {
        public string Name => "fixed";

        public SolverOutcome Solve(Equilibrium equilibrium, IActivityModel model) => new()
        {
            Status = SolverStatus.Solved,
            PH = pH,
            BracketLow = double.NaN,
            BracketHigh = double.NaN,
            InputResolution = double.NaN,
        };
    }
}
