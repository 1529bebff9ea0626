namespace Lyonium.Equilibria;

/// <summary>A method of finding the pH of an equilibrium: a plug-in point.</summary>
/// <remarks>
/// An implementation keeps no state and gives the same answer on every thread. It does not throw on numbers: where it does not apply or
/// does not settle, its outcome says so.
/// </remarks>
public interface ISolver
{
    /// <summary>The name by which records pin the method, such as <c>exact</c>.</summary>
    string Name { get; }

    /// <summary>Finds the pH.</summary>
    /// <param name="equilibrium">The equilibrium.</param>
    /// <param name="model">The model of activity coefficients.</param>
    /// <returns>The pH with what the method can say for it, or the reason why there is none.</returns>
    SolverOutcome Solve(Equilibrium equilibrium, IActivityModel model);
}
