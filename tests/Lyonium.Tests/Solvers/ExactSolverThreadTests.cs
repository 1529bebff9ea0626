using System.Linq;
using System.Threading.Tasks;
using Lyonium.Tests.Equilibria;
using Xunit;

namespace Lyonium.Tests.Solvers;

public sealed class ExactSolverThreadTests
{
    // One solver, one model, and mixtures of all sizes in turn on each thread, so that a buffer left behind by one would reach another.
    [Fact]
    public void Solve_on_many_threads_same_double()
    {
        var equilibria = RandomMixtures.Take(500).Select(one => one.ToEquilibrium()).ToArray();
        var alone = equilibria.Select(one => Solving.Exact.Solve(one, Solving.Davies).PH).ToArray();
        var together = new double[8 * equilibria.Length];

        Parallel.For(0, together.Length, new ParallelOptions { MaxDegreeOfParallelism = 8 }, i =>
            together[i] = Solving.Exact.Solve(equilibria[i * 7919 % equilibria.Length], Solving.Davies).PH);

        for (var i = 0; i < together.Length; i++)
        {
            Assert.Equal(alone[i * 7919 % equilibria.Length], together[i]);
        }
    }
}
