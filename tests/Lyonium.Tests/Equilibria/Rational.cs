using System;
using System.Numerics;

namespace Lyonium.Tests.Equilibria;

/// <summary>An exact fraction; every double is one.</summary>
/// <remarks>Not reduced: only its sign and its order of size are asked for.</remarks>
internal readonly struct Rational(BigInteger numerator, BigInteger denominator)
{
    public BigInteger Numerator { get; } = numerator;

    /// <summary>Above zero.</summary>
    public BigInteger Denominator { get; } = denominator;

    public int Sign => Numerator.Sign;

    public static implicit operator Rational(int value) => new(value, 1);

    public static Rational operator +(Rational a, Rational b)
    {
        // Doubles have denominators that are powers of two; keeping to the larger one keeps long sums short.
        if (a.Denominator.IsPowerOfTwo && b.Denominator.IsPowerOfTwo)
        {
            var shift = (int)(a.Denominator.GetBitLength() - b.Denominator.GetBitLength());
            return shift >= 0
                ? new(a.Numerator + (b.Numerator << shift), a.Denominator)
                : new((a.Numerator << -shift) + b.Numerator, b.Denominator);
        }

        return new((a.Numerator * b.Denominator) + (b.Numerator * a.Denominator), a.Denominator * b.Denominator);
    }

    public static Rational operator -(Rational a, Rational b) => a + (-1 * b);

    public static Rational operator *(Rational a, Rational b) => new(a.Numerator * b.Numerator, a.Denominator * b.Denominator);

    public static Rational operator /(Rational a, Rational b) => b.Sign < 0
        ? new(-a.Numerator * b.Denominator, -(a.Denominator * b.Numerator))
        : new(a.Numerator * b.Denominator, a.Denominator * b.Numerator);

    /// <summary>The number that a double stands for, to the last bit.</summary>
    public static Rational Exactly(double value)
    {
        var bits = BitConverter.DoubleToInt64Bits(value);
        var exponent = (int)((bits >> 52) & 0x7FF);
        var fraction = bits & 0xFFFFFFFFFFFFF;
        BigInteger significand = exponent == 0 ? fraction : fraction | (1L << 52);
        var power = Math.Max(exponent, 1) - 1075;
        significand = bits < 0 ? -significand : significand;
        return power < 0 ? new(significand, BigInteger.One << -power) : new(significand << power, 1);
    }

    public Rational Abs() => new(BigInteger.Abs(Numerator), Denominator);

    /// <summary>Rounds down to a multiple of 2^-bits, which keeps long calculations short.</summary>
    public BigInteger ToFixed(int bits)
    {
        var scaled = Numerator << bits;
        var quotient = BigInteger.DivRem(scaled, Denominator, out var remainder);
        return remainder.Sign < 0 ? quotient - 1 : quotient;
    }
}
