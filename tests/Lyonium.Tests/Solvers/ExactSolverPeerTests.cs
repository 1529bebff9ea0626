using System;
using Lyonium.Tests.Equilibria;
using MathNet.Numerics.RootFinding;
using Xunit;

namespace Lyonium.Tests.Solvers;

/// <summary>A general root finder on a charge balance written out in plain doubles.</summary>
public sealed class ExactSolverPeerTests
{
    private const int Mixtures = 5_000;

    // The peer takes its accuracy in pH for one of the function's value too, and would stop at a small charge.
    private const double Magnified = 1e12;

    // Plain doubles lose what cancels: the peer's zero is known to the rounding of its largest terms over its slope, and no better.
    [Fact]
    public void Solve_random_mixtures_agrees_with_MathNet_Brent_where_plain_doubles_can_tell()
    {
        var compared = 0;
        foreach (var mixture in RandomMixtures.Take(Mixtures))
        {
            var outcome = Solving.Ideally(mixture);
            var can = 1e-12 + (64 * outcome.InputResolution);
            if (can > 1e-6 || !Brent.TryFindRoot(pH => Magnified * ChargeAt(mixture, pH), -3, 17, 1e-14, 200, out var root))
            {
                continue;
            }

            compared++;
            Assert.True(Math.Abs(root - outcome.PH) <= can, $"{root} and {outcome.PH}: {mixture}");
        }

        Assert.True(compared > Mixtures / 2, $"Only {compared} of {Mixtures} could be compared.");
    }

    private static double ChargeAt(MixtureInput mixture, double pH)
    {
        var hydrogen = Math.Pow(10, -pH);
        var charge = hydrogen - (Math.Pow(10, -mixture.PKw) / hydrogen);
        foreach (var ladder in mixture.Ladders)
        {
            double amount = 1, sum = 1, charges = ladder.TopCharge;
            for (var j = 1; j <= ladder.PKa.Length; j++)
            {
                amount *= Math.Pow(10, pH - ladder.PKa[j - 1]);
                sum += amount;
                charges += (ladder.TopCharge - j) * amount;
            }

            charge += ladder.MolPerKg * charges / sum;
        }

        return charge;
    }
}
