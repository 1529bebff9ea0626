using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Documents;
using Lyonium.Faults;
using Lyonium.Quantities;

namespace Lyonium.Substances;

/// <summary>Reads the substances of a table and holds each formula to what the substance brings.</summary>
internal sealed class SubstanceReader
{
    private readonly SourcedValueReader _values;
    private readonly Dictionary<string, Family> _families;
    private readonly Dictionary<string, double> _weights;
    private readonly TakenNames _names;

    public SubstanceReader(SourcedValueReader values, IReadOnlyList<Family> families, IReadOnlyList<AtomicWeight> weights, TakenNames names)
    {
        _names = names;
        _values = values;
        _families = families.ToDictionary(family => family.Id, StringComparer.Ordinal);
        _weights = weights.ToDictionary(one => one.Symbol, one => one.Weight.Value, StringComparer.Ordinal);
    }

    public IReadOnlyList<Substance> Read(JsonPlace? list) =>
        (list?.Items() ?? []).Select(ReadSubstance).OfType<Substance>().ToArray();

    private Substance? ReadSubstance(JsonPlace place)
    {
        var properties = place.Properties(
            "id", "name", "synonyms", "formula", "otherFormulas", "brings", "protons", "density", "molarVolume", "solubility", "solutionDensities", "groups");
        var id = TableId.Read(place, properties);
        var name = TableText.Read(place, properties, "name");
        var synonyms = Texts(properties, "synonyms");
        var formulaPlace = place.Need(properties, "formula");
        var formula = ReadFormula(formulaPlace);
        var brings = ReadBrings(place.Need(properties, "brings"));
        var protons = place.Need(properties, "protons")?.WholeNumber();
        if (id is null || name is null || formula is null || brings is null || protons is not int given)
        {
            return null;
        }

        TakeNames(place, id, name, synonyms);
        CheckBalance(formulaPlace!, formula, brings, given);
        return new Substance
        {
            Id = id,
            Name = name,
            Synonyms = synonyms,
            Formula = formula,
            OtherFormulas = Texts(properties, "otherFormulas"),
            MolarMassGPerMol = MolarMass(formula, formulaPlace!),
            CrystalWaterGPerMol = formula.CrystalWater * WaterMass,
            Brings = brings,
            Protons = given,
            DensityKgPerL = _values.ReadPositive(properties, "density"),
            MolarVolumeMLPerMol = properties.TryGetValue("molarVolume", out var volume) ? _values.Read(volume) : null,
            SolubilityMolPerKg = _values.ReadPositive(properties, "solubility"),
            SolutionDensities = ReadDensities(properties),
            Groups = Texts(properties, "groups"),
        };
    }

    private double WaterMass => (2 * WeightOf("H")) + WeightOf("O");

    private double WeightOf(string symbol) => _weights.TryGetValue(symbol, out var weight) ? weight : double.NaN;

    private static string[] Texts(IReadOnlyDictionary<string, JsonPlace> properties, string name) =>
        properties.TryGetValue(name, out var place) ? place.Items().Select(item => item.Text()).OfType<string>().ToArray() : [];

    private static ChemicalFormula? ReadFormula(JsonPlace? place)
    {
        if (place?.Text() is not { } text)
        {
            return null;
        }

        if (!ChemicalFormula.TryParse(text, out var formula, out var detail))
        {
            place.Faults.Add(FaultKinds.TableBadFormula, place.Path, text, ("detail", detail));
        }

        return formula;
    }

    private BroughtFamily[]? ReadBrings(JsonPlace? place)
    {
        if (place is null)
        {
            return null;
        }

        var brought = new List<BroughtFamily>();
        var sound = place.IsObject;
        foreach (var property in place.Properties())
        {
            var count = property.Value.WholeNumber();
            if (!_families.TryGetValue(property.Key, out var family))
            {
                place.Faults.Add(FaultKinds.TableUnknownFamily, property.Value.Path, property.Key);
                sound = false;
            }
            else if (count is not > 0)
            {
                place.Faults.Add(FaultKinds.TableBadValue, property.Value.Path, property.Value.RawText, ("detail", "a substance brings one or more"));
                sound = false;
            }
            else
            {
                brought.Add(new BroughtFamily(family, count.Value));
            }
        }

        return sound ? brought.ToArray() : null;
    }

