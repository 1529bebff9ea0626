using System;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Records;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Predictions;

/// <summary>What a prediction takes for granted is listed, with figure, limit and whether it held.</summary>
public sealed class AssumptionTests
{
    private const string Kilogram = "{ \"substance\": \"water\", \"mass\": \"1 kg\" }";

    private static Prediction Of(string parts, string more = "") => new Predictor().Predict(RecipeJson.Read(RecipeText.With(parts, more)));

    private static Assumption One(Prediction prediction, string code) => prediction.Assumptions.Single(one => one.Code == code);

    [Fact]
    public void SilentDefaults_areListedWhereTheyAreSilent()
    {
        var silent = Of(Kilogram).Assumptions.Select(one => one.Code).ToArray();
        var stated = Of(Kilogram, "\"temperature\": \"25 Cel\", \"preparedAt\": \"20 Cel\"").Assumptions.Select(one => one.Code).ToArray();

        Assert.Superset(new[] { "temperature-default", "preparation-temperature-default", "closed-to-air", "all-dissolved" }.ToHashSet(StringComparer.Ordinal), silent.ToHashSet(StringComparer.Ordinal));
        Assert.DoesNotContain("temperature-default", stated);
        Assert.DoesNotContain("preparation-temperature-default", stated);
        Assert.Contains("closed-to-air", stated);
    }

    [Theory]
    [InlineData("0.09 mol", true)]
    [InlineData("0.11 mol", false)]
    public void IonicStrength_isFlaggedAboveTheRangeOfTheModel(string amount, bool held)
    {
        var one = One(Of($"{{ \"substance\": \"NaCl\", \"amount\": \"{amount}\" }}, " + Kilogram), "ionic-strength-in-range");

        Assert.Equal(held, one.Held);
        Assert.Equal(0.1, one.Limit);
        Assert.Equal("bates-guggenheim", one.Of);
        Assert.Equal(held ? 0.09 : 0.11, one.Figure!.Value, 1e-6);
        Assert.Contains("Guggenheim", one.Basis, StringComparison.Ordinal);
    }

    [Fact]
    public void Ideal_isFlaggedWhereItIsNot()
    {
        var prediction = new Predictor().With(new IdealModel()).Predict(RecipeJson.Read(RecipeText.With("{ \"substance\": \"NaCl\", \"amount\": \"0.1 mol\" }, " + Kilogram)));

        Assert.False(One(prediction, "ionic-strength-in-range").Held);
    }

    [Theory]
    [InlineData("100 g", true)] // 1000/1100 = 0.909
    [InlineData("120 g", false)] // 1000/1120 = 0.893
    public void Water_isTheSolventWhereItIsNineTenths(string mass, bool held) =>
        Assert.Equal(held, One(Of($"{{ \"substance\": \"sucrose\", \"mass\": \"{mass}\" }}, " + Kilogram), "water-is-the-solvent").Held);

    [Fact]
    public void EstimatedSoluteVolume_saysWhatItDoesToThePH()
    {
        // 1 mol of tris-like salt in a litre to the mark: 0.3 mL/g of 157.597 g is 47 mL of 921 g of water; a strong acid's pH moves by
        // log10(921.2/968.4), up to 0.0217, plus what the activity coefficients do.
        var prediction = Of("{ \"substance\": \"tris hydrochloride\", \"amount\": \"1 mol\" }, { \"substance\": \"HCl\", \"amount\": \"0.01 mol\" }", "\"makeUpTo\": \"1 L\"");
        var one = One(prediction, "solute-volume-estimated");

        Assert.Equal("tris hydrochloride", one.Of);
        Assert.InRange(one.Figure!.Value, 0.01, 0.04);
        Assert.False(one.Held);
        Assert.Contains("0.3 mL/g", one.Basis, StringComparison.Ordinal);
    }

    [Fact]
    public void EstimatedSoluteVolume_ofADiluteBuffer_holds()
    {
        var one = One(Of("{ \"substance\": \"tris\", \"mass\": \"1 g\" }, { \"substance\": \"tris hydrochloride\", \"mass\": \"1 g\" }", "\"makeUpTo\": \"1 L\""), "solute-volume-estimated");

        Assert.True(one.Held);
        Assert.InRange(one.Figure!.Value, 0, 0.005);
    }

