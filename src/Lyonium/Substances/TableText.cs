using System.Collections.Generic;
using Lyonium.Documents;
using Lyonium.Faults;

namespace Lyonium.Substances;

/// <summary>Texts of a table that must be there and say something: names, keys, citations.</summary>
internal static class TableText
{
    public static string? Read(JsonPlace place, IReadOnlyDictionary<string, JsonPlace> properties, string name)
    {
        if (place.Need(properties, name) is not { } textPlace || textPlace.Text() is not { } text)
        {
            return null;
        }

        if (!string.IsNullOrWhiteSpace(text))
        {
            return text;
        }

        place.Faults.Add(FaultKinds.TableBadValue, textPlace.Path, text, ("detail", "it is blank"));
        return null;
    }
}
