namespace Lyonium.Equilibria;

/// <summary>What holds a component: its total, or its activity.</summary>
public enum ConstraintKind
{
    /// <summary>The component's total is fixed, in mol per kg of water.</summary>
    Total,

    /// <summary>The component's activity is fixed, by a gas or a solid that the solution is in equilibrium with.</summary>
    FixedActivity,
}
