using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Provenance;
using Lyonium.Quantities;
using Lyonium.Recipes;
using Lyonium.Solvers;
using Lyonium.Substances;

namespace Lyonium.Predictions;

/// <summary>Holds an answer against the listed solubilities of its uncharged forms and of what was poured.</summary>
internal sealed class SolubilityCheck(SolvedMixture answer, IActivityModel model)
{
    // A mixture at the very solubility, such as a saturated standard, is within it; the last digits of a double are not.
    private const double Limit = 1;
    private const double Slack = 1e-9;

    /// <summary>An assumption that does not hold for each solubility that is exceeded.</summary>
    public IEnumerable<Assumption> Exceeded() => OfTheForms().Concat(OfWhatWasPoured());

    private Mixture Mixture => answer.Modelled.Mixture;

    private IEnumerable<Assumption> OfTheForms()
    {
        var species = Equilibrium.WaterIons;
        foreach (var family in answer.Modelled.Families)
        {
            for (var form = family.Forms.Count - 1; form >= 0; form--, species++)
            {
                if (form < family.SolubilitiesMolPerKg.Count && family.SolubilitiesMolPerKg[form] is { } listed)
                {
                    var times = answer.Speciation.MolalitiesMolPerKg[species] / listed.Value;
                    if (times > Limit + Slack)
                    {
                        yield return NotHeld(family.Forms[form].Display + " of " + family.Name, times, listed);
                    }
                }
            }
        }
    }

    private IEnumerable<Assumption> OfWhatWasPoured()
    {
        foreach (var (substance, amount) in Mixture.Amounts)
        {
            if (substance.SolubilityMolPerKg is not { } listed)
            {
                continue;
            }

            var times = amount / Mixture.WaterKg / listed.Value;
            if (times > Limit + Slack && !IsTurnedIntoSomethingElse(substance, listed.Value))
            {
                yield return NotHeld(substance.Name, times, listed);
            }
        }
    }

    // More may be poured than dissolves in water alone where the rest of the mixture turns it into something else: lime in acid. So the
    // ions that make the substance are held against those of its saturated solution; their geometric mean says whether they make it again.
    private bool IsTurnedIntoSomethingElse(Substance substance, double solubilityMolPerKg)
    {
        var saturated = SolvedMixture.TrySolve(Mixture.Alone(substance, solubilityMolPerKg), answer.Modelled.PairSets, new ExactSolver(), model);
        if (!saturated.Success)
        {
            return false;
        }

        var sum = DissolvedForms.Of(substance)
            .Sum(form => form.Value * Math.Log(MolalityOf(answer, form.Key) / MolalityOf(saturated.Value, form.Key)));
        return sum <= 0;
    }

    private static double MolalityOf(SolvedMixture solved, string id)
    {
        for (var i = 0; i < solved.Modelled.Species.Count; i++)
        {
            if (string.Equals(solved.Modelled.Species[i].Id, id, StringComparison.Ordinal))
            {
                return solved.Speciation.MolalitiesMolPerKg[i];
            }
        }

        return double.NaN;
    }

    private static Assumption NotHeld(string of, double times, SourcedValue listed)
    {
        var at = listed.Conditions is { } conditions ? " at " + conditions : "";
        return new Assumption(
            ModelScope.WithinListedSolubility,
            of,
            times,
            Limit,
            Held: false,
            $"{ModelScope.MayNotDissolve}: listed solubility {NumberText.Shortest(listed.Value)} mol/kg{at}, {listed.Source.Citation}");
    }
}
