using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Documents;
using Lyonium.Faults;
using Lyonium.Provenance;
using Lyonium.Quantities;

namespace Lyonium.Substances;

/// <summary>Reads the families of a table and holds their ladders to one proton a form and rising pKa.</summary>
internal sealed class FamilyReader(SourcedValueReader values, string version)
{
    private static readonly string[] FormProperties = ["formula", "solubility"];
    private static readonly string[] LaterFormProperties = ["ionSize"];
    private const double ZeroCelsiusK = 273.15;
    private readonly StepReader _steps = new(values, version);

    public IReadOnlyList<Family> Read(JsonPlace? list)
    {
        var families = new List<Family>();
        var ids = new HashSet<string>(StringComparer.Ordinal) { "water" };
        foreach (var place in list?.Items() ?? [])
        {
            if (ReadFamily(place) is not { } family)
            {
                continue;
            }

            // The ions of water are the species water:0 and water:2.
            var owner = family.Id == "water" ? "the ions of water" : ids.Add(family.Id) ? null : "another family";
            if (owner is null)
            {
                families.Add(family);
            }
            else
            {
                place.Faults.Add(FaultKinds.TableDuplicate, place.Path + ".id", family.Id, ("owner", owner));
            }
        }

        return families;
    }

    private Family? ReadFamily(JsonPlace place)
    {
        var properties = place.Properties("id", "name", "forms", "steps", "note");
        var id = TableId.Read(place, properties);
        var name = TableText.Read(place, properties, "name");
        var formPlaces = place.Need(properties, "forms")?.Items() ?? [];
        var forms = formPlaces.Select(ReadForm).ToArray();
        var stepPlaces = place.Need(properties, "steps")?.Items() ?? [];
        if (id is null || name is null || forms.Length == 0 || forms.Any(form => form.Formula is null))
        {
            return null;
        }

        var whole = forms.Select(form => form.Formula!).ToArray();
        CheckLadder(id, whole, formPlaces, stepPlaces.Count, place);
        var steps = stepPlaces.Select((step, index) => _steps.Read(step, id, index + 1)).ToArray();
        if (steps.Contains(null))
        {
            return null;
        }

        CheckOrder(id, steps, stepPlaces);
        return new Family
        {
            Id = id,
            Name = name,
            Forms = whole,
            SolubilitiesMolPerKg = forms.Select(form => form.Solubility).ToArray(),
            IonSizesAngstrom = forms.Select(form => form.IonSize).ToArray(),
            Steps = steps.Select(step => step!).ToArray(),
            Note = properties.TryGetValue("note", out var note) ? note.Text() ?? "" : "",
        };
    }

    private (ChemicalFormula? Formula, SourcedValue? Solubility, SourcedValue? IonSize) ReadForm(JsonPlace place)
    {
        var properties = TableVersion.Properties(place, version, FormProperties, LaterFormProperties);
        var solubility = values.ReadPositive(properties, "solubility");
        var ionSize = values.ReadPositive(properties, "ionSize", most: 20);
        if (place.Need(properties, "formula") is not { } formulaPlace || formulaPlace.Text() is not { } text)
        {
            return (null, solubility, ionSize);
        }

        if (!ChemicalFormula.TryParse(text, out var formula, out var detail))
        {
            place.Faults.Add(FaultKinds.TableBadFormula, formulaPlace.Path, text, ("detail", detail));
        }

        return (formula, solubility, ionSize);
    }

    private static void CheckLadder(string id, ChemicalFormula[] forms, IReadOnlyList<JsonPlace> places, int steps, JsonPlace family)
    {
        for (var i = 1; i < forms.Length; i++)
        {
            if (!IsOneProtonLess(forms[i - 1], forms[i]))
            {
                family.Faults.Add(FaultKinds.TableBadLadder, places[i].Path, forms[i].Text, ("family", id));
            }
        }

        if (steps != forms.Length - 1)
        {
            var count = steps.ToString(CultureInfo.InvariantCulture) + " steps";
            family.Faults.Add(FaultKinds.TableBadLadder, family.Path + ".steps", count, ("family", id));
        }
    }

    private static bool IsOneProtonLess(ChemicalFormula above, ChemicalFormula below)
    {
        static double Of(ChemicalFormula formula, string symbol) => formula.Composition.TryGetValue(symbol, out var count) ? count : 0;
        return above.Charge == below.Charge + 1
            && Of(above, "H") == Of(below, "H") + 1
            && above.Composition.Keys.Concat(below.Composition.Keys).All(symbol => symbol == "H" || Of(above, symbol) == Of(below, symbol));
    }

    private static void CheckOrder(string id, DissociationStep?[] steps, IReadOnlyList<JsonPlace> places)
    {
        for (var i = 1; i < steps.Length; i++)
        {
            var (before, step) = (steps[i - 1]!, steps[i]!);
            if (!(step.PKa.Value > before.PKa.Value))
            {
                RefuseOrder(places[i], ".pKa", id, i, NumberText.Shortest(step.PKa.Value), before.PKa.Value);
            }
            else if (FirstEndOutOfOrder(before, step) is double temperatureK)
            {
                var celsius = NumberText.Shortest(Math.Round(temperatureK - ZeroCelsiusK, 2));
                RefuseOrder(places[i], "", id, i, Rounded(step.PKaAt(temperatureK)) + " at " + celsius + " Cel", before.PKaAt(temperatureK));
            }
        }
    }

    // What a step is carried to may overtake its neighbour; a step that is carried nowhere holds at every temperature.
    private static double? FirstEndOutOfOrder(DissociationStep before, DissociationStep step)
    {
        var low = Math.Max(before.ValidRange?.LowK ?? 0, step.ValidRange?.LowK ?? 0);
        var high = Math.Min(before.ValidRange?.HighK ?? double.PositiveInfinity, step.ValidRange?.HighK ?? double.PositiveInfinity);
        if (double.IsInfinity(high) || low > high)
        {
            return null;
        }

        foreach (var temperatureK in new[] { low, high })
        {
            if (!(step.PKaAt(temperatureK) > before.PKaAt(temperatureK)))
            {
                return temperatureK;
            }
        }

        return null;
    }

    private static string Rounded(double pKa) => double.IsInfinity(pKa) || double.IsNaN(pKa) ? "no number" : NumberText.Shortest(Math.Round(pKa, 4));

    private static void RefuseOrder(JsonPlace place, string below, string id, int index, string found, double before) => place.Faults.Add(
        FaultKinds.TableStepOutOfOrder,
        place.Path + below,
        found,
        ("step", (index + 1).ToString(CultureInfo.InvariantCulture)),
        ("family", id),
        ("before", Rounded(before)));
}
