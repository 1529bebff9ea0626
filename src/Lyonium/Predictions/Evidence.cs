using System.Collections.Generic;
using Lyonium.Modelling;
using Lyonium.Provenance;

namespace Lyonium.Predictions;

/// <summary>What a prediction rests on.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed record Evidence
{
    /// <summary>The software that computed it.</summary>
    public required SoftwareIdentity Software { get; init; }

    /// <summary>The table that the constants come from.</summary>
    public required TableIdentity Table { get; init; }

    /// <summary>The constants, at the values at which they were used.</summary>
    public required IReadOnlyList<UsedConstant> Constants { get; init; }

    /// <summary>The pH below the answer at which the charge balance is positive; NaN where the method gives no bracket.</summary>
    public required double BracketLow { get; init; }

    /// <summary>The pH above the answer at which the charge balance is negative; NaN where the method gives no bracket.</summary>
    public required double BracketHigh { get; init; }

    /// <summary>How often the charge balance was evaluated.</summary>
    public required int Evaluations { get; init; }

    /// <summary>The net charge over Σ|z|m at the answer.</summary>
    public required double Residual { get; init; }

    /// <summary>What half a last digit of the inputs, as doubles, moves the pH by; NaN where the method does not say.</summary>
    public required double InputResolution { get; init; }
}
