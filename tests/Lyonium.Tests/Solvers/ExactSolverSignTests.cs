using System;
using System.Linq;
using Lyonium.Tests.Equilibria;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.Tests.Solvers;

/// <summary>The answer against the sign of the plain charge balance in exact arithmetic.</summary>
public sealed class ExactSolverSignTests(ITestOutputHelper output)
{
    private const int Mixtures = 10_000;
    private const int Brackets = 3_000;
    private const int DaviesBrackets = 600;

    // A relative 2.3e-9 in h is 1e-9 in pH. The published bound also allows what rounding the inputs does; the same doubles are on both
    // sides here, so no such allowance is made.
    [Fact]
    public void Solve_ideal_random_mixtures_balance_changes_sign_within_1e_9_in_pH()
    {
        var above = 1 + Rational.Exactly(2.3e-9);
        var below = 1 - Rational.Exactly(2.3e-9);
        foreach (var mixture in RandomMixtures.Take(Mixtures))
        {
            var hydrogen = Rational.Exactly(Math.Pow(10, -Solving.Ideally(mixture).PH));
            var balance = PlainChargeBalance.WithRoundedConstants(mixture);
            Assert.True(balance.At(hydrogen * above).Sign > 0, "not positive above: " + mixture);
            Assert.True(balance.At(hydrogen * below).Sign < 0, "not negative below: " + mixture);
        }
    }

    // Powers of ten are taken to 60 figures here, so the bracket must hold for what the doubles mean and not only for their rounding.
    [Fact]
    public void Solve_ideal_random_mixtures_bracket_ends_have_opposite_signs_in_truth()
    {
        var widths = new double[Brackets];
        for (var i = 0; i < Brackets; i++)
        {
            var mixture = RandomMixtures.At(i);
            var outcome = Solving.Ideally(mixture);
            var balance = PlainChargeBalance.WithTrueConstants(mixture);
            Assert.True(balance.At(PowerOfTen.Of(-outcome.BracketLow)).Sign > 0, "low end: " + mixture);
            Assert.True(balance.At(PowerOfTen.Of(-outcome.BracketHigh)).Sign < 0, "high end: " + mixture);
            Assert.InRange(outcome.PH, outcome.BracketLow, outcome.BracketHigh);
            widths[i] = Solving.WidthInLastDigits(outcome);
        }

        Array.Sort(widths);
        output.WriteLine($"Bracket in last digits: median {widths[Brackets / 2]:F0}, 99 % {widths[Brackets * 99 / 100]:F0}, widest {widths[^1]:F0}.");
        output.WriteLine($"Wider than 64 last digits: {widths.Count(width => width > 64)} of {Brackets}.");
        Assert.True(widths[^1] <= 64, "The widest bracket is " + widths[^1]);
    }

    [Fact]
    public void Solve_Davies_random_mixtures_bracket_ends_have_opposite_signs_in_high_precision()
    {
        foreach (var mixture in RandomMixtures.Take(DaviesBrackets))
        {
            var outcome = Solving.Solved(mixture, Solving.Davies);
            var guess = Lyonium.Equilibria.Speciation.At(mixture.ToEquilibrium(), Solving.Davies, outcome.PH).IonicStrengthMolPerKg;
            var balance = new DaviesInHighPrecision(mixture);
            Assert.True(balance.ChargeAt(outcome.BracketLow, guess).Sign > 0, "low end: " + mixture);
            Assert.True(balance.ChargeAt(outcome.BracketHigh, guess).Sign < 0, "high end: " + mixture);
            Assert.InRange(outcome.BracketHigh - outcome.BracketLow, 0, 1e-9);
        }
    }
}
