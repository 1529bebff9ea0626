using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using Lyonium.Documents;
using Lyonium.Faults;
using Lyonium.Recipes;

namespace Lyonium.Predictions;

/// <summary>The cautions of the library, as data.</summary>
internal sealed class CautionTable
{
    private const string Resource = "Lyonium.Data.cautions.json";
    private const int MostBytes = 1024 * 1024;

    private static readonly Lazy<CautionTable> BuiltIn = new(ReadEmbedded);

    private readonly string _always;
    private readonly IReadOnlyList<CautionRule> _rules;

    private CautionTable(string always, IReadOnlyList<CautionRule> rules)
    {
        _always = always;
        _rules = rules;
    }

    public static CautionTable Default => BuiltIn.Value;

    /// <summary>The cautions that a mixture calls for; the general one stands last.</summary>
    public IReadOnlyList<Caution> For(Mixture mixture)
    {
        var cautions = _rules.Select(rule => rule.Apply(mixture)).OfType<Caution>().ToList();
        cautions.Add(new Caution("always", [], [], _always, []));
        return cautions.ToArray();
    }

    /// <summary>How the substances of a mixture consume each other otherwise than by proton exchange, as assumptions that do not hold.</summary>
    public IEnumerable<Assumption> ReactionsIn(Mixture mixture) => _rules.Select(rule => rule.ReactionIn(mixture)).OfType<Assumption>();

    private static CautionTable ReadEmbedded()
    {
        using var stream = typeof(CautionTable).Assembly.GetManifestResourceStream(Resource)
            ?? throw new InvalidOperationException($"The library was built without '{Resource}'.");
        var faults = new FaultList();
        using var bytes = new MemoryStream();
        var root = JsonDocumentReader.Open(stream, MostBytes, faults, bytes);
        faults.ThrowIfAny();
        var properties = root!.Properties("format", "edition", "sources", "always", "cautions");
        var table = new CautionTable(root.Need(properties, "always")!.Text()!, root.Need(properties, "cautions")!.Items().Select(ReadRule).ToArray());
        faults.ThrowIfAny();
        return table;
    }

    private static CautionRule ReadRule(JsonPlace place)
    {
        var properties = place.Properties("code", "when", "hazard", "hazardEu", "text", "scope", "reaction", "source", "known", "note");
        var when = place.Need(properties, "when")!.Properties("concentrated", "together", "present", "fromMolPerL", "belowMolPerL");
        string[] groups = when.TryGetValue("together", out var pair)
            ? [.. pair.Items().Select(item => item.Text()!)]
            : [(when.TryGetValue("concentrated", out var strong) ? strong : when["present"]).Text()!];
        return new CautionRule(
            place.Need(properties, "code")!.Text()!,
            groups,
            when.TryGetValue("fromMolPerL", out var from) ? from.Number() : null,
            when.TryGetValue("belowMolPerL", out var below) ? below.Number() : null,
            Texts(properties, "hazard"),
            Texts(properties, "hazardEu"),
            place.Need(properties, "text")!.Text()!,
            properties.ContainsKey("scope") ? place.Need(properties, "reaction")!.Text()! : null);
    }

    private static string[] Texts(IReadOnlyDictionary<string, JsonPlace> properties, string name) =>
        properties.TryGetValue(name, out var place) ? place.Items().Select(item => item.Text()!).ToArray() : [];
}
