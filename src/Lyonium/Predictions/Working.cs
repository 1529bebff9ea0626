using System.Collections.Generic;
using Lyonium.Equilibria;

namespace Lyonium.Predictions;

/// <summary>What a method did, step by step, so that a person can check it with a pocket calculator.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed record Working
{
    /// <summary>Each dissociation with its mass action.</summary>
    public required IReadOnlyList<WorkedReaction> Reactions { get; init; }

    /// <summary>Starting, change and equilibrium molality of each species.</summary>
    public required IReadOnlyList<WorkedAmount> Amounts { get; init; }

    /// <summary>How the pH was found, in words and symbols.</summary>
    public required string Found { get; init; }

    /// <summary>The molality of the hydrogen ion at the answer, in mol/kg.</summary>
    public required double HydrogenMolPerKg { get; init; }

    /// <summary>The activity coefficient of the hydrogen ion at the answer.</summary>
    public required double HydrogenActivityCoefficient { get; init; }

    /// <summary>The net charge at the answer, in mol/kg: zero for an exact method, what was neglected for a short-cut.</summary>
    public required double ChargeMolPerKg { get; init; }

    /// <summary>The ionic strength at the answer, in mol/kg, at which the constants are taken.</summary>
    public required double IonicStrengthMolPerKg { get; init; }

    /// <summary>The estimates of a method that repeats itself; empty for others.</summary>
    public required IReadOnlyList<Iterate> Iterates { get; init; }

    /// <summary>The steps as plain text.</summary>
    /// <returns>Some lines, each ended by a line feed.</returns>
    public string ToText() => WorkingText.Write(this);
}
