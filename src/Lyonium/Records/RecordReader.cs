using System;
using System.Linq;
using System.Text.Json;
using Lyonium.Documents;
using Lyonium.Recipes;
using Lyonium.Substances;

namespace Lyonium.Records;

/// <summary>What a record must say to be replayed; the rest is compared as it stands.</summary>
internal sealed class RecordReader
{
    /// <summary>What <c>lyonium-record/1.1</c> has and <c>lyonium-record/1</c> has not.</summary>
    public static readonly string[] Later = ["pairSets", "buffer", "uncertainty"];

    private static readonly string[] Needed = ["pHydrogenConcentration", "ionicStrength", "water", "species"];

    private static readonly string[] Known =
    [
        "format", "recipe", "pH", "pHydrogenConcentration", "reported", "method", "activityModel", "ionicStrength", "volume", "water",
        "temperature", "species", "assumptions", "iterates", "cautions", "evidence", "notes",
    ];

    private static readonly string[] KnownLater = [.. Known, .. Later];

    private readonly JsonPlace _root;
    private readonly JsonPlace? _recipe;

    public RecordReader(JsonPlace root, string version)
    {
        _root = root;
        IsFirstVersion = string.Equals(version, "1", StringComparison.Ordinal);
        var properties = root.Properties(IsFirstVersion ? Known : KnownLater);
        _recipe = root.Need(properties, "recipe");
        PH = root.Need(properties, "pH")?.Number();
        Method = root.Need(properties, "method")?.Text();
        ActivityModel = root.Need(properties, "activityModel")?.Text();
        PairSets = properties.TryGetValue("pairSets", out var sets) ? sets.Items().Select(one => one.Text()).OfType<string>().ToArray() : [];
        foreach (var name in Needed)
        {
            root.Need(properties, name);
        }

        Build = root.Need(properties, "evidence")?.Find("software") is { } software
            ? string.Join(" ", Text(software, "version"), Text(software, "target"), Text(software, "processArchitecture"))
            : "";
    }

    /// <summary>The record as it is written.</summary>
    public JsonElement Root => _root.Element;

    /// <summary>Whether it is a <c>lyonium-record/1</c>, without <see cref="Later"/>.</summary>
    public bool IsFirstVersion { get; }

    public double? PH { get; }

    public string? Method { get; }

    public string? ActivityModel { get; }

    /// <summary>The sets of ion pairs; a /1 record has none, and none were in use.</summary>
    public string[] PairSets { get; }

    public string Build { get; }

    public Recipe? ReadRecipe(SubstanceTable table)
    {
        if (_recipe is null || !DocumentFormat.Check(_recipe, RecipeJson.FormatName, RecipeJson.FormatVersion))
        {
            return null;
        }

        var attempt = new RecipeReader(_recipe, table, _root.Faults).Read();
        return attempt.Success ? attempt.Value : null;
    }

    private static string? Text(JsonPlace place, string name) => place.Find(name)?.Text();
}
