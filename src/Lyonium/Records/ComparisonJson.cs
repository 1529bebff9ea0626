using System;
using System.Linq;
using System.Text.Json;
using Lyonium.Predictions;

namespace Lyonium.Records;

/// <summary>Comparisons as JSON (<c>lyonium-comparison/1</c>).</summary>
/// <remarks>Thread-safe.</remarks>
public static class ComparisonJson
{
    /// <summary>Writes a comparison.</summary>
    /// <param name="comparison">The comparison.</param>
    /// <returns>The text, indented.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="comparison"/> is <see langword="null"/>.</exception>
    public static string Write(Comparison comparison)
    {
        _ = comparison ?? throw new ArgumentNullException(nameof(comparison));
        var document = new ComparisonDocument(
            "lyonium-comparison/1",
            comparison.Recipe.Id,
            comparison.ActivityModel,
            comparison.Tolerance,
            comparison.Rows.Select(Describe).ToArray());
        return JsonSerializer.Serialize(document, ContractJson.Context.ComparisonDocument);
    }

    private static ComparisonRowEntry Describe(ComparisonRow row) => new(
        row.Method,
        row.PH,
        row.Deviation,
        row.WithinTolerance,
        row.Reason,
        row.Assumptions.Select(EntryOf.Assumption).ToArray(),
        row.Iterates.Select(EntryOf.Iterate).ToArray());
}
