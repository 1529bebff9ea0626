using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Solvers;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Predictions;

/// <summary>Buffer capacity, dilution value and temperature coefficient against differences of predictions, and against closed formulas.</summary>
public sealed class BufferFiguresTests
{
    // Mixtures of every kind, on 1 kg of water: an acid, a base, buffers, an ampholyte, a strong acid, salts, water.
    private static readonly string[] Mixtures =
    [
        "acetic acid=0.1", "ammonia=0.05", "acetic acid=0.1 + sodium acetate=0.1", "potassium hydrogen phthalate=0.05",
        "potassium dihydrogen phosphate=0.025 + disodium hydrogen phosphate=0.025", "sodium hydrogen carbonate=0.025 + sodium carbonate=0.025",
        "hydrochloric acid=0.02 + potassium chloride=0.05", "sodium hydroxide=0.01", "citric acid=0.02 + trisodium citrate dihydrate=0.02",
        "tris=0.01667 + tris hydrochloride=0.05", "potassium hydrogen tartrate=0.03", "sodium chloride=0.1", "acetic acid=1e-6",
    ];

    public static TheoryData<string, string> Cases() => CasesWith(ActivityModels.All);

    // With specific interactions sodium is no cation like any other.
    public static TheoryData<string, string> CasesOfCharges() =>
        CasesWith(ActivityModels.All.Where(model => !model.Uses.HasFlag(IonData.Interactions)));

    private static TheoryData<string, string> CasesWith(IEnumerable<IActivityModel> models)
    {
        var cases = new TheoryData<string, string>();
        foreach (var mixture in Mixtures)
        {
            foreach (var model in models)
            {
                cases.Add(mixture, model.Name);
            }
        }

        return cases;
    }

