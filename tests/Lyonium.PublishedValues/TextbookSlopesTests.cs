using System;
using System.Globalization;
using Lyonium.Water;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Debye–Hückel slopes on the molality basis against the textbook form; published tables of them stand among the checks that ship with
/// the library.
/// </summary>
public sealed class TextbookSlopesTests(ITestOutputHelper output)
{
    // A = 1.8248e6 (rho / (eps T)^3)^(1/2) and B = 50.29 (rho / (eps T))^(1/2) per angstrom: the textbook forms, R. A. Robinson and
    // R. H. Stokes, Electrolyte Solutions (memory), with the factors of present constants; 0.03 % for factors of four and five figures.
    [Theory]
    [InlineData(273.15)]
    [InlineData(298.15)]
    [InlineData(373.15)]
    public void At_AnyTemperature_AgreesWithTheTextbookForm(double kelvin)
    {
        var density = WaterDensity.KgPerL(kelvin);
        var product = WaterPermittivity.Relative(kelvin, density) * kelvin;
        var slopes = DebyeHuckelSlopes.At(kelvin);
        var a = 1.8248e6 * Math.Sqrt(density / (product * product * product));
        var b = 50.29 * Math.Sqrt(density / product);
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{kelvin} K  A {slopes.A:F5} ({a:F5})  B {slopes.B:F5} ({b:F5})"));
        Assert.InRange(slopes.A / a, 0.9997, 1.0003);
        Assert.InRange(slopes.B / b, 0.9997, 1.0003);
    }
}
