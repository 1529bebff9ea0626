using System.Numerics;

namespace Lyonium.Tests.Equilibria;

/// <summary>Powers of ten to 60 figures, so that a check does not share the library's rounding of them.</summary>
internal static class PowerOfTen
{
    /// <summary>Numbers are kept as multiples of 2^-Bits.</summary>
    public const int Bits = 256;

    private const int ExtraBits = 256;
    private const int Halvings = 10;

    private static readonly BigInteger One = BigInteger.One << Bits;

    // ln 10 = 3 ln 2 + ln 1.25 = 6 artanh(1/3) + 2 artanh(1/9)
    private static readonly BigInteger NaturalLogOfTen = (6 * InverseHyperbolicTangent(3)) + (2 * InverseHyperbolicTangent(9));

    public static Rational Of(double exponent) => Of(Rational.Exactly(exponent));

    public static Rational Of(Rational exponent)
    {
        var fixedPoint = exponent.ToFixed(Bits);
        var whole = (int)(fixedPoint >> Bits);
        var fraction = Exponential((fixedPoint - (whole * One)) * NaturalLogOfTen >> Bits);
        return whole >= 0
            ? new Rational(fraction * BigInteger.Pow(10, whole), One)
            : new Rational((fraction << ExtraBits) / BigInteger.Pow(10, -whole), One << ExtraBits);
    }

    private static BigInteger Exponential(BigInteger value)
    {
        var small = value >> Halvings;
        var sum = One;
        var term = One;
        for (var n = 1; !term.IsZero; n++)
        {
            term = (term * small >> Bits) / n;
            sum += term;
        }

        for (var i = 0; i < Halvings; i++)
        {
            sum = sum * sum >> Bits;
        }

        return sum;
    }

    private static BigInteger InverseHyperbolicTangent(int inverse)
    {
        var power = One / inverse;
        var sum = power;
        for (var n = 3; !power.IsZero; n += 2)
        {
            power /= inverse * inverse;
            sum += power / n;
        }

        return sum;
    }
}
