using System;
using System.Collections.Generic;
using Lyonium.Documents;

namespace Lyonium.Substances;

/// <summary>The versions of <c>lyonium-table</c>, and what the later one has more.</summary>
internal static class TableVersion
{
    public const string FormatName = "lyonium-table";
    public const string First = "1";
    public const string Latest = "1.1";

    /// <summary>The properties of an object of a table; what only the later version has is told with that version.</summary>
    public static IReadOnlyDictionary<string, JsonPlace> Properties(JsonPlace place, string version, string[] first, string[] later) =>
        string.Equals(version, First, StringComparison.Ordinal)
            ? place.Properties(first, later, FormatName + "/" + Latest)
            : place.Properties([.. first, .. later]);
}
