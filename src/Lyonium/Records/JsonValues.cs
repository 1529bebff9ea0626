using System;
using System.Collections.Generic;
using System.Linq;
using System.Text.Json;
using Lyonium.Faults;

namespace Lyonium.Records;

/// <summary>JSON values, compared as values: blanks, the order of members and the way a number is written do not count.</summary>
internal static class JsonValues
{
    /// <summary>The text of a string; <see langword="null"/> for anything else, and for half a surrogate pair.</summary>
    public static string? TextOf(JsonElement element)
    {
        try
        {
            return element.ValueKind == JsonValueKind.String ? element.GetString() : null;
        }
        catch (InvalidOperationException)
        {
            return null;
        }
    }

    /// <summary>The name of a member; <see langword="null"/> for half a surrogate pair.</summary>
    public static string? NameOf(JsonProperty member)
    {
        try
        {
            return member.Name;
        }
        catch (InvalidOperationException)
        {
            return null;
        }
    }

    /// <summary>The text of a member of an object, where it has one.</summary>
    public static string? MemberText(JsonElement element, string name)
    {
        if (element.ValueKind != JsonValueKind.Object)
        {
            return null;
        }

        var member = element.EnumerateObject().FirstOrDefault(one => NameOf(one) == name).Value;
        return TextOf(member);
    }

    /// <summary>Where two values differ first; <see langword="null"/> where they are the same.</summary>
    public static (string Path, JsonElement? Recorded, JsonElement? Replayed)? FirstDifference(string path, JsonElement recorded, JsonElement replayed)
    {
        if (recorded.ValueKind != replayed.ValueKind)
        {
            return (path, recorded, replayed);
        }

        var isSame = recorded.ValueKind switch
        {
            JsonValueKind.String => TextOf(recorded) is { } text
                ? string.Equals(text, TextOf(replayed), StringComparison.Ordinal)
                : string.Equals(recorded.GetRawText(), replayed.GetRawText(), StringComparison.Ordinal),
            JsonValueKind.Number => string.Equals(Digits(recorded.GetRawText()), Digits(replayed.GetRawText()), StringComparison.Ordinal),
            _ => true,
        };
        return !isSame ? (path, recorded, replayed)
            : recorded.ValueKind == JsonValueKind.Object ? FirstInObject(path, recorded, replayed)
            : recorded.ValueKind == JsonValueKind.Array ? FirstInArray(path, recorded, replayed)
            : null;
    }

    private static (string Path, JsonElement? Recorded, JsonElement? Replayed)? FirstInArray(string path, JsonElement recorded, JsonElement replayed)
    {
        if (recorded.GetArrayLength() != replayed.GetArrayLength())
        {
            return (path, recorded, replayed);
        }

        var at = 0;
        foreach (var (one, other) in recorded.EnumerateArray().Zip(replayed.EnumerateArray(), (one, other) => (one, other)))
        {
            if (FirstDifference($"{path}[{at}]", one, other) is { } difference)
            {
                return difference;
            }

            at++;
        }

        return null;
    }

    private static (string Path, JsonElement? Recorded, JsonElement? Replayed)? FirstInObject(string path, JsonElement recorded, JsonElement replayed)
    {
        var own = Members(recorded);
        var now = Members(replayed);
        if (own is null || now is null)
        {
            // A name stands twice or is none: such objects are the same only as they are written.
            return string.Equals(recorded.GetRawText(), replayed.GetRawText(), StringComparison.Ordinal) ? null : (path, recorded, replayed);
        }

        foreach (var one in now)
        {
            var at = path + PathStep.Of(one.Key);
            if (!own.TryGetValue(one.Key, out var other))
            {
                return (at, null, one.Value);
            }

            if (FirstDifference(at, other, one.Value) is { } difference)
            {
                return difference;
            }
        }

        var extra = own.Where(one => !now.ContainsKey(one.Key)).Take(1).ToArray();
        return extra.Length == 0 ? null : (path + PathStep.Of(extra[0].Key), extra[0].Value, null);
    }

    private static Dictionary<string, JsonElement>? Members(JsonElement element)
    {
        var members = new Dictionary<string, JsonElement>(StringComparer.Ordinal);
        foreach (var member in element.EnumerateObject())
        {
            if (NameOf(member) is not { } name || members.ContainsKey(name))
            {
                return null;
            }

            members.Add(name, member.Value);
        }

        return members;
    }

    // Digits and the power of ten of the last one, so that 1.50, 1.5 and 15e-1 are one number and no digit is lost to a double.
    private static string Digits(string number)
    {
        var exponentAt = number.IndexOfAny(['e', 'E']);
        var figures = exponentAt < 0 ? number : number.Substring(0, exponentAt);
        if (!long.TryParse(
            exponentAt < 0 ? "0" : number.Substring(exponentAt + 1),
            System.Globalization.NumberStyles.AllowLeadingSign,
            System.Globalization.CultureInfo.InvariantCulture,
            out var power))
        {
            return number;
        }

        var isNegative = figures[0] == '-';
        figures = figures.TrimStart('-');
        var point = figures.IndexOf('.');
        if (point >= 0)
        {
            power -= figures.Length - point - 1;
            figures = figures.Remove(point, 1);
        }

        figures = figures.TrimStart('0');
        var trimmed = figures.TrimEnd('0');
        power += figures.Length - trimmed.Length;
        return trimmed.Length == 0 ? "0" : FormattableString.Invariant($"{(isNegative ? "-" : "")}{trimmed}e{power}");
    }
}