    [Fact]
    public void NoEstimate_isNotListed() =>
        Assert.DoesNotContain("solute-volume-estimated", Of("{ \"substance\": \"tris\", \"amount\": \"0.1 mol\" }, " + Kilogram).Assumptions.Select(one => one.Code));

    [Fact]
    public void DensityFromTheTable_isListed()
    {
        var near = One(Of("{ \"substance\": \"HCl\", \"massFraction\": \"37 %\", \"volume\": \"1 mL\" }, " + Kilogram), "density-from-the-table");
        var far = One(Of("{ \"substance\": \"HCl\", \"massFraction\": \"37 %\", \"volume\": \"1 mL\" }, " + Kilogram, "\"preparedAt\": \"30 Cel\""), "density-from-the-table");

        Assert.Equal((0.0, true), (near.Figure!.Value, near.Held));
        Assert.Equal(10, far.Figure!.Value, 1e-9);
        Assert.False(far.Held);
    }

    [Fact]
    public void ConstantAtAnotherIonicStrength_isListedWithWhetherTheModelReachesIt()
    {
        var edta = Of("{ \"substance\": \"EDTA\", \"amount\": \"1 mmol\" }, " + Kilogram).Assumptions.Where(one => one.Code == "constant-carried-to-infinite-dilution").ToArray();

        Assert.Equal(6, edta.Length);
        Assert.All(edta, one => Assert.Equal(one.Figure <= 0.5, one.Held));
        Assert.Contains(edta, one => one is { Of: "edta:6", Figure: 0.1, Held: true });
    }

    // Of ascorbic acid the table has no course; its pKa holds at 25 Cel.
    [Fact]
    public void ConstantAtAnotherTemperature_isListedAsNotHeld()
    {
        var prediction = Of("{ \"substance\": \"ascorbic acid\", \"amount\": \"1 mmol\" }, " + Kilogram, "\"temperature\": \"30 Cel\"");

        Assert.Contains(prediction.Assumptions, one => one is { Code: "constant-at-its-temperature", Of: "ascorbate:1", Held: false } && one.Figure is > 4.99 and < 5.01);
    }

    // Published at 20 Cel, with an enthalpy: carried to 25 Cel, and nothing to flag.
    [Fact]
    public void ConstantWithACourse_isCarriedAndNotListed() => Assert.DoesNotContain(
        Of("{ \"substance\": \"nitrilotriacetic acid\", \"amount\": \"1 mmol\" }, " + Kilogram).Assumptions,
        one => one.Of == "nitrilotriacetate:3" && one.Code.Contains("temperature", StringComparison.Ordinal));

    // The equation of hypochlorite was published from 5 to 35 Cel.
    [Theory]
    [InlineData("35 Cel", false)]
    [InlineData("45 Cel", true)]
    public void ConstantBeyondItsRange_isListedAsNotHeld(string temperature, bool isListed)
    {
        var prediction = Of("{ \"substance\": \"sodium hypochlorite\", \"amount\": \"1 mmol\" }, " + Kilogram, $"\"temperature\": \"{temperature}\"");
        var listed = prediction.Assumptions.Where(one => one is { Code: "constant-within-its-temperature-range", Of: "hypochlorite:1" }).ToArray();

        Assert.Equal(isListed ? [false] : [], listed.Select(one => one.Held));
        Assert.All(listed, one => Assert.Equal(10, one.Figure!.Value, 1e-6));
    }

    [Fact]
    public void InputsThatCannotTell_areListed()
    {
        // 5 mol/kg nearly neutralised: a last digit decides.
        var prediction = Of("{ \"substance\": \"HCl\", \"amount\": \"5 mol\" }, { \"substance\": \"NaOH\", \"amount\": \"5 mol\" }, " + Kilogram);

        Assert.False(One(prediction, "inputs-resolve-the-answer").Held);
        Assert.DoesNotContain("inputs-resolve-the-answer", Of("{ \"substance\": \"HCl\", \"amount\": \"5 mol\" }, " + Kilogram).Assumptions.Select(one => one.Code));
    }

    [Fact]
    public void Codes_areWordsOfTheContract() =>
        Assert.All(Of("{ \"substance\": \"EDTA\", \"mass\": \"1 g\" }", "\"makeUpTo\": \"1 L\"").Assumptions, one => Assert.Matches("^[a-z][a-z0-9-]*$", one.Code));
}
