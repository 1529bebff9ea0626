using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;

namespace Lyonium.Solvers;

/// <summary>What the methods by proton levels share: constants at the ionic strength of their own answer, and what is refused.</summary>
internal static class ShortCut
{
    private const int MostRounds = 60;

    /// <summary>
    /// Runs a method with activity coefficients of one, takes the coefficients at the ionic strength of its answer, and repeats until they
    /// stand still.
    /// </summary>
    /// <param name="equilibrium">The equilibrium.</param>
    /// <param name="model">The model of activity coefficients.</param>
    /// <param name="method">Gives the outcome for filled levels and log10 γ of the hydrogen ion.</param>
    public static SolverOutcome AtItsOwnIonicStrength(
        Equilibrium equilibrium, IActivityModel model, Func<ProtonLevels, double, SolverOutcome> method)
    {
        if (Refuse(equilibrium) is { } refused)
        {
            return refused;
        }

        IReadOnlyList<double> log10Gammas = new double[equilibrium.SpeciesCount];
        for (var round = 0; round < MostRounds; round++)
        {
            if (ProtonLevels.Fill(equilibrium, log10Gammas) is not { } levels)
            {
                return SolverOutcome.Without(SolverStatus.DoesNotApply, "a step gives off two protons at once, or is more acidic than the one before it");
            }

            var outcome = method(levels, log10Gammas[Equilibrium.HydrogenIon]);
            if (outcome.Status != SolverStatus.Solved || !TrySpeciate(equilibrium, model, outcome.PH, out var speciation))
            {
                return outcome.Status != SolverStatus.Solved
                    ? outcome
                    : SolverOutcome.Without(SolverStatus.NotSettled, "the activity coefficients do not settle");
            }

            if (speciation!.Log10Gammas.Zip(log10Gammas, (one, other) => Math.Abs(one - other)).Max() <= 1e-12)
            {
                return outcome;
            }

            log10Gammas = speciation.Log10Gammas;
        }

        return SolverOutcome.Without(SolverStatus.NotSettled, "the activity coefficients do not settle");
    }

    /// <summary>
    /// The outcome with one more assumption: how far the full charge balance allows the answer to be from its zero. The figure is the
    /// smallest of 0.001, 0.002, 0.005, 0.01 … within which the balance changes sign, so an answer that is farther off than the limit
    /// never counts as held.
    /// </summary>
    public static SolverOutcome WithAllNeglected(SolverOutcome outcome, Equilibrium equilibrium, IActivityModel model)
    {
        if (outcome.Status != SolverStatus.Solved)
        {
            return outcome;
        }

        const double limit = 0.02;
        var figure = Distance(equilibrium, model, outcome.PH);
        var all = new SolverAssumption(
            "all-neglected", -1, figure, limit, figure <= limit, "the full charge balance changes sign within this distance in pH");
        return outcome with { Assumptions = [.. outcome.Assumptions, all] };
    }

    private static double Distance(Equilibrium equilibrium, IActivityModel model, double pH)
    {
        double[] distances = [0.001, 0.002, 0.005, 0.01, 0.02, 0.05, 0.1, 0.2, 0.5, 1, 2, 5, 10, 20];
        if (!TrySpeciate(equilibrium, model, pH, out var here))
        {
            return double.PositiveInfinity;
        }

        var side = Math.Sign(here!.ChargeMolPerKg);
        foreach (var distance in distances)
        {
            if (TrySpeciate(equilibrium, model, pH + (side * distance), out var there) && Math.Sign(there!.ChargeMolPerKg) != side)
            {
                return distance;
            }
        }

        return side == 0 ? 0 : double.PositiveInfinity;
    }

    private static SolverOutcome? Refuse(Equilibrium equilibrium)
    {
        if (equilibrium.IsLadders)
        {
            return null;
        }

        return equilibrium.Species.All(species => species.IsRung)
            ? SolverOutcome.Without(SolverStatus.FixedActivity, "a component at a fixed activity")
            : SolverOutcome.Without(SolverStatus.CoupledSpecies, "ion pairs, dimers or polymers");
    }

    private static bool TrySpeciate(Equilibrium equilibrium, IActivityModel model, double pH, out Speciation? speciation)
    {
        speciation = null;
        if (!(pH >= -300 && pH <= 300))
        {
            return false;
        }

        try
        {
            speciation = Speciation.At(equilibrium, model, pH);
            return true;
        }
        catch (ArithmeticException)
        {
            return false;
        }
    }
}
