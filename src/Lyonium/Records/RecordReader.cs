using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Documents;
using Lyonium.Recipes;
using Lyonium.Substances;

namespace Lyonium.Records;

/// <summary>The parts of a record that a replay is judged by.</summary>
internal sealed class RecordReader
{
    private static readonly string[] Known =
    [
        "format", "recipe", "pH", "pHydrogenConcentration", "reported", "method", "activityModel", "ionicStrength", "volume", "water",
        "temperature", "species", "assumptions", "iterates", "cautions", "evidence", "notes",
    ];

    private static readonly string[] KnownLater = [.. Known, "pairSets", "buffer", "uncertainty"];

    private readonly JsonPlace _root;
    private readonly JsonPlace? _recipe;

    public RecordReader(JsonPlace root, string version)
    {
        _root = root;
        var properties = root.Properties(string.Equals(version, "1", StringComparison.Ordinal) ? Known : KnownLater);
        _recipe = root.Need(properties, "recipe");
        PH = root.Need(properties, "pH")?.Number();
        PHydrogenConcentration = root.Need(properties, "pHydrogenConcentration")?.Number();
        Method = root.Need(properties, "method")?.Text();
        ActivityModel = root.Need(properties, "activityModel")?.Text();
        PairSets = properties.TryGetValue("pairSets", out var sets) ? sets.Items().Select(one => one.Text()).OfType<string>().ToArray() : [];
        IonicStrength = Number(root.Need(properties, "ionicStrength"));
        Water = Number(root.Need(properties, "water"));
        foreach (var species in root.Need(properties, "species")?.Items() ?? [])
        {
            if (Text(species, "id") is { } id && Number(species.Find("molality")) is double molality)
            {
                Species[id] = molality;
            }
        }

        if (properties.TryGetValue("buffer", out var buffer) && buffer.IsObject)
        {
            BufferCapacity = Number(buffer.Find("capacity"));
            DilutionValue = buffer.Find("dilutionValue") is { IsNull: false } dilution ? dilution.Number() : null;
            TemperatureCoefficient = buffer.Find("temperatureCoefficient") is { IsObject: true } coefficient ? Number(coefficient) : null;
        }

        ReadEvidence(root.Need(properties, "evidence"));
    }

    public double? PH { get; }

    public double? PHydrogenConcentration { get; }

    public string? Method { get; }

    public string? ActivityModel { get; }

    /// <summary>The sets of ion pairs; a /1 record has none, and none were in use.</summary>
    public string[] PairSets { get; }

    public double? IonicStrength { get; }

    public double? Water { get; }

    public double? BufferCapacity { get; }

    public double? DilutionValue { get; }

    public double? TemperatureCoefficient { get; }

    /// <summary>The molality of each species, in mol/kg, by id.</summary>
    public Dictionary<string, double> Species { get; } = new(StringComparer.Ordinal);

    /// <summary>The value of each constant, by id and quantity.</summary>
    public Dictionary<string, double> Constants { get; } = new(StringComparer.Ordinal);

    public string Build { get; private set; } = "";

    public string Edition { get; private set; } = "";

    public string Sha256 { get; private set; } = "";

    public string Layers { get; private set; } = "";

    /// <summary>How a constant is told apart from others.</summary>
    public static string KeyOf(string id, string quantity) => id + " " + quantity;

    public Recipe? ReadRecipe(SubstanceTable table)
    {
        if (_recipe is null || !DocumentFormat.Check(_recipe, RecipeJson.FormatName, RecipeJson.FormatVersion))
        {
            return null;
        }

        var attempt = new RecipeReader(_recipe, table, _root.Faults).Read();
        return attempt.Success ? attempt.Value : null;
    }

    private void ReadEvidence(JsonPlace? evidence)
    {
        if (evidence?.Find("software") is { } software)
        {
            Build = string.Join(" ", Text(software, "version"), Text(software, "target"), Text(software, "processArchitecture"));
        }

        if (evidence?.Find("table") is { } table)
        {
            Edition = Text(table, "edition") ?? "";
            Sha256 = Text(table, "sha256") ?? "";
            Layers = string.Join(", ", (table.Find("layers")?.Items() ?? []).Select(layer => Text(layer, "name") + " " + Text(layer, "sha256")));
        }

        foreach (var constant in evidence?.Find("constants")?.Items() ?? [])
        {
            if (Text(constant, "id") is { } id && Text(constant, "quantity") is { } quantity && constant.Find("value")?.Number() is double value)
            {
                Constants[KeyOf(id, quantity)] = value;
            }
        }
    }

    private static string? Text(JsonPlace place, string name) => place.Find(name)?.Text();

    private static double? Number(JsonPlace? withUnit) => withUnit?.Find("value")?.Number();
}
