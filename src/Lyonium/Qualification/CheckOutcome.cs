using System;

namespace Lyonium.Qualification;

/// <summary>A check and what came of it.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed record CheckOutcome
{
    /// <summary>The check.</summary>
    public required PublishedCheck Check { get; init; }

    /// <summary>What this process obtained; NaN where it obtained nothing.</summary>
    public required double Obtained { get; init; }

    /// <summary>The ionic strength of the mixture in mol/kg; <see langword="null"/> where the check has no mixture.</summary>
    public double? IonicStrengthMolPerKg { get; init; }

    /// <summary>Why nothing was obtained; empty where something was.</summary>
    public string Failure { get; init; } = "";

    /// <summary>Obtained less expected.</summary>
    public double Deviation => Obtained - Check.Expected;

    /// <summary>What came of it. Half a last digit of the arithmetic is allowed beyond the tolerance.</summary>
    public CheckVerdict Verdict
    {
        get
        {
            if (double.IsNaN(Obtained))
            {
                return CheckVerdict.Fails;
            }

            const double arithmetic = 1e-12;
            return Check.Tolerance is not double tolerance ? CheckVerdict.Reported
                : Math.Abs(Deviation) <= tolerance + (arithmetic * Math.Abs(Check.Expected)) ? CheckVerdict.Holds
                : CheckVerdict.Fails;
        }
    }

    /// <summary>Whether it holds against a figure that was never seen in its source: the agreement of two memories, less than a proof.</summary>
    public bool AgreesValueNotRead => Verdict == CheckVerdict.Holds && Check.IsFromMemory;
}