    // Sodium hydroxide is a strong base with a singly charged cation and no water.
    [Theory]
    [MemberData(nameof(CasesOfCharges))]
    public void Capacity_agreesWithBaseAdded(string parts, string model)
    {
        var buffer = Of(parts, model).Buffer!;
        var step = 1e-4 * buffer.CapacityMolPerL;
        var pH = new[] { 0.0, 1, 2, 3, 4 }.Select(times => Of(parts + FormattableString.Invariant($" + sodium hydroxide={times * step:R}"), model).PH).ToArray();

        // One-sided, to the fourth order: base cannot be taken away.
        var slope = ((-25 * pH[0]) + (48 * pH[1]) - (36 * pH[2]) + (16 * pH[3]) - (3 * pH[4])) / (12 * step);
        var mixture = Of(parts, model).Mixture;
        Assert.Equal(1, buffer.CapacityMolPerL * mixture.VolumeL * slope, 1e-6);
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void TemperatureCoefficient_agreesWithPredictionsAtOtherTemperatures(string parts, string model)
    {
        double At(double celsius) => Of(parts, model, celsius).PH;
        var difference = ((8 * (At(26) - At(24))) - (At(27) - At(23))) / 12;

        Assert.Equal(difference, Of(parts, model).Buffer!.TemperatureCoefficientPerK, 1e-7);
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void DilutionValue_agreesWithTheMixtureInTwiceTheVolume(string parts, string model)
    {
        var before = Of(parts, model);
        var inMore = Recipe.Named("diluted").At("25 Cel").PreparedAt("25 Cel");
        foreach (var (substance, amount) in Split(parts))
        {
            inMore.Add(amount + " mol", substance);
        }

        var water = before.Mixture.VolumeL * 0.9970470 + 1;
        var after = new Predictor(SubstanceTable.Default, null, ActivityModels.Find(model)).Predict(
            inMore.PourWater(FormattableString.Invariant($"{water} kg")).Build());

        // 0.997047 kg/L, the density of water at 25 °C of the CRC Handbook.
        Assert.Equal(after.PH - before.PH, before.Buffer!.DilutionValue, 1e-6);
    }

    // D. D. Van Slyke, J. Biol. Chem. 52 (1922) 525: without activity coefficients β = ln 10 · (h + Kw/h + Σ c K h / (K + h)²).
    [Theory]
    [InlineData(0.1, 0.0)]
    [InlineData(0.1, 0.1)]
    [InlineData(0.001, 0.01)]
    public void Capacity_withoutActivityCoefficients_isVanSlykes(double acid, double salt)
    {
        var prediction = Of(FormattableString.Invariant($"acetic acid={acid} + sodium acetate={salt}"), "ideal");
        var h = Math.Pow(10, -prediction.PH);
        var k = Math.Pow(10, -prediction.Evidence.Constants.Single(one => one.Id == "acetate:1" && one.Quantity == "pKa").Value.Value);
        var kw = Math.Pow(10, -prediction.Evidence.Constants.Single(one => one.Quantity == "pKw").Value.Value);
        var vanSlyke = Math.Log(10) * (h + (kw / h) + ((acid + salt) * k * h / ((k + h) * (k + h))));

        Assert.Equal(1, prediction.Buffer!.CapacityMolPerL * prediction.Mixture.VolumeL / prediction.Mixture.WaterKg / vanSlyke, 1e-9);
    }

    // pH = pKw/2, so dpH/dT is half of that of pKw; −0.0333/2 from the handbook's 14.165 at 20 °C and 13.832 at 30 °C (CRC, read).
    [Fact]
    public void TemperatureCoefficient_ofWater_isHalfOfThatOfPKw() =>
        Assert.Equal((13.832 - 14.165) / 20, Of("sodium chloride=1e-9", "ideal").Buffer!.TemperatureCoefficientPerK, 1e-4);

    [Theory]
    [InlineData(0)]
    [InlineData(100)]
    public void Buffer_atTheEndsOfTheRange_isThere(double celsius) =>
        Assert.InRange(Of("acetic acid=0.1 + sodium acetate=0.1", "bates-guggenheim", celsius).Buffer!.TemperatureCoefficientPerK, -0.01, 0.01);

    // Figures belong to the equilibrium, whatever the method.
    [Fact]
    public void Buffer_ofAShortCut_isThatOfTheEquilibrium()
    {
        var recipe = Of("acetic acid=0.1", "davies").Recipe;
        var exact = new Predictor(SubstanceTable.Default, null, new DaviesModel()).Predict(recipe).Buffer!;
        var shortCut = new Predictor(SubstanceTable.Default, new DominantAcidSolver(), new DaviesModel()).Predict(recipe).Buffer!;

        Assert.Equal(exact.CapacityMolPerL, shortCut.CapacityMolPerL);
        Assert.Equal(exact.DilutionValue, shortCut.DilutionValue);
        Assert.Equal(exact.TemperatureCoefficientPerK, shortCut.TemperatureCoefficientPerK);
    }

    [Fact]
    public void LeavesOut_namesTheStepsWithoutAnEnthalpy()
    {
        Assert.Empty(Of("acetic acid=0.1", "ideal").Buffer!.TemperatureCoefficientLeavesOut);
        var unknown = SubstanceTable.Default.Families.SelectMany(family => family.Steps).First(step => !step.ChangesWithTemperature);
        var family = unknown.Id.Split(':')[0];
        var substance = SubstanceTable.Default.Substances.First(one => one.Brings.Any(brought => brought.Family.Id == family));

        Assert.Contains(unknown.Id, Of(substance.Name + "=0.01", "ideal").Buffer!.TemperatureCoefficientLeavesOut);
    }

    // A model that fails beside the answer gives no figures, and the prediction stands.
    [Fact]
    public void Buffer_whereTheModelFailsBesideTheAnswer_isNotThere()
    {
        var prediction = new Predictor(SubstanceTable.Default, null, new FailsAwayFrom25()).Predict(Of("acetic acid=0.1", "ideal").Recipe);

        Assert.Equal(2.88, prediction.PH, 0.01);
        Assert.Null(prediction.Buffer);
        Assert.Null(prediction.ModelUncertainty);
    }

    private static Prediction Of(string parts, string model, double celsius = 25)
    {
        var builder = Recipe.Named("mixture").At(celsius.ToString(CultureInfo.InvariantCulture) + " Cel").PreparedAt("25 Cel");
        foreach (var (substance, amount) in Split(parts))
        {
            builder.Add(amount + " mol", substance);
        }

        return new Predictor(SubstanceTable.Default, null, ActivityModels.Find(model)).Predict(builder.PourWater("1 kg").Build());
    }

    private static (string Substance, string Amount)[] Split(string parts) =>
        parts.Split(" + ").Select(part => part.Split('=')).Select(part => (part[0], part[1])).ToArray();

    private sealed class FailsAwayFrom25 : IActivityModel
    {
        public string Name => "only at 25 Cel";

        public double HighestIonicStrengthMolPerKg => 1;

        public IonData Uses => IonData.None;

        public string Source => "a test";

        public void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas)
        {
            log10Gammas.Clear();
            if (Math.Abs(equilibrium.Solvent.TemperatureK - 298.15) > 1e-6)
            {
                throw new InvalidOperationException("only at 25 Cel");
            }
        }
    }
}
