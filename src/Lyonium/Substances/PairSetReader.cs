using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Documents;
using Lyonium.Faults;
using Lyonium.Quantities;

namespace Lyonium.Substances;

/// <summary>Reads interaction coefficients and sets of ion pairs, and holds them to the families that there are.</summary>
internal sealed class PairSetReader
{
    private const double LargestLog10K = 100;
    private const double LargestKgPerMol = 5;
    private const int MostOfOne = 12;

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

            if (!(Math.Abs(value.Value) <= LargestKgPerMol))
            {
                Refuse(place, NumberText.Shortest(value.Value), "an interaction coefficient lies between -5 and 5 kg/mol");
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

            if (species.Length == 0 || models.Length == 0 || id == "none")
            {
                Refuse(place, id, "a set has species and models, and is not called none");
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

    /// <summary>Tells each id that stands twice among the pairs of all sets, layers laid over each other.</summary>
    public static void CheckIds(IEnumerable<PairSet> sets, JsonPlace root)
    {
        foreach (var id in sets.SelectMany(set => set.Species.Select(one => one.Id)).GroupBy(id => id, StringComparer.Ordinal).Where(group => group.Count() > 1))
        {
            root.Faults.Add(FaultKinds.TableDuplicate, root.Path + ".pairSets", id.Key, ("owner", "another pair"));
        }
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

        if (IsAForm(formedFrom))
        {
            Refuse(formulaPlace, text, "a pair is made of at least two species, not all of them water, and is no form of a family already");
        }

        if (!(Math.Abs(log10K.Value) <= LargestLog10K))
        {
            Refuse(place, NumberText.Shortest(log10K.Value), "log10 K lies between -100 and 100");
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
            else if (part.Value.WholeNumber() is int count)
            {
                if (count is >= 1 and <= MostOfOne)
                {
                    read.Add(new KeyValuePair<string, int>(part.Key, count));
                }
                else
                {
                    Refuse(part.Value, NumberText.Shortest(count), "a count lies between 1 and 12");
                }
            }
        }

        return read.Count == 0 ? null : read.ToArray();
    }

    // One species of a family with the ions of water is a rung of its ladder: refused where the ladder has that rung.
    private bool IsAForm(KeyValuePair<string, int>[] formedFrom)
    {
        var others = formedFrom.Where(part => !part.Key.StartsWith("water:", StringComparison.Ordinal)).ToArray();
        if (others.Length == 0 || formedFrom.Sum(part => part.Value) < 2)
        {
            return true;
        }

        if (others.Length > 1 || others[0].Value > 1)
        {
            return false;
        }

        var parts = others[0].Key.Split(':');
        var protons = int.Parse(parts[1], CultureInfo.InvariantCulture)
            + formedFrom.Sum(part => part.Key == "water:2" ? part.Value : part.Key == "water:0" ? -part.Value : 0);
        return _forms.ContainsKey(parts[0] + ":" + protons.ToString(CultureInfo.InvariantCulture));
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