    private void TakeNames(JsonPlace place, string id, string name, IReadOnlyList<string> synonyms)
    {
        foreach (var one in synonyms.Concat([name, id]).GroupBy(NameFolding.Fold, StringComparer.Ordinal).Select(group => group.First()))
        {
            if (NameFolding.Fold(one).Length == 0)
            {
                place.Faults.Add(FaultKinds.TableBadValue, place.Path, one, ("detail", "a name has letters"));
            }
            else if (_names.Take(one, id) is { } owner)
            {
                place.Faults.Add(FaultKinds.TableDuplicate, place.Path, one, ("owner", owner));
            }
        }
    }

    private double MolarMass(ChemicalFormula formula, JsonPlace place)
    {
        double mass = 0;
        foreach (var element in formula.Composition)
        {
            if (!_weights.TryGetValue(element.Key, out var weight))
            {
                place.Faults.Add(
                    FaultKinds.TableBadFormula, place.Path, formula.Text, ("detail", $"the table has no atomic weight for '{element.Key}'"));
            }

            mass += element.Value * weight;
        }

        return mass;
    }

    // Formula = base forms + protons · H + k · H2O, for one k; and no charge in all.
    private static void CheckBalance(JsonPlace place, ChemicalFormula formula, BroughtFamily[] brings, int protons)
    {
        var charge = protons + brings.Sum(one => one.Count * one.Family.Base.Charge);
        if (charge != 0 || formula.Charge != 0)
        {
            place.Faults.Add(
                FaultKinds.TableNotBalanced, place.Path, formula.Text, ("detail", $"the charges add up to {NumberText.Shortest(charge)}"));
        }

        var left = formula.Composition.ToDictionary(one => one.Key, one => one.Value, StringComparer.Ordinal);
        void Take(string symbol, double count) => left[symbol] = (left.TryGetValue(symbol, out var there) ? there : 0) - count;
        foreach (var one in brings)
        {
            foreach (var element in one.Family.Base.Composition)
            {
                Take(element.Key, one.Count * element.Value);
            }
        }

        Take("H", protons);
        var water = left.TryGetValue("O", out var oxygen) ? oxygen : 0;
        Take("O", water);
        Take("H", 2 * water);
        foreach (var element in left.Where(element => Math.Abs(element.Value) > 1e-9))
        {
            place.Faults.Add(
                FaultKinds.TableNotBalanced,
                place.Path,
                formula.Text,
                ("detail", $"{NumberText.Shortest(element.Value)} {element.Key} of the formula is not accounted for"));
        }
    }

    private SolutionDensities? ReadDensities(IReadOnlyDictionary<string, JsonPlace> properties)
    {
        if (!properties.TryGetValue("solutionDensities", out var list))
        {
            return null;
        }

        var points = new List<SolutionDensity>();
        foreach (var place in list.Items())
        {
            var members = place.Properties("massFraction", "value", "temperatureCelsius", "source", "known", "note");
            var fraction = place.Need(members, "massFraction")?.Number();
            var density = _values.Finish(place, members, place.Need(members, "value"), "standardUncertainty");
            if (fraction is not double w || density is null)
            {
                continue;
            }

            if (!(w > 0 && w <= 1 && density.Value > 0 && (points.Count == 0 || w > points[points.Count - 1].MassFraction)))
            {
                place.Faults.Add(
                    FaultKinds.TableBadValue, place.Path, NumberText.Shortest(w), ("detail", "mass fractions rise from above 0 to 1, and a density is above zero"));
                continue;
            }

            points.Add(new SolutionDensity(w, density));
        }

        return points.Count == 0 ? null : new SolutionDensities(points.ToArray());
    }
}
