using System.Collections.Generic;
using Lyonium.Predictions;

namespace Lyonium.Records;

/// <summary>What came of replaying a record.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
/// <param name="IsBitIdentical">Whether the pH is the same double.</param>
/// <param name="IsSameBuild">Whether version, target and processor architecture are those that made the record.</param>
/// <param name="Differences">What differs beyond the bound, is missing or is too much, in the order of the record, the first thousand; empty where everything agrees.</param>
/// <param name="Prediction">The new prediction.</param>
public sealed record ReplayReport(
    bool IsBitIdentical, bool IsSameBuild, IReadOnlyList<ReplayDifference> Differences, Prediction Prediction)
{
    /// <summary>Whether the record agrees, field by field and within the bounds; who made it is told by <see cref="IsSameBuild"/>.</summary>
    public bool Agrees => Differences.Count == 0;
}
