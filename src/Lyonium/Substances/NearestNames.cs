using System;
using System.Collections.Generic;
using System.Linq;

namespace Lyonium.Substances;

/// <summary>The names nearest to one that was not found, by the number of letters to change (Levenshtein distance).</summary>
internal static class NearestNames
{
    // Folding shortens a name by a few letters at most.
    private const int Slack = 4;

    // More changes than this make another word.
    private const int Farthest = 8;

    public static IReadOnlyList<string> To(string wanted, IEnumerable<string> names)
    {
        // A name longer than any substance's is no typing error, and must not cost time.
        if (wanted.Length > 80)
        {
            return [];
        }

        var folded = NameFolding.Fold(wanted);
        var farthest = Math.Min(Farthest, Math.Max(2, folded.Length / 3));
        return names
            .SelectMany(name => Spellings(name).Select(spelling => (Name: name, Spelling: spelling)))
            .Where(one => Math.Abs(one.Spelling.Length - folded.Length) <= farthest + Slack)
            .Select(one => (one.Name, Distance: Distance(folded, NameFolding.Fold(one.Spelling), farthest)))
            .Where(one => one.Distance <= farthest)
            .OrderBy(one => one.Distance)
            .ThenBy(one => one.Name, StringComparer.Ordinal)
            .Select(one => one.Name)
            .Distinct(StringComparer.Ordinal)
            .Take(3)
            .ToArray();
    }

    // People leave out what goes without saying: oxalic for oxalic acid.
    private static IEnumerable<string> Spellings(string name)
    {
        const string acid = " acid";
        yield return name;
        if (name.EndsWith(acid, StringComparison.Ordinal))
        {
            yield return name.Substring(0, name.Length - acid.Length);
        }
    }

    // The distance, or some number above the farthest that is looked for.
    private static int Distance(string a, string b, int farthest)
    {
        var above = Enumerable.Range(0, b.Length + 1).ToArray();
        var row = new int[b.Length + 1];
        for (var i = 1; i <= a.Length; i++)
        {
            row[0] = i;
            var least = i;
            for (var j = 1; j <= b.Length; j++)
            {
                var change = above[j - 1] + (a[i - 1] == b[j - 1] ? 0 : 1);
                row[j] = Math.Min(change, 1 + Math.Min(above[j], row[j - 1]));
                least = Math.Min(least, row[j]);
            }

            if (least > farthest)
            {
                return least;
            }

            (above, row) = (row, above);
        }

        return above[b.Length];
    }
}
