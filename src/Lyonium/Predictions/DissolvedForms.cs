using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Modelling;
using Lyonium.Substances;

namespace Lyonium.Predictions;

/// <summary>What a solid consists of, as species of its solution: the ions, or molecules, that have to meet to make it again.</summary>
internal static class DissolvedForms
{
    private const string HydrogenIon = "water:2";
    private const string HydroxideIon = "water:0";

    /// <summary>The species with their counts; the protons of the substance sit on its strongest bases.</summary>
    public static IReadOnlyDictionary<string, int> Of(Substance substance)
    {
        var counts = substance.Brings.ToDictionary(one => Doorway.SpeciesId(one.Family, 0), one => one.Count, StringComparer.Ordinal);
        var levels = substance.Brings.SelectMany(one => one.Family.Steps.Select(step => (one.Family, Step: step, one.Count)))
            .OrderByDescending(level => level.Step.PKa.Value);
        var left = substance.Protons;
        foreach (var (family, step, count) in levels)
        {
            var filled = Math.Min(Math.Max(left, 0), count);
            if (filled > 0)
            {
                var protons = family.Steps.Count - step.Number;
                counts[Doorway.SpeciesId(family, protons)] -= filled;
                counts[Doorway.SpeciesId(family, protons + 1)] = filled;
                left -= filled;
            }
        }

        if (left != 0)
        {
            counts[left > 0 ? HydrogenIon : HydroxideIon] = Math.Abs(left);
        }

        return counts.Where(one => one.Value > 0).ToDictionary(one => one.Key, one => one.Value, StringComparer.Ordinal);
    }
}
