using System;
using System.Collections.Generic;
using System.Linq;
using System.Threading.Tasks;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Solvers;

namespace Lyonium.Conformance;

/// <summary>What any method must pass: mixtures and properties that an author of an <see cref="ISolver"/> can run against it.</summary>
/// <remarks>
/// A method may refuse a mixture (does not apply, not settled) with a reason; it may not throw, answer with something that is no number,
/// answer outside its own bracket, or be silently wrong: an answer all of whose assumptions hold must lie within
/// <see cref="Tolerance"/> of the exact one. Thread-safe.
/// </remarks>
public static class SolverConformance
{
    /// <summary>How far from the exact answer a method may be when it reports that everything it took for granted held: 0.02 in pH.</summary>
    public const double Tolerance = 0.02;

    /// <summary>Runs every check.</summary>
    /// <param name="method">The method.</param>
    /// <returns>A check a mixture and property, in a fixed order.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="method"/> is <see langword="null"/>.</exception>
    public static IReadOnlyList<ConformanceCheck> Check(ISolver method)
    {
        _ = method ?? throw new ArgumentNullException(nameof(method));
        var checks = new List<ConformanceCheck>();
        foreach (var mixture in ConformanceMixtures.Ladders())
        {
            foreach (var model in ActivityModels.All)
            {
                checks.Add(CheckAnswer(method, mixture, model));
            }

            checks.Add(Run("the order of components does not matter", mixture.Name, () => SameAnswer(
                method, mixture.Equilibrium, mixture.Reversed())));
        }

        checks.Add(Run("the same answer on every thread", "all mixtures", () => SameOnEveryThread(method)));
        checks.AddRange(ConformanceMixtures.NotLadders().Select(mixture => Run(
            "coupled species and fixed activities are solved exactly or refused", mixture.Name, () => Refused(method, mixture.Equilibrium))));
        return checks;
    }

    private static ConformanceCheck CheckAnswer(ISolver method, ConformanceMixture mixture, IActivityModel model) =>
        Run("the answer is right, refused, or owned up to", $"{mixture.Name}, {model.Name}", () =>
        {
            var outcome = method.Solve(mixture.Equilibrium, model);
            if (outcome.Status != SolverStatus.Solved)
            {
                return string.IsNullOrWhiteSpace(outcome.Reason) ? "refused without a reason" : null;
            }

            if (double.IsNaN(outcome.PH) || double.IsInfinity(outcome.PH))
            {
                return "the answer is not a number";
            }

            if (outcome.PH < outcome.BracketLow || outcome.PH > outcome.BracketHigh)
            {
                return "the answer lies outside its own bracket";
            }

            // Far beyond its range a model can leave the balance without a zero: then there is nothing to compare with.
            var exact = new ExactSolver().Solve(mixture.Equilibrium, model);
            var isOff = exact.Status == SolverStatus.Solved && !(Math.Abs(outcome.PH - exact.PH) <= Tolerance);
            return isOff && outcome.Assumptions.All(one => one.Held)
                ? FormattableString.Invariant($"the answer is {outcome.PH:F4}, the exact one {exact.PH:F4}, and every assumption is reported as held")
                : null;
        });

    private static string? SameAnswer(ISolver method, Equilibrium one, Equilibrium other)
    {
        var first = method.Solve(one, new IdealModel());
        var second = method.Solve(other, new IdealModel());
        if (first.Status != second.Status)
        {
            return $"{first.Status} in one order and {second.Status} in the other";
        }

        return first.Status == SolverStatus.Solved && Math.Abs(first.PH - second.PH) > 1e-9
            ? FormattableString.Invariant($"{first.PH:R} in one order and {second.PH:R} in the other")
            : null;
    }

    private static string? SameOnEveryThread(ISolver method)
    {
        var mixtures = ConformanceMixtures.Ladders();
        var alone = mixtures.Select(one => method.Solve(one.Equilibrium, ActivityModels.Default).PH).ToArray();
        var together = new double[4 * mixtures.Count];
        Parallel.For(0, together.Length, i => together[i] = method.Solve(mixtures[i % mixtures.Count].Equilibrium, ActivityModels.Default).PH);
        for (var i = 0; i < together.Length; i++)
        {
            if (!together[i].Equals(alone[i % alone.Length]))
            {
                return $"{mixtures[i % mixtures.Count].Name} has another answer when threads run side by side";
            }
        }

        return null;
    }

    private static string? Refused(ISolver method, Equilibrium equilibrium)
    {
        var outcome = method.Solve(equilibrium, new IdealModel());
        return outcome.Status != SolverStatus.Solved || !double.IsNaN(outcome.BracketLow)
            ? null
            : "an answer without a bracket for a mixture that does not fall into ladders";
    }

    private static ConformanceCheck Run(string property, string mixture, Func<string?> check)
    {
        try
        {
            var failure = check();
            return new ConformanceCheck(property, mixture, failure is null, failure ?? "");
        }
        catch (Exception e) when (e is not OutOfMemoryException)
        {
            // The method is other people's code; whatever it throws is a failed check.
            return new ConformanceCheck(property, mixture, Passed: false, "it threw " + e.GetType().Name + ": " + e.Message);
        }
    }
}
