using System;
using Lyonium.Equilibria;

namespace Lyonium.Tests.Predictions;

/// <summary>A method of somebody else's that does what a test asks of it.</summary>
internal sealed class FixedMethod(string name, Func<Equilibrium, SolverOutcome> solve) : ISolver
{
    public string Name => name;

    public SolverOutcome Solve(Equilibrium equilibrium, IActivityModel model) => solve(equilibrium);
}
