using System;
using System.Collections.Generic;
using System.Globalization;
using Lyonium.Equilibria;

namespace Lyonium.Solvers;

/// <summary>
/// Iterated successive approximation: starts from the neglect of dissociation, puts the last answer back in, and stops when the answer
/// keeps its figures.
/// </summary>
/// <remarks>
/// <para>
/// The protons at hand fill the dissociation steps from the highest pKa on, as in <see cref="DominantAcidSolver"/>; every protolyte then
/// offers and wants protons. Each round corrects the amount that stays undissociated with the last answer and solves
/// rest = h · wanted − offered / h (or h = K · filled / empty for a buffer pair). For one weak acid this is x ← √(K (c − x)).
/// </para>
/// <para>
/// Range of use: from the neglect start a weak acid needs c &gt; K; strongly dissociated steps do not settle, and the outcome says so with
/// the iterates. A settled answer fulfils the whole charge balance to the stated figures; the error that is left is estimated from the
/// ratio of the last corrections and from the amounts that still moved, so that a slow case does not stop early. Activity coefficients
/// are taken at the ionic strength of the answer. Stateless and thread-safe.
/// </para>
/// </remarks>
public sealed class SuccessiveApproximationSolver : ISolver
{
    private const int MostRounds = 200;

    private readonly int _figures;

    /// <summary>Makes the method with four significant figures of the hydrogen-ion molality.</summary>
    public SuccessiveApproximationSolver()
        : this(4)
    {
    }

    /// <summary>Makes the method.</summary>
    /// <param name="significantFigures">The figures of the hydrogen-ion molality that the answer keeps, 2 to 12.</param>
    /// <exception cref="ArgumentOutOfRangeException">The number of figures is not in range.</exception>
    public SuccessiveApproximationSolver(int significantFigures) =>
        _figures = significantFigures is >= 2 and <= 12
            ? significantFigures
            : throw new ArgumentOutOfRangeException(nameof(significantFigures), significantFigures, "2 to 12 figures.");

    /// <inheritdoc/>
    public string Name => "successive-approximation";

    /// <inheritdoc/>
    public SolverOutcome Solve(Equilibrium equilibrium, IActivityModel model)
    {
        _ = equilibrium ?? throw new ArgumentNullException(nameof(equilibrium));
        _ = model ?? throw new ArgumentNullException(nameof(model));
        return ShortCut.AtItsOwnIonicStrength(equilibrium, model, Solve);
    }

    private SolverOutcome Solve(ProtonLevels levels, double log10GammaH)
    {
        var tolerance = 0.5 * Math.Pow(10, 1 - _figures);
        var rounds = new ApproximationRounds(levels);
        var iterates = new List<Iterate>();
        double last = double.NaN, lastCorrection = double.NaN;
        while (iterates.Count < MostRounds)
        {
            var h = rounds.Next();
            if (!(h > 0) || double.IsInfinity(h))
            {
                return NotSettled(iterates, "more would dissociate than there is");
            }

            var correction = iterates.Count == 0 ? double.NaN : Math.Log(h / last);
            iterates.Add(new Iterate(-Math.Log10(h) - log10GammaH, iterates.Count == 0 ? 0 : -correction / Math.Log(10)));
            var rate = Math.Abs(correction / lastCorrection);
            // Large and small corrections can take turns, so a small one alone says little; the amounts behind it must stand still as well.
            var left = Math.Max(Left(correction, rate), rounds.Change);
            if (Math.Abs(correction) <= tolerance && left <= tolerance)
            {
                return Settled(iterates, left, tolerance);
            }

            last = h;
            lastCorrection = correction;
        }

        return NotSettled(iterates, "the answer still changes after " + MostRounds.ToString(CultureInfo.InvariantCulture) + " rounds");
    }

    // What is left of corrections that keep shrinking at the rate of the last one.
    private static double Left(double correction, double rate)
    {
        if (correction == 0)
        {
            return 0;
        }

        return rate < 1 ? Math.Abs(correction) * Math.Max(rate / (1 - rate), 0.01) : double.PositiveInfinity;
    }

    private static SolverOutcome Settled(List<Iterate> iterates, double left, double tolerance)
    {
        var toPH = 1 / Math.Log(10);
        return SolverOutcome.Answer(iterates[iterates.Count - 1].PH) with
        {
            Iterates = iterates.ToArray(),
            Formula = "h from rest = h · wanted − offered / h, undissociated amounts corrected with the last h",
            Assumptions =
            [
                new SolverAssumption(
                    "figures-kept",
                    -1,
                    left * toPH,
                    tolerance * toPH,
                    Held: true,
                    "estimate of the error left in pH, from the ratio of the last corrections and the amounts that still moved"),
            ],
        };
    }

    private static SolverOutcome NotSettled(List<Iterate> iterates, string reason) =>
        SolverOutcome.Without(SolverStatus.NotSettled, reason) with { Iterates = iterates.ToArray() };
}
