using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Documents;
using Lyonium.Faults;
using Lyonium.Provenance;
using Lyonium.Quantities;

namespace Lyonium.Substances;

/// <summary>Reads the dissociation steps of a family: the pKa and how it changes with temperature.</summary>
internal sealed class StepReader(SourcedValueReader values, string version)
{
    private static readonly string[] Properties = ["pKa", "enthalpy", "heatCapacity", "alternatives", "reason"];
    private static readonly string[] LaterProperties = [.. Properties, "equation", "validCelsius"];

    public DissociationStep? Read(JsonPlace place, string family, int number)
    {
        var properties = place.Properties(string.Equals(version, "1", StringComparison.Ordinal) ? Properties : LaterProperties);
        var pKa = values.Read(place.Need(properties, "pKa"));
        var alternatives = (properties.TryGetValue("alternatives", out var others) ? others.Items() : []).Select(values.Read).OfType<SourcedValue>().ToArray();
        var reason = properties.TryGetValue("reason", out var why) ? why.Text() ?? "" : "";
        if (alternatives.Length > 0 && reason.Length == 0)
        {
            place.Faults.Add(FaultKinds.MissingProperty, place.Path, "", ("property", "reason"));
        }

        if (pKa is null)
        {
            return null;
        }

        if (Math.Abs(pKa.Value) > 50)
        {
            Refuse(place, ".pKa", NumberText.Shortest(pKa.Value), "a pKa lies between -50 and 50");
        }

        var step = new DissociationStep
        {
            Id = family + ":" + number.ToString(CultureInfo.InvariantCulture),
            Number = number,
            PKa = pKa,
            EnthalpyKJPerMol = properties.TryGetValue("enthalpy", out var enthalpy) ? values.Read(enthalpy) : null,
            HeatCapacityJPerMolK = properties.TryGetValue("heatCapacity", out var capacity) ? values.Read(capacity) : null,
            Equation = properties.TryGetValue("equation", out var equation) ? ReadEquation(equation) : null,
            Alternatives = alternatives,
            Reason = reason,
        };
        Check(place, step);
        return step with { ValidRange = RangeOf(step, properties) };
    }

    private PKaEquation? ReadEquation(JsonPlace place)
    {
        var properties = place.Properties("overT", "constant", "timesT", "timesLnT", "source", "known", "note");
        var about = values.Finish(place, properties, place.Need(properties, "constant"), "standardUncertainty");
        return about is null
            ? null
            : new PKaEquation
            {
                OverT = Coefficient(properties, "overT"),
                Constant = about.Value,
                TimesT = Coefficient(properties, "timesT"),
                TimesLnT = Coefficient(properties, "timesLnT"),
                Source = about.Source,
                Known = about.Known,
                Note = about.Note,
            };
    }

    private static double Coefficient(IReadOnlyDictionary<string, JsonPlace> properties, string name) =>
        properties.TryGetValue(name, out var place) ? place.Number() ?? 0 : 0;

    private static TemperatureRange? RangeOf(DissociationStep step, IReadOnlyDictionary<string, JsonPlace> properties)
    {
        if (properties.TryGetValue("validCelsius", out var place))
        {
            return ReadRange(place);
        }

        return step.EnthalpyKJPerMol is null ? null
            : step.HeatCapacityJPerMolK is null ? TemperatureRange.WithEnthalpyAlone
            : TemperatureRange.WithHeatCapacity;
    }

    private static TemperatureRange? ReadRange(JsonPlace place)
    {
        var ends = place.Items().Select(item => item.Number()).ToArray();
        if (ends.Length == 2 && ends[0] is double low && ends[1] is double high && low >= 0 && low < high && high <= 100)
        {
            return TemperatureRange.OfCelsius(low, high);
        }

        Refuse(place, "", place.RawText, "a range is two temperatures within 0 to 100 Cel, the lower first");
        return null;
    }

    // A course that misses its own constant is a slip of the pen; the range tells how far the course may be used.
    private static void Check(JsonPlace place, DissociationStep step)
    {
        if (step.HeatCapacityJPerMolK is not null && step.EnthalpyKJPerMol is null)
        {
            Refuse(place, ".heatCapacity", NumberText.Shortest(step.HeatCapacityJPerMolK.Value), "a heat capacity stands beside an enthalpy");
        }

        if (step.Equation is not { } equation)
        {
            return;
        }

        if (place.Find("validCelsius") is null)
        {
            place.Faults.Add(FaultKinds.MissingProperty, place.Path, "", ("property", "validCelsius"));
        }

        const double most = 0.02;
        var miss = equation.At(step.PublishedAtK) - step.PKa.Value;
        if (!(Math.Abs(miss) <= most))
        {
            Refuse(
                place, ".equation", NumberText.Shortest(equation.At(step.PublishedAtK)), "the equation gives the pKa at its temperature within 0.02");
        }
    }

    private static void Refuse(JsonPlace place, string below, string found, string detail) =>
        place.Faults.Add(FaultKinds.TableBadValue, place.Path + below, found, ("detail", detail));
}
