using System;
using Lyonium.Faults;

namespace Lyonium.Quantities;

/// <summary>A number with its unit, as it was stated, and its standard uncertainty where one was stated.</summary>
/// <remarks>
/// Two measures are equal when they mean the same: 250 mL equals 0.25 L. Immutable; safe to share between threads.
/// </remarks>
public sealed class Measure : IEquatable<Measure>
{
    private readonly UcumUnit _unit;

    internal Measure(double value, UcumUnit unit, double? standardUncertainty = null)
    {
        // Minus zero is zero, and is not written with a sign.
        Value = value == 0 ? 0 : value;
        _unit = unit;
        StandardUncertainty = standardUncertainty;
        Computed = unit.ToComputed(Value);
    }

    /// <summary>The number, in <see cref="Unit"/>.</summary>
    public double Value { get; }

    /// <summary>The UCUM code of the unit, such as <c>mL</c>.</summary>
    public string Unit => _unit.Code;

    /// <summary>The standard uncertainty of <see cref="Value"/>, in <see cref="Unit"/>; <see langword="null"/> where none was stated.</summary>
    public double? StandardUncertainty { get; }

    /// <summary>What it measures.</summary>
    public Dimension Dimension => _unit.Dimension;

    /// <summary>The number in the unit that the library computes in; <see cref="Quantities.Dimension"/> names it.</summary>
    public double Computed { get; }

    /// <summary>Reads a measure from text: a number with a decimal point, a blank and a UCUM code (<c>"12.5 mL"</c>).</summary>
    /// <param name="text">The text.</param>
    /// <param name="dimension">What it must measure.</param>
    /// <returns>The measure.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="text"/> is <see langword="null"/>.</exception>
    /// <exception cref="LyoniumException">The text is not a finite number and a unit of that dimension.</exception>
    public static Measure Parse(string text, Dimension dimension)
    {
        var faults = new FaultList();
        var measure = MeasureReader.Read(text ?? throw new ArgumentNullException(nameof(text)), dimension, "$", faults);
        faults.ThrowIfAny();
        return measure!;
    }

    /// <inheritdoc/>
    public bool Equals(Measure? other) =>
        other is not null && Dimension == other.Dimension && Computed.Equals(other.Computed) && ComputedUncertainty.Equals(other.ComputedUncertainty);

    /// <inheritdoc/>
    public override bool Equals(object? obj) => Equals(obj as Measure);

    /// <inheritdoc/>
    public override int GetHashCode() => unchecked(((int)Dimension * 397) ^ Computed.GetHashCode());

    /// <summary>The measure as JSON writes it, such as <c>12.5 mL</c>; its uncertainty is not shown.</summary>
    /// <returns>The shortest number that reads back to the same double, a blank and the UCUM code.</returns>
    public override string ToString() => NumberText.Shortest(Value) + " " + Unit;

    private double? ComputedUncertainty => StandardUncertainty is double u ? _unit.DifferenceToComputed(u) : null;
}
