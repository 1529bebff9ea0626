using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Substances;

namespace Lyonium.Modelling;

/// <summary>The species of a family, in numbers: the base form first, each form above it with the sum of the pKa of the steps between.</summary>
internal static class FamilySpecies
{
    public static IEnumerable<Species> Of(Family family, int component, Func<DissociationStep, double> pKa, double sizeOfUnlistedIons)
    {
        double log10K = 0;
        for (var protons = 0; protons < family.Forms.Count; protons++)
        {
            if (protons > 0)
            {
                log10K += pKa(family.Steps[family.Steps.Count - protons]);
            }

            var form = family.Forms.Count - 1 - protons;
            var size = family.IonSizesAngstrom.ElementAtOrDefault(form)?.Value ?? sizeOfUnlistedIons;
            yield return new Species([new Term(component, 1)], protons, family.Forms[form].Charge, log10K, size);
        }
    }
}
