using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Documents;
using Lyonium.Faults;
using Lyonium.Provenance;
using Lyonium.Quantities;

namespace Lyonium.Substances;

/// <summary>Reads values with their sources; a value whose source is not listed is a fault.</summary>
internal sealed class SourcedValueReader
{
    private const double ZeroCelsius = 273.15;
    private const double LowestCelsius = 0;
    private const double HighestCelsius = 100;
    private readonly Dictionary<string, Source> _byKey;

    public SourcedValueReader(IReadOnlyList<Source> sources)
    {
        Sources = sources;
        _byKey = sources.ToDictionary(source => source.Key, StringComparer.Ordinal);
    }

    public IReadOnlyList<Source> Sources { get; }

    /// <summary>Reads an object with <c>value</c>, its conditions, <c>source</c> and <c>known</c>.</summary>
    public SourcedValue? Read(JsonPlace? place)
    {
        if (place is null)
        {
            return null;
        }

        var properties = place.Properties(
            "value", "standardUncertainty", "temperatureCelsius", "ionicStrength", "source", "known", "note");
        return Finish(place, properties, place.Need(properties, "value"), "standardUncertainty");
    }

    /// <summary>Reads an optional value that is above zero and not above a limit.</summary>
    public SourcedValue? ReadPositive(IReadOnlyDictionary<string, JsonPlace> properties, string name, double most = double.PositiveInfinity)
    {
        if (!properties.TryGetValue(name, out var place) || Read(place) is not { } value)
        {
            return null;
        }

        if (value.Value > 0 && value.Value <= most)
        {
            return value;
        }

        var article = "aeiou".IndexOf(name[0]) < 0 ? "a" : "an";
        var limit = value.Value > 0 ? "at most " + NumberText.Shortest(most) : "above zero";
        place.Faults.Add(FaultKinds.TableBadValue, place.Path, NumberText.Shortest(value.Value), ("detail", $"{article} {name} is {limit}"));
        return null;
    }

    /// <summary>Reads the source and the conditions that stand beside a number.</summary>
    public SourcedValue? Finish(
        JsonPlace place, IReadOnlyDictionary<string, JsonPlace> properties, JsonPlace? number, string uncertaintyName)
    {
        var value = number?.Number();
        var source = ReadSource(place, properties);
        var known = ReadKnown(place, properties);
        var uncertainty = Optional(properties, uncertaintyName);
        var celsius = Optional(properties, "temperatureCelsius");
        var ionicStrength = Optional(properties, "ionicStrength") ?? 0;
        var isSound = Holds(!(ionicStrength < 0), place, ".ionicStrength", ionicStrength, "an ionic strength is not below zero")
            & Holds(!(celsius < LowestCelsius) && !(celsius > HighestCelsius), place, ".temperatureCelsius", celsius, "a temperature lies within 0 to 100 Cel")
            & Holds(
                uncertaintyName == "standardUncertainty" ? !(uncertainty <= 0) : !(uncertainty < 0),
                place,
                "." + uncertaintyName,
                uncertainty,
                uncertaintyName == "standardUncertainty" ? "a standard uncertainty is above zero; leave it out where it is not known" : "an uncertainty is not below zero");
        if (!isSound)
        {
            return null;
        }

        if (value is not double finite || source is null || known is not Known how)
        {
            return null;
        }

        return new SourcedValue(finite, source, how)
        {
            StandardUncertainty = uncertainty,
            TemperatureK = celsius + ZeroCelsius,
            IonicStrengthMolPerKg = ionicStrength,
            Note = properties.TryGetValue("note", out var note) ? note.Text() ?? "" : "",
        };
    }

    private static bool Holds(bool isSound, JsonPlace place, string below, double? found, string detail)
    {
        if (!isSound)
        {
            place.Faults.Add(FaultKinds.TableBadValue, place.Path + below, NumberText.Shortest(found ?? double.NaN), ("detail", detail));
        }

        return isSound;
    }

    private static double? Optional(IReadOnlyDictionary<string, JsonPlace> properties, string name) =>
        properties.TryGetValue(name, out var place) ? place.Number() : null;

    private Source? ReadSource(JsonPlace place, IReadOnlyDictionary<string, JsonPlace> properties)
    {
        if (place.Need(properties, "source") is not { } sourcePlace || sourcePlace.Text() is not { } key)
        {
            return null;
        }

        if (_byKey.TryGetValue(key, out var source))
        {
            return source;
        }

        place.Faults.Add(FaultKinds.TableMissingSource, sourcePlace.Path, key);
        return null;
    }

    private static Known? ReadKnown(JsonPlace place, IReadOnlyDictionary<string, JsonPlace> properties)
    {
        if (place.Need(properties, "known") is not { } knownPlace || knownPlace.Text() is not { } text)
        {
            return null;
        }

        var known = KnownText.Find(text);
        if (known is null)
        {
            place.Faults.Add(FaultKinds.TableBadValue, knownPlace.Path, text, ("detail", "it is one of " + KnownText.All));
        }

        return known;
    }
}
