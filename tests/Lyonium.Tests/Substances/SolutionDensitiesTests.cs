using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Substances;

/// <summary>Densities between points, by hand: points at 10 % (1.10), 20 % (1.22) and 40 % (1.43).</summary>
public sealed class SolutionDensitiesTests
{
    private static SolutionDensities Densities => UserTable.Sound().Find("NaOH").Value.SolutionDensities!;

    [Theory]
    [InlineData(0.1, 1.10)]
    [InlineData(0.2, 1.22)]
    [InlineData(0.15, 1.16)]
    [InlineData(0.125, 1.13)]
    [InlineData(0.4, 1.43)]
    public void AtMassFraction_betweenPointsOrOnThem_isOnTheLine(double fraction, double density) =>
        Assert.Equal(density, Densities.AtMassFraction(fraction)!.Value, 1e-12);

    [Theory]
    [InlineData(0)]
    [InlineData(0.05)]
    [InlineData(0.0999)]
    [InlineData(0.3)]
    [InlineData(0.4001)]
    [InlineData(1)]
    [InlineData(double.NaN)]
    public void AtMassFraction_beyondThePointsOrInAWideGap_isNothing(double fraction) =>
        Assert.Null(Densities.AtMassFraction(fraction));

    [Theory]
    [InlineData(0.110, 1.10)]
    [InlineData(0.244, 1.22)]
    [InlineData(0.174, 1.16)] // 0.15 × 1.16
    [InlineData(0.14125, 1.13)] // 0.125 × 1.13
    [InlineData(0.572, 1.43)]
    public void AtMassConcentration_betweenPointsOrOnThem_solvesForTheFraction(double kgPerL, double density) =>
        Assert.Equal(density, Densities.AtMassConcentration(kgPerL)!.Value, 1e-12);

    [Theory]
    [InlineData(0)]
    [InlineData(0.1)]
    [InlineData(0.4)]
    [InlineData(0.6)]
    [InlineData(double.PositiveInfinity)]
    public void AtMassConcentration_beyondThePointsOrInAWideGap_isNothing(double kgPerL) =>
        Assert.Null(Densities.AtMassConcentration(kgPerL));

    [Fact]
    public void Between_keepsTheSourceAndSaysThatItWasReadBetween()
    {
        var between = Densities.AtMassFraction(0.15)!;

        Assert.Equal("own", between.Source.Key);
        Assert.Equal(293.15, between.TemperatureK!.Value, 1e-9);
        Assert.Contains("between", between.Note, System.StringComparison.Ordinal);
        Assert.Empty(Densities.AtMassFraction(0.1)!.Note);
    }
}
