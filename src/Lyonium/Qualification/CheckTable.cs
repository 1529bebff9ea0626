using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using System.Text.Json;
using Lyonium.Provenance;
using Lyonium.Quantities;

namespace Lyonium.Qualification;

/// <summary>The published checks that ship with the library, in the order of their files and rows.</summary>
internal static class CheckTable
{
    private const string Folder = "Lyonium.Data.checks.";

    private static readonly Lazy<IReadOnlyList<RunnableCheck>> BuiltIn = new(() => ReadEmbedded());

    public static IReadOnlyList<RunnableCheck> All => BuiltIn.Value;

    private static RunnableCheck[] ReadEmbedded()
    {
        var assembly = typeof(CheckTable).Assembly;
        return assembly.GetManifestResourceNames()
            .Where(name => name.StartsWith(Folder, StringComparison.Ordinal))
            .OrderBy(name => name, StringComparer.Ordinal)
            .SelectMany(name =>
            {
                using var stream = assembly.GetManifestResourceStream(name)!;
                return Read(stream);
            })
            .ToArray();
    }

    private static RunnableCheck[] Read(Stream stream)
    {
        var file = JsonSerializer.Deserialize(stream, CheckFileContext.Default.CheckFileDocument)!;
        return file.Sets.SelectMany(set => set.Rows.Select((row, index) => Of(set, row, index + 1))).ToArray();
    }

    private static RunnableCheck Of(CheckSetDocument set, CheckRowDocument row, int number)
    {
        var quantity = CheckedQuantity.Find(set.Quantity);
        var inputs = (set.At ?? new Dictionary<string, string>(StringComparer.Ordinal)).Concat(row.At ?? new Dictionary<string, string>(StringComparer.Ordinal))
            .ToArray();
        var check = new PublishedCheck
        {
            Id = set.Id + ":" + NumberText.Shortest(number),
            Title = set.Title,
            Source = set.Source,
            Known = KnownText.Find(row.Known ?? set.Known) ?? throw new InvalidDataException($"{set.Id}: '{row.Known ?? set.Known}' is no way of knowing."),
            Quantity = quantity.Name,
            Unit = quantity.Unit,
            Inputs = inputs,
            Expected = row.Expected,
            Tolerance = row.Caution is null ? row.Tolerance ?? set.Tolerance : null,
            Reason = row.Caution ?? row.Reason ?? set.Reason,
        };
        return new RunnableCheck(check, quantity, set.Recipe);
    }
}
