using System;
using System.Diagnostics;
using Xunit;

namespace Lyonium.Tests;

/// <summary>Tests that hold work to a time run alone, and take the best of three, since other work shares the machine.</summary>
internal static class Timing
{
    public const string Alone = "timing";

    public static void Within(TimeSpan limit, Action work)
    {
        var best = TimeSpan.MaxValue;
        for (var i = 0; i < 3 && best > limit; i++)
        {
            var watch = Stopwatch.StartNew();
            work();
            best = watch.Elapsed < best ? watch.Elapsed : best;
        }

        Assert.True(best <= limit, $"{best} and not {limit}");
    }
}

/// <summary>Holds the tests that measure time; no other test runs beside them.</summary>
[CollectionDefinition(Timing.Alone, DisableParallelization = true)]
public sealed class TimingDefinition;
