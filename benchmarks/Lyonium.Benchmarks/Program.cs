using BenchmarkDotNet.Running;
using Lyonium.Benchmarks;

if (args is ["ratios"])
{
    Ratios.Print();
}
else
{
    BenchmarkSwitcher.FromAssembly(typeof(SolverBenchmarks).Assembly).Run(args);
}
