using System;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Tests.Equilibria;
using Xunit;

namespace Lyonium.Tests.Solvers;

/// <summary>A ready equilibrium is solved without a byte on the heap.</summary>
public sealed class ExactSolverAllocationTests
{
    [Theory]
    [InlineData("ideal", 1)]
    [InlineData("ideal", 64)]
    [InlineData("davies", 1)]
    [InlineData("davies", 64)]
    public void Solve_ready_equilibrium_allocates_nothing(string modelName, int ladders)
    {
        IActivityModel model = modelName == "ideal" ? Solving.Ideal : Solving.Davies;
        var equilibrium = new MixtureInput(
            Enumerable.Range(0, ladders).Select(i => new LadderInput(0.01, i % 3, 2 + (i * 0.1), 7.2 + (i * 0.05))).ToArray()).ToEquilibrium();

        // The pool of buffers fills on the first call, and the compiler may still be at work in a few of the next.
        for (var i = 0; i < 200; i++)
        {
            Solving.Exact.Solve(equilibrium, model);
        }

        var before = GC.GetAllocatedBytesForCurrentThread();
        var outcome = Solving.Exact.Solve(equilibrium, model);
        var allocated = GC.GetAllocatedBytesForCurrentThread() - before;

        Assert.Equal(SolverStatus.Solved, outcome.Status);
        Assert.Equal(0, allocated);
    }
}
