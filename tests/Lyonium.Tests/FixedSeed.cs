using System;
using CsCheck;

namespace Lyonium.Tests;

/// <summary>Samples of a generator from a fixed seed: the same cases in every run.</summary>
internal static class FixedSeed
{
    private const ulong Seed = 20_261_201;

    public static void Check<T>(this Gen<T> gen, Action<T> check, int iter)
    {
        var random = new PCG(1, Seed);
        for (var i = 0; i < iter; i++)
        {
            check(gen.Generate(random, null, out _));
        }
    }

    public static void Check<T1, T2>(this Gen<(T1 First, T2 Second)> gen, Action<T1, T2> check, int iter) =>
        gen.Check(one => check(one.First, one.Second), iter);

    public static void Check<T1, T2, T3>(this Gen<(T1 First, T2 Second, T3 Third)> gen, Action<T1, T2, T3> check, int iter) =>
        gen.Check(one => check(one.First, one.Second, one.Third), iter);
}
