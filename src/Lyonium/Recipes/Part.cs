using System;
using Lyonium.Quantities;

namespace Lyonium.Recipes;

/// <summary>One thing that goes into the vessel.</summary>
/// <remarks>Immutable; equal by value; safe to share between threads.</remarks>
public abstract class Part : IEquatable<Part>
{
    private protected Part(Measure taken, string? id)
    {
        Taken = taken;
        Id = id;
    }

    /// <summary>The id of the part in its recipe; <see langword="null"/> where it has none.</summary>
    public string? Id { get; }

    /// <summary>How much is taken: a volume, a mass, an amount of substance, or (of a recipe) the whole as 100 %.</summary>
    public Measure Taken { get; }

    /// <inheritdoc/>
    public bool Equals(Part? other) =>
        other is not null
        && GetType() == other.GetType()
        && string.Equals(Id, other.Id, StringComparison.Ordinal)
        && Taken.Equals(other.Taken)
        && HoldsTheSame(other);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => Equals(obj as Part);

    /// <inheritdoc/>
    public override int GetHashCode() => Taken.GetHashCode();

    private protected abstract bool HoldsTheSame(Part other);
}
