using System;
using System.IO;
using System.Text;
using System.Text.Json;
using Lyonium.Documents;
using Lyonium.Faults;
using Lyonium.Recipes;
using Lyonium.Substances;

namespace Lyonium.Records;

/// <summary>Recipes as JSON (<c>lyonium-recipe/1</c>).</summary>
/// <remarks>Reading refuses what it does not know, and tells every fault with its place. Thread-safe.</remarks>
public static class RecipeJson
{
    /// <summary>The most bytes of UTF-8 text that are read: 4 MiB.</summary>
    public const int MostBytes = 4 * 1024 * 1024;

    internal const string FormatName = "lyonium-recipe";
    internal const string FormatVersion = "1";

    /// <summary>Reads a recipe, with substances of the built-in table.</summary>
    /// <param name="json">The text.</param>
    /// <returns>The recipe.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="json"/> is <see langword="null"/>.</exception>
    /// <exception cref="LyoniumException">The recipe is refused; every fault is listed.</exception>
    public static Recipe Read(string json) => TryRead(json, SubstanceTable.Default).GetValueOrThrow();

    /// <summary>Reads a recipe, or tells every fault as a value.</summary>
    /// <param name="json">The text.</param>
    /// <param name="table">The table whose substances it names.</param>
    /// <returns>The recipe, or every fault.</returns>
    /// <exception cref="ArgumentNullException">A parameter is <see langword="null"/>.</exception>
    public static Attempt<Recipe> TryRead(string json, SubstanceTable table)
    {
        _ = json ?? throw new ArgumentNullException(nameof(json));
        _ = table ?? throw new ArgumentNullException(nameof(table));
        var faults = new FaultList();
        return Read(JsonDocumentReader.Open(json, MostBytes, faults), table, faults);
    }

    /// <summary>Reads a recipe from UTF-8, or tells every fault as a value.</summary>
    /// <param name="json">The stream; at most a little more than <see cref="MostBytes"/> is read, and it is left open.</param>
    /// <param name="table">The table whose substances it names.</param>
    /// <returns>The recipe, or every fault.</returns>
    /// <exception cref="ArgumentNullException">A parameter is <see langword="null"/>.</exception>
    public static Attempt<Recipe> TryRead(Stream json, SubstanceTable table)
    {
        _ = json ?? throw new ArgumentNullException(nameof(json));
        _ = table ?? throw new ArgumentNullException(nameof(table));
        var faults = new FaultList();
        using var bytes = new MemoryStream();
        return Read(JsonDocumentReader.Open(json, MostBytes, faults, bytes), table, faults);
    }

    /// <summary>Writes a recipe, with the ids of its substances.</summary>
    /// <param name="recipe">The recipe.</param>
    /// <returns>The text, indented; reading it gives an equal recipe.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="recipe"/> is <see langword="null"/>.</exception>
    public static string Write(Recipe recipe)
    {
        _ = recipe ?? throw new ArgumentNullException(nameof(recipe));
        using var bytes = new MemoryStream();
        using (var writer = new Utf8JsonWriter(bytes, JsonText.WriterOptions))
        {
            RecipeWriter.Write(writer, recipe);
        }

        return Encoding.UTF8.GetString(bytes.ToArray());
    }

    private static Attempt<Recipe> Read(JsonPlace? root, SubstanceTable table, FaultList faults) =>
        root is not null && DocumentFormat.Check(root, FormatName, FormatVersion)
            ? new RecipeReader(root, table, faults).Read()
            : faults.Attempt<Recipe>(null);
}
