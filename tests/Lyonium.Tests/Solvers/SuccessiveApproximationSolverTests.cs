using System;
using System.Collections.Generic;
using System.Linq;
using CsCheck;
using Lyonium.Equilibria;
using Lyonium.Solvers;
using Lyonium.Tests.Equilibria;
using Xunit;

namespace Lyonium.Tests.Solvers;

/// <summary>Successive approximation: its iterates by hand, when they settle, and what is said when they do not.</summary>
public sealed class SuccessiveApproximationSolverTests
{
    // So small an ion product that water does not count beside any acid of these tests.
    private const double NoWater = 100;

    private static readonly Gen<(double PK, double Ratio)> Acids = Gen.Select(Gen.Double[1, 9], Gen.Double[0.02, 8], (pK, log10Ratio) => (pK, Math.Pow(10, log10Ratio)));

    public static TheoryData<string> Cases => [.. MethodCase.All.Select(one => one.Name)];

    // Common practice: x ← √(K (c − x)) from x = √(K c).
    [Fact]
    public void Solve_one_weak_acid_iterates_of_the_formula_by_hand() => Acids.Check(
        acid =>
        {
            var (k, c, outcome) = Solve(acid.PK, acid.Ratio);
            Assert.Equal(SolverStatus.Solved, outcome.Status);
            var x = Math.Sqrt(k * c);
            foreach (var iterate in outcome.Iterates)
            {
                Assert.Equal(-Math.Log10(x), iterate.PH, 1e-9);
                x = Math.Sqrt(k * (c - x));
            }
        },
        iter: 500);

    // Each side closes in on the answer; with c from 1.25 K on each iterate is nearer than the one before as well (at 1.25 K by hand, in
    // units of K: 1.118, 0.363, 0.942 around 0.725).
    [Fact]
    public void Solve_one_weak_acid_iterates_fall_on_both_sides_in_turn_and_close_in() => Acids.Check(
        acid =>
        {
            var (k, c, outcome) = Solve(acid.PK, acid.Ratio, significantFigures: 10);
            var answer = 2 * k * c / (k + Math.Sqrt((k * k) + (4 * k * c)));
            var off = outcome.Iterates.Select(one => Math.Pow(10, -one.PH) - answer).Where(one => Math.Abs(one) > 1e-9 * answer).ToArray();
            Assert.NotEmpty(off);
            Assert.True(off[0] > 0);
            Assert.All(off.Zip(off.Skip(1)), pair => Assert.True(pair.First * pair.Second < 0));
            Assert.All(off.Zip(off.Skip(2)), pair => Assert.True(Math.Abs(pair.Second) < Math.Abs(pair.First)));
            if (acid.Ratio >= 1.25)
            {
                Assert.All(off.Zip(off.Skip(1)), pair => Assert.True(Math.Abs(pair.Second) < Math.Abs(pair.First)));
            }
        },
        iter: 500);

    // At x = √(K c) nothing is left undissociated when c = K: from the neglect start c must be above K.
    [Theory]
    [InlineData(1.001, SolverStatus.Solved)]
    [InlineData(1.05, SolverStatus.Solved)]
    [InlineData(0.999, SolverStatus.NotSettled)]
    [InlineData(0.75, SolverStatus.NotSettled)]
    [InlineData(0.01, SolverStatus.NotSettled)]
    public void Solve_one_weak_acid_settles_only_where_it_is_more_concentrated_than_strong(double ratio, SolverStatus expected)
    {
        var (k, c, outcome) = Solve(3, ratio);

        Assert.Equal(expected, outcome.Status);
        Assert.Equal(-Math.Log10(Math.Sqrt(k * c)), outcome.Iterates[0].PH, 1e-9);
        if (expected != SolverStatus.Solved)
        {
            Assert.True(double.IsNaN(outcome.PH));
            Assert.Equal("more would dissociate than there is", outcome.Reason);
            return;
        }

        Assert.Equal(-Math.Log10(2 * k * c / (k + Math.Sqrt((k * k) + (4 * k * c)))), outcome.PH, 0.00025);
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Solve_case_settles_on_the_exact_answer_to_its_figures(string name)
    {
        var mixture = MethodCase.All.Single(one => one.Name == name).Mixture;
        var outcome = Solving.Successive.Solve(mixture.ToEquilibrium(), Solving.Ideal);
        var assumption = Assert.Single(outcome.Assumptions);

        Assert.Equal(SolverStatus.Solved, outcome.Status);
        Assert.Equal(Solving.Ideally(mixture).PH, outcome.PH, 0.5e-3 / Math.Log(10));
        Assert.Equal("figures-kept", assumption.Code);
        Assert.InRange(assumption.Figure, 0, assumption.Limit);
        Assert.Equal(0.5e-3 / Math.Log(10), assumption.Limit, 1e-12);
        Assert.Equal(outcome.PH, outcome.Iterates[^1].PH);
        Assert.InRange(outcome.Iterates.Count, 2, 12);
    }

    [Fact]
    public void Solve_corrections_are_the_differences_of_the_iterates()
    {
        var (_, _, outcome) = Solve(3, 4);

        Assert.True(outcome.Iterates.Count > 4);
        Assert.Equal(0, outcome.Iterates[0].Correction);
        Assert.All(
            outcome.Iterates.Zip(outcome.Iterates.Skip(1)),
            pair => Assert.Equal(pair.Second.PH - pair.First.PH, pair.Second.Correction, 1e-12));
    }

    [Fact]
    public void Solve_more_figures_more_rounds_and_a_closer_answer()
    {
        var mixture = MixtureInput.Of(new LadderInput(0.1, 0, 2.15, 7.2, 12.35));
        var exact = Solving.Ideally(mixture).PH;
        var rounds = new List<int>();
        foreach (var figures in new[] { 2, 4, 6, 9, 12 })
        {
            var outcome = new SuccessiveApproximationSolver(figures).Solve(mixture.ToEquilibrium(), Solving.Ideal);
            Assert.Equal(exact, outcome.PH, 0.5 * Math.Pow(10, 1 - figures) / Math.Log(10));
            rounds.Add(outcome.Iterates.Count);
        }

        Assert.Equal(rounds.Order(), rounds);
        Assert.True(rounds[^1] > rounds[0] + 4);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(0)]
    [InlineData(-4)]
    [InlineData(13)]
    [InlineData(int.MaxValue)]
    public void Constructor_figures_out_of_range_throws(int significantFigures) =>
        Assert.Equal(
            "significantFigures",
            Assert.Throws<ArgumentOutOfRangeException>(() => new SuccessiveApproximationSolver(significantFigures)).ParamName);

    [Theory]
    [InlineData(2)]
    [InlineData(12)]
    public void Constructor_figures_at_the_ends_of_the_range_accepted(int significantFigures) =>
        Assert.Equal("successive-approximation", new SuccessiveApproximationSolver(significantFigures).Name);

    private static (double K, double C, SolverOutcome Outcome) Solve(double pK, double ratio, int significantFigures = 4)
    {
        var k = Math.Pow(10, -pK);
        var mixture = new MixtureInput([new LadderInput(k * ratio, 0, pK)], NoWater);
        return (k, k * ratio, new SuccessiveApproximationSolver(significantFigures).Solve(mixture.ToEquilibrium(), Solving.Ideal));
    }
}
