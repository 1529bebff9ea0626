using System;
using System.Collections.Generic;
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
        Reactions = Reactions().ToArray(),
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
        var equilibrium = answer.Modelled.Equilibrium;
        if (ProtonLevels.Fill(equilibrium, _speciation.Log10Gammas) is not { } levels)
        {
            return null;
        }

        var start = new double[equilibrium.SpeciesCount];
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
