using System;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Tests.Equilibria;
using Xunit;

namespace Lyonium.Tests.Solvers;

/// <summary>The dominant-acid short-cut: its formulas by hand, its assumptions, and what they say of its error.</summary>
public sealed class DominantAcidSolverTests
{
    public static TheoryData<string> Cases => [.. MethodCase.All.Select(one => one.Name)];

    [Theory]
    [MemberData(nameof(Cases))]
    public void Solve_case_pH_of_the_formula_by_hand(string name)
    {
        var one = MethodCase.All.Single(one => one.Name == name);
        var outcome = Solving.Dominant.Solve(one.Mixture.ToEquilibrium(), Solving.Ideal);

        Assert.Equal(SolverStatus.Solved, outcome.Status);
        Assert.Equal(one.Formula, outcome.Formula);
        Assert.Equal(one.ByHand, outcome.PH, 5e-6);
        Assert.True(double.IsNaN(outcome.BracketLow));
    }

    // The figures are the protons neglected over those the answer rests on. They move ln h by at most their sum over the steepness of the
    // balance: 2 for a weak acid or base, 1 for strong excess, at least 1/2 for a pair. A fifth on top for what the tangent leaves out.
    [Theory]
    [MemberData(nameof(Cases))]
    public void Solve_case_off_by_no_more_than_its_figures_imply(string name)
    {
        var one = MethodCase.All.Single(one => one.Name == name);
        var outcome = Solving.Dominant.Solve(one.Mixture.ToEquilibrium(), Solving.Ideal);
        var allowed = 1.2 * 2 * Neglected(outcome) / Math.Log(10);

        Assert.InRange(outcome.PH - Solving.Ideally(one.Mixture).PH, -allowed - 1e-12, allowed + 1e-12);
    }

    [Fact]
    public void Solve_random_mixtures_off_by_no_more_than_their_figures_imply()
    {
        var judged = 0;
        foreach (var one in new[] { true, false }.SelectMany(isGentle => MethodFigures.Of(isGentle, Solving.Dominant, Solving.Ideal).Answers))
        {
            var neglected = Neglected(one.Outcome);
            if (neglected <= 0.05)
            {
                judged++;
                Assert.True(Math.Abs(one.Deviation) <= (1.2 * 2 * neglected / Math.Log(10)) + 1e-12, $"neglected {neglected}: {one}");
            }
        }

        Assert.True(judged > 10_000, "Too few of the mixtures were judged: " + judged);
    }

    // 0.1 mol/kg with pKa 4.75 by hand: h = 10^-2.875 = 1.3335e-3, K/h = 0.013335, Kw/(K c) = 5.6e-9; water too little to count.
    [Fact]
    public void Solve_weak_acid_figures_by_hand()
    {
        var outcome = Solving.Dominant.Solve(MixtureInput.Of(new LadderInput(0.1, 0, 4.75)).ToEquilibrium(), Solving.Ideal);

        Assert.Equal(0.013335, Figure(outcome, "dissociated-fraction"), 1e-6);
        Assert.Equal(5.623e-9, Figure(outcome, "water-share"), 1e-12);
        Assert.All(outcome.Assumptions, one => Assert.True(one.Held, one.Code));
        Assert.All(outcome.Assumptions.Where(one => one.Code != "all-neglected"), one => Assert.Equal((0.05, "common practice"), (one.Limit, one.Basis)));
    }

    // Phosphoric acid: K/h = 10^-(2.15 − 1.575) = 0.266, above 5 %; its second step, with all
    // of the acid counted, 0.1 × K2/(K2 + h) = 2.371e-7, which is 8.91e-6 of h.
    [Fact]
    public void Solve_acid_more_dissociated_than_five_percent_given_and_not_held()
    {
        var outcome = Solving.Dominant.Solve(MixtureInput.Of(new LadderInput(0.1, 0, 2.15, 7.2, 12.35)).ToEquilibrium(), Solving.Ideal);

        Assert.Equal(SolverStatus.Solved, outcome.Status);
        Assert.Equal(1.575, outcome.PH, 1e-9);
        Assert.Equal(0.26607, Figure(outcome, "dissociated-fraction"), 1e-5);
        Assert.False(outcome.Assumptions.Single(one => one.Code == "dissociated-fraction").Held);
        Assert.Equal(8.91e-6, outcome.Assumptions.Where(one => one.Code == "next-step-share").Max(one => one.Figure), 1e-8);
        Assert.False(outcome.Assumptions.Single(one => one.Code == "all-neglected").Held);
    }

    // Two acids of 0.1 mol/kg, pKa 3.75 and 4.0: the second gives 0.1 × 1e-4 / (1e-4 + h) beside h = 10^-2.375 = 4.217e-3.
    [Fact]
    public void Solve_two_acids_close_together_the_other_one_told_and_not_held()
    {
        var outcome = Solving.Dominant.Solve(
            MixtureInput.Of(new LadderInput(0.1, 0, 3.75), new LadderInput(0.1, 0, 4)).ToEquilibrium(), Solving.Ideal);

        Assert.Equal(2.375, outcome.PH, 1e-9);
        var other = outcome.Assumptions.Single(one => one.Code == "other-protolyte-share");
        Assert.Equal(1, other.Component);
        Assert.Equal(0.1 * 1e-4 / (1e-4 + 4.21697e-3) / 4.21697e-3, other.Figure, 1e-5);
        Assert.False(other.Held);
    }

    // Ranked by the protons each gives alone, not by K·c: 1e-3 mol/kg of pKa 1 gives 9.9e-4, 0.5 mol/kg of pKa 3.5 gives 0.0124.
    [Fact]
    public void Solve_strong_trace_with_the_larger_product_does_not_rule()
    {
        var outcome = Solving.Dominant.Solve(
            MixtureInput.Of(new LadderInput(2e-3, 0, 1), new LadderInput(0.5, 0, 3.75)).ToEquilibrium(), Solving.Ideal);

        Assert.Equal((3.75 - Math.Log10(0.5)) / 2, outcome.PH, 1e-9);
        Assert.False(outcome.Assumptions.Single(one => one is { Code: "other-protolyte-share", Component: 0 }).Held);
    }

    [Theory]
    [InlineData(0, 2, "dissociate")]
    [InlineData(1, 12, "take a proton")]
    public void Solve_more_would_react_than_there_is_does_not_apply(int topCharge, double pKa, string what)
    {
        var outcome = Solving.Dominant.Solve(MixtureInput.Of(new LadderInput(0.001, topCharge, pKa)).ToEquilibrium(), Solving.Ideal);

        Assert.Equal(SolverStatus.DoesNotApply, outcome.Status);
        Assert.Contains(what, outcome.Reason, StringComparison.Ordinal);
        Assert.True(double.IsNaN(outcome.PH));
    }

    // At c = K exactly the neglect has all of it dissociated, which is still possible; just below it is not.
    [Theory]
    [InlineData(0.01, SolverStatus.Solved)]
    [InlineData(0.00999, SolverStatus.DoesNotApply)]
    public void Solve_acid_as_strong_as_it_is_concentrated_is_the_last_that_applies(double molPerKg, SolverStatus expected) =>
        Assert.Equal(expected, Solving.Dominant.Solve(MixtureInput.Of(new LadderInput(molPerKg, 0, 2)).ToEquilibrium(), Solving.Ideal).Status);

    private static double Neglected(SolverOutcome outcome) =>
        outcome.Assumptions.Where(one => one.Code != "all-neglected").Sum(one => one.Figure);

    private static double Figure(SolverOutcome outcome, string code) => outcome.Assumptions.Single(one => one.Code == code).Figure;
}
