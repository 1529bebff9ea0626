using System.Collections.Generic;
using System.Linq;
using Lyonium.Documents;
using Lyonium.Faults;

namespace Lyonium.Substances;

/// <summary>Ids of families and substances: lower-case letters, digits and hyphens, which no later edition reuses.</summary>
internal static class TableId
{
    public static string? Read(JsonPlace place, IReadOnlyDictionary<string, JsonPlace> properties)
    {
        if (place.Need(properties, "id") is not { } idPlace || idPlace.Text() is not { } id)
        {
            return null;
        }

        if (id.Length is > 0 and <= 80 && id.All(c => c is (>= 'a' and <= 'z') or (>= '0' and <= '9') or '-'))
        {
            return id;
        }

        place.Faults.Add(FaultKinds.TableBadValue, idPlace.Path, id, ("detail", "an id has 1 to 80 lower-case letters, digits and hyphens"));
        return null;
    }
}
