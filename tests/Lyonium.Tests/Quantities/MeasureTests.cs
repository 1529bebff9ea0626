using System;
using System.Globalization;
using CsCheck;
using Lyonium.Faults;
using Lyonium.Quantities;
using Xunit;

namespace Lyonium.Tests.Quantities;

public sealed class MeasureTests
{
    [Theory]
    [InlineData("", "LYO0102")]
    [InlineData(" ", "LYO0102")]
    [InlineData("mL", "LYO0102")]
    [InlineData("12.5", "LYO0102")]
    [InlineData("12.5mL", "LYO0102")]
    [InlineData("1 2 mL", "LYO0102")]
    [InlineData("one mL", "LYO0102")]
    [InlineData("1.2.3 mL", "LYO0102")]
    [InlineData("0x10 mL", "LYO0102")]
    [InlineData("1e mL", "LYO0102")]
    [InlineData("1e+ mL", "LYO0102")]
    [InlineData("e5 mL", "LYO0102")]
    [InlineData(". mL", "LYO0102")]
    [InlineData("- mL", "LYO0102")]
    [InlineData("--1 mL", "LYO0102")]
    [InlineData("(1) mL", "LYO0102")]
    [InlineData("1_000 mL", "LYO0102")]
    [InlineData("١٢ mL", "LYO0102")]
    [InlineData("−5 mL", "LYO0102")]
    [InlineData("12.5\u00a0mL", "LYO0102")]
    [InlineData("12,5 mL", "LYO0103")]
    [InlineData("1,000 mL", "LYO0103")]
    [InlineData("1,000.5 mL", "LYO0103")]
    [InlineData("1 pint", "LYO0104")]
    [InlineData("1 {unit}", "LYO0104")]
    [InlineData("1 g", "LYO0101")]
    [InlineData("1 mol/L", "LYO0101")]
    [InlineData("-1 mL", "LYO0105")]
    [InlineData("-1e-300 mL", "LYO0105")]
    [InlineData("-1e999 mL", "LYO0107")]
    [InlineData("NaN mL", "LYO0107")]
    [InlineData("nan mL", "LYO0107")]
    [InlineData("Infinity mL", "LYO0107")]
    [InlineData("-inf mL", "LYO0107")]
    [InlineData("∞ mL", "LYO0107")]
    [InlineData("1e999 mL", "LYO0107")]
    public void Parse_whatIsNoVolume_isRefused(string text, string code)
    {
        var thrown = Assert.Throws<LyoniumException>(() => Measure.Parse(text, Dimension.Volume));

        var fault = Assert.Single(thrown.Faults);
        Assert.Equal(code, fault.Code);
        Assert.Equal(text, fault.Found);
        FaultText.Check(thrown.Faults);
    }

    [Fact]
    public void Parse_decimalComma_namesThePoint()
    {
        var thrown = Assert.Throws<LyoniumException>(() => Measure.Parse("12,5 mL", Dimension.Volume));

        Assert.Contains("point", thrown.Faults[0].Remedy, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("0 mL", 0)]
    [InlineData("-0 mL", 0)]
    [InlineData("1e-3 mL", 1e-6)]
    [InlineData("1E3 mL", 1)]
    [InlineData("+1 mL", 1e-3)]
    [InlineData(".5 mL", 5e-4)]
    [InlineData(" 5 mL ", 5e-3)]
    [InlineData("1e308 mL", 1e305)]
    [InlineData("1e-320 L", 1e-320)]
    [InlineData("0.00000000000000000000000000000000000000000000000001 L", 1e-50)]
    public void Parse_whatIsAVolume_isRead(string text, double litres) =>
        Assert.Equal(litres, Measure.Parse(text, Dimension.Volume).Computed);

    [Fact]
    public void Parse_numberBeyondADouble_isRefusedForEveryDimension()
    {
        foreach (var (unit, dimension) in new[] { ("K", Dimension.Temperature), ("Cel", Dimension.Temperature), ("%", Dimension.MassFraction), ("mol", Dimension.Amount) })
        {
            var thrown = Assert.Throws<LyoniumException>(() => Measure.Parse("1e400 " + unit, dimension));
            Assert.Equal("LYO0107", thrown.Faults[0].Code);
        }
    }

    [Theory]
    [InlineData("-273.16 Cel")]
    [InlineData("-1 K")]
    public void Parse_belowAbsoluteZero_isRefused(string text)
    {
        var thrown = Assert.Throws<LyoniumException>(() => Measure.Parse(text, Dimension.Temperature));

        Assert.Equal("LYO0105", Assert.Single(thrown.Faults).Code);
    }

    [Fact]
    public void Parse_null_throws() => Assert.Throws<ArgumentNullException>(() => Measure.Parse(null!, Dimension.Mass));

    [Fact]
    public void ToString_anyDouble_readsBackToTheSameDouble()
    {
        Gen.Double[0, 1e300].Check(
            value =>
            {
                var text = value.ToString("R", CultureInfo.InvariantCulture) + " kg";
                var measure = Measure.Parse(text, Dimension.Mass);
                var again = Measure.Parse(measure.ToString(), Dimension.Mass);
                Assert.Equal(BitConverter.DoubleToInt64Bits(value), BitConverter.DoubleToInt64Bits(measure.Value));
                Assert.Equal(BitConverter.DoubleToInt64Bits(value), BitConverter.DoubleToInt64Bits(again.Value));
                Assert.Equal(measure, again);
                Assert.Equal(measure.GetHashCode(), again.GetHashCode());
            },
            iter: 5000);
    }

    [Fact]
    public void ToString_anyBitPatternOfADouble_readsBackToTheSameDouble()
    {
        var random = new Random(20261);
        for (var i = 0; i < 5000; i++)
        {
            var value = Math.Abs(BitConverter.Int64BitsToDouble(random.NextInt64()));
            if (!double.IsFinite(value))
            {
                continue;
            }

            var text = NumberText.Shortest(value);
            Assert.Equal(BitConverter.DoubleToInt64Bits(value), BitConverter.DoubleToInt64Bits(double.Parse(text, CultureInfo.InvariantCulture)));
            Assert.True(NumberText.IsNumber(text), text);
        }
    }

    [Fact]
    public void Equals_whenDimensionOrNumberDiffers_isFalse()
    {
        var litre = Measure.Parse("1 L", Dimension.Volume);

        Assert.NotEqual(litre, Measure.Parse("1 kg", Dimension.Mass));
        Assert.NotEqual(litre, Measure.Parse("1.0000000000000002 L", Dimension.Volume));
        Assert.False(litre.Equals(null));
        Assert.False(litre.Equals("1 L"));
    }
}
