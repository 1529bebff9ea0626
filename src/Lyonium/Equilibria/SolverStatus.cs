namespace Lyonium.Equilibria;

/// <summary>How a method ended.</summary>
public enum SolverStatus
{
    /// <summary>No outcome: nothing was said. It is no answer.</summary>
    None,

    /// <summary>There is an answer.</summary>
    Solved,

    /// <summary>The method does not solve species over more than one component.</summary>
    CoupledSpecies,

    /// <summary>The method does not solve a component at a fixed activity.</summary>
    FixedActivity,

    /// <summary>The method does not apply to this equilibrium.</summary>
    DoesNotApply,

    /// <summary>The method did not settle on an answer.</summary>
    NotSettled,
}
