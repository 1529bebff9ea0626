using System;
using Lyonium.Water;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// The density of water at 101.325 kPa: G. S. Kell, J. Chem. Eng. Data 20 (1975) 97, equation read; its denominator is 16.879850e-3, often
/// misprinted as 16.897850e-3. Its temperatures are of IPTS-68: t68 = 1.00024 t90 (P. M. Saunders 1990, known from memory).
/// </summary>
public sealed class Kell1975Tests(ITestOutputHelper output)
{
    // Kell's water is at most 999.972 kg/m3 dense, water of the standard isotopic composition 999.975 (3e-6, memory); he is at 101.325 kPa
    // and the library at 100 kPa (0.7e-6 by the compressibility of 5e-10 per Pa); SR6-08 states 1e-6 for itself. Together 5e-6.
    private const double Tolerance = 5e-6;

    [Fact]
    public void KgPerL_From0To100Celsius_AgreesWithKellsEquation()
    {
        double worst = 0;
        for (var celsius = 0.0; celsius <= 100; celsius += 2.5)
        {
            var expected = Kell(celsius * 1.00024);
            var obtained = WaterDensity.KgPerL(celsius + 273.15);
            var deviation = (obtained / expected) - 1;
            output.WriteLine(FormattableString.Invariant(
                $"{celsius,5} degC  expected {expected:F7} obtained {obtained:F7} kg/L  relative deviation {deviation:+0.0e+0;-0.0e+0}"));
            worst = Math.Max(worst, Math.Abs(deviation));
        }

        output.WriteLine(FormattableString.Invariant($"worst {worst:0.0e+0}, tolerance {Tolerance:0.0e+0}"));
        Assert.True(worst <= Tolerance, FormattableString.Invariant($"worst relative deviation {worst}"));
    }

    [Fact]
    public void Kell_At25Celsius_IsNotTheMisprint() => Assert.Equal(0.997045, Kell(25), 0.5e-6);

    private static double Kell(double t)
    {
        var numerator = 999.83952 + (t * (16.945176 + (t * (-7.9870401e-3 + (t * (-46.170461e-6 + (t * (105.56302e-9 - (t * 280.54253e-12)))))))));
        return numerator / (1 + (16.879850e-3 * t)) / 1000;
    }
}
