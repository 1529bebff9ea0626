using System;
using System.Collections.Generic;
using System.Linq;

namespace Lyonium.Tests.Equilibria;

/// <summary>
/// Random mixtures on which short-cuts are at home: single-step acids and bases with pKa at least 2 apart, each with c/K above 400 and
/// K·c above 20 Kw (with Kb for a base). The same index gives the same mixture, wherever it is asked for.
/// </summary>
/// <remarks>
/// One in four is one weak acid or base alone; one in four several acids; one in four several bases; one in four acids and bases with a
/// strong acid or base beside them.
/// </remarks>
internal static class GentleMixtures
{
    public const int Seed = 20260728;

    public static IEnumerable<MixtureInput> Take(int count, int from = 0) => Enumerable.Range(from, count).Select(At);

    public static bool IsSingle(int index) => index % 4 == 0;

    public static MixtureInput At(int index)
    {
        var random = new Random(unchecked(Seed + (index * 7919)));
        var count = IsSingle(index) ? 1 : random.Next(2, 5);
        var ladders = new List<LadderInput>();
        for (var tries = 0; ladders.Count < count; tries++)
        {
            if (tries % 50 == 49)
            {
                ladders.Clear(); // What is there may leave no room for another.
            }

            var one = Protolyte(random, isBase: index % 4 == 1 ? false : index % 4 == 2 || random.Next(2) == 0);
            if (ladders.TrueForAll(other => Math.Abs(one.PKa[0] - other.PKa[0]) >= 2))
            {
                ladders.Add(one);
            }
        }

        if (index % 4 == 3)
        {
            ladders.Add(new LadderInput(Total(random), random.Next(2) == 0 ? -1 : 1));
        }

        return new MixtureInput(ladders);
    }

    // Total and constant are drawn together, so that both limits hold.
    private static LadderInput Protolyte(Random random, bool isBase)
    {
        const double step = 1.0 / (1 << 24);
        var total = Total(random);
        var most = Math.Log10(total / 400);
        var least = Math.Log10(20 / total) - MixtureInput.TextbookPKw;
        var pK = Math.Round(-(least + ((most - least) * random.NextDouble())) / step) * step;
        return isBase ? new LadderInput(total, 1, MixtureInput.TextbookPKw - pK) : new LadderInput(total, 0, pK);
    }

    private static double Total(Random random) => RandomMixtures.LogUniform(random, 1e-4, 1);
}
