using System;
using Lyonium.Equilibria;
using Lyonium.Tests.Equilibria;
using Xunit;

namespace Lyonium.Tests.Solvers;

/// <summary>What the short-cuts cannot do, they refuse with the reason.</summary>
public sealed class ShortCutRefusalTests
{
    private static readonly Solvent Water = new(298.15, 14, 0.51, 0.328);

    public static TheoryData<string> Methods { get; } = ["dominant-acid", "successive-approximation"];

    [Theory]
    [MemberData(nameof(Methods))]
    public void Solve_species_over_two_components_refused_as_coupled(string method) =>
        AssertRefused(
            method,
            new Equilibrium(
                [Constraint.Total(0.1), Constraint.Total(0.2)],
                [
                    new Species([new Term(0, 1)], 0, 2, 0),
                    new Species([new Term(1, 1)], 0, -2, 0),
                    new Species([new Term(0, 1), new Term(1, 1)], 0, 0, 2.3),
                ],
                Water),
            SolverStatus.CoupledSpecies,
            "ion pairs");

    [Theory]
    [MemberData(nameof(Methods))]
    public void Solve_fixed_activity_refused(string method) =>
        AssertRefused(
            method,
            new Equilibrium(
                [Constraint.FixedActivity(-3.5)],
                [new Species([new Term(0, 1)], 0, 0, 0), new Species([new Term(0, 1)], -1, -1, -6.35)],
                Water),
            SolverStatus.FixedActivity,
            "fixed activity");

    [Theory]
    [MemberData(nameof(Methods))]
    public void Solve_step_of_two_protons_does_not_apply(string method) =>
        AssertRefused(
            method,
            new Equilibrium(
                [Constraint.Total(0.1)],
                [new Species([new Term(0, 1)], 0, -2, 0), new Species([new Term(0, 1)], 2, 0, 9)],
                Water),
            SolverStatus.DoesNotApply,
            "two protons at once");

    // pKa 5 before pKa 4: the middle form is never the largest, and proton levels would be filled in the wrong order.
    [Theory]
    [MemberData(nameof(Methods))]
    public void Solve_steps_out_of_order_do_not_apply(string method) =>
        AssertRefused(method, MixtureInput.Of(new LadderInput(0.1, 0, 5, 4)).ToEquilibrium(), SolverStatus.DoesNotApply, "more acidic than the one before");

    [Theory]
    [MemberData(nameof(Methods))]
    public void Solve_steps_of_the_same_strength_do_not_apply(string method) =>
        AssertRefused(method, MixtureInput.Of(new LadderInput(0.1, 0, 5, 5)).ToEquilibrium(), SolverStatus.DoesNotApply, "more acidic than the one before");

    // All refused mixtures but the coupled and the fixed ones have an exact answer, so the refusal is the method's own.
    [Fact]
    public void Solve_step_of_two_protons_the_exact_method_answers()
    {
        var equilibrium = new Equilibrium(
            [Constraint.Total(0.1)], [new Species([new Term(0, 1)], 0, -2, 0), new Species([new Term(0, 1)], 2, 0, 9)], Water);

        Assert.Equal(SolverStatus.Solved, Solving.Exact.Solve(equilibrium, Solving.Ideal).Status);
    }

    [Theory]
    [MemberData(nameof(Methods))]
    public void Solve_model_gives_no_number_not_settled(string method)
    {
        var outcome = Method(method).Solve(
            MixtureInput.Of(new LadderInput(0.1, 0, 4.75)).ToEquilibrium(), new OddModel((_, gammas) => gammas.Fill(double.NaN)));

        Assert.Equal(SolverStatus.NotSettled, outcome.Status);
        Assert.Equal("the activity coefficients do not settle", outcome.Reason);
        Assert.True(double.IsNaN(outcome.PH));
    }

    [Theory]
    [MemberData(nameof(Methods))]
    public void Solve_null_throws(string method)
    {
        var equilibrium = MixtureInput.Of().ToEquilibrium();

        Assert.Throws<ArgumentNullException>(() => Method(method).Solve(null!, Solving.Ideal));
        Assert.Throws<ArgumentNullException>(() => Method(method).Solve(equilibrium, null!));
    }

    private static void AssertRefused(string method, Equilibrium equilibrium, SolverStatus status, string reason)
    {
        var outcome = Method(method).Solve(equilibrium, Solving.Davies);

        Assert.Equal(status, outcome.Status);
        Assert.Contains(reason, outcome.Reason, StringComparison.Ordinal);
        Assert.True(double.IsNaN(outcome.PH));
        Assert.Empty(outcome.Assumptions);
        Assert.Null(outcome.Formula);
    }

    private static ISolver Method(string name) => name == Solving.Dominant.Name ? Solving.Dominant : Solving.Successive;
}
