using System.Collections.Generic;

namespace Lyonium.Substances;

/// <summary>Ion pairs, dimers and polymers that belong together, and to the activity models with which their constants hold.</summary>
/// <remarks>
/// A constant that was derived without a pair contains it already; the pair on top of it counts twice. So pairs come in sets.
/// Immutable; safe to share between threads.
/// </remarks>
public sealed record PairSet
{
    /// <summary>The id, for ever, such as <c>hydroxide-pairs</c>.</summary>
    public required string Id { get; init; }

    /// <summary>What it is, in words.</summary>
    public required string Name { get; init; }

    /// <summary>The names of the activity models that it belongs to.</summary>
    public required IReadOnlyList<string> Models { get; init; }

    /// <summary>Whether a prediction with one of these models has it unless other sets are asked for.</summary>
    public required bool IsDefault { get; init; }

    /// <summary>The species.</summary>
    public required IReadOnlyList<PairedSpecies> Species { get; init; }

    /// <summary>The user's table that it comes from; <see langword="null"/> for the library's own.</summary>
    public string? Layer { get; init; }
}
