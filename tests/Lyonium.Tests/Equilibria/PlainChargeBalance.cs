using System;
using System.Linq;

namespace Lyonium.Tests.Equilibria;

/// <summary>The ideal charge balance as a textbook writes it, Σ z m, in exact fractions.</summary>
internal sealed class PlainChargeBalance
{
    private readonly MixtureInput _mixture;
    private readonly Rational[][] _constants;
    private readonly Rational _ionProduct;

    private PlainChargeBalance(MixtureInput mixture, Func<double, Rational> powerOfTen)
    {
        _mixture = mixture;
        _constants = mixture.Ladders.Select(one => one.PKa.Select(pKa => powerOfTen(-pKa)).ToArray()).ToArray();
        _ionProduct = powerOfTen(-mixture.PKw);
    }

    /// <summary>With the constants that a program has: 10 to the −pKa, rounded to a double.</summary>
    public static PlainChargeBalance WithRoundedConstants(MixtureInput mixture) =>
        new(mixture, exponent => Rational.Exactly(Math.Pow(10, exponent)));

    /// <summary>With 10 to the −pKa to 60 figures: what the doubles that were put in mean.</summary>
    public static PlainChargeBalance WithTrueConstants(MixtureInput mixture) => new(mixture, PowerOfTen.Of);

    public Rational At(Rational hydrogen)
    {
        var charge = hydrogen - (_ionProduct / hydrogen);
        for (var i = 0; i < _constants.Length; i++)
        {
            charge += Rational.Exactly(_mixture.Ladders[i].MolPerKg) * AverageCharge(_mixture.Ladders[i].TopCharge, _constants[i], hydrogen);
        }

        return charge;
    }

    // Of the form that lost j protons there is h^(n − j) K1 … Kj, relative to the others.
    private static Rational AverageCharge(int topCharge, Rational[] constants, Rational hydrogen)
    {
        Rational sum = 0, charge = 0, product = 1;
        for (var j = 0; j <= constants.Length; j++)
        {
            product *= j == 0 ? 1 : constants[j - 1];
            var amount = product;
            for (var kept = j; kept < constants.Length; kept++)
            {
                amount *= hydrogen;
            }

            sum += amount;
            charge += (topCharge - j) * amount;
        }

        return charge / sum;
    }
}
