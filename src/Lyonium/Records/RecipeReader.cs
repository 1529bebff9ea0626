using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Documents;
using Lyonium.Faults;
using Lyonium.Quantities;
using Lyonium.Recipes;
using Lyonium.Substances;

namespace Lyonium.Records;

/// <summary>Reads the JSON of a recipe into a draft, which checks it as it checks one written in code.</summary>
internal sealed class RecipeReader(JsonPlace root, SubstanceTable table, FaultList faults)
{
    private readonly RecipeDraft _draft = new(faults, root.Path);
    private readonly Dictionary<string, Stock?> _stocks = new(StringComparer.Ordinal);
    private string? _knownStocks;

    public Attempt<Recipe> Read() => faults.Attempt(ReadInner());

    /// <summary>The recipe, or <see langword="null"/> with its faults told.</summary>
    private Recipe? ReadInner()
    {
        var properties = root.Properties("format", "id", "name", "temperature", "preparedAt", "stocks", "parts", "makeUpTo", "notes");
        _draft.Id = Optional(properties, "id")?.Text();
        _draft.Name = Optional(properties, "name")?.Text();
        _draft.Notes = Optional(properties, "notes")?.RawObject();
        _draft.SetTemperature(Optional(properties, "temperature")?.Measure(Dimension.Temperature));
        _draft.SetPreparedAt(Optional(properties, "preparedAt")?.Measure(Dimension.Temperature));
        ReadStocks(Optional(properties, "stocks"));
        if (!ReadParts(root.Need(properties, "parts")))
        {
            return null;
        }

        if (Optional(properties, "makeUpTo") is { } mark)
        {
            _draft.SetMakeUpTo(mark.Measure(mark.MeasuredDimension() == Dimension.Mass ? Dimension.Mass : Dimension.Volume));
        }

        var attempt = _draft.Build(table);
        return attempt.Success ? attempt.Value : null;
    }

    private static JsonPlace? Optional(IReadOnlyDictionary<string, JsonPlace> properties, string name) =>
        properties.TryGetValue(name, out var place) ? place : null;

    private void ReadStocks(JsonPlace? list)
    {
        if (list is null)
        {
            return;
        }

        foreach (var entry in list.Properties())
        {
            if (string.IsNullOrWhiteSpace(entry.Key))
            {
                faults.Add(FaultKinds.Incomplete, entry.Value.Path, entry.Key, ("missing", "a name for the stock"));
            }

            var properties = entry.Value.Properties("substance", "concentration", "molality", "massFraction", "density");
            var substance = entry.Value.Need(properties, "substance")?.Text();
            var stock = ReadStock(entry.Value, properties, substance, entry.Key);
            _stocks[entry.Key] = stock;
            if (stock is not null)
            {
                _draft.AddStock(stock);
            }
        }
    }

    private Stock? ReadStock(JsonPlace place, IReadOnlyDictionary<string, JsonPlace> properties, string? substance, string? name)
    {
        var strength = ReadStrength(place, properties);
        var density = Optional(properties, "density");
        var densityMeasure = density?.Measure(Dimension.Density);
        if (densityMeasure is not null && !Stock.CheckDensity(densityMeasure, density!.Path, faults))
        {
            return null;
        }

        return strength is null || substance is null || (density is not null && densityMeasure is null)
            ? null
            : Stock.Unchecked(substance, strength, densityMeasure, name);
    }

    private Measure? ReadStrength(JsonPlace place, IReadOnlyDictionary<string, JsonPlace> properties)
    {
        if (One(place, properties, "a strength (concentration, molality or massFraction)", "concentration", "molality", "massFraction") is not { } name)
        {
            return null;
        }

        var strength = properties[name].Measure(name switch
        {
            "concentration" => Dimension.AmountConcentration,
            "molality" => Dimension.Molality,
            _ => Dimension.MassFraction,
        });
        return strength is not null && Stock.CheckStrength(strength, properties[name].Path, faults) ? strength : null;
    }

    private bool ReadParts(JsonPlace? list)
    {
        if (list is null)
        {
            return true;
        }

        if (list.ItemCount > Recipe.MostParts)
        {
            faults.Add(
                FaultKinds.TooManyParts,
                list.Path,
                list.ItemCount.ToString(CultureInfo.InvariantCulture),
                ("limit", Recipe.MostParts.ToString(CultureInfo.InvariantCulture)));
            return false;
        }

        foreach (var place in list.Items())
        {
            ReadPart(place);
        }

        return true;
    }

