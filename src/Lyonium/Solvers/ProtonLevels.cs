using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;

namespace Lyonium.Solvers;

/// <summary>One dissociation step as a level on which protons sit.</summary>
/// <param name="Component">The component whose step it is.</param>
/// <param name="Step">How many protons the emptied form still holds beside the lowest form.</param>
/// <param name="K">The dissociation constant in mol/kg, with the activity coefficients in it.</param>
/// <param name="Total">How many protons it can hold, in mol/kg.</param>
internal readonly record struct ProtonLevel(int Component, int Step, double K, double Total);

/// <summary>
/// Every dissociation step by pKa, highest first, filled with the protons at hand: the neutralisation of strong and weak, all of it.
/// </summary>
/// <remarks>R. W. Gurney, Ionic Processes in Solution, McGraw-Hill (1953), draws proton transfer this way.</remarks>
internal sealed class ProtonLevels
{
    private ProtonLevels(IReadOnlyList<ProtonLevel> levels, int filled, double rest, double ionProduct)
    {
        Levels = levels;
        Filled = filled;
        Rest = rest;
        IonProduct = ionProduct;
    }

    /// <summary>The levels, the highest pKa first.</summary>
    public IReadOnlyList<ProtonLevel> Levels { get; }

    /// <summary>How many levels count as filled: those up to the nearest boundary between two levels.</summary>
    public int Filled { get; }

    /// <summary>
    /// The protons beyond that boundary, in mol/kg: positive where some sit on the next level (or are an excess of strong acid), negative
    /// where some lack on the last one (or there is an excess of strong base).
    /// </summary>
    public double Rest { get; }

    /// <summary>The ion product of water in (mol/kg)², with the activity coefficients in it.</summary>
    public double IonProduct { get; }

    public IEnumerable<ProtonLevel> FilledLevels => Levels.Take(Filled);

    public IEnumerable<ProtonLevel> EmptyLevels => Levels.Skip(Filled);

    /// <summary>The level that is shared between filled and empty; <see langword="null"/> where the rest is an excess of strong acid or base.</summary>
    public ProtonLevel? SharedLevel => Rest > 0
        ? Filled < Levels.Count ? Levels[Filled] : null
        : Filled > 0 ? Levels[Filled - 1] : null;

    /// <summary>Fills the levels of an equilibrium of ladders.</summary>
    /// <param name="equilibrium">The equilibrium.</param>
    /// <param name="log10Gammas">log10 γ of every species, which go into the constants.</param>
    /// <returns>The levels; <see langword="null"/> where a step gives off two protons at once or is out of order, so that no levels exist.</returns>
    public static ProtonLevels? Fill(Equilibrium equilibrium, IReadOnlyList<double> log10Gammas)
    {
        var ladders = equilibrium.Ladders;
        var hydrogen = log10Gammas[Equilibrium.HydrogenIon];
        var levels = new List<ProtonLevel>();
        var protons = default(ExactSum);
        protons.Add(-ladders.SpectatorCharge.Value);
        for (var i = 0; i < ladders.Total.Length; i++)
        {
            var start = ladders.Start[i];
            protons.AddProduct(ladders.Total[i], -ladders.Charge[start]);
            for (var rung = start + 1; rung < ladders.Start[i + 1]; rung++)
            {
                var log10K = -ladders.Log10Ratio[rung] + log10Gammas[ladders.Species[rung]] - log10Gammas[ladders.Species[rung - 1]] - hydrogen;
                var level = new ProtonLevel(ladders.Component[i], rung - start - 1, Math.Pow(10, log10K), ladders.Total[i]);
                if (ladders.Gap[rung] != 1 || (level.Step > 0 && level.K <= levels[levels.Count - 1].K))
                {
                    return null;
                }

                levels.Add(level);
            }
        }

        var ordered = levels.OrderBy(level => level.K).ThenBy(level => level.Component).ToArray();
        var (filled, rest) = Nearest(ordered, protons);
        var ionProduct = Math.Pow(10, -equilibrium.Solvent.PKw - hydrogen - log10Gammas[Equilibrium.HydroxideIon]);
        return new ProtonLevels(ordered, filled, rest, ionProduct);
    }

    private static (int Filled, double Left) Nearest(ProtonLevel[] levels, ExactSum protons)
    {
        for (var i = 0; i < levels.Length; i++)
        {
            var here = protons.Value;
            if (here <= 0.5 * levels[i].Total)
            {
                return (i, here);
            }

            protons.Add(-levels[i].Total);
        }

        return (levels.Length, protons.Value);
    }
}
