using System;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Solvers;
using Lyonium.Tests.Equilibria;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.Tests.Solvers;

/// <summary>The exact method is certified with each activity model of the library.</summary>
public sealed class ExactSolverModelsTests(ITestOutputHelper output)
{
    private const int Mixtures = 5_000;

    public static TheoryData<string> Models() => new(ActivityModels.All.Select(one => one.Name));

    // The bracket's ends have opposite signs of the full balance, found anew by Speciation; within its range a model always has an answer,
    // and beyond it a mixture without one says why.
    [Theory]
    [MemberData(nameof(Models))]
    public void Solve_random_mixtures_are_certified_or_say_why(string name)
    {
        var model = ActivityModels.Find(name)!;
        int within = 0, unsolved = 0, evaluations = 0;
        double widest = 0;
        foreach (var mixture in RandomMixtures.Take(Mixtures))
        {
            var equilibrium = mixture.ToEquilibrium();
            var outcome = new ExactSolver().Solve(equilibrium, model);
            if (outcome.Status != SolverStatus.Solved)
            {
                unsolved++;
                Assert.False(string.IsNullOrWhiteSpace(outcome.Reason));
                Assert.False(IsSurelyWithin(mixture, model), $"{name}: {outcome.Reason}; {mixture}");
                continue;
            }

            within += IsSurelyWithin(mixture, model) ? 1 : 0;
            widest = Math.Max(widest, outcome.BracketHigh - outcome.BracketLow);
            evaluations = Math.Max(evaluations, outcome.Evaluations);
            Assert.InRange(outcome.PH, outcome.BracketLow, outcome.BracketHigh);
            Assert.True(outcome.BracketHigh - outcome.BracketLow <= 1e-9, $"{name}: {mixture}");
            Assert.True(Speciation.At(equilibrium, model, outcome.BracketLow).ChargeMolPerKg > 0, $"{name}, low end: {mixture}");
            Assert.True(Speciation.At(equilibrium, model, outcome.BracketHigh).ChargeMolPerKg < 0, $"{name}, high end: {mixture}");
        }

        output.WriteLine(FormattableString.Invariant(
            $"{name}: {Mixtures} mixtures, {within} surely within its range, {unsolved} without an answer, widest bracket {widest:G2}, most evaluations {evaluations}"));
        Assert.True(name == "ideal" || within > 100, $"{within} within the range");
    }

    private static bool IsSurelyWithin(MixtureInput mixture, IActivityModel model) =>
        mixture.Ladders.Sum(one => 0.5 * one.MolPerKg * LargestCharge(one) * LargestCharge(one)) + mixture.Ladders.Sum(one => one.MolPerKg * LargestCharge(one))
            <= model.HighestIonicStrengthMolPerKg;

    private static double LargestCharge(LadderInput ladder) => Math.Max(Math.Abs(ladder.TopCharge), Math.Abs(ladder.TopCharge - ladder.PKa.Length));
}
