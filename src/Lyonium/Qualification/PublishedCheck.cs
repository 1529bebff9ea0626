using System.Collections.Generic;
using Lyonium.Provenance;

namespace Lyonium.Qualification;

/// <summary>A published figure that the library can be held against.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed record PublishedCheck
{
    /// <summary>The id, <c>set:number</c>, such as <c>nbs-phthalate-1962:6</c>.</summary>
    public required string Id { get; init; }

    /// <summary>What the set of checks is about, such as <c>potassium hydrogen phthalate 0.05 mol/kg</c>.</summary>
    public required string Title { get; init; }

    /// <summary>Where the figure was published.</summary>
    public required string Source { get; init; }

    /// <summary>How the figure reached the library.</summary>
    public required Known Known { get; init; }

    /// <summary>What is checked, such as <c>pH</c>; <c>docs/guides/qualification.md</c> lists the words.</summary>
    public required string Quantity { get; init; }

    /// <summary>The unit of the figure as a UCUM code; <c>1</c> for a number.</summary>
    public required string Unit { get; init; }

    /// <summary>What sets this check apart from the others of its set, such as <c>temperature: 25 Cel</c>.</summary>
    public required IReadOnlyList<KeyValuePair<string, string>> Inputs { get; init; }

    /// <summary>The published figure.</summary>
    public required double Expected { get; init; }

    /// <summary>How far from it still holds, in the same unit; <see langword="null"/> where the check is only reported.</summary>
    public double? Tolerance { get; init; }

    /// <summary>Why the tolerance is what it is, or why there is none.</summary>
    public required string Reason { get; init; }

    /// <summary>Whether the figure was never seen in its source: where it agrees, it counts apart.</summary>
    public bool IsFromMemory => Known == Known.Memory;
}
