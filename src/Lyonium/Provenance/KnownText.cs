using System;

namespace Lyonium.Provenance;

/// <summary>The words for <see cref="Known"/> in tables and records.</summary>
internal static class KnownText
{
    public const string All = "\"read\", \"memory\", \"read+memory\" or \"derived\"";

    public static string Of(Known known) => known switch
    {
        Known.Read => "read",
        Known.Memory => "memory",
        Known.ReadAndMemory => "read+memory",
        Known.Derived => "derived",
        _ => throw new ArgumentOutOfRangeException(nameof(known), known, "Not a way of knowing."),
    };

    public static Known? Find(string text) => text switch
    {
        "read" => Known.Read,
        "memory" => Known.Memory,
        "read+memory" => Known.ReadAndMemory,
        "derived" => Known.Derived,
        _ => null,
    };
}
