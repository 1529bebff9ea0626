using System;
using System.Numerics;

namespace Lyonium.Tests.Equilibria;

/// <summary>The charge balance with the Davies equation and a self-consistent ionic strength, to 50 figures.</summary>
/// <remarks>Written from log10 γ = −A z² (√I / (1 + √I) − 0.3 I) and γ-corrected laws of mass action; it shares no formula with the library.</remarks>
internal sealed class DaviesInHighPrecision(MixtureInput mixture)
{
    private static readonly BigInteger One = BigInteger.One << PowerOfTen.Bits;
    private static readonly Rational ThreeTenths = Rational.Exactly(0.3);

    /// <summary>The charge at a pH, on the branch of the ionic strength that lies next to a first guess.</summary>
    public Rational ChargeAt(double pH, double ionicStrengthGuess)
    {
        Rational last = Rational.Exactly(ionicStrengthGuess * (1 + 1e-6));
        Rational current = Rational.Exactly(ionicStrengthGuess);
        var lastMiss = At(pH, last).IonicStrength - last;
        for (var round = 0; round < 20; round++)
        {
            var (charge, ionicStrength) = At(pH, current);
            var miss = ionicStrength - current;
            if ((miss.Abs() - new Rational(1, BigInteger.One << 160)).Sign <= 0)
            {
                return charge;
            }

            var next = current - (miss * (current - last) / (miss - lastMiss));
            (last, lastMiss, current) = (current, miss, Shorten(next));
        }

        throw new InvalidOperationException("The ionic strength did not settle in high precision.");
    }

    private static Rational Shorten(Rational value) => new(value.ToFixed(PowerOfTen.Bits), One);

    private static Rational SquareRoot(Rational value)
    {
        // Newton on whole numbers: the root of value · 2^(2 Bits) is the root of value in multiples of 2^-Bits.
        var square = value.ToFixed(2 * PowerOfTen.Bits);
        var root = BigInteger.One << (int)((square.GetBitLength() / 2) + 1);
        for (var next = (root + (square / root)) >> 1; next < root; next = (root + (square / root)) >> 1)
        {
            root = next;
        }

        return new Rational(root, One);
    }

    private (Rational Charge, Rational IonicStrength) At(double pH, Rational ionicStrength)
    {
        var root = SquareRoot(ionicStrength);
        var perSquare = Shorten(-1 * Rational.Exactly(MixtureInput.Slope) * ((root / (1 + root)) - (ThreeTenths * ionicStrength)));
        var exponentH = Rational.Exactly(-pH);
        var hydrogen = PowerOfTen.Of(exponentH - perSquare);
        var hydroxide = PowerOfTen.Of(Rational.Exactly(-mixture.PKw) - exponentH - perSquare);
        var charge = hydrogen - hydroxide;
        var twiceStrength = hydrogen + hydroxide;
        foreach (var ladder in mixture.Ladders)
        {
            // a(H)^n-scaled: m_j ∝ 10^(−ΣpKa + j pH) / γ_j, from the most protonated form on.
            Rational sum = 0, charges = 0, squares = 0, exponent = 0;
            for (var j = 0; j <= ladder.PKa.Length; j++)
            {
                exponent += j == 0 ? 0 : Rational.Exactly(pH) - Rational.Exactly(ladder.PKa[j - 1]);
                var z = ladder.TopCharge - j;
                var amount = PowerOfTen.Of(exponent - (z * z * perSquare));
                sum += amount;
                charges += z * amount;
                squares += z * z * amount;
            }

            var total = Rational.Exactly(ladder.MolPerKg);
            charge += Shorten(total * charges / sum);
            twiceStrength += Shorten(total * squares / sum);
        }

        return (charge, Shorten(twiceStrength / 2));
    }
}
