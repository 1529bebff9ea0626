using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Qualification;
using Lyonium.Quantities;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// The bars of accuracy with the defaults, stated here apart from the tolerances of the checks that ship with the library, so that neither
/// can be loosened alone. Sources stand with the checks; <c>docs/validation.md</c> shows every row.
/// </summary>
public sealed class AccuracyBarsTests(ITestOutputHelper output)
{
    private static readonly Lazy<QualificationReport> Report = new(() => new Qualifier().Run());

    private static readonly string[] Standards =
        ["tetroxalate", "tartrate", "citrate", "phthalate", "phosphate11", "phosphate135", "acetate", "borax", "carbonate", "tris"];

    // Three-decimal values of the NBS and of IUPAC.
    [Theory]
    [InlineData(25, 25, 0.010, 0.02, 10)]
    [InlineData(0, 50, 0.022, 0.025, 100)]
    public void Standards_agree(double lowCelsius, double highCelsius, double bar, double barOfCarbonateAndTris, int fewest)
    {
        var rows = Report.Value.Outcomes.Where(IsThreeDecimalStandard)
            .Where(one => TemperatureK(one) >= lowCelsius + 273.149 && TemperatureK(one) <= highCelsius + 273.151).ToArray();

        Hold(rows, fewest, one => IsCarbonateOrTris(one) ? barOfCarbonateAndTris : bar);
    }

    [Fact]
    public void HydrochloricAcidPhthalateAndPhosphateSeries_agree() =>
        Hold(
            Report.Value.Outcomes.Where(one => one.Check.Id.StartsWith("bower-bates-1955-", StringComparison.Ordinal)
                && !one.Check.Id.Contains("borate", StringComparison.Ordinal) && one.Check.Tolerance is not null),
            40,
            _ => 0.03);

    // The rows of these series that are not judged, so that none is exempted in silence.
    [Fact]
    public void Series_have_no_other_rows_without_a_tolerance() => Assert.Equal(
        ["bower-bates-1955-phosphate-naoh:11", "bower-bates-1955-phosphate-naoh:12"],
        Report.Value.Outcomes.Where(one => one.Check.Id.StartsWith("bower-bates-1955-", StringComparison.Ordinal)
            && !one.Check.Id.Contains("borate", StringComparison.Ordinal) && one.Check.Tolerance is null).Select(one => one.Check.Id));

    [Fact]
    public void CoefficientsOfKielland_agree() => Hold(Of("ion-activity-coefficient"), 60, _ => 0.007);

    [Theory]
    [InlineData("phthalate")]
    [InlineData("phosphate11")]
    [InlineData("phosphate135")]
    [InlineData("tartrate")]
    [InlineData("carbonate")]
    public void BufferCapacity_agrees(string standard) =>
        Hold(Of("buffer-capacity").Where(one => one.Check.Id.StartsWith($"bates-{standard}-", StringComparison.Ordinal)), 1, one => 0.1 * one.Check.Expected);

    [Theory]
    [InlineData("phthalate")]
    [InlineData("tartrate")]
    public void DilutionValue_agrees(string standard) =>
        Hold(Of("dilution-value").Where(one => one.Check.Id.StartsWith($"bates-{standard}-", StringComparison.Ordinal)), 1, _ => 0.01);

    [Fact]
    public void CheckValuesOfPKw_agree() =>
        Hold(Report.Value.Outcomes.Where(one => one.Check.Id.StartsWith("iapws-r11-24:", StringComparison.Ordinal)), 6, _ => 1e-6);

    private static IEnumerable<CheckOutcome> Of(string quantity) => Report.Value.Outcomes.Where(one => one.Check.Quantity == quantity);

    private static bool IsThreeDecimalStandard(CheckOutcome one) =>
        one.Check.Quantity == "pH"
        && (one.Check.Id.StartsWith("nbs-", StringComparison.Ordinal) || one.Check.Id.StartsWith("iupac-phthalate-", StringComparison.Ordinal))
        && !one.Check.Id.Contains("two-decimals", StringComparison.Ordinal)
        && Standards.Any(standard => one.Check.Id.Contains(standard, StringComparison.Ordinal));

    private static bool IsCarbonateOrTris(CheckOutcome one) =>
        one.Check.Id.Contains("carbonate", StringComparison.Ordinal) || one.Check.Id.Contains("tris", StringComparison.Ordinal);

    private static double TemperatureK(CheckOutcome one) =>
        one.Check.Inputs.Where(input => input.Key == "temperature").Select(input => Measure.Parse(input.Value, Dimension.Temperature).Computed).Single();

    private void Hold(IEnumerable<CheckOutcome> outcomes, int fewest, Func<CheckOutcome, double> bar)
    {
        var all = outcomes.ToArray();
        Assert.True(all.Length >= fewest, $"{all.Length} rows where at least {fewest} are published");
        var worst = all.OrderByDescending(one => Math.Abs(one.Deviation) / bar(one)).First();
        output.WriteLine(FormattableString.Invariant(
            $"{all.Length} rows, worst {worst.Check.Id}: expected {worst.Check.Expected}, obtained {worst.Obtained:F5}, deviation {worst.Deviation:+0.00000;-0.00000}"));
        Assert.All(all, one => Assert.True(
            Math.Abs(one.Deviation) <= bar(one) + 1e-12,
            FormattableString.Invariant($"{one.Check.Id}: expected {one.Check.Expected}, obtained {one.Obtained}")));
    }
}
