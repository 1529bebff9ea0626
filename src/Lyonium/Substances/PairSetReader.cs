using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Documents;
using Lyonium.Faults;

namespace Lyonium.Substances;

/// <summary>Reads interaction coefficients and sets of ion pairs, and holds them to the families that there are.</summary>
internal sealed class PairSetReader
{
    private readonly SourcedValueReader _values;
    private readonly Dictionary<string, ChemicalFormula?> _forms = new(StringComparer.Ordinal);

    public PairSetReader(SourcedValueReader values, IReadOnlyList<Family> families)
    {
        _values = values;
        _forms.Add("water:2", null);
        _forms.Add("water:0", null);
        foreach (var family in families)
        {
            for (var protons = 0; protons < family.Forms.Count; protons++)
            {
                _forms.Add(family.Id + ":" + protons.ToString(CultureInfo.InvariantCulture), family.Forms[family.Forms.Count - 1 - protons]);
            }
        }
    }

    public IReadOnlyList<InteractionCoefficient> ReadInteractions(JsonPlace? list)
    {
        var read = new List<InteractionCoefficient>();
        var seen = new HashSet<(string, string)>();
        foreach (var place in list?.Items() ?? [])
        {
            var properties = place.Properties("cation", "anion", "value", "standardUncertainty", "source", "known", "note");
            var value = _values.Finish(place, properties, place.Need(properties, "value"), "standardUncertainty");
            var cation = SpeciesId(place.Need(properties, "cation"), charge => charge > 0);
            var anion = SpeciesId(place.Need(properties, "anion"), charge => charge < 0);
            if (value is null || cation is null || anion is null)
            {
                continue;
            }

            if (seen.Add((cation, anion)))
            {
                read.Add(new InteractionCoefficient(cation, anion, value, Layer: null));
            }
            else
            {
                place.Faults.Add(FaultKinds.TableDuplicate, place.Path, cation + " " + anion, ("owner", "another interaction"));
            }
        }

        return read;
    }

    public IReadOnlyList<PairSet> ReadPairSets(JsonPlace? list)
    {
        var sets = new List<PairSet>();
        foreach (var place in list?.Items() ?? [])
        {
            var properties = place.Properties("id", "name", "models", "isDefault", "species");
            var id = TableId.Read(place, properties);
            var name = TableText.Read(place, properties, "name");
            var models = (place.Need(properties, "models")?.Items() ?? []).Select(one => one.Text()).OfType<string>().ToArray();
            var species = (place.Need(properties, "species")?.Items() ?? []).Select(ReadSpecies).OfType<PairedSpecies>().ToArray();
            var isDefault = place.Need(properties, "isDefault")?.Flag() ?? false;
            if (id is null || name is null)
            {
                continue;
            }

            if (sets.Any(one => string.Equals(one.Id, id, StringComparison.Ordinal)))
            {
                place.Faults.Add(FaultKinds.TableDuplicate, place.Path + ".id", id, ("owner", "another set"));
                continue;
            }

            sets.Add(new PairSet { Id = id, Name = name, Models = models, IsDefault = isDefault, Species = species });
        }

        return sets;
    }

    private PairedSpecies? ReadSpecies(JsonPlace place)
    {
        var properties = place.Properties("id", "formula", "formedFrom", "log10K", "enthalpy");
        var id = TableId.Read(place, properties);
        var log10K = _values.Read(place.Need(properties, "log10K"));
        var enthalpy = properties.TryGetValue("enthalpy", out var course) ? _values.Read(course) : null;
        var formedFrom = ReadFormedFrom(place.Need(properties, "formedFrom"));
        if (place.Need(properties, "formula") is not { } formulaPlace || formulaPlace.Text() is not { } text || id is null || log10K is null || formedFrom is null)
        {
            return null;
        }

        if (!ChemicalFormula.TryParse(text, out var formula, out var detail))
        {
            place.Faults.Add(FaultKinds.TableBadFormula, formulaPlace.Path, text, ("detail", detail));
            return null;
        }

        var charge = formedFrom.Sum(one => one.Value * ChargeOf(one.Key));
        if (charge != formula!.Charge)
        {
            Refuse(formulaPlace, text, "its charge is that of what it is formed from");
        }

        return new PairedSpecies { Id = id, Formula = formula, FormedFrom = formedFrom, Log10K = log10K, EnthalpyKJPerMol = enthalpy };
    }

    private KeyValuePair<string, int>[]? ReadFormedFrom(JsonPlace? place)
    {
        var parts = place?.Properties() ?? new Dictionary<string, JsonPlace>(StringComparer.Ordinal);
        var read = new List<KeyValuePair<string, int>>();
        foreach (var part in parts)
        {
            if (!_forms.ContainsKey(part.Key))
            {
                part.Value.Faults.Add(FaultKinds.TableUnknownFamily, part.Value.Path, part.Key);
            }
            else if (part.Value.WholeNumber() is int count && count != 0)
            {
                read.Add(new KeyValuePair<string, int>(part.Key, count));
            }
        }

        return read.Count == 0 ? null : read.ToArray();
    }

    private string? SpeciesId(JsonPlace? place, Func<int, bool> hasCharge)
    {
        if (place?.Text() is not { } id)
        {
            return null;
        }

        if (!_forms.ContainsKey(id))
        {
            place.Faults.Add(FaultKinds.TableUnknownFamily, place.Path, id);
            return null;
        }

        if (!hasCharge(ChargeOf(id)))
        {
            Refuse(place, id, "an interaction is of a cation with an anion");
            return null;
        }

        return id;
    }

    private int ChargeOf(string id) => _forms[id]?.Charge ?? (string.Equals(id, "water:2", StringComparison.Ordinal) ? 1 : -1);

    private static void Refuse(JsonPlace place, string found, string detail) =>
        place.Faults.Add(FaultKinds.TableBadValue, place.Path, found, ("detail", detail));
}
