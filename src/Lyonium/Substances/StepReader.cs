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
    private static readonly string[] LaterProperties = ["equation", "validCelsius"];

    public DissociationStep? Read(JsonPlace place, string family, int number)
    {
        var properties = TableVersion.Properties(place, version, Properties, LaterProperties);
        var pKa = ReadPKa(place.Need(properties, "pKa"));
        var alternatives = (properties.TryGetValue("alternatives", out var others) ? others.Items() : []).Select(ReadPKa).OfType<SourcedValue>().ToArray();
        var reason = properties.TryGetValue("reason", out var why) ? why.Text() ?? "" : "";
        if (alternatives.Length > 0 && reason.Length == 0)
        {
            place.Faults.Add(FaultKinds.MissingProperty, place.Path, "", ("property", "reason"));
        }

        if (why is not null && others is not { ItemCount: > 0 })
        {
            Refuse(place, ".reason", reason, "a reason says why the pKa was chosen, and stands beside \"alternatives\"");
        }

        if (pKa is null)
        {
            return null;
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
        step = step with { ValidRange = RangeOf(step, properties) };
        CheckRange(place, step, properties);
        return step;
    }

    private SourcedValue? ReadPKa(JsonPlace? place)
    {
        const double lowest = -20, highest = 40;
        var pKa = values.Read(place);
        if (pKa is not null && !(pKa.Value >= lowest && pKa.Value <= highest))
        {
            Refuse(place!, "", NumberText.Shortest(pKa.Value), "a pKa lies within -20 to 40");
        }

        return pKa;
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

    // A range that is stated is one of a course, and the constant itself lies in it; to its ends the course gives a pKa.
    private static void CheckRange(JsonPlace place, DissociationStep step, IReadOnlyDictionary<string, JsonPlace> properties)
    {
        if (step.ValidRange is not { } range)
        {
            return;
        }

        if (!properties.ContainsKey("equation") && !properties.ContainsKey("enthalpy"))
        {
            Refuse(place, ".validCelsius", Celsius(range.LowK) + " to " + Celsius(range.HighK), "a range stands beside an equation or an enthalpy");
            return;
        }

        const double rounding = 1e-9;
        if (properties.ContainsKey("validCelsius") && range.Beyond(step.PublishedAtK) > rounding)
        {
            Refuse(
                place,
                ".validCelsius",
                Celsius(range.LowK) + " to " + Celsius(range.HighK),
                $"it does not hold {Celsius(step.PublishedAtK)} Cel, the temperature of the pKa");
        }

        const double most = 50;
        foreach (var temperatureK in new[] { range.LowK, range.HighK }.Where(temperatureK => !(Math.Abs(step.PKaAt(temperatureK)) <= most)))
        {
            Refuse(
                place,
                step.Equation is null ? ".enthalpy" : ".equation",
                NumberText.Shortest(step.PKaAt(temperatureK)),
                $"the pKa at {Celsius(temperatureK)} Cel lies within -50 to 50");
        }
    }

    private static string Celsius(double temperatureK) => NumberText.Shortest(Math.Round(temperatureK - 273.15, 2));

    private static void Refuse(JsonPlace place, string below, string found, string detail) =>
        place.Faults.Add(FaultKinds.TableBadValue, place.Path + below, found, ("detail", detail));
}
