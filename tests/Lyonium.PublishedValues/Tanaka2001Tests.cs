using System;
using Lyonium.Water;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// The density of air-free water at 101.325 kPa, 0 to 40 °C, as recommended by the CIPM: M. Tanaka, G. Girard, R. Davis, A. Peuto and
/// N. Bignell, Metrologia 38 (2001) 301; equation known from memory. Its stated uncertainty is at most 0.83e-6 (k = 2).
/// </summary>
public sealed class Tanaka2001Tests(ITestOutputHelper output)
{
    // 0.83e-6 of the equation and 1e-6 that SR6-08 states for itself.
    private const double Tolerance = 1.83e-6;

    [Theory]
    [InlineData(0)]
    [InlineData(4)]
    [InlineData(10)]
    [InlineData(15)]
    [InlineData(20)]
    [InlineData(25)]
    [InlineData(30)]
    [InlineData(40)]
    public void KgPerL_From0To40Celsius_AgreesWithTheEquationOfTheCipm(double celsius)
    {
        var expected = Tanaka(celsius) / 1000;
        var obtained = WaterDensity.KgPerL(celsius + 273.15);
        var deviation = (obtained / expected) - 1;
        output.WriteLine(FormattableString.Invariant(
            $"{celsius,3} degC  expected {expected:F8} obtained {obtained:F8} kg/L  relative deviation {deviation:+0.0e+0;-0.0e+0}"));
        Assert.InRange(deviation, -Tolerance, Tolerance);
    }

    // 1325 Pa more than the library's 0.1 MPa; the compressibility is 5.07e-10 to 4.4e-10 per Pa (the same paper), 4.7e-10 here.
    private static double Tanaka(double t)
    {
        var atOneAtmosphere = 999.974950 * (1 - ((t - 3.983035) * (t - 3.983035) * (t + 301.797) / (522528.9 * (t + 69.34881))));
        return atOneAtmosphere * (1 - (1325 * 4.7e-10));
    }
}
