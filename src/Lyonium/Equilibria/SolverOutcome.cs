using System;
using System.Collections.Generic;

namespace Lyonium.Equilibria;

/// <summary>What a solver hands back, in numbers.</summary>
/// <remarks>The default value is no outcome, and so no answer. Immutable; safe to share between threads.</remarks>
public readonly record struct SolverOutcome
{
    /// <summary>How the method ended.</summary>
    public SolverStatus Status { get; init; }

    /// <summary>Why there is no answer, in a sentence; <see langword="null"/> where there is one.</summary>
    public string? Reason { get; init; }

    /// <summary>−log10 of the hydrogen-ion activity, molality scale; NaN where there is no answer.</summary>
    public double PH { get; init; }

    /// <summary>
    /// The lower end of the bracket: a pH at which the full charge balance is positive. NaN where the method gives no bracket.
    /// </summary>
    public double BracketLow { get; init; }

    /// <summary>The upper end of the bracket: a pH at which the full charge balance is negative. NaN where there is no bracket.</summary>
    public double BracketHigh { get; init; }

    /// <summary>How often the charge balance was evaluated.</summary>
    public int Evaluations { get; init; }

    /// <summary>What half a last digit of the totals, as doubles, moves the pH by; NaN where the method does not say.</summary>
    public double InputResolution { get; init; }

    /// <summary>What the method took for granted; empty for an exact one.</summary>
    public IReadOnlyList<SolverAssumption> Assumptions
    {
        get => field ?? [];
        init;
    }

    /// <summary>The formula that the method used, in words and symbols; <see langword="null"/> where it solves the whole balance.</summary>
    public string? Formula { get; init; }

    /// <summary>The estimates of a method that repeats itself; empty for others.</summary>
    public IReadOnlyList<Iterate> Iterates
    {
        get => field ?? [];
        init;
    }

    /// <summary>An answer without a bracket.</summary>
    /// <param name="pH">−log10 of the hydrogen-ion activity, molality scale.</param>
    /// <returns>The outcome; say what was taken for granted with <c>with</c>.</returns>
    public static SolverOutcome Answer(double pH) => new()
    {
        Status = SolverStatus.Solved,
        PH = pH,
        BracketLow = double.NaN,
        BracketHigh = double.NaN,
        InputResolution = double.NaN,
    };

    /// <summary>An outcome without an answer.</summary>
    /// <param name="status">How the method ended; not <see cref="SolverStatus.Solved"/>.</param>
    /// <param name="reason">Why there is no answer, in a sentence.</param>
    /// <param name="evaluations">How often the charge balance was evaluated.</param>
    /// <returns>The outcome.</returns>
    /// <exception cref="ArgumentException"><paramref name="status"/> is <see cref="SolverStatus.Solved"/>.</exception>
    public static SolverOutcome Without(SolverStatus status, string reason, int evaluations = 0) =>
        status == SolverStatus.Solved
            ? throw new ArgumentException("A solved outcome has an answer.", nameof(status))
            : new SolverOutcome
            {
                Status = status,
                Reason = reason ?? throw new ArgumentNullException(nameof(reason)),
                PH = double.NaN,
                BracketLow = double.NaN,
                BracketHigh = double.NaN,
                InputResolution = double.NaN,
                Evaluations = evaluations,
            };
}