    private void ReadPart(JsonPlace place)
    {
        var properties = place.Properties(
            "id", "stock", "substance", "recipe", "concentration", "molality", "massFraction", "density", "volume", "mass", "amount", "purity");
        var id = Optional(properties, "id")?.Text();
        var what = One(place, properties, "a stock, a substance or a recipe", "stock", "substance", "recipe");
        if (what == "stock")
        {
            ReadPouredStock(place, properties, id);
        }
        else if (what == "substance" && properties["substance"].Text() is { } substance)
        {
            ReadSubstance(place, properties, substance, id);
        }
        else if (what == "recipe")
        {
            ReadPouredRecipe(place, properties, id);
        }
        else
        {
            _draft.SkipPart();
        }
    }

    private void ReadPouredRecipe(JsonPlace place, IReadOnlyDictionary<string, JsonPlace> properties, string? id)
    {
        Refuse(place, properties, "recipe", "concentration", "molality", "massFraction", "density", "amount", "purity");
        var inner = properties["recipe"];
        var isSound = DocumentFormat.Check(inner, RecipeJson.FormatName, RecipeJson.FormatVersion);
        var taken = properties.ContainsKey("volume") || properties.ContainsKey("mass") ? ReadVolumeOrMass(place, properties) : RecipePart.All;
        _draft.AddRecipe(isSound ? new RecipeReader(inner, table, faults).ReadInner() : null, taken, id);
    }

    private void ReadPouredStock(JsonPlace place, IReadOnlyDictionary<string, JsonPlace> properties, string? id)
    {
        Refuse(place, properties, "stock", "concentration", "molality", "massFraction", "density", "amount", "purity");
        Stock? stock = null;
        if (properties["stock"].Text() is { } name && !_stocks.TryGetValue(name, out stock))
        {
            faults.Add(FaultKinds.UnknownStock, properties["stock"].Path, name, ("known", _knownStocks ??= KnownStocks()));
        }

        _draft.AddSolution(stock, ReadVolumeOrMass(place, properties), id);
    }

    private void ReadSubstance(JsonPlace place, IReadOnlyDictionary<string, JsonPlace> properties, string substance, string? id)
    {
        if (WaterName.Is(substance))
        {
            Refuse(place, properties, "water", "concentration", "molality", "massFraction", "density", "amount", "purity");
            _draft.AddWater(ReadVolumeOrMass(place, properties), id);
        }
        else if (properties.ContainsKey("concentration") || properties.ContainsKey("molality") || properties.ContainsKey("massFraction"))
        {
            Refuse(place, properties, "a strength", "amount", "purity");
            _draft.AddSolution(ReadStock(place, properties, substance, name: null), ReadVolumeOrMass(place, properties), id);
        }
        else if (properties.ContainsKey("volume"))
        {
            faults.Add(
                FaultKinds.Incomplete, place.Path, "", ("missing", "a strength (concentration, molality or massFraction) for the volume, or a mass instead"));
            _draft.SkipPart();
        }
        else
        {
            Refuse(place, properties, "a pure substance", "density");
            var taken = One(place, properties, "a mass or an amount", "mass", "amount");
            if (taken == "amount")
            {
                Refuse(place, properties, "amount", "purity");
            }

            var measure = taken is null ? null : properties[taken].Measure(taken == "mass" ? Dimension.Mass : Dimension.Amount);
            _draft.AddSubstance(substance, measure, Optional(properties, "purity")?.Measure(Dimension.MassFraction), id);
        }
    }

    private string KnownStocks()
    {
        const int most = 20;
        var names = _stocks.Keys.OrderBy(key => key, StringComparer.Ordinal).Take(most);
        return _stocks.Count == 0 ? "none" : string.Join(", ", names) + (_stocks.Count > most ? " …" : "");
    }

    private Measure? ReadVolumeOrMass(JsonPlace place, IReadOnlyDictionary<string, JsonPlace> properties) =>
        One(place, properties, RecipeDraft.VolumeOrMass, "volume", "mass") is { } name
            ? properties[name].Measure(name == "mass" ? Dimension.Mass : Dimension.Volume)
            : null;

    // The one of these properties that is there; none or several is a fault.
    private string? One(JsonPlace place, IReadOnlyDictionary<string, JsonPlace> properties, string what, params string[] names)
    {
        var there = names.Where(properties.ContainsKey).ToArray();
        if (there.Length == 1)
        {
            return there[0];
        }

        if (there.Length > 1)
        {
            faults.Add(FaultKinds.Contradictory, place.Path, string.Join(" and ", there));
        }
        else if (place.IsObject)
        {
            faults.Add(FaultKinds.Incomplete, place.Path, "", ("missing", what));
        }

        return null;
    }

    private void Refuse(JsonPlace place, IReadOnlyDictionary<string, JsonPlace> properties, string beside, params string[] names)
    {
        foreach (var name in names.Where(properties.ContainsKey))
        {
            faults.Add(FaultKinds.Contradictory, place.Path, beside + " and " + name);
        }
    }
}
