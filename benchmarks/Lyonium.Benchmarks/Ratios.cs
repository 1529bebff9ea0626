using System;
using System.Diagnostics;
using System.Globalization;
using System.Linq;

namespace Lyonium.Benchmarks;

/// <summary>The quick answer: how the methods compare on this machine, in under twenty seconds.</summary>
/// <remarks>The methods take turns, so that a busy moment hits all of them; each figure is the median of its runs.</remarks>
internal static class Ratios
{
    private const int Rounds = 61;
    private const int Solves = 1000;

    public static void Print()
    {
        Console.WriteLine($"{"mixture",-18}{"method",-32}{"µs",8}{"ratio",8}{"bytes",8}  pH");
        foreach (var mixture in BenchmarkCase.All)
        {
            Print(
                mixture.Name,
                ("exact", mixture.Exact),
                ("MathNet Brent", mixture.MathNetBrent),
                ("MathNet RobustNewtonRaphson", mixture.MathNetNewton),
                ("exact, with Davies", mixture.ExactDavies));
        }

        var pair = new PairCase();
        foreach (var model in PairCase.Models)
        {
            Print("one ion pair", ("ladders, " + model.Name, () => pair.Ladders(model)), ("coupled, " + model.Name, () => pair.Coupled(model)));
        }
    }

    private static void Print(string mixture, params (string Name, Func<double> Solve)[] methods)
    {
        var times = methods.Select(_ => new double[Rounds]).ToArray();
        for (var round = -Rounds / 2; round < Rounds; round++)
        {
            for (var i = 0; i < methods.Length; i++)
            {
                // The first rounds are for the compiler.
                times[i][Math.Max(round, 0)] = Time(methods[i].Solve);
            }
        }

        var medians = times.Select(one => one.Order().ElementAt(Rounds / 2)).ToArray();
        for (var i = 0; i < methods.Length; i++)
        {
            Console.WriteLine(string.Create(
                CultureInfo.InvariantCulture,
                $"{mixture,-18}{methods[i].Name,-32}{medians[i],8:F2}{medians[i] / medians[0],8:F1}{Allocated(methods[i].Solve),8}  {methods[i].Solve():F9}"));
        }
    }

    private static double Time(Func<double> solve)
    {
        var start = Stopwatch.GetTimestamp();
        for (var i = 0; i < Solves; i++)
        {
            solve();
        }

        return Stopwatch.GetElapsedTime(start).TotalMicroseconds / Solves;
    }

    private static long Allocated(Func<double> solve)
    {
        var before = GC.GetAllocatedBytesForCurrentThread();
        solve();
        return GC.GetAllocatedBytesForCurrentThread() - before;
    }
}
