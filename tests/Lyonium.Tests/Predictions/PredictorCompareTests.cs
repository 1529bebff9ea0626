using System;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Solvers;
using Lyonium.Substances;
using Lyonium.Tests.Substances;
using Xunit;

namespace Lyonium.Tests.Predictions;

/// <summary>Every method side by side: the rows, the deviation, the verdict, the reason.</summary>
public sealed class PredictorCompareTests
{
    private static readonly string[] Methods = ["exact", "successive-approximation", "dominant-acid"];

    // Formic and lactic acid, each 0.025 mol/kg: close together, so the stronger one alone is wrong.
    private static readonly Recipe Close = Recipe.Named("ferment")
        .PourWater("1 kg").Add("0.025 mol", "formic acid").Add("0.025 mol", "lactic acid").Build();

    // Stronger than it is concentrated: no short-cut answers.
    private static readonly Recipe Dissociated = Recipe.Named("thin").PourWater("1 kg").Add("0.0001 mol", "formic acid").Build();

    [Fact]
    public void TryCompare_a_row_a_method_the_exact_one_first()
    {
        var comparison = new Predictor().TryCompare(Close).GetValueOrThrow();

        Assert.Equal(Methods, comparison.Rows.Select(row => row.Method));
        Assert.Equal(("bates-guggenheim", 0.02), (comparison.ActivityModel, comparison.Tolerance));
        Assert.Same(Close, comparison.Recipe);
    }

    [Theory]
    [InlineData("ideal")]
    [InlineData("davies")]
    public void TryCompare_rows_are_what_each_method_predicts(string model)
    {
        var predictor = new Predictor(SubstanceTable.Default, activityModel: ActivityModels.Find(model));
        var comparison = predictor.TryCompare(Close).GetValueOrThrow();
        var exact = predictor.Predict(Close);

        Assert.Equal(model, comparison.ActivityModel);
        foreach (var row in comparison.Rows)
        {
            var alone = predictor.With(Lyonium.Solvers.Methods.Find(row.Method)!).Predict(Close);
            Assert.Equal(alone.PH, row.PH);
            Assert.Equal(alone.PH - exact.PH, row.Deviation);
            Assert.Equal(alone.Formula, row.Formula);
            Assert.Equal(alone.Assumptions, row.Assumptions);
            Assert.Equal(alone.Iterates, row.Iterates);
            Assert.Null(row.Reason);
        }

        Assert.Equal(0, comparison.Rows[0].Deviation);
    }

    // Ideal, by hand: K of formic acid is 10^-3.745 (the mean of 3.739 and 3.752, the published values of the table's sources), of lactic
    // acid 10^-3.86; h of formic acid alone is √(K c) = 2.12e-3, of both at the first estimate √((1.80 + 1.38)e-4 × 0.025) = 2.82e-3.
    [Fact]
    public void TryCompare_two_weak_acids_close_together_the_short_cut_is_told_to_be_off_by_a_tenth()
    {
        var comparison = new Predictor(SubstanceTable.Default, activityModel: new IdealModel()).TryCompare(Close).GetValueOrThrow();
        var dominant = comparison.Rows[2];

        Assert.Equal(-Math.Log10(2.12e-3), dominant.PH!.Value, 0.006);
        Assert.Equal(Math.Log10(2.72 / 2.12), dominant.Deviation!.Value, 0.02);
        Assert.False(dominant.WithinTolerance);
        Assert.Contains(dominant.Assumptions, one => one is { Code: "all-neglected", Held: false });
        Assert.Contains(dominant.Assumptions, one => one is { Code: "other-protolyte-share", Of: "lactate", Held: false });
        Assert.True(comparison.Rows[1].WithinTolerance);
    }

