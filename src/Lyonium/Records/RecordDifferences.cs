using System;
using System.Collections.Generic;
using System.Linq;
using System.Text.Json;
using Lyonium.Faults;
using Lyonium.Quantities;

namespace Lyonium.Records;

/// <summary>Compares two records field by field: one that was kept, and one that is written for the same recipe now.</summary>
/// <remarks>
/// A rule is the path of a field without its indices, such as <c>species.molality.value</c>. Where entries have a key, they are told by it.
/// </remarks>
internal sealed class RecordDifferences(ReplayBounds bounds)
{
    // A hostile record may have a million entries of its own.
    private const int Most = 1000;
    private const int LongestText = 200;

    private readonly List<ReplayDifference> _differences = [];

    public IReadOnlyList<ReplayDifference> All => _differences;

    /// <summary>Compares the members of the two roots, without those that are named.</summary>
    public void Compare(JsonElement recorded, JsonElement replayed, params string[] without) =>
        CompareMembers("$", "", recorded, replayed, without);

    private void Compare(string path, string rule, JsonElement recorded, JsonElement replayed)
    {
        if (ReplayBounds.IsOneValue(rule))
        {
            CompareAsOne(path, recorded, replayed);
        }
        else if (recorded.ValueKind != replayed.ValueKind)
        {
            Add(path, recorded, replayed);
        }
        else if (recorded.ValueKind == JsonValueKind.Object)
        {
            CompareMembers(path, rule, recorded, replayed, []);
        }
        else if (recorded.ValueKind == JsonValueKind.Array)
        {
            CompareItems(path, rule, recorded, replayed);
        }
        else if (!IsSame(rule, recorded, replayed))
        {
            Add(path, recorded, replayed);
        }
    }

    private void CompareMembers(string path, string rule, JsonElement recorded, JsonElement replayed, string[] without)
    {
        var own = new Dictionary<string, JsonElement>(StringComparer.Ordinal);
        var extra = new List<(string Path, JsonElement Value)>();
        foreach (var member in recorded.EnumerateObject())
        {
            // Of two members of one name a reader takes either; half a surrogate pair is no name at all.
            if (JsonValues.NameOf(member) is not { } name)
            {
                extra.Add((path, recorded));
            }
            else if (without.Contains(name, StringComparer.Ordinal))
            {
                continue;
            }
            else if (own.ContainsKey(name))
            {
                extra.Add((path + PathStep.Of(name), member.Value));
            }
            else
            {
                own.Add(name, member.Value);
            }
        }

        foreach (var member in replayed.EnumerateObject().Where(member => !without.Contains(member.Name, StringComparer.Ordinal)))
        {
            var below = rule.Length == 0 ? member.Name : rule + "." + member.Name;
            var at = ReplayBounds.ShownPath(below, path, path + PathStep.Of(member.Name));
            if (own.TryGetValue(member.Name, out var value))
            {
                Compare(at, below, value, member.Value);
                own.Remove(member.Name);
            }
            else
            {
                Add(at, null, member.Value);
            }
        }

        foreach (var (at, value) in own.Select(one => (path + PathStep.Of(one.Key), one.Value)).Concat(extra))
        {
            Add(at, value, null);
        }
    }

    private void CompareItems(string path, string rule, JsonElement recorded, JsonElement replayed)
    {
        if (rule == ReplayBounds.Bracket && bounds.IsBracket(recorded))
        {
            return;
        }

        var own = Keyed(rule, recorded);
        var now = Keyed(rule, replayed);
        foreach (var (key, value) in now.Order.Select(key => (key, now.Items[key])))
        {
            if (own.Items.TryGetValue(key, out var other))
            {
                Compare($"{path}[{key.Text}]", rule, other, value);
            }
            else
            {
                Add($"{path}[{key.Text}]", null, value);
            }
        }

        foreach (var key in own.Order.Where(key => !now.Items.ContainsKey(key)))
        {
            Add($"{path}[{key.Text}]", own.Items[key], null);
        }
    }

    // What stands twice is told apart by how often it stood before.
    private static (List<(string Text, int Times)> Order, Dictionary<(string Text, int Times), JsonElement> Items) Keyed(string rule, JsonElement array)
    {
        var order = new List<(string Text, int Times)>();
        var items = new Dictionary<(string Text, int Times), JsonElement>();
        var times = new Dictionary<string, int>(StringComparer.Ordinal);
        foreach (var item in array.EnumerateArray())
        {
            var text = ReplayBounds.KeyOf(rule, item) ?? NumberText.Shortest(order.Count);
            times[text] = times.TryGetValue(text, out var before) ? before + 1 : 0;
            order.Add((text, times[text]));
            items.Add((text, times[text]), item);
        }

        return (order, items);
    }

    private bool IsSame(string rule, JsonElement recorded, JsonElement replayed) => recorded.ValueKind switch
    {
        JsonValueKind.Number => bounds.IsSameNumber(
            rule, NumberText.Parse(recorded.GetRawText()), NumberText.Parse(replayed.GetRawText())),
        JsonValueKind.String => JsonValues.TextOf(recorded) is { } text && bounds.IsSameText(rule, text, JsonValues.TextOf(replayed) ?? ""),
        _ => true,
    };

    private void CompareAsOne(string path, JsonElement recorded, JsonElement replayed)
    {
        if (JsonValues.FirstDifference(path, recorded, replayed) is { } at)
        {
            Add(at.Path, at.Recorded, at.Replayed);
        }
    }

    private void Add(string path, JsonElement? recorded, JsonElement? replayed)
    {
        if (_differences.Count < Most)
        {
            _differences.Add(new ReplayDifference(Cut(path), Shown(recorded), Shown(replayed)));
        }
    }

    private static string Shown(JsonElement? value) => value is { } element
        ? Cut(element.ValueKind == JsonValueKind.Number && !double.IsInfinity(NumberText.Parse(element.GetRawText()))
            ? NumberText.Shortest(NumberText.Parse(element.GetRawText()))
            : JsonValues.TextOf(element) ?? string.Join(" ", element.GetRawText().Split('\n').Select(line => line.Trim())))
        : "";

    private static string Cut(string text) => text.Length <= LongestText ? text : text.Substring(0, LongestText - 1) + "…";
}
