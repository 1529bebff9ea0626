using System;
using System.Collections.Generic;
using System.Linq;
using System.Text.Json;
using Lyonium.Faults;
using Lyonium.Quantities;

namespace Lyonium.Documents;

/// <summary>A JSON value and where it stands. Reads it as what the format wants there, or tells the fault.</summary>
internal sealed class JsonPlace
{
    private readonly JsonElement _element;
    private readonly FaultList _faults;

    public JsonPlace(JsonElement element, string path, FaultList faults)
    {
        _element = element;
        Path = path;
        _faults = faults;
    }

    public string Path { get; }

    public FaultList Faults => _faults;

    public bool IsObject => _element.ValueKind == JsonValueKind.Object;

    public bool IsNull => _element.ValueKind == JsonValueKind.Null;

    public bool IsText => _element.ValueKind == JsonValueKind.String;

    /// <summary>The value itself.</summary>
    public JsonElement Element => _element;

    /// <summary>The value as it is written.</summary>
    public string RawText => _element.GetRawText();

    /// <summary>An object as it is written, whatever stands in it.</summary>
    public string? RawObject() => Is(JsonValueKind.Object, "an object") ? RawText : null;

    /// <summary>The properties of an object; each one that is not known, or stands twice, is told.</summary>
    public IReadOnlyDictionary<string, JsonPlace> Properties(params string[] known) => Properties(known, [], "");

    /// <summary>The properties of an object of an earlier version; what only a later one has is told with that version.</summary>
    /// <param name="known">What this version has.</param>
    /// <param name="later">What only the later version has.</param>
    /// <param name="laterFormat">The later version, as its documents name it.</param>
    public IReadOnlyDictionary<string, JsonPlace> Properties(string[] known, string[] later, string laterFormat)
    {
        var properties = new Dictionary<string, JsonPlace>(StringComparer.Ordinal);
        if (!Is(JsonValueKind.Object, "an object"))
        {
            return properties;
        }

        foreach (var property in _element.EnumerateObject())
        {
            if (NameOf(property) is not { } name)
            {
                _faults.Add(FaultKinds.WrongType, Path, "", ("expected", "property names in Unicode"), ("actual", "half a surrogate pair in one"));
                continue;
            }

            var isUnknown = known.Length > 0 && !known.Contains(name, StringComparer.Ordinal);
            if (isUnknown && _faults.IsFull)
            {
                continue;
            }

            var path = Path + PathStep.Of(name);
            if (isUnknown)
            {
                _faults.Add(FaultKinds.UnknownProperty, path, name, ("known", string.Join(", ", known)), ("suggestion", later.Contains(name, StringComparer.Ordinal)
                    ? $"set \"format\" to \"{laterFormat}\", which has it"
                    : $"use {string.Join(", ", known)}; free data goes under \"notes\" of the document"));
            }
            else if (properties.ContainsKey(name))
            {
                _faults.Add(FaultKinds.DuplicateProperty, path, name);
            }
            else
            {
                properties.Add(name, new JsonPlace(property.Value, path, _faults));
            }
        }

        return properties;
    }

    /// <summary>One property of an object, whatever else stands in it; <see langword="null"/> where it is not there.</summary>
    public JsonPlace? Find(string name) =>
        Member(name) is { } value ? new JsonPlace(value, Path + PathStep.Of(name), _faults) : null;

    /// <summary>The items of an array.</summary>
    public IReadOnlyList<JsonPlace> Items()
    {
        if (!Is(JsonValueKind.Array, "an array"))
        {
            return [];
        }

        var items = new List<JsonPlace>(_element.GetArrayLength());
        foreach (var item in _element.EnumerateArray())
        {
            items.Add(new JsonPlace(item, $"{Path}[{items.Count}]", _faults));
        }

        return items;
    }

    /// <summary>How many items an array has; 0 for anything else.</summary>
    public int ItemCount => _element.ValueKind == JsonValueKind.Array ? _element.GetArrayLength() : 0;

    public string? Text() => Is(JsonValueKind.String, "a text") ? TextValue() : null;

    public double? Number()
    {
        if (!Is(JsonValueKind.Number, "a number"))
        {
            return null;
        }

        var value = NumberText.Parse(_element.GetRawText());
        if (!double.IsInfinity(value))
        {
            return value;
        }

        _faults.Add(FaultKinds.NotFinite, Path, _element.GetRawText(), ("example", "1.5"));
        return null;
    }

