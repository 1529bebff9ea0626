using System;
using System.Collections.Concurrent;
using System.Linq;
using System.Threading.Tasks;
using Lyonium.Equilibria;
using Lyonium.Tests.Equilibria;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.Tests.Solvers;

/// <summary>Many random mixtures without a failure: 20,000, and a million where the environment has LYONIUM_MILLION=1.</summary>
public sealed class ExactSolverMillionTests(ITestOutputHelper output)
{
    private static readonly int Mixtures = Environment.GetEnvironmentVariable("LYONIUM_MILLION") == "1" ? 1_000_000 : 20_000;

    // Some of these mixtures are far beyond the range of the Davies equation; they could jump, and none was seen to.
    [Theory]
    [InlineData("ideal")]
    [InlineData("davies")]
    public void Solve_random_mixtures_all_solved_and_narrow(string modelName)
    {
        IActivityModel model = modelName == "ideal" ? Solving.Ideal : Solving.Davies;
        var failures = new ConcurrentBag<string>();
        var evaluations = new int[Mixtures];
        var widths = new double[Mixtures];
        Parallel.For(0, Mixtures, new ParallelOptions { MaxDegreeOfParallelism = 2 }, i =>
        {
            var mixture = RandomMixtures.At(i);
            var outcome = Solving.Exact.Solve(mixture.ToEquilibrium(), model);
            evaluations[i] = outcome.Evaluations;
            widths[i] = outcome.BracketHigh - outcome.BracketLow;
            if (outcome.Status != SolverStatus.Solved || !(outcome.BracketLow <= outcome.PH && outcome.PH <= outcome.BracketHigh))
            {
                failures.Add($"{i}: {outcome.Reason}; {mixture}");
            }
        });

        Report(model, failures, evaluations, widths);
        Assert.Empty(failures.Take(3));
        Assert.InRange(widths.Max(), 0, 1e-9);
        Assert.InRange(evaluations.Max(), 1, 60);
    }

    private void Report(IActivityModel model, ConcurrentBag<string> failures, int[] evaluations, double[] widths)
    {
        var sorted = evaluations.Order().ToArray();
        output.WriteLine($"{model.Name}, seed {RandomMixtures.Seed}: {Mixtures} mixtures, {failures.Count} failures.");
        output.WriteLine($"Evaluations: median {sorted[Mixtures / 2]}, 99 % {sorted[Mixtures / 100 * 99]}, most {sorted[^1]}.");
        output.WriteLine($"Widest bracket: {widths.Max():E2} in pH, at mixture {Array.IndexOf(widths, widths.Max())}.");
    }
}
