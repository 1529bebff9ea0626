using System;

namespace Lyonium.Equilibria;

/// <summary>The one constraint on a component.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public readonly record struct Constraint
{
    private Constraint(ConstraintKind kind, double value)
    {
        Kind = kind;
        Value = value;
    }

    /// <summary>What is held.</summary>
    public ConstraintKind Kind { get; }

    /// <summary>The total in mol/kg, or the log10 of the fixed activity.</summary>
    public double Value { get; }

    /// <summary>The component's total is fixed.</summary>
    /// <param name="molPerKg">The total in mol per kg of water, zero or more.</param>
    /// <returns>The constraint.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The total is negative or not finite.</exception>
    public static Constraint Total(double molPerKg) =>
        molPerKg >= 0 && !double.IsInfinity(molPerKg)
            ? new Constraint(ConstraintKind.Total, molPerKg)
            : throw new ArgumentOutOfRangeException(nameof(molPerKg), molPerKg, "A total is finite and zero or more.");

    /// <summary>The component's activity is fixed, by a gas or a solid outside of the solution; such a component has no charge.</summary>
    /// <param name="log10Activity">The log10 of its activity, molality scale; finite.</param>
    /// <returns>The constraint.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite.</exception>
    public static Constraint FixedActivity(double log10Activity) =>
        double.IsNaN(log10Activity) || double.IsInfinity(log10Activity)
            ? throw new ArgumentOutOfRangeException(nameof(log10Activity), log10Activity, "A fixed activity is finite.")
            : new Constraint(ConstraintKind.FixedActivity, log10Activity);
}
