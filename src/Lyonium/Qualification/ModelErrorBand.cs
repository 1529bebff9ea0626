using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Quantities;

namespace Lyonium.Qualification;

/// <summary>The error of an activity model in pH over a band of ionic strength.</summary>
/// <remarks>
/// The root mean square of the deviations: the standard deviation about the published values, not about its own mean. It counts the checks of
/// pH that have a tolerance, from 0 to 50 °C; those that are only reported have chemistry that the model leaves out. Immutable; safe to share between threads.
/// </remarks>
/// <param name="LowMolPerKg">From which ionic strength on, in mol/kg.</param>
/// <param name="HighMolPerKg">Up to which ionic strength, in mol/kg.</param>
/// <param name="Count">How many published values lie in the band.</param>
/// <param name="StandardDeviation">The root mean square deviation, in pH.</param>
public sealed record ModelErrorBand(double LowMolPerKg, double HighMolPerKg, int Count, double StandardDeviation)
{
    /// <summary>Fewer published values than this say nothing of a band.</summary>
    private const int Fewest = 8;

    private const double HighestK = 323.15 + 1e-9;
    private static readonly double[] Ends = [0, 0.03, 0.075, 0.15, 0.5];

    internal static IReadOnlyList<ModelErrorBand> Of(IReadOnlyList<CheckOutcome> outcomes)
    {
        var bands = new List<ModelErrorBand>();
        for (var i = 1; i < Ends.Length; i++)
        {
            var deviations = outcomes.Where(Counts).Where(one => one.IonicStrengthMolPerKg >= Ends[i - 1] && one.IonicStrengthMolPerKg < Ends[i])
                .Select(one => one.Deviation).ToArray();
            if (deviations.Length >= Fewest)
            {
                bands.Add(new ModelErrorBand(Ends[i - 1], Ends[i], deviations.Length, Math.Sqrt(deviations.Sum(one => one * one) / deviations.Length)));
            }
        }

        return bands.ToArray();
    }

    private static bool Counts(CheckOutcome outcome) =>
        string.Equals(outcome.Check.Quantity, "pH", StringComparison.Ordinal)
        && outcome.Check.Tolerance is not null
        && !double.IsNaN(outcome.Obtained)
        && outcome.Check.Inputs.All(input => input.Key != "temperature" || Measure.Parse(input.Value, Dimension.Temperature).Computed <= HighestK);
}
