using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using Lyonium.Documents;
using Lyonium.Faults;
using Lyonium.Provenance;

namespace Lyonium.Substances;

/// <summary>Reads a table from its JSON, and tells every fault in it.</summary>
internal static class SubstanceTableReader
{
    private const int MostBytes = 4 * 1024 * 1024;
    private const string Resource = "Lyonium.Data.table.json";

    private static readonly string[] Sections = ["format", "edition", "sources", "elements", "families", "substances"];
    private static readonly string[] LaterSections = ["interactions", "pairSets"];

    public static SubstanceTable ReadEmbedded()
    {
        using var stream = typeof(SubstanceTableReader).Assembly.GetManifestResourceStream(Resource)
            ?? throw new InvalidOperationException($"The library was built without '{Resource}'.");
        return Read(stream).GetValueOrThrow();
    }

    public static Attempt<SubstanceTable> Read(Stream stream)
    {
        var faults = new FaultList();
        if (Open(stream, faults) is not var (root, properties, version, edition, sha256))
        {
            return faults.Attempt<SubstanceTable>(null);
        }

        var values = new SourcedValueReader(ReadSources(root.Need(properties, "sources"), faults));
        var weights = ReadElements(root.Need(properties, "elements"), values);
        var families = new FamilyReader(values, version).Read(root.Need(properties, "families"));
        var substances = new SubstanceReader(values, families, weights, new TakenNames()).Read(root.Need(properties, "substances"));
        var pairs = new PairSetReader(values, families);
        var interactions = pairs.ReadInteractions(Optional(properties, "interactions"));
        var sets = pairs.ReadPairSets(Optional(properties, "pairSets"));
        PairSetReader.CheckIds(sets, root);
        return faults.Any || edition is null
            ? faults.Attempt<SubstanceTable>(null)
            : new Attempt<SubstanceTable>(new SubstanceTable(
                new TableIdentity(edition, sha256, []), values.Sources, weights, families, substances, interactions, sets));
    }

    /// <summary>Reads a user's own table and lays it over another: what it has replaces what is below, the rest stays.</summary>
    public static Attempt<SubstanceTable> ReadLayer(Stream stream, string name, SubstanceTable below)
    {
        var faults = new FaultList();
        if (Open(stream, faults) is not var (root, properties, version, edition, sha256))
        {
            return faults.Attempt<SubstanceTable>(null);
        }

        var ownSources = ReadSources(Optional(properties, "sources"), faults);
        var values = new SourcedValueReader(Over(below.Sources, ownSources, source => source.Key));
        var weights = Over(below.AtomicWeights, ReadElements(Optional(properties, "elements"), values), one => one.Symbol);
        var ownFamilies = new FamilyReader(values, version).Read(Optional(properties, "families")).Select(one => one with { Layer = name }).ToArray();
        CheckBases(ownFamilies, below, root);
        var families = Over(below.Families, ownFamilies, one => one.Id);
        var kept = below.Substances.Select(one => one.With(families)).ToArray();
        var ownIds = new HashSet<string>(Ids(Optional(properties, "substances")), StringComparer.Ordinal);
        var names = new TakenNames(kept.Where(one => !ownIds.Contains(one.Id)));
        var own = new SubstanceReader(values, families, weights, names).Read(Optional(properties, "substances")).Select(one => one with { Layer = name }).ToArray();
        var pairs = new PairSetReader(values, families);
        var ownInteractions = pairs.ReadInteractions(Optional(properties, "interactions")).Select(one => one with { Layer = name }).ToArray();
        var ownSets = pairs.ReadPairSets(Optional(properties, "pairSets")).Select(one => one with { Layer = name }).ToArray();
        var allSets = Over(below.PairSets, ownSets, one => one.Id);
        PairSetReader.CheckIds(allSets, root);
        if (faults.Any || edition is null)
        {
            return faults.Attempt<SubstanceTable>(null);
        }

        var layer = new TableLayer(name, edition, sha256);
        var identity = below.Identity with { Layers = [.. below.Identity.Layers, layer] };
        return new Attempt<SubstanceTable>(
            new SubstanceTable(
                identity,
                values.Sources,
                weights,
                families,
                Over(kept, own, one => one.Id),
                Over(below.Interactions, ownInteractions, one => one.Cation + " " + one.Anion),
                allSets));
    }

    private static (JsonPlace Root, IReadOnlyDictionary<string, JsonPlace> Properties, string Version, string? Edition, string Sha256)? Open(
        Stream stream, FaultList faults)
    {
        using var bytes = new MemoryStream();
        var root = JsonDocumentReader.Open(stream, MostBytes, faults, bytes);
        if (root is null || DocumentFormat.VersionOf(root, TableVersion.FormatName, TableVersion.First, TableVersion.Latest) is not { } version)
        {
            return null;
        }

        var properties = TableVersion.Properties(root, version, Sections, LaterSections);
        return (root, properties, version, TableText.Read(root, properties, "edition"), Fingerprint.Of(bytes.ToArray()));
    }

    private static JsonPlace? Optional(IReadOnlyDictionary<string, JsonPlace> properties, string name) =>
        properties.TryGetValue(name, out var place) ? place : null;

    private static IEnumerable<string> Ids(JsonPlace? list) =>
        Items(list).Where(place => place.IsObject).Select(place => place.Find("id")).Where(id => id is { IsText: true }).Select(id => id!.Text()!);

    // What lies above takes the place of what has the same key below; the rest is added at the end.
    private static T[] Over<T>(IReadOnlyList<T> below, IReadOnlyList<T> above, Func<T, string> key)
    {
        var byKey = above.ToDictionary(key, StringComparer.Ordinal);
        var replaced = below.Select(one => byKey.TryGetValue(key(one), out var other) ? other : one).ToArray();
        var there = new HashSet<string>(below.Select(key), StringComparer.Ordinal);
        return [.. replaced, .. above.Where(one => !there.Contains(key(one)))];
    }

    // Substances below bring base forms; a family that replaces another must end in the same one.
    private static void CheckBases(IEnumerable<Family> own, SubstanceTable below, JsonPlace root)
    {
        foreach (var family in own)
        {
            var other = below.Families.FirstOrDefault(one => string.Equals(one.Id, family.Id, StringComparison.Ordinal));
            if (other is not null
                && (other.Base.Charge != family.Base.Charge || !other.Base.Composition.SequenceEqual(family.Base.Composition)))
            {
                root.Faults.Add(
                    FaultKinds.TableChangesBase, root.Path + ".families", family.Base.Text, ("family", family.Id), ("base", other.Base.Text));
            }
        }
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
