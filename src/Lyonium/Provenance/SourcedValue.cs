using System;

namespace Lyonium.Provenance;

/// <summary>A published number: it cannot be made without its source.</summary>
/// <remarks>The unit is named by the property that holds the value. Immutable; safe to share between threads.</remarks>
public sealed record SourcedValue
{
    /// <summary>Makes a sourced value.</summary>
    /// <param name="value">The number, finite, in the unit of the property that will hold it.</param>
    /// <param name="source">Where it was published.</param>
    /// <param name="known">How it reached the table.</param>
    /// <exception cref="ArgumentNullException"><paramref name="source"/> is <see langword="null"/>.</exception>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="value"/> is not finite.</exception>
    public SourcedValue(double value, Source source, Known known)
    {
        if (double.IsNaN(value) || double.IsInfinity(value))
        {
            throw new ArgumentOutOfRangeException(nameof(value), value, "A published number is finite.");
        }

        Value = value;
        Source = source ?? throw new ArgumentNullException(nameof(source));
        Known = known;
    }

    /// <summary>The number.</summary>
    public double Value { get; }

    /// <summary>Where it was published.</summary>
    public Source Source { get; }

    /// <summary>How it reached the table.</summary>
    public Known Known { get; }

    /// <summary>The published standard uncertainty, in the unit of the value; <see langword="null"/> where none was published.</summary>
    public double? StandardUncertainty { get; init; }

    /// <summary>The temperature at which it holds, in K; <see langword="null"/> where it has none.</summary>
    public double? TemperatureK { get; init; }

    /// <summary>The ionic strength at which it holds, in mol/kg; 0 is infinite dilution.</summary>
    public double IonicStrengthMolPerKg { get; init; }

    /// <summary>What else a reader should know; empty where there is nothing.</summary>
    public string Note { get; init; } = "";

    /// <summary><see cref="Known"/> as tables and records write it: <c>read</c>, <c>memory</c>, <c>read+memory</c> or <c>derived</c>.</summary>
    public string KnownAs => KnownText.Of(Known);

    /// <summary>The conditions in words, such as <c>25 Cel, 0.1 mol/kg</c>; <see langword="null"/> where it has none.</summary>
    public string? Conditions => ConditionsText.Of(this);
}