    [Fact]
    public void TryCompare_tolerance_decides_the_verdict_and_nothing_else()
    {
        var off = new Predictor().TryCompare(Close).GetValueOrThrow().Rows[2].Deviation!.Value;
        var narrow = new Predictor().TryCompare(Close, Math.Abs(off) * 0.999).GetValueOrThrow();
        var wide = new Predictor().TryCompare(Close, Math.Abs(off) * 1.001).GetValueOrThrow();

        Assert.False(narrow.Rows[2].WithinTolerance);
        Assert.True(wide.Rows[2].WithinTolerance);
        Assert.Equal(narrow.Rows.Select(row => row.PH), wide.Rows.Select(row => row.PH));
        Assert.True(narrow.Rows[0].WithinTolerance);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-0.02)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void TryCompare_tolerance_that_is_none_throws(double tolerance) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => new Predictor().TryCompare(Close, tolerance));

    [Fact]
    public void TryCompare_method_without_an_answer_has_a_reason_and_its_iterates()
    {
        var rows = new Predictor().TryCompare(Dissociated).GetValueOrThrow().Rows;

        Assert.All(rows.Skip(1), row =>
        {
            Assert.Null(row.PH);
            Assert.Null(row.Deviation);
            Assert.Null(row.WithinTolerance);
            Assert.Empty(row.Assumptions);
            Assert.Contains("more would dissociate", row.Reason, StringComparison.Ordinal);
        });
        Assert.NotEmpty(rows[1].Iterates);
        Assert.Empty(rows[2].Iterates);
    }

    [Fact]
    public void TryCompare_refused_recipe_every_fault()
    {
        var attempt = new Predictor(UserTable.Sound()).TryCompare(Close);

        Assert.False(attempt.Success);
        Assert.Equal(["formic-acid", "lactic-acid"], attempt.Faults.Select(fault => fault.Found));
        Assert.Throws<ArgumentNullException>(() => new Predictor().TryCompare(null!));
    }

    [Fact]
    public void TryCompare_own_method_is_a_row_after_the_librarys()
    {
        var own = new FixedMethod("seven", _ => SolverOutcome.Answer(7) with
        {
            Assumptions = [new SolverAssumption("always-seven", -1, 1, 0, Held: false, "a test")],
        });
        var rows = new Predictor(SubstanceTable.Default, own).TryCompare(Close).GetValueOrThrow().Rows;

        Assert.Equal(Methods.Append("seven"), rows.Select(row => row.Method));
        Assert.Equal(7, rows[3].PH);
        Assert.Equal(7 - rows[0].PH, rows[3].Deviation);
        Assert.False(rows[3].WithinTolerance);
        Assert.Contains(rows[3].Assumptions, one => one is { Code: "always-seven", Held: false });
    }

    [Fact]
    public void TryCompare_own_method_that_throws_is_a_row_with_its_reason()
    {
        var own = new FixedMethod("broken", _ => throw new InvalidTimeZoneException("boom"));
        var rows = new Predictor(SubstanceTable.Default, own).TryCompare(Close).GetValueOrThrow().Rows;

        Assert.Equal("broken", rows[3].Method);
        Assert.Null(rows[3].PH);
        Assert.Contains("boom", rows[3].Reason, StringComparison.Ordinal);
        Assert.True(rows[1].WithinTolerance);
    }

    // A predictor with more figures compares with those, not with the library's four.
    [Fact]
    public void TryCompare_own_setting_of_a_method_takes_its_place()
    {
        var predictor = new Predictor(SubstanceTable.Default, new SuccessiveApproximationSolver(10));
        var rows = predictor.TryCompare(Close).GetValueOrThrow().Rows;

        Assert.Equal(Methods.Order(StringComparer.Ordinal), rows.Select(row => row.Method).Order(StringComparer.Ordinal));
        var row = rows.Single(row => row.Method == "successive-approximation");
        Assert.InRange(Math.Abs(row.Deviation!.Value), 0, 1e-9);
        Assert.True(row.Iterates.Count > new Predictor().TryCompare(Close).GetValueOrThrow().Rows[1].Iterates.Count);
    }
}
