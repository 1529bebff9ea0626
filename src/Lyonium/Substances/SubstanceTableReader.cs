using System;
using System.Collections.Generic;
using System.IO;
using Lyonium.Documents;
using Lyonium.Faults;
using Lyonium.Provenance;

namespace Lyonium.Substances;

/// <summary>Reads a table from its JSON, and tells every fault in it.</summary>
internal static class SubstanceTableReader
{
    private const int MostBytes = 4 * 1024 * 1024;
    private const string Resource = "Lyonium.Data.table.json";

    public static SubstanceTable ReadEmbedded()
    {
        using var stream = typeof(SubstanceTableReader).Assembly.GetManifestResourceStream(Resource)
            ?? throw new InvalidOperationException($"The library was built without '{Resource}'.");
        return Read(stream).GetValueOrThrow();
    }

    public static Attempt<SubstanceTable> Read(Stream stream)
    {
        var faults = new FaultList();
        using var copy = new MemoryStream();
        var root = JsonDocumentReader.Open(stream, MostBytes, faults, copy);
        if (root is null || !DocumentFormat.Check(root, "lyonium-table", "1"))
        {
            return faults.Attempt<SubstanceTable>(null);
        }

        var properties = root.Properties("format", "edition", "sources", "elements", "families", "substances");
        var edition = TableText.Read(root, properties, "edition");
        var values = new SourcedValueReader(ReadSources(root.Need(properties, "sources"), faults));
        var weights = ReadElements(root.Need(properties, "elements"), values);
        var families = new FamilyReader(values).Read(root.Need(properties, "families"));
        var substances = new SubstanceReader(values, families, weights).Read(root.Need(properties, "substances"));
        return faults.Any || edition is null
            ? faults.Attempt<SubstanceTable>(null)
            : new Attempt<SubstanceTable>(new SubstanceTable(
                new TableIdentity(edition, Fingerprint.Of(copy.ToArray()), []), values.Sources, weights, families, substances));
    }

    private static IReadOnlyList<JsonPlace> Items(JsonPlace? place) => place?.Items() ?? [];

    private static List<Source> ReadSources(JsonPlace? list, FaultList faults)
    {
        var sources = new List<Source>();
        var keys = new HashSet<string>(StringComparer.Ordinal);
        foreach (var place in Items(list))
        {
            var properties = place.Properties("key", "citation");
            if (TableText.Read(place, properties, "key") is not { } key || TableText.Read(place, properties, "citation") is not { } citation)
            {
                continue;
            }

            if (!keys.Add(key))
            {
                faults.Add(FaultKinds.TableDuplicate, place.Path + ".key", key, ("owner", "another source"));
            }
            else
            {
                sources.Add(new Source(key, citation));
            }
        }

        return sources;
    }

    private static AtomicWeight[] ReadElements(JsonPlace? list, SourcedValueReader values)
    {
        var weights = new List<AtomicWeight>();
        var symbols = new HashSet<string>(StringComparer.Ordinal);
        foreach (var place in Items(list))
        {
            if (ReadElement(place, values) is not { } element)
            {
                continue;
            }

            if (symbols.Add(element.Symbol))
            {
                weights.Add(element);
            }
            else
            {
                place.Faults.Add(FaultKinds.TableDuplicate, place.Path + ".symbol", element.Symbol, ("owner", "another element"));
            }
        }

        return weights.ToArray();
    }

    private static AtomicWeight? ReadElement(JsonPlace place, SourcedValueReader values)
    {
        var properties = place.Properties("symbol", "weight", "uncertainty", "source", "known", "note");
        var symbol = TableText.Read(place, properties, "symbol");
        var weight = values.Finish(place, properties, place.Need(properties, "weight"), "uncertainty");
        if (weight is { Value: <= 0 })
        {
            place.Faults.Add(FaultKinds.TableBadValue, place.Path + ".weight", "", ("detail", "an atomic weight is above zero"));
            return null;
        }

        return symbol is null || weight is null ? null : new AtomicWeight(symbol, weight);
    }
}
