using System;
using System.Collections.Generic;
using System.Linq;

namespace Lyonium.Tests.Equilibria;

/// <summary>Random mixtures for every test of a method: the same seed and index give the same mixture, wherever it is asked for.</summary>
/// <remarks>
/// One in four is made of ladders alone; one in four has an excess of strong acid or base; one in four has spectators of both signs and
/// of charge 2; and one in four is nearly neutralised, so that charges far larger than the answer cancel.
/// </remarks>
internal static class RandomMixtures
{
    public const int Seed = 20260727;

    public static IEnumerable<MixtureInput> Take(int count, int from = 0) => Enumerable.Range(from, count).Select(At);

    public static MixtureInput At(int index)
    {
        var random = new Random(unchecked(Seed + (index * 7919)));
        var ladders = Enumerable.Range(0, random.Next(1, 9)).Select(_ => Ladder(random)).ToList();
        switch (index % 4)
        {
            case 1:
                ladders.Add(new LadderInput(Total(random), Sign(random)));
                break;
            case 2:
                ladders.Add(new LadderInput(Total(random), 1));
                ladders.Add(new LadderInput(Total(random), -1));
                ladders.Add(new LadderInput(Total(random), 2 * Sign(random)));
                break;
            case 3:
                NearlyNeutralise(ladders, random);
                break;
            default:
                break;
        }

        return new MixtureInput(ladders);
    }

    public static double LogUniform(Random random, double low, double high) =>
        low * Math.Exp(random.NextDouble() * Math.Log(high / low));

    private static LadderInput Ladder(Random random)
    {
        // In steps of 2^-24, so that sums and differences of pKa are exact and no check has to allow for their rounding.
        const double step = 1.0 / (1 << 24);
        var pKa = Enumerable.Range(0, random.Next(1, 5))
            .Select(_ => Math.Round((-3 + (17 * random.NextDouble())) / step) * step)
            .Order()
            .ToArray();
        return new LadderInput(Total(random), random.Next(0, 3), pKa);
    }

    // Counter-ions for one form of each ladder, all but a part between one in a hundred and one in 10^16.
    private static void NearlyNeutralise(List<LadderInput> ladders, Random random)
    {
        var charge = ladders.Sum(one => one.MolPerKg * (one.TopCharge - random.Next(0, one.PKa.Length + 1)));
        var off = Sign(random) * Math.Pow(10, -2 - (14 * random.NextDouble()));
        var left = -charge * (1 + off);
        var common = random.Next(2) == 0 ? 0 : Total(random);
        ladders.Add(new LadderInput(Math.Abs(left) + common, left < 0 ? -1 : 1));
        ladders.Add(new LadderInput(common, left < 0 ? 1 : -1));
    }

    private static double Total(Random random) => LogUniform(random, 1e-9, 5);

    private static int Sign(Random random) => random.Next(2) == 0 ? -1 : 1;
}
