using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Faults;
using Lyonium.Quantities;
using Xunit;

namespace Lyonium.Tests.Quantities;

/// <summary>The unit codes of the JSON contract, and what one of each is in the unit that the library computes in.</summary>
public sealed class UcumUnitTests
{
    // typed text, UCUM code written out, dimension, power of ten to the computed unit
    public static TheoryData<string, string, Dimension, int> Codes { get; } = new()
    {
        { "mol/L", "mol/L", Dimension.AmountConcentration, 0 },
        { "mmol/L", "mmol/L", Dimension.AmountConcentration, -3 },
        { "umol/L", "umol/L", Dimension.AmountConcentration, -6 },
        { "M", "mol/L", Dimension.AmountConcentration, 0 },
        { "mM", "mmol/L", Dimension.AmountConcentration, -3 },
        { "\u00b5M", "umol/L", Dimension.AmountConcentration, -6 },
        { "\u03bcM", "umol/L", Dimension.AmountConcentration, -6 },
        { "mol/kg", "mol/kg", Dimension.Molality, 0 },
        { "%", "%", Dimension.MassFraction, -2 },
        { "L", "L", Dimension.Volume, 0 },
        { "mL", "mL", Dimension.Volume, -3 },
        { "uL", "uL", Dimension.Volume, -6 },
        { "\u00b5L", "uL", Dimension.Volume, -6 },
        { "\u03bcL", "uL", Dimension.Volume, -6 },
        { "kg", "kg", Dimension.Mass, 0 },
        { "g", "g", Dimension.Mass, -3 },
        { "mg", "mg", Dimension.Mass, -6 },
        { "ug", "ug", Dimension.Mass, -9 },
        { "mol", "mol", Dimension.Amount, 0 },
        { "mmol", "mmol", Dimension.Amount, -3 },
        { "g/mL", "g/mL", Dimension.Density, 0 },
        { "kg/L", "kg/L", Dimension.Density, 0 },
        { "g/L", "g/L", Dimension.Density, -3 },
        { "K", "K", Dimension.Temperature, 0 },
    };

    [Theory]
    [MemberData(nameof(Codes))]
    public void Parse_eachCode_givesTheNumberInTheComputedUnit(string typed, string code, Dimension dimension, int power)
    {
        foreach (var digits in new[] { "1", "12.5", "250", "0.1", "0.7", "3e2", "7.25E-1", "123456789" })
        {
            var measure = Measure.Parse(digits + " " + typed, dimension);

            var number = digits.Replace("E", "e", StringComparison.Ordinal);
            var (mantissa, exponent) = number.Contains('e', StringComparison.Ordinal)
                ? (number[..number.IndexOf('e', StringComparison.Ordinal)], int.Parse(number[(number.IndexOf('e', StringComparison.Ordinal) + 1)..], CultureInfo.InvariantCulture))
                : (number, 0);
            var shifted = double.Parse(mantissa + "e" + (exponent + power).ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
            Assert.Equal(shifted, measure.Computed);
            Assert.Equal(code, measure.Unit);
            Assert.Equal(dimension, measure.Dimension);
        }
    }

    [Theory]
    [InlineData("0 Cel", 273.15)]
    [InlineData("25 Cel", 298.15)]
    [InlineData("25 °C", 298.15)]
    [InlineData("25 degC", 298.15)]
    [InlineData("100 Cel", 373.15)]
    [InlineData("298.15 K", 298.15)]
    public void Parse_temperature_givesKelvin(string text, double kelvin)
    {
        var measure = Measure.Parse(text, Dimension.Temperature);

        Assert.Equal(kelvin, measure.Computed);
        Assert.Equal(text.EndsWith('K') ? "K" : "Cel", measure.Unit);
    }

    [Theory]
    [InlineData("250 mL", "0.25 L")]
    [InlineData("250000 uL", "0.25 L")]
    [InlineData("0.7 mL", "0.0007 L")]
    [InlineData("0.7 mL", "700 uL")]
    [InlineData("1.1 mL", "1100 µL")]
    [InlineData("2.3 g", "0.0023 kg")]
    public void Equals_whenTheSameInAnotherUnit_isTrue(string one, string other)
    {
        var dimension = one.EndsWith('L') ? Dimension.Volume : Dimension.Mass;
        var (a, b) = (Measure.Parse(one, dimension), Measure.Parse(other, dimension));

        Assert.Equal(a, b);
        Assert.Equal(a.GetHashCode(), b.GetHashCode());
        Assert.Equal(a.Computed, b.Computed);
    }

    [Fact]
    public void Parse_aDecimalInAnyUnit_givesTheSameDouble()
    {
        // Every three-digit number of hundredths: as mL, as L and as uL, written out in decimal, must be one double.
        var different = new List<string>();
        for (var n = 1; n <= 9999; n++)
        {
            var millilitres = (n / 100m).ToString(CultureInfo.InvariantCulture);
            var litres = (n / 100_000m).ToString(CultureInfo.InvariantCulture);
            var microlitres = (n * 10m).ToString(CultureInfo.InvariantCulture);
            var computed = new[] { millilitres + " mL", litres + " L", microlitres + " uL" }
                .Select(text => Measure.Parse(text, Dimension.Volume).Computed).Distinct().Count();
            if (computed != 1)
            {
                different.Add(millilitres);
            }
        }

        Assert.True(different.Count == 0, $"{different.Count} differ, such as {string.Join(", ", different.Take(5))} mL");
    }

    [Fact]
    public void Parse_aTemperatureInEitherUnit_givesTheSameDouble()
    {
        for (var n = 0; n <= 10_000; n++)
        {
            var celsius = (n / 100m).ToString(CultureInfo.InvariantCulture) + " Cel";
            var kelvin = ((n / 100m) + 273.15m).ToString(CultureInfo.InvariantCulture) + " K";
            Assert.Equal(Measure.Parse(kelvin, Dimension.Temperature), Measure.Parse(celsius, Dimension.Temperature));
        }
    }

    [Theory]
    [InlineData("ml", Dimension.Volume)]
    [InlineData("l", Dimension.Volume)]
    [InlineData("ML", Dimension.Volume)]
    [InlineData("Kg", Dimension.Mass)]
    [InlineData("G", Dimension.Mass)]
    [InlineData("Mol", Dimension.Amount)]
    [InlineData("mol/l", Dimension.AmountConcentration)]
    [InlineData("m", Dimension.AmountConcentration)]
    [InlineData("cel", Dimension.Temperature)]
    [InlineData("k", Dimension.Temperature)]
    public void Parse_codeInAnotherCase_isRefused(string code, Dimension dimension)
    {
        var thrown = Assert.Throws<LyoniumException>(() => Measure.Parse("1 " + code, dimension));

        var fault = Assert.Single(thrown.Faults);
        Assert.Equal("LYO0104", fault.Code);
        FaultText.Check(thrown.Faults);
        Assert.Contains("'" + code + "'", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Parse_everyCodeInEveryOtherDimension_namesBothKinds()
    {
        foreach (object?[] row in Codes)
        {
            var (typed, own) = ((string)row[0]!, (Dimension)row[2]!);
            foreach (var other in Enum.GetValues<Dimension>().Where(one => one != own))
            {
                var thrown = Assert.Throws<LyoniumException>(() => Measure.Parse("1 " + typed, other));

                var fault = Assert.Single(thrown.Faults);
                Assert.Equal("LYO0101", fault.Code);
                Assert.NotEqual(fault.Arguments["expected"], fault.Arguments["actual"], StringComparer.Ordinal);
                FaultText.Check(thrown.Faults);
            }
        }
    }
}
