using System;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Predictions;
using Lyonium.Records;
using Lyonium.Solvers;
using Lyonium.Substances;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Predictions;

/// <summary>What other people's methods and models say beside a number: told as a fault, or left out of the record.</summary>
public sealed class PluginEdgeTests
{
    private static readonly Lyonium.Recipes.Recipe Recipe = RecipeJson.Read(RecipeText.OfTheContract);

    [Theory]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NaN)]
    public void Write_of_a_model_without_a_highest_ionic_strength_leaves_the_limit_out(double highest)
    {
        var model = new Model { Highest = highest };
        var predictor = new Predictor().With(model);

        var record = RecordJson.Write(predictor.Predict(Recipe));
        Schemas.Record.Hold(record);
        Schemas.Comparison.Hold(ComparisonJson.Write(predictor.TryCompare(Recipe).Value));
        Assert.True(new RecordReplay(SubstanceTable.Default, Methods.All, [model]).TryReplay(record).Value.Agrees);
    }

    [Fact]
    public void Write_of_figures_that_are_no_numbers_leaves_them_out()
    {
        var method = new FixedMethod("own", _ => SolverOutcome.Answer(4) with
        {
            BracketLow = 3.9,
            Assumptions = [new SolverAssumption("wide", -1, double.NaN, double.NegativeInfinity, true, "a test")],
            Iterates = [new Iterate(4, double.NaN), new Iterate(double.PositiveInfinity, 1)],
        });
        var record = RecordJson.Write(new Predictor().With(method).Predict(Recipe));

        Schemas.Record.Hold(record);
        Schemas.Comparison.Hold(ComparisonJson.Write(new Predictor().With(method).TryCompare(Recipe).Value));
        Assert.DoesNotContain("\"bracket\"", record, StringComparison.Ordinal);
        var refusing = new FixedMethod("own", _ => SolverOutcome.Without(SolverStatus.NotSettled, "no") with { Iterates = [new Iterate(double.NaN, 1)] });
        Schemas.Faults.Hold(FaultsJson.Write(new Predictor().With(refusing).TryPredict(Recipe).Faults));
    }

    [Theory]
    [InlineData(99, "code", "basis", "component 99")]
    [InlineData(0, "", "basis", "no code")]
    [InlineData(0, "code", null, "no basis")]
    public void TryPredict_an_assumption_that_is_none_is_told(int component, string code, string? basis, string says) =>
        Failed(new FixedMethod("own", _ => SolverOutcome.Answer(4) with { Assumptions = [new SolverAssumption(code, component, 1, 1, true, basis!)] }), says);

    [Fact]
    public void TryPredict_null_among_assumptions_or_iterates_is_told()
    {
        Failed(new FixedMethod("own", _ => SolverOutcome.Answer(4) with { Assumptions = [null!] }), "null");
        Failed(new FixedMethod("own", _ => SolverOutcome.Answer(4) with { Iterates = [null!] }), "null");
    }

    [Fact]
    public void TryPredict_no_outcome_is_no_answer() => Failed(new FixedMethod("own", _ => default), "no outcome");

    [Theory]
    [InlineData(null)]
    [InlineData(" ")]
    public void TryPredict_without_a_name_or_a_source_is_told(string? text)
    {
        Failed(new FixedMethod(text!, _ => SolverOutcome.Answer(4)), "no name");
        Failed(new Model { NameOf = () => text! }, "no name");
        Failed(new Model { SourceOf = () => text! }, "no source");
    }

    [Fact]
    public void TryPredict_getters_that_throw_are_told()
    {
        static string Throw() => throw new InvalidTimeZoneException("boom");
        var asked = 0;

        Failed(new Model { NameOf = Throw }, "boom");
        Failed(new Model { SourceOf = Throw }, "boom");
        Failed(new Model { SourceOf = () => asked++ == 0 ? "a test" : Throw() }, "boom");
        var compared = new Predictor().With(new ThrowingName()).TryCompare(Recipe).Value;
        Assert.Equal(nameof(ThrowingName), compared.Rows[^1].Method);
    }

    // Whoever forgets a species gave a coefficient of one to it before.
    [Fact]
    public void TryPredict_a_model_that_fills_a_part_is_refused()
    {
        var fault = Assert.Single(new Predictor().With(new Model { Fill = gammas => gammas[..2].Fill(-0.1) }).TryPredict(Recipe).Faults);

        Assert.Equal("LYO0604", fault.Code);
        Assert.Equal("dilute, or use another activity model", fault.Remedy);
    }

    [Fact]
    public void With_a_plugin_under_a_name_of_the_library_is_refused()
    {
        var method = new FixedMethod("dominant-acid", _ => SolverOutcome.Answer(4));
        var model = new Model { NameOf = () => "davies" };

        Assert.Contains("'davies'", Assert.Throws<ArgumentException>(() => new Predictor().With(model)).Message, StringComparison.Ordinal);
        Assert.Contains("'dominant-acid'", Assert.Throws<ArgumentException>(() => new Predictor().With(method)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentException>(() => new Predictor(SubstanceTable.Default, method));
        Assert.Throws<ArgumentException>(() => new RecordReplay(SubstanceTable.Default, [method], ActivityModels.All));
        Assert.Throws<ArgumentException>(() => new RecordReplay(SubstanceTable.Default, Methods.All, [model]));
        Assert.Equal("davies", new Predictor().With(new DaviesModel()).ActivityModel.Name);
    }

    private static void Failed(ISolver method, string says) => Failed(new Predictor().With(method), says);

    private static void Failed(IActivityModel model, string says) => Failed(new Predictor().With(model), says);

    private static void Failed(Predictor predictor, string says)
    {
        var fault = Assert.Single(predictor.TryPredict(Recipe).Faults);
        Assert.Equal("LYO0605", fault.Code);
        Assert.Contains(says, fault.Message, StringComparison.Ordinal);
        FaultText.Check([fault]);
    }

    private delegate void Filling(Span<double> log10Gammas);

    private sealed class ThrowingName : ISolver
    {
        public string Name => throw new InvalidTimeZoneException("boom");

        public SolverOutcome Solve(Equilibrium equilibrium, IActivityModel model) => SolverOutcome.Answer(4);
    }

    private sealed class Model : IActivityModel
    {
        public Func<string> NameOf { get; init; } = () => "of a house";

        public Func<string> SourceOf { get; init; } = () => "a test";

        public double Highest { get; init; } = 1;

        public Filling Fill { get; init; } = gammas => gammas.Clear();

        public string Name => NameOf();

        public double HighestIonicStrengthMolPerKg => Highest;

        public IonData Uses => IonData.None;

        public string Source => SourceOf();

        public void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas) => Fill(log10Gammas);
    }
}
