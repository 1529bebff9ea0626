using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Equilibria;

namespace Lyonium.Tests.Equilibria;

/// <summary>A mixture as a textbook states it, from which both the library's problem and an independent check are made.</summary>
internal sealed record MixtureInput(IReadOnlyList<LadderInput> Ladders, double PKw = MixtureInput.TextbookPKw)
{
    public const double TextbookPKw = 14;

    /// <summary>The Debye–Hückel slope that the tests use; any number near the true one would do.</summary>
    public const double Slope = 0.51;

    public static MixtureInput Of(params LadderInput[] ladders) => new(ladders);

    public Equilibrium ToEquilibrium()
    {
        var species = new List<Species>();
        for (var component = 0; component < Ladders.Count; component++)
        {
            var pKa = Ladders[component].PKa;
            double log10K = 0;
            for (var protons = 0; protons <= pKa.Length; protons++)
            {
                log10K += protons == 0 ? 0 : pKa[^protons];
                species.Add(new Species([new Term(component, 1)], protons, Ladders[component].TopCharge - pKa.Length + protons, log10K));
            }
        }

        return new Equilibrium(
            Ladders.Select(one => Constraint.Total(one.MolPerKg)).ToArray(), species, new Solvent(298.15, PKw, Slope, 0.328));
    }

    public MixtureInput With(LadderInput ladder) => this with { Ladders = [.. Ladders, ladder] };

    /// <summary>Text from which a failing mixture can be typed in again.</summary>
    public override string ToString() => string.Join(
        "; ",
        Ladders.Select(one =>
            $"{Text(one.MolPerKg)} mol/kg, top {one.TopCharge.ToString(CultureInfo.InvariantCulture)}, pKa [{string.Join(", ", one.PKa.Select(Text))}]"));

    private static string Text(double value) => value.ToString("R", CultureInfo.InvariantCulture);
}
