using System;
using System.Linq;
using CsCheck;
using Lyonium.Equilibria;
using Lyonium.Tests.Equilibria;
using Xunit;

namespace Lyonium.Tests.Solvers;

/// <summary>What must hold for every mixture, whatever its answer is.</summary>
public sealed class ExactSolverPropertyTests
{
    private static readonly Gen<MixtureInput> AnyMixture = Gen.Int[0, 1_000_000_000].Select(RandomMixtures.At);

    [Fact]
    public void Solve_components_in_another_order_same_answer() =>
        Gen.Select(AnyMixture, Gen.Int[0, int.MaxValue]).Check(
            (mixture, seed) =>
            {
                var order = mixture.Ladders.ToArray();
                new Random(seed).Shuffle(order);
                var one = Solving.Ideally(mixture);
                var other = Solving.Ideally(new MixtureInput(order));
                AssertSameZero(one, other, mixture);
            },
            iter: 3000);

    [Fact]
    public void Solve_component_split_in_two_same_answer() =>
        AnyMixture.Check(
            mixture =>
            {
                var first = mixture.Ladders[0];
                var half = first with { MolPerKg = first.MolPerKg / 2 };
                var one = Solving.Ideally(mixture);
                var other = Solving.Ideally(new MixtureInput([half, .. mixture.Ladders.Skip(1), half]));
                AssertSameZero(one, other, mixture);
            },
            iter: 3000);

    [Fact]
    public void Solve_more_strong_acid_never_a_higher_pH() =>
        Gen.Select(AnyMixture, Gen.Double[-9, 0.7]).Check(
            (mixture, log10Added) =>
            {
                var before = Solving.Ideally(mixture);
                var after = Solving.Ideally(mixture.With(new LadderInput(Math.Pow(10, log10Added), -1)));
                Assert.True(after.PH <= before.BracketHigh, $"{before.PH} rises to {after.PH}: {mixture}");
            },
            iter: 5000);

    // The mirror image: acids and bases, h and hydroxide change places, so pH becomes pKw − pH.
    [Fact]
    public void Solve_mirrored_mixture_mirrored_pH() =>
        AnyMixture.Check(
            mixture =>
            {
                var mirrored = new MixtureInput(mixture.Ladders
                    .Select(one => new LadderInput(
                        one.MolPerKg,
                        one.PKa.Length - one.TopCharge,
                        one.PKa.Select(pKa => MixtureInput.TextbookPKw - pKa).Reverse().ToArray()))
                    .ToArray());
                foreach (var model in new IActivityModel[] { Solving.Ideal, Solving.Davies })
                {
                    var one = Solving.Solved(mixture, model);
                    var other = Solving.Solved(mirrored, model);
                    Assert.Equal(MixtureInput.TextbookPKw, one.PH + other.PH, 1e-12);
                }
            },
            iter: 3000);

    // Half a last digit in each total, the other way round for positive and negative charges, is the most that rounding can do.
    [Fact]
    public void Solve_totals_moved_by_a_last_digit_moves_no_further_than_the_resolution_stated()
    {
        var moved = 0;
        foreach (var mixture in RandomMixtures.Take(4000))
        {
            var outcome = Solving.Ideally(mixture);
            if (outcome.InputResolution > 1e-3)
            {
                continue;
            }

            var charged = mixture.Ladders.Select(one => one.PKa.Length == 0 && one.TopCharge > 0
                ? one with { MolPerKg = Math.BitIncrement(one.MolPerKg) }
                : one).ToArray();
            var other = Solving.Ideally(new MixtureInput(charged));
            var allowed = (2.1 * outcome.InputResolution) + (outcome.BracketHigh - outcome.BracketLow);
            Assert.True(Math.Abs(other.PH - outcome.PH) <= allowed, $"{other.PH - outcome.PH} is above {allowed}: {mixture}");
            moved += Math.Abs(other.PH - outcome.PH) > 1e-13 ? 1 : 0;
        }

        Assert.True(moved > 10, "Too few of the mixtures were sensitive for the test to mean anything: " + moved);
    }

    // Each bracket holds the zero, so brackets of the same zero overlap.
    private static void AssertSameZero(SolverOutcome one, SolverOutcome other, MixtureInput mixture) =>
        Assert.True(
            one.BracketLow < other.BracketHigh && other.BracketLow < one.BracketHigh, $"{one.PH:R} and {other.PH:R}: {mixture}");
}
