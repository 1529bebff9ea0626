using System;
using System.Linq;

namespace Lyonium.Equilibria;

/// <summary>Components that share species, or hold a fixed activity, with all their species, laid out for speed.</summary>
/// <remarks>
/// Components with a total are the unknowns; a component at a fixed activity is part of the constants of its species. A component of which
/// there is nothing takes its species with it.
/// </remarks>
internal sealed class CoupledGroup
{
    private CoupledGroup(Equilibrium equilibrium, int[] components, int[] species)
    {
        Members = components;
        Components = components.Where(one => equilibrium.Constraints[one].Kind == ConstraintKind.Total && equilibrium.Constraints[one].Value > 0).ToArray();
        var absent = components.Where(one => equilibrium.Constraints[one].Kind == ConstraintKind.Total && equilibrium.Constraints[one].Value <= 0).ToArray();
        Totals = Array.ConvertAll(Components, one => equilibrium.Constraints[one].Value);
        Species = species.Where(one => !equilibrium.Species[one].Terms.Any(term => absent.Contains(term.Component))).ToArray();
        Counts = new double[Species.Length * Components.Length];
        Protons = new double[Species.Length];
        Charges = new double[Species.Length];
        LnK = new double[Species.Length];
        for (var i = 0; i < Species.Length; i++)
        {
            var one = equilibrium.Species[Species[i]];
            Protons[i] = one.Protons;
            Charges[i] = one.Charge;
            var log10K = one.Log10K;
            foreach (var term in one.Terms)
            {
                var column = Array.IndexOf(Components, term.Component);
                if (column >= 0)
                {
                    Counts[(i * Components.Length) + column] = term.Count;
                }
                else
                {
                    log10K += term.Count * equilibrium.Constraints[term.Component].Value;
                }
            }

            LnK[i] = Math.Log(10) * log10K;
            Species[i] += Equilibrium.WaterIons;
        }
    }

    /// <summary>All its components, by their index in the equilibrium.</summary>
    public int[] Members { get; }

    /// <summary>The components with a total above zero: the unknowns.</summary>
    public int[] Components { get; }

    /// <summary>Their totals, in mol/kg; above zero.</summary>
    public double[] Totals { get; }

    /// <summary>The species, by their index in the equilibrium with the ions of water first.</summary>
    public int[] Species { get; }

    /// <summary>How many of each component each species is made of, species by species.</summary>
    public double[] Counts { get; }

    /// <summary>The protons that each species takes up.</summary>
    public double[] Protons { get; }

    /// <summary>The charge number of each species.</summary>
    public double[] Charges { get; }

    /// <summary>ln of the formation constant of each species, fixed activities taken in.</summary>
    public double[] LnK { get; }

    /// <summary>How many doubles <see cref="CoupledSpeciation"/> works in.</summary>
    public int WorkLength => CoupledSpeciation.WorkLength(Species.Length, Components.Length);

    /// <summary>The groups of an equilibrium; what is left are ladders.</summary>
    public static CoupledGroup[] Of(Equilibrium equilibrium)
    {
        var groupOf = Enumerable.Range(0, equilibrium.Constraints.Count).ToArray();
        foreach (var species in equilibrium.Species)
        {
            foreach (var term in species.Terms.Skip(1))
            {
                Join(groupOf, species.Terms[0].Component, term.Component);
            }
        }

        return groupOf.Select((group, component) => (group, component)).GroupBy(one => one.group, one => one.component)
            .Select(group => group.ToArray())
            .Where(components => IsCoupled(equilibrium, components))
            .Select(components => new CoupledGroup(
                equilibrium,
                components,
                Enumerable.Range(0, equilibrium.Species.Count).Where(one => components.Contains(equilibrium.Species[one].Terms[0].Component)).ToArray()))
            .ToArray();
    }

    private static bool IsCoupled(Equilibrium equilibrium, int[] components) =>
        components.Length > 1
        || equilibrium.Constraints[components[0]].Kind == ConstraintKind.FixedActivity
        || equilibrium.Species.Any(one => one.Terms[0].Component == components[0] && !one.IsRung);

    private static void Join(int[] groupOf, int one, int other)
    {
        var (kept, gone) = (Math.Min(groupOf[one], groupOf[other]), Math.Max(groupOf[one], groupOf[other]));
        for (var i = 0; i < groupOf.Length; i++)
        {
            groupOf[i] = groupOf[i] == gone ? kept : groupOf[i];
        }
    }
}
