using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Provenance;
using Lyonium.Substances;

namespace Lyonium.Modelling;

/// <summary>The ion pairs, dimers and polymers of a mixture: those of the sets in use whose parts are all there.</summary>
internal sealed class PairSpecies
{
    private readonly double _temperatureK;
    private readonly IReadOnlyList<Family> _families;
    private readonly Dictionary<string, Species> _parts;
    private readonly double _pKw;

    public PairSpecies(IReadOnlyList<PairSet> sets, IReadOnlyList<Family> families, IReadOnlyList<Species> species, Solvent solvent)
    {
        _temperatureK = solvent.TemperatureK;
        _pKw = solvent.PKw;
        _families = families;
        _parts = new Dictionary<string, Species>(StringComparer.Ordinal);
        foreach (var one in species)
        {
            _parts.Add(Doorway.SpeciesId(families[one.Terms[0].Component], one.Protons), one);
        }

        All = sets.SelectMany(set => set.Species.Select(pair => (Pair: pair, set.Layer)))
            .Where(one => one.Pair.FormedFrom.All(part => IsWater(part.Key) || _parts.ContainsKey(part.Key)))
            .Select(one => (one.Pair, one.Layer, Of(one.Pair)))
            .ToArray();
    }

    /// <summary>Each pair with its species in numbers.</summary>
    public IReadOnlyList<(PairedSpecies Pair, string? Layer, Species Species)> All { get; }

    /// <summary>What a pair is to a chemist; its share is that of the first family it is made of.</summary>
    public ModelledSpecies Describe(PairedSpecies pair, Species species, IReadOnlyList<double> totalsMolPerKg)
    {
        var first = species.Terms[0];
        return new ModelledSpecies(pair.Id, _families[first.Component].Id, pair.Formula.Display, species.Charge, totalsMolPerKg[first.Component] / first.Count);
    }

    /// <summary>The constants of the pairs, as published and as used.</summary>
    public IEnumerable<UsedConstant> Constants()
    {
        foreach (var (pair, layer, _) in All)
        {
            yield return new UsedConstant(pair.Id, "log10 K", pair.Log10K, layer);
            if (pair.ChangesWithTemperature && Math.Abs(pair.ShiftTo(_temperatureK)) > 0)
            {
                yield return new UsedConstant(pair.Id, "enthalpy in kJ/mol", pair.EnthalpyKJPerMol!, layer);
                yield return new UsedConstant(
                    pair.Id,
                    "log10 K at the temperature of the mixture",
                    new SourcedValue(pair.Log10K.Value + pair.ShiftTo(_temperatureK), pair.Log10K.Source, Known.Derived) { TemperatureK = _temperatureK, Note = "carried with enthalpy, van 't Hoff equation" },
                    layer);
            }
        }
    }

    private static bool IsWater(string id) => id is "water:2" or "water:0";

    private Species Of(PairedSpecies pair)
    {
        var counts = new SortedDictionary<int, int>();
        var log10K = pair.Log10K.Value + pair.ShiftTo(_temperatureK);
        var protons = 0;
        foreach (var part in pair.FormedFrom)
        {
            if (IsWater(part.Key))
            {
                var isHydroxide = part.Key == "water:0";
                protons += isHydroxide ? -part.Value : part.Value;
                log10K -= isHydroxide ? part.Value * _pKw : 0;
                continue;
            }

            var species = _parts[part.Key];
            var component = species.Terms[0].Component;
            counts[component] = (counts.TryGetValue(component, out var count) ? count : 0) + part.Value;
            protons += part.Value * species.Protons;
            log10K += part.Value * species.Log10K;
        }

        return new Species(counts.Select(one => new Term(one.Key, one.Value)).ToArray(), protons, pair.Formula.Charge, log10K);
    }
}
