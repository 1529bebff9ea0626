using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Quantities;

namespace Lyonium.Qualification;

/// <summary>The error of an activity model in pH over a band of ionic strength.</summary>
/// <remarks>
/// The root mean square of the deviations about the published values, not about their own mean: a bias is an error too. Each solution counts
/// once, however many tables and temperatures print it: first the mean square over its published values from 0 to 50 °C, then the mean over
/// the solutions. What counts are the pH values that have a tolerance; left out are solutions whose chemistry the model does not have, and
/// series that were recalled and not seen. Immutable; safe to share between threads.
/// </remarks>
/// <param name="LowMolPerKg">From which ionic strength on, in mol/kg.</param>
/// <param name="HighMolPerKg">Up to which ionic strength, in mol/kg.</param>
/// <param name="Solutions">How many solutions of the band have published values.</param>
/// <param name="RootMeanSquareDeviation">The root mean square deviation, in pH.</param>
public sealed record ModelErrorBand(double LowMolPerKg, double HighMolPerKg, int Solutions, double RootMeanSquareDeviation)
{
    /// <summary>Fewer solutions than this say nothing of a band.</summary>
    private const int Fewest = 3;

    private const double HighestK = 323.15 + 1e-9;
    // Below 0.075 mol/kg there are few solutions, and what the constants may be off by does not shrink with the ionic strength: one band.
    private static readonly double[] Ends = [0, 0.075, 0.15, 0.5];

    internal static IReadOnlyList<ModelErrorBand> Of(IReadOnlyList<CheckOutcome> outcomes)
    {
        var solutions = outcomes.Where(Counts).GroupBy(Solution, StringComparer.Ordinal)
            .Select(one => (
                IonicStrength: one.Average(outcome => outcome.IonicStrengthMolPerKg!.Value),
                MeanSquare: one.Average(outcome => outcome.Deviation * outcome.Deviation)))
            .ToArray();
        var bands = new List<ModelErrorBand>();
        for (var i = 1; i < Ends.Length; i++)
        {
            var inBand = solutions.Where(one => one.IonicStrength >= Ends[i - 1] && one.IonicStrength < Ends[i]).ToArray();
            if (inBand.Length >= Fewest)
            {
                bands.Add(new ModelErrorBand(Ends[i - 1], Ends[i], inBand.Length, Math.Sqrt(inBand.Average(one => one.MeanSquare))));
            }
        }

        return bands.ToArray();
    }

    private static string Solution(CheckOutcome outcome) =>
        string.Join("; ", outcome.Check.Inputs.Where(input => input.Key != "temperature").Select(input => input.Key + " " + input.Value).Prepend(outcome.Check.Title));

    private static bool Counts(CheckOutcome outcome) =>
        string.Equals(outcome.Check.Quantity, "pH", StringComparison.Ordinal)
        && outcome.Check.Tolerance is not null
        && !double.IsNaN(outcome.Obtained)
        && outcome.Check.Inputs.All(input => input.Key != "temperature" || Measure.Parse(input.Value, Dimension.Temperature).Computed <= HighestK);
}
