using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;

namespace Lyonium.Conformance;

/// <summary>A mixture of the conformance kit.</summary>
internal sealed record ConformanceMixture(string Name, IReadOnlyList<ConformanceLadder> Parts)
{
    public Equilibrium Equilibrium => ConformanceMixtures.Build(Parts);

    public Equilibrium Reversed() => ConformanceMixtures.Build(Parts.Reverse().ToArray());
}

/// <summary>A ladder: its total, the charge of its most protonated form, and its pKa from the most acidic on.</summary>
internal sealed record ConformanceLadder(double Total, int TopCharge, params double[] PKa);

/// <summary>The mixtures of the conformance kit: round numbers, not substances.</summary>
internal static class ConformanceMixtures
{
    private static readonly Solvent Water = new(298.15, 14, 0.51, 0.329);

    public static IReadOnlyList<ConformanceMixture> Ladders() =>
    [
        new("water alone", []),
        new("only a salt", [Cation(0.1), Anion(0.1)]),
        new("strong acid", [Anion(0.01)]),
        new("strong acid below the neutral point", [Anion(1e-8)]),
        new("strong base", [Cation(0.01)]),
        new("weak acid", [new(0.1, 0, 5)]),
        new("weak acid, much dissociated", [new(1e-4, 0, 3)]),
        new("weak acid with K above c", [new(1e-3, 0, 1)]),
        new("very weak acid, very dilute", [new(1e-6, 0, 10)]),
        new("weak base", [new(0.1, 1, 9), Cation(0), Anion(0)]),
        new("salt of a weak base and a strong acid", [new(0.1, 1, 9), Anion(0.1)]),
        new("salt of a weak acid and a strong base", [new(0.1, 0, 5), Cation(0.1)]),
        new("buffer", [new(0.1, 0, 5), Cation(0.03)]),
        new("dilute buffer near its own dissociation", [new(1e-4, 0, 4), Cation(5e-5)]),
        new("ampholyte", [new(0.05, 1, 3, 9), Anion(0)]),
        new("acid salt", [new(0.05, 0, 3, 8), Cation(0.05)]),
        new("three steps", [new(0.02, 0, 2, 7, 12), Cation(0.03)]),
        new("two weak acids close together", [new(0.05, 0, 3.75), new(0.05, 0, 3.86)]),
        new("two weak acids far apart", [new(0.05, 0, 3), new(0.05, 0, 9)]),
        new("salt of a weak acid and a weak base", [new(0.1, 0, 4.76), new(0.1, 1, 9.25)]),
        new("strong with weak", [Anion(0.01), new(0.1, 0, 4.76)]),
        new("a trace of strong acid in much weak acid", [Anion(1e-9), new(0.1, 0, 9)]),
        new("strong acid on a weak base, all neutralised", [new(0.1, 1, 9.25), Anion(0.1)]),
        new("nearly neutralised, concentrated", [Cation(5), Anion(4.9999999)]),
        new("charged ladder", [new(0.01, 2, 0, 1.5, 2, 2.7, 6.1, 10.3), Cation(0.02)]),
        new("eight protolytes", [.. Enumerable.Range(0, 8).Select(i => new ConformanceLadder(0.01, 0, 2 + (1.3 * i))), Cation(0.035)]),
    ];

    public static IReadOnlyList<(string Name, Equilibrium Equilibrium)> NotLadders() =>
    [
        ("a species over two components", new Equilibrium(
            [Constraint.Total(0.1), Constraint.Total(0.1)],
            [new Species([new Term(0, 1)], 0, 2, 0), new Species([new Term(1, 1)], 0, -2, 0), new Species([new Term(0, 1), new Term(1, 1)], 0, 0, 2)],
            Water)),
        ("a component at a fixed activity", new Equilibrium(
            [Constraint.FixedActivity(-5)],
            [new Species([new Term(0, 1)], 0, 0, 0), new Species([new Term(0, 1)], -1, -1, -6)],
            Water)),
    ];

    public static Equilibrium Build(IReadOnlyList<ConformanceLadder> ladders)
    {
        var species = new List<Species>();
        for (var i = 0; i < ladders.Count; i++)
        {
            var steps = ladders[i].PKa;
            double log10K = 0;
            for (var protons = 0; protons <= steps.Length; protons++)
            {
                log10K += protons == 0 ? 0 : steps[steps.Length - protons];
                species.Add(new Species([new Term(i, 1)], protons, ladders[i].TopCharge - steps.Length + protons, log10K));
            }
        }

        return new Equilibrium(ladders.Select(ladder => Constraint.Total(ladder.Total)).ToArray(), species, Water);
    }

    private static ConformanceLadder Cation(double total) => new(total, 1);

    private static ConformanceLadder Anion(double total) => new(total, -1);
}
