using System;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Solvers;
using Lyonium.Tests.Equilibria;
using Xunit;

namespace Lyonium.Tests.Solvers;

/// <summary>The methods on a mixture, with the mixture in the message of a failure.</summary>
internal static class Solving
{
    public static readonly ExactSolver Exact = new();
    public static readonly SuccessiveApproximationSolver Successive = new();
    public static readonly DominantAcidSolver Dominant = new();
    public static readonly IdealModel Ideal = new();
    public static readonly DaviesModel Davies = new();

    public static SolverOutcome Ideally(MixtureInput mixture) => Solved(mixture, Ideal);

    public static SolverOutcome Solved(MixtureInput mixture, IActivityModel model)
    {
        var outcome = Exact.Solve(mixture.ToEquilibrium(), model);
        Assert.True(outcome.Status == SolverStatus.Solved, $"{model.Name}: {outcome.Reason}; {mixture}");
        return outcome;
    }

    /// <summary>How many last digits of a double of the pH's size the bracket is wide; for a pH below one, last digits of one.</summary>
    public static double WidthInLastDigits(SolverOutcome outcome)
    {
        var size = Math.Max(1, Math.Abs(outcome.PH));
        return (outcome.BracketHigh - outcome.BracketLow) / (Math.BitIncrement(size) - size);
    }
}