    public bool? Flag()
    {
        if (_element.ValueKind is JsonValueKind.True or JsonValueKind.False)
        {
            return _element.ValueKind == JsonValueKind.True;
        }

        _faults.Add(FaultKinds.WrongType, Path, "", ("expected", "true or false"), ("actual", "something else"));
        return null;
    }

    public int? WholeNumber()
    {
        if (Number() is not double value)
        {
            return null;
        }

        if (value == Math.Floor(value) && Math.Abs(value) <= 1_000_000)
        {
            return (int)value;
        }

        _faults.Add(FaultKinds.WrongType, Path, RawText, ("expected", "a whole number"), ("actual", "another number"));
        return null;
    }

    /// <summary>A quantity: <c>"12.5 mL"</c>, or an object with value, unit and perhaps a standard uncertainty.</summary>
    public Measure? Measure(Dimension dimension)
    {
        if (IsText)
        {
            return TextValue() is { } text ? MeasureReader.Read(text, dimension, Path, _faults) : null;
        }

        if (!IsObject)
        {
            Is(JsonValueKind.String, "a quantity (a text such as \"" + DimensionText.ExampleOf(dimension) + "\", or an object with value and unit)");
            return null;
        }

        var properties = Properties("value", "unit", "standardUncertainty");
        var value = Need(properties, "value")?.Number();
        var unit = Need(properties, "unit")?.Text();
        double? uncertainty = null;
        if (properties.TryGetValue("standardUncertainty", out var place))
        {
            uncertainty = place.Number();
            if (uncertainty is null)
            {
                return null;
            }
        }

        return value is double number && unit is not null
            ? MeasureReader.Read(number, unit, dimension, Path, NumberText.Shortest(number) + " " + unit, _faults, uncertainty)
            : null;
    }

    /// <summary>The dimension that a quantity's unit has, where it can be told.</summary>
    public Dimension? MeasuredDimension()
    {
        if (IsText)
        {
            return TextOf(_element) is { } text ? MeasureReader.DimensionOf(text) : null;
        }

        return Member("unit") is { ValueKind: JsonValueKind.String } unit && TextOf(unit) is { } code ? MeasureReader.DimensionOf(code) : null;
    }

    /// <summary>A property that must be there.</summary>
    public JsonPlace? Need(IReadOnlyDictionary<string, JsonPlace> properties, string name)
    {
        if (properties.TryGetValue(name, out var place))
        {
            return place;
        }

        if (IsObject)
        {
            _faults.Add(FaultKinds.MissingProperty, Path, "", ("property", name));
        }

        return null;
    }

    private string? TextValue()
    {
        var text = TextOf(_element);
        if (text is null)
        {
            _faults.Add(FaultKinds.WrongType, Path, RawText, ("expected", "a text in Unicode"), ("actual", "half a surrogate pair"));
        }

        return text;
    }

    private JsonElement? Member(string name)
    {
        if (!IsObject)
        {
            return null;
        }

        JsonElement? found = null;
        foreach (var property in _element.EnumerateObject().Where(property => NameOf(property) == name))
        {
            found = property.Value;
        }

        return found;
    }

    // Half a surrogate pair is legal JSON and no text; it can stand in a property name as well.
    private static string? TextOf(JsonElement element)
    {
        try
        {
            return element.GetString();
        }
        catch (InvalidOperationException)
        {
            return null;
        }
    }

    private static string? NameOf(JsonProperty property)
    {
        try
        {
            return property.Name;
        }
        catch (InvalidOperationException)
        {
            return null;
        }
    }

    private bool Is(JsonValueKind kind, string expected)
    {
        if (_element.ValueKind == kind)
        {
            return true;
        }

        var actual = _element.ValueKind switch
        {
            JsonValueKind.Object => "an object",
            JsonValueKind.Array => "an array",
            JsonValueKind.String => "a text",
            JsonValueKind.Number => "a number",
            JsonValueKind.Null => "null",
            _ => "true or false",
        };
        _faults.Add(FaultKinds.WrongType, Path, _element.GetRawText(), ("expected", expected), ("actual", actual));
        return false;
    }
}
