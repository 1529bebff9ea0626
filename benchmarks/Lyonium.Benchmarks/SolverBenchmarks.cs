using System.Collections.Generic;
using BenchmarkDotNet.Attributes;

namespace Lyonium.Benchmarks;

/// <summary>One solve of a ready equilibrium; judge ratios and allocations, not nanoseconds.</summary>
[MemoryDiagnoser]
public class SolverBenchmarks
{
    public static IEnumerable<BenchmarkCase> Cases => BenchmarkCase.All;

    [ParamsSource(nameof(Cases))]
    public BenchmarkCase Case { get; set; } = BenchmarkCase.WeakAcidsAndStrong;

    [Benchmark(Baseline = true)]
    public double Exact() => Case.Exact();

    [Benchmark]
    public double ExactDavies() => Case.ExactDavies();

    [Benchmark]
    public double MathNetBrent() => Case.MathNetBrent();

    [Benchmark]
    public double MathNetNewton() => Case.MathNetNewton();
}
