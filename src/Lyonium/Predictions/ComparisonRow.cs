using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Faults;

namespace Lyonium.Predictions;

/// <summary>One method of a comparison.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed record ComparisonRow
{
    /// <summary>The name of the method.</summary>
    public required string Method { get; init; }

    /// <summary>The pH; <see langword="null"/> where the method gives none.</summary>
    public double? PH { get; init; }

    /// <summary>The pH less the exact one; <see langword="null"/> where the method gives none.</summary>
    public double? Deviation { get; init; }

    /// <summary>Whether the deviation is within the tolerance; <see langword="null"/> where the method gives no answer.</summary>
    public bool? WithinTolerance { get; init; }

    /// <summary>Why the method gives no answer; <see langword="null"/> where it gives one.</summary>
    public string? Reason { get; init; }

    /// <summary>The formula of a short-cut.</summary>
    public string? Formula { get; init; }

    /// <summary>What the method took for granted; empty where it gives no answer.</summary>
    public IReadOnlyList<Assumption> Assumptions { get; init; } = [];

    /// <summary>The estimates of a method that repeats itself, also of one that did not settle.</summary>
    public IReadOnlyList<Iterate> Iterates { get; init; } = [];

    internal static ComparisonRow Of(string method, Attempt<Prediction> attempt, Prediction exact, double tolerance)
    {
        if (!attempt.Success)
        {
            var fault = attempt.Faults[0];
            return new ComparisonRow
            {
                Method = method,
                Reason = fault.Found,
                Iterates = fault.Iterates.Select(one => new Iterate(one.PH, one.Correction)).ToArray(),
            };
        }

        var deviation = attempt.Value.PH - exact.PH;
        return new ComparisonRow
        {
            Method = method,
            PH = attempt.Value.PH,
            Deviation = deviation,
            WithinTolerance = Math.Abs(deviation) <= tolerance,
            Formula = attempt.Value.Formula,
            Assumptions = attempt.Value.Assumptions,
            Iterates = attempt.Value.Iterates,
        };
    }
}
