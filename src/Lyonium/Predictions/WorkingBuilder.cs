using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Solvers;

namespace Lyonium.Predictions;

/// <summary>Retraces a solved mixture as worked steps.</summary>
internal sealed class WorkingBuilder(SolvedMixture answer)
{
    private readonly Speciation _speciation = answer.Speciation;

    public Working Build() => new()
    {
        Reactions = Reactions().Concat(Formations()).ToArray(),
        Amounts = Amounts().ToArray(),
        Found = answer.Outcome.Formula ?? "the pH at which the charges of all species add up to zero",
        HydrogenMolPerKg = _speciation.MolalitiesMolPerKg[Equilibrium.HydrogenIon],
        HydrogenActivityCoefficient = Math.Pow(10, _speciation.Log10Gammas[Equilibrium.HydrogenIon]),
        ChargeMolPerKg = _speciation.ChargeMolPerKg,
        IonicStrengthMolPerKg = _speciation.IonicStrengthMolPerKg,
        Iterates = answer.Outcome.Iterates,
    };

    private IEnumerable<WorkedReaction> Reactions()
    {
        var modelled = answer.Modelled;
        var gammas = _speciation.Log10Gammas;
        var molalities = _speciation.MolalitiesMolPerKg;
        var first = Equilibrium.WaterIons;
        foreach (var family in modelled.Families)
        {
            foreach (var step in family.Steps)
            {
                var less = first + family.Steps.Count - step.Number;
                var (acid, @base) = (modelled.Species[less + 1].Display, modelled.Species[less].Display);
                var species = modelled.Equilibrium.Species;
                var pKa = species[less + 1 - Equilibrium.WaterIons].Log10K - species[less - Equilibrium.WaterIons].Log10K;
                var log10K = -pKa + gammas[less + 1] - gammas[less] - gammas[Equilibrium.HydrogenIon];
                yield return new WorkedReaction(
                    step.Id,
                    $"{acid} ⇌ {@base} + H⁺",
                    $"[{@base}][H⁺] / [{acid}]",
                    pKa,
                    Math.Pow(10, log10K),
                    molalities[less] * molalities[Equilibrium.HydrogenIon] / molalities[less + 1]);
            }

            first += family.Forms.Count;
        }
    }

    private IEnumerable<WorkedReaction> Formations()
    {
        var modelled = answer.Modelled;
        var index = modelled.Species.Select((one, i) => (one.Id, i)).ToDictionary(one => one.Id, one => one.i, StringComparer.Ordinal);
        for (var i = 0; i < modelled.Pairs.Count; i++)
        {
            var pair = modelled.Pairs[i];
            var at = modelled.Species.Count - modelled.Pairs.Count + i;
            var log10K = pair.Log10K.Value + pair.ShiftTo(modelled.Equilibrium.Solvent.TemperatureK);
            var conditional = log10K - _speciation.Log10Gammas[at];
            double parts = 1;
            foreach (var part in pair.FormedFrom)
            {
                conditional += part.Value * _speciation.Log10Gammas[index[part.Key]];
                parts *= Math.Pow(_speciation.MolalitiesMolPerKg[index[part.Key]], part.Value);
            }

            var display = modelled.Species[at].Display;
            var terms = pair.FormedFrom.Select(part => (Count: part.Value, modelled.Species[index[part.Key]].Display)).ToArray();
            yield return new WorkedReaction(
                pair.Id,
                string.Join(" + ", terms.Select(one => (one.Count == 1 ? "" : one.Count.ToString(CultureInfo.InvariantCulture) + " ") + one.Display)) + " ⇌ " + display,
                $"[{display}] / ({string.Concat(terms.Select(one => $"[{one.Display}]" + (one.Count == 1 ? "" : "^" + one.Count.ToString(CultureInfo.InvariantCulture))))})",
                -log10K,
                Math.Pow(10, conditional),
                _speciation.MolalitiesMolPerKg[at] / parts,
                IsFormation: true);
        }
    }

    private IEnumerable<WorkedAmount> Amounts()
    {
        var start = Start();
        for (var i = 0; i < answer.Modelled.Species.Count; i++)
        {
            yield return new WorkedAmount(answer.Modelled.Species[i].Display, start?[i], _speciation.MolalitiesMolPerKg[i]);
        }
    }

    // Every proton at hand on the highest level that is free; what no level takes is an excess of strong acid or base.
    private double[]? Start()
    {
        // Nothing has paired yet.
        var paired = answer.Modelled.Equilibrium;
        var single = paired.Species.Count - answer.Modelled.Pairs.Count;
        var equilibrium = new Equilibrium(paired.Constraints, paired.Species.Take(single).ToArray(), paired.Solvent);
        if (ProtonLevels.Fill(equilibrium, _speciation.Log10Gammas) is not { } levels)
        {
            return null;
        }

        var start = new double[paired.SpeciesCount];
        var standing = Standing(equilibrium, levels);
        foreach (var one in standing)
        {
            start[one.Value] = equilibrium.Constraints[one.Key].Value;
        }

        if (levels.SharedLevel is { } shared)
        {
            var index = standing[shared.Component];
            start[index] -= Math.Abs(levels.Rest);
            start[index + Math.Sign(levels.Rest)] += Math.Abs(levels.Rest);
        }
        else
        {
            start[levels.Rest > 0 ? Equilibrium.HydrogenIon : Equilibrium.HydroxideIon] = Math.Abs(levels.Rest);
        }

        return start;
    }

    // The species that each component stands on when the levels up to the boundary are filled: so many rungs above the base form.
    private static Dictionary<int, int> Standing(Equilibrium equilibrium, ProtonLevels levels)
    {
        var standing = new Dictionary<int, int>();
        for (var i = 0; i < equilibrium.Species.Count; i++)
        {
            var component = equilibrium.Species[i].Terms[0].Component;
            if (!standing.ContainsKey(component))
            {
                standing.Add(component, i + Equilibrium.WaterIons);
            }
        }

        foreach (var level in levels.FilledLevels)
        {
            standing[level.Component]++;
        }

        return standing;
    }
}
