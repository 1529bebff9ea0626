using System;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Predictions;
using Lyonium.Records;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Predictions;

/// <summary>Other people's methods and models: whatever they do, a fault names them, and nothing is thrown.</summary>
public sealed class PluginFailureTests
{
    private static readonly Lyonium.Recipes.Recipe Recipe = RecipeJson.Read(RecipeText.OfTheContract);

    [Theory]
    [InlineData(SolverStatus.CoupledSpecies, "LYO0601")]
    [InlineData(SolverStatus.FixedActivity, "LYO0602")]
    [InlineData(SolverStatus.DoesNotApply, "LYO0603")]
    [InlineData(SolverStatus.NotSettled, "LYO0604")]
    [InlineData((SolverStatus)99, "LYO0604")]
    public void Method_withoutAnAnswer_isToldByItsReason(SolverStatus status, string code) =>
        Refused(new Method(() => new SolverOutcome { Status = status, Reason = "species 3 says so", PH = double.NaN }), code, "species 3 says so");

    [Fact]
    public void Method_withoutAReason_isTold() => Refused(new Method(() => new SolverOutcome { Status = SolverStatus.NotSettled }), "LYO0604", "no reason");

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    public void Method_whoseAnswerIsNoNumber_isTold(double pH) =>
        Refused(new Method(() => new SolverOutcome { Status = SolverStatus.Solved, PH = pH, BracketLow = double.NaN, BracketHigh = double.NaN }), "LYO0605", "not a number");

    [Theory]
    [InlineData(6.9)]
    [InlineData(7.2)]
    public void Method_whoseAnswerIsOutsideItsBracket_isTold(double pH) =>
        Refused(new Method(() => new SolverOutcome { Status = SolverStatus.Solved, PH = pH, BracketLow = 7, BracketHigh = 7.1 }), "LYO0605", "bracket");

    [Fact]
    public void Method_whoseAnswerIsBeyondAllScales_isTold() =>
        Refused(new Method(() => new SolverOutcome { Status = SolverStatus.Solved, PH = 1e6, BracketLow = double.NaN, BracketHigh = double.NaN }), "LYO0605", "");

    [Fact]
    public void Method_thatThrows_isToldWithItsMessageOnOneLine() =>
        Refused(new Method(() => throw new InvalidOperationException("first line\nsecond line")), "LYO0605", "InvalidOperationException: first line second line");

    [Fact]
    public void Method_withoutAName_isTold() =>
        Assert.Equal("LYO0605", Assert.Single(new Predictor().With(new Method(() => throw new InvalidOperationException("x")) { Name = null! }).TryPredict(Recipe).Faults).Code);

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    [InlineData(1e300)]
    [InlineData(-1e300)]
    public void Model_whoseCoefficientsAreNoNumbers_isTold(double log10Gamma)
    {
        var attempt = new Predictor().With(new Model((_, gammas) => gammas.Fill(log10Gamma))).TryPredict(Recipe);
        Assert.False(attempt.Success);
        var fault = Assert.Single(attempt.Faults);
        Assert.StartsWith("LYO060", fault.Code, StringComparison.Ordinal);
        FaultText.Check([fault]);
    }

    [Fact]
    public void Model_thatThrows_isTold()
    {
        var fault = Assert.Single(new Predictor().With(new Model((_, _) => throw new NotSupportedException("no pitch"))).TryPredict(Recipe).Faults);

        Assert.Equal("LYO0605", fault.Code);
        Assert.Contains("no pitch", fault.Message, StringComparison.Ordinal);
        Assert.Contains("'odd'", fault.Message, StringComparison.Ordinal);
        FaultText.Check([fault]);
    }

    [Fact]
    public void Model_thatThrowsWhereAConstantIsCarried_isTold()
    {
        var edta = RecipeJson.Read(RecipeText.With("{ \"substance\": \"EDTA\", \"amount\": \"1 mmol\" }, { \"substance\": \"water\", \"mass\": \"1 kg\" }"));
        var model = new Model((ionicStrength, gammas) =>
        {
            if (ionicStrength == 0.1)
            {
                throw new NotSupportedException("not at 0.1");
            }

            gammas.Clear();
        });

        Assert.Equal("LYO0605", Assert.Single(new Predictor().With(model).TryPredict(edta).Faults).Code);
    }

    [Fact]
    public void Model_whoseNameIsPinned_isInTheRecord()
    {
        var prediction = new Predictor().With(new Model((_, gammas) => gammas.Clear())).Predict(Recipe);

        Assert.Equal("odd", prediction.ActivityModel);
        Assert.Equal(new Predictor().With(new IdealModel()).Predict(Recipe).PH, prediction.PH);
        Assert.Contains("\"activityModel\": \"odd\"", RecordJson.Write(prediction), StringComparison.Ordinal);
    }

    [Fact]
    public void Assumptions_andIterates_ofAMethod_reachThePrediction()
    {
        var prediction = new Predictor().With(new Method(() => new SolverOutcome
        {
            Status = SolverStatus.Solved,
            PH = 4,
            BracketLow = double.NaN,
            BracketHigh = double.NaN,
            InputResolution = double.NaN,
            Assumptions = [new SolverAssumption("dissociated-fraction", 0, 0.07, 0.05, false, "common practice"), new SolverAssumption("whole", -1, 1, 2, true, "x")],
            Iterates = [new Iterate(3, 1), new Iterate(4, 0.1)],
        })).Predict(Recipe);

        Assert.Contains(prediction.Assumptions, one => one is { Code: "dissociated-fraction", Figure: 0.07, Limit: 0.05, Held: false, Of: not "mixture" });
        Assert.Contains(prediction.Assumptions, one => one is { Code: "whole", Of: "mixture" });
        Assert.Equal([3.0, 4.0], prediction.Iterates.Select(one => one.PH));
        Assert.DoesNotContain("\"bracket\"", RecordJson.Write(prediction), StringComparison.Ordinal);
    }

    private static void Refused(ISolver method, string code, string says)
    {
        var fault = Assert.Single(new Predictor().With(method).TryPredict(Recipe).Faults);

        Assert.Equal(code + " $", fault.Code + " " + fault.Path);
        Assert.Contains(says, fault.Message, StringComparison.Ordinal);
        Assert.Contains("'own'", fault.Message, StringComparison.Ordinal);
        FaultText.Check([fault]);
    }

    private sealed class Method(Func<SolverOutcome> answer) : ISolver
    {
        public string Name { get; init; } = "own";

        public SolverOutcome Solve(Equilibrium equilibrium, IActivityModel model) => answer();
    }

    private delegate void Fill(double ionicStrengthMolPerKg, Span<double> log10Gammas);

    private sealed class Model(Fill fill) : IActivityModel
    {
        public string Name => "odd";

        public double HighestIonicStrengthMolPerKg => 1;

        public IonData Uses => IonData.None;

        public string Source => "none";

        public void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas) =>
            fill(ionicStrengthMolPerKg, log10Gammas);
    }
}
