namespace Lyonium.Provenance;

/// <summary>How a published figure reached the table.</summary>
public enum Known
{
    /// <summary>Seen in the source or in a copy of it.</summary>
    Read,

    /// <summary>Recalled; the published source is named, and the figure was not seen there.</summary>
    Memory,

    /// <summary>Recalled, and seen in the source or in a copy of it.</summary>
    ReadAndMemory,

    /// <summary>Computed from inputs that are named.</summary>
    Derived,
}
