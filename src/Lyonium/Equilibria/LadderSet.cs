using System;
using System.Collections.Generic;
using System.Linq;

namespace Lyonium.Equilibria;

/// <summary>The ladders of an equilibrium as flat arrays: rungs from the least to the most protonated, ladder after ladder.</summary>
/// <remarks>A component with a single rung (a spectator) has nothing to speciate; it only adds to the fixed charge.</remarks>
internal sealed class LadderSet
{
    // A ratio of constants must be a double; chemistry needs a tenth of this.
    private const int MostDecades = 300;

    public LadderSet(Equilibrium equilibrium, int[] coupled)
    {
        var rungs = equilibrium.Species
            .Select((species, index) => (Species: species, Index: index))
            .Where(one => !coupled.Contains(one.Species.Terms[0].Component))
            .GroupBy(one => one.Species.Terms[0].Component)
            .OrderBy(group => group.Key)
            .Select(group => (Component: group.Key, Rungs: group.OrderBy(one => one.Species.Protons).ToArray()))
            .ToArray();

        var ladders = rungs.Where(one => one.Rungs.Length > 1).ToArray();
        Start = new int[ladders.Length + 1];
        Total = new double[ladders.Length];
        Component = Array.ConvertAll(ladders, one => one.Component);
        var species = new List<int>();
        var charge = new List<int>();
        var gap = new List<int>();
        var log10Ratio = new List<double>();
        var ratio = new List<double>();
        for (var i = 0; i < ladders.Length; i++)
        {
            Total[i] = equilibrium.Constraints[ladders[i].Component].Value;
            Species? below = null;
            foreach (var (one, index) in ladders[i].Rungs)
            {
                if (below is not null && one.Protons == below.Protons)
                {
                    throw new ArgumentException($"Two rungs of component {ladders[i].Component} have the same protons.");
                }

                if (below is not null && !(Math.Abs(one.Log10K - below.Log10K) <= MostDecades))
                {
                    throw new ArgumentException(
                        $"Two neighbouring rungs of component {ladders[i].Component} have constants more than {MostDecades} decades apart.");
                }

                species.Add(index + Equilibrium.WaterIons);
                charge.Add(one.Charge);
                gap.Add(below is null ? 0 : one.Protons - below.Protons);
                log10Ratio.Add(below is null ? 0 : one.Log10K - below.Log10K);
                ratio.Add(below is null ? 0 : PowerOfDifference(one.Log10K, below.Log10K));
                below = one;
            }

            Start[i + 1] = species.Count;
        }

        Species = species.ToArray();
        Charge = charge.ToArray();
        Gap = gap.ToArray();
        Log10Ratio = log10Ratio.ToArray();
        Ratio = ratio.ToArray();

        var fixedCharge = default(ExactSum);
        SpectatorSpecies = new int[rungs.Length - ladders.Length];
        SpectatorTotal = new double[SpectatorSpecies.Length];
        var at = 0;
        foreach (var (component, only) in rungs.Where(one => one.Rungs.Length == 1))
        {
            var (one, index) = only[0];
            var total = equilibrium.Constraints[component].Value;
            SpectatorSpecies[at] = index + Equilibrium.WaterIons;
            SpectatorTotal[at++] = total;
            fixedCharge.AddProduct(total, one.Charge);
            SpectatorIonicStrength += 0.5 * one.Charge * one.Charge * total;
            SpectatorChargeMagnitude += Math.Abs(one.Charge) * total;
        }

        SpectatorCharge = fixedCharge;
    }

    /// <summary>Where each ladder's rungs start; one more entry than ladders.</summary>
    public int[] Start { get; }

    /// <summary>The component of each ladder.</summary>
    public int[] Component { get; }

    /// <summary>The total of each ladder, in mol/kg.</summary>
    public double[] Total { get; }

    /// <summary>The species index of each rung.</summary>
    public int[] Species { get; }

    /// <summary>The charge number of each rung.</summary>
    public int[] Charge { get; }

    /// <summary>How many protons each rung has more than the one below it; 0 for the lowest.</summary>
    public int[] Gap { get; }

    /// <summary>The log10 of K of each rung over K of the one below it.</summary>
    public double[] Log10Ratio { get; }

    /// <summary>K of each rung over K of the one below it, activity coefficients all one.</summary>
    public double[] Ratio { get; }

    public int[] SpectatorSpecies { get; }

    public double[] SpectatorTotal { get; }

    /// <summary>The charge of the spectators, exact to twice a double's digits, in mol/kg.</summary>
    public ExactSum SpectatorCharge { get; }

    public double SpectatorIonicStrength { get; }

    /// <summary>Σ|z|m of the spectators, in mol/kg.</summary>
    public double SpectatorChargeMagnitude { get; }

    // 10^(a − b), with what rounding drops of the difference.
    private static double PowerOfDifference(double a, double b)
    {
        var difference = default(ExactSum);
        difference.Add(a);
        difference.Add(-b);
        var rounded = difference.Value;
        difference.Add(-rounded);
        return Math.Pow(10, rounded) * (1 + (Math.Log(10) * difference.Value));
    }
}
