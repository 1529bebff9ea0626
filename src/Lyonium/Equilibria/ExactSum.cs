using System.Runtime.CompilerServices;

namespace Lyonium.Equilibria;

/// <summary>A running sum that keeps what rounding drops, so that 5 mol/kg of charge almost neutralised leaves its true rest.</summary>
/// <remarks>Two-sum after Knuth, and an exact product with a small whole number after Veltkamp and Dekker.</remarks>
internal struct ExactSum
{
    private double _sum;
    private double _rest;

    /// <summary>The sum, rounded once.</summary>
    public readonly double Value => _sum + _rest;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void Add(double value)
    {
        var sum = _sum + value;
        var kept = sum - _sum;
        _rest += (_sum - (sum - kept)) + (value - kept);
        _sum = sum;
    }

    /// <summary>Adds a number times a whole number below 2^26 in magnitude, with no rounding of the product.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public void AddProduct(double value, int factor)
    {
        const double splitter = 134217729; // 2^27 + 1
        var scaled = splitter * value;
        var high = scaled - (scaled - value);
        Add(high * factor);
        Add((value - high) * factor);
    }
}
