using System;
using Lyonium.Equilibria;
using Lyonium.Tests.Equilibria;
using Xunit;

namespace Lyonium.Tests.Solvers;

/// <summary>What the exact method does not solve, it refuses with the reason.</summary>
public sealed class ExactSolverRefusalTests
{
    private static readonly MixtureInput Acid = MixtureInput.Of(new LadderInput(0.1, 0, 4.75), new LadderInput(0.05, 1));

    [Theory]
    [InlineData(double.NaN, 0)]
    [InlineData(double.NaN, 1)]
    [InlineData(double.NaN, 2)]
    [InlineData(double.NaN, 4)]
    [InlineData(double.PositiveInfinity, 2)]
    [InlineData(double.NegativeInfinity, 3)]
    public void Solve_model_gives_no_number_for_one_species_not_settled(double log10Gamma, int species)
    {
        var outcome = Solving.Exact.Solve(Acid.ToEquilibrium(), new OddModel((_, gammas) => gammas[species] = log10Gamma));

        Assert.Equal(SolverStatus.NotSettled, outcome.Status);
        Assert.Equal("the activity coefficients do not settle", outcome.Reason);
    }

    // At the zero the ionic strength is 0.05. Above it the model drives the anion back, below it the model draws more out, so that no
    // ionic strength near the zero agrees with itself.
    [Fact]
    public void Solve_model_that_contradicts_itself_at_the_zero_not_settled()
    {
        var outcome = Solving.Exact.Solve(
            Acid.ToEquilibrium(),
            new OddModel((ionicStrength, gammas) => gammas[Equilibrium.WaterIons] = ionicStrength > 0.05 ? 2 : -2));

        Assert.Equal(SolverStatus.NotSettled, outcome.Status);
        Assert.False(string.IsNullOrWhiteSpace(outcome.Reason));
    }

    [Fact]
    public void Solve_model_that_throws_lets_it_through_and_solves_the_next()
    {
        Assert.Throws<InvalidTimeZoneException>(() =>
            Solving.Exact.Solve(Acid.ToEquilibrium(), new OddModel((_, _) => throw new InvalidTimeZoneException())));

        Assert.Equal(4.75, Solving.Ideally(Acid).PH, 1e-3);
    }

    [Fact]
    public void Solve_null_throws()
    {
        Assert.Throws<ArgumentNullException>(() => Solving.Exact.Solve(null!, Solving.Ideal));
        Assert.Throws<ArgumentNullException>(() => Solving.Exact.Solve(Acid.ToEquilibrium(), null!));
    }
}
