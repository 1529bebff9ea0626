using System;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Faults;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Substances;
using Lyonium.Tests.Equilibria;
using Xunit;

namespace Lyonium.Tests.Predictions;

/// <summary>A plug-in is other people's code: whatever it does comes back as a fault that names it.</summary>
public sealed class PredictorContainmentTests
{
    private static readonly Recipe Buffer = Recipe.Named("rinse").PourWater("1 kg").Add("0.05 mol", "acetic acid").Add("0.02 mol", "NaOH").Build();

    [Fact]
    public void TryPredict_method_throws_fault_names_it() =>
        AssertFailed(_ => throw new InvalidTimeZoneException("boom"), "InvalidTimeZoneException: boom");

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    public void TryPredict_method_answers_no_number_fault(double pH) => AssertFailed(_ => Solved(pH, double.NaN, double.NaN), "not a number");

    [Theory]
    [InlineData(4, 4.5, 5)]
    [InlineData(6, 4.5, 5)]
    public void TryPredict_method_answers_outside_its_bracket_fault(double pH, double low, double high) =>
        AssertFailed(_ => Solved(pH, low, high), "outside its own bracket");

    [Fact]
    public void TryPredict_method_answers_a_pH_that_is_none_fault() => AssertFailed(_ => Solved(1e9, double.NaN, double.NaN), "pH");

    [Fact]
    public void TryPredict_model_throws_fault_names_it()
    {
        var fault = Single(new Predictor(
            SubstanceTable.Default, activityModel: new OddModel((_, _) => throw new InvalidTimeZoneException("boom"))).TryPredict(Buffer));

        Assert.Equal("LYO0605", fault.Code);
        Assert.Contains("'odd'", fault.Message, StringComparison.Ordinal);
        Assert.Contains("boom", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void TryPredict_model_gives_no_number_did_not_settle()
    {
        var fault = Single(new Predictor(
            SubstanceTable.Default, activityModel: new OddModel((_, gammas) => gammas.Fill(double.NaN))).TryPredict(Buffer));

        Assert.Equal("LYO0604", fault.Code);
    }

    [Theory]
    [InlineData(SolverStatus.CoupledSpecies, "LYO0601")]
    [InlineData(SolverStatus.FixedActivity, "LYO0602")]
    [InlineData(SolverStatus.DoesNotApply, "LYO0603")]
    [InlineData(SolverStatus.NotSettled, "LYO0604")]
    public void TryPredict_method_refuses_its_fault_and_reason(SolverStatus status, string code)
    {
        var fault = Single(With(_ => SolverOutcome.Without(status, "the reason")).TryPredict(Buffer));

        Assert.Equal(code, fault.Code);
        Assert.Contains("the reason", fault.Message, StringComparison.Ordinal);
    }

    // Amounts and water three times as large: the same solution.
    [Theory]
    [InlineData(3)]
    [InlineData(0.001)]
    [InlineData(1e6)]
    public void Predict_amounts_and_water_scaled_same_pH(double factor)
    {
        static string Text(double value, string unit) => value.ToString("R", System.Globalization.CultureInfo.InvariantCulture) + " " + unit;
        var scaled = Recipe.Named("rinse")
            .PourWater(Text(factor, "kg"))
            .Add(Text(0.05 * factor, "mol"), "acetic acid")
            .Add(Text(0.02 * factor, "mol"), "NaOH")
            .Build();

        foreach (var model in new IActivityModel[] { new IdealModel(), new DaviesModel() })
        {
            var predictor = new Predictor(SubstanceTable.Default, activityModel: model);
            var one = predictor.Predict(Buffer);
            Assert.Equal(one.PH, predictor.Predict(scaled).PH, (one.Evidence.BracketHigh - one.Evidence.BracketLow) + (2 * one.Evidence.InputResolution));
        }
    }

    private static SolverOutcome Solved(double pH, double low, double high) =>
        new() { Status = SolverStatus.Solved, PH = pH, BracketLow = low, BracketHigh = high };

    private static Predictor With(Func<Equilibrium, SolverOutcome> solve) => new(SubstanceTable.Default, new OddMethod(solve));

    private static Fault Single(Attempt<Prediction> attempt)
    {
        Assert.False(attempt.Success);
        return Assert.Single(attempt.Faults);
    }

    private static void AssertFailed(Func<Equilibrium, SolverOutcome> solve, string words)
    {
        var fault = Single(With(solve).TryPredict(Buffer));

        Assert.Equal("LYO0605", fault.Code);
        Assert.Contains("'odd method'", fault.Message, StringComparison.Ordinal);
        Assert.Contains(words, fault.Message, StringComparison.Ordinal);
    }

    private sealed class OddMethod(Func<Equilibrium, SolverOutcome> solve) : ISolver
    {
        public string Name => "odd method";

        public SolverOutcome Solve(Equilibrium equilibrium, IActivityModel model) => solve(equilibrium);
    }
}
