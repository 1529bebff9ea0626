using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;

namespace Lyonium.Tests.Equilibria;

/// <summary>
/// Random coupled systems: up to 6 components and 12 species beyond the components themselves, constants from 10^-3 to 10^12, charges up to 4,
/// totals from 1e-9 to 5 mol/kg; the same index gives the same system. One in four is nearly neutralised, one in four has an uncharged component at a fixed activity.
/// </summary>
internal static class CoupledSystems
{
    public const int Seed = 20261201;

    private static readonly Solvent Water = new(298.15, 14, MixtureInput.Slope, 0.328);

    public static IEnumerable<Equilibrium> Take(int count, int from = 0) => Enumerable.Range(from, count).Select(At);

    public static Equilibrium At(int index)
    {
        var random = new Random(unchecked(Seed + (index * 7919)));
        var components = random.Next(1, 7);
        var charges = Enumerable.Range(0, components).Select(_ => random.Next(-3, 3)).ToArray();
        if (index % 4 == 1)
        {
            charges[0] = 0;
        }

        var species = new List<Species>();
        for (var c = 0; c < components; c++)
        {
            species.Add(new Species([new Term(c, 1)], 0, charges[c], 0));
        }

        var more = random.Next(1, 13 - components);
        for (var i = 0; i < more; i++)
        {
            var another = Another(random, charges);
            if (Math.Abs(another.Charge) > 4)
            {
                continue;
            }

            if (!another.IsRung || species.TrueForAll(one => !one.IsRung || one.Terms[0] != another.Terms[0] || one.Protons != another.Protons))
            {
                species.Add(another);
            }
        }

        var constraints = Enumerable.Range(0, components).Select(_ => Constraint.Total(RandomMixtures.LogUniform(random, 1e-9, 5))).ToList();
        switch (index % 4)
        {
            case 1:
                constraints[0] = Constraint.FixedActivity(-9 + (8 * random.NextDouble()));
                break;
            case 2:
                Neutralise(random, constraints, species, charges);
                break;
            default:
                break;
        }

        // Counter-ions, so that not every system is an excess of strong acid or base.
        for (var sign = -1; sign <= 1; sign += 2)
        {
            species.Add(new Species([new Term(constraints.Count, 1)], 0, sign, 0));
            constraints.Add(Constraint.Total(RandomMixtures.LogUniform(random, 1e-9, 5)));
        }

        return new Equilibrium(constraints, species, Water);
    }

    private static Species Another(Random random, int[] charges)
    {
        var terms = Enumerable.Range(0, charges.Length).OrderBy(_ => random.Next()).Take(random.Next(1, Math.Min(3, charges.Length) + 1))
            .Select(c => new Term(c, random.Next(4) == 0 ? 2 : 1)).ToArray();
        var protons = random.Next(-1, 3);
        if (terms.Length == 1 && terms[0].Count == 1 && protons == 0)
        {
            protons = 1;
        }

        var log10K = -3 + (15 * random.NextDouble());
        return new Species(terms, protons, protons + terms.Sum(term => term.Count * charges[term.Component]), log10K);
    }

    // Counter-ions for the components as they are, all but a part between one in a hundred and one in 10^14.
    private static void Neutralise(Random random, List<Constraint> constraints, List<Species> species, int[] charges)
    {
        var charge = charges.Select((one, c) => one * constraints[c].Value).Sum();
        var left = -charge * (1 + ((random.Next(2) == 0 ? 1 : -1) * Math.Pow(10, -2 - (12 * random.NextDouble()))));
        species.Add(new Species([new Term(constraints.Count, 1)], 0, Math.Sign(left) == 0 ? 1 : Math.Sign(left), 0));
        constraints.Add(Constraint.Total(Math.Abs(left)));
    }
}
