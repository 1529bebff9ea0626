using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Quantities;

namespace Lyonium.Recipes;

/// <summary>An immutable list of what is poured, weighed and made up, at one temperature.</summary>
/// <remarks>
/// Built by <see cref="Named"/> and the builder, or read from JSON. Equal by value: 250 mL equals 0.25 L. Safe to share between threads.
/// </remarks>
public sealed class Recipe : IEquatable<Recipe>
{
    /// <summary>The most parts that a recipe may have.</summary>
    public const int MostParts = 10_000;

    /// <summary>The most levels over which recipes may be poured into each other.</summary>
    public const int MostNesting = 16;

    internal const double DefaultTemperatureK = 298.15;
    internal const double DefaultPreparedAtK = 293.15;

    internal Recipe(
        string? id,
        string? name,
        Measure? temperature,
        Measure? preparedAt,
        IReadOnlyList<Stock> stocks,
        IReadOnlyList<Part> parts,
        Measure? makeUpTo,
        string? notes)
    {
        Id = id;
        Name = name;
        Temperature = temperature;
        PreparedAt = preparedAt;
        Stocks = stocks;
        Parts = parts;
        MakeUpTo = makeUpTo;
        Notes = notes;
        foreach (var part in parts.OfType<RecipePart>())
        {
            Nesting = Math.Max(Nesting, 1 + part.Recipe.Nesting);
        }
    }

    /// <summary>Over how many levels recipes are poured into this one.</summary>
    internal int Nesting { get; }

    /// <summary>The host's id for it; <see langword="null"/> where it has none.</summary>
    public string? Id { get; }

    /// <summary>Its name; <see langword="null"/> where it has none.</summary>
    public string? Name { get; }

    /// <summary>The temperature at which the pH is asked for; <see langword="null"/> where it was not stated (25 °C).</summary>
    public Measure? Temperature { get; }

    /// <summary>The temperature at which volumes are measured; <see langword="null"/> where it was not stated (20 °C).</summary>
    public Measure? PreparedAt { get; }

    /// <summary>The stocks that have a name, in the order in which they were named.</summary>
    public IReadOnlyList<Stock> Stocks { get; }

    /// <summary>What goes in, in order.</summary>
    public IReadOnlyList<Part> Parts { get; }

    /// <summary>The volume or mass that water fills it up to; <see langword="null"/> where it is not made up.</summary>
    public Measure? MakeUpTo { get; }

    /// <summary>The host's own data as JSON text, kept as it was written; <see langword="null"/> where there is none.</summary>
    public string? Notes { get; }

    /// <summary>The temperature at which the pH is asked for, in K.</summary>
    public double TemperatureK => Temperature?.Computed ?? DefaultTemperatureK;

    /// <summary>The temperature at which volumes are measured, in K.</summary>
    public double PreparedAtK => PreparedAt?.Computed ?? DefaultPreparedAtK;

    /// <summary>Starts a recipe.</summary>
    /// <param name="name">Its name.</param>
    /// <returns>A builder.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="name"/> is <see langword="null"/>.</exception>
    public static RecipeBuilder Named(string name) => new(name ?? throw new ArgumentNullException(nameof(name)));

    /// <inheritdoc/>
    public bool Equals(Recipe? other) =>
        other is not null
        && string.Equals(Id, other.Id, StringComparison.Ordinal)
        && string.Equals(Name, other.Name, StringComparison.Ordinal)
        && string.Equals(Notes, other.Notes, StringComparison.Ordinal)
        && Equals(Temperature, other.Temperature)
        && Equals(PreparedAt, other.PreparedAt)
        && Equals(MakeUpTo, other.MakeUpTo)
        && Stocks.SequenceEqual(other.Stocks)
        && Parts.SequenceEqual(other.Parts);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => Equals(obj as Recipe);

    /// <inheritdoc/>
    public override int GetHashCode()
    {
        var hash = StringComparer.Ordinal.GetHashCode(Name ?? "");
        foreach (var part in Parts)
        {
            hash = unchecked((hash * 31) + part.GetHashCode());
        }

        return hash;
    }
}
