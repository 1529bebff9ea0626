using System;
using System.Linq;
using Lyonium.Faults;
using Xunit;

namespace Lyonium.Tests.Faults;

public sealed class FaultTests
{
    [Fact]
    public void Of_givesKindPlaceFoundAndFilledTexts()
    {
        var fault = Fault.Of(FaultKinds.UnknownUnit, "$.parts[0].volume", "1 pint", ("unit", "pint"), ("known", "L, mL, uL"));

        Assert.Equal("LYO0104", fault.Code);
        Assert.Equal("$.parts[0].volume", fault.Path);
        Assert.Equal("1 pint", fault.Found);
        Assert.Equal("'pint' is not a unit that is read here.", fault.Message);
        Assert.Equal("use one of L, mL, uL", fault.Remedy);
        Assert.Equal(
            "LYO0104 at $.parts[0].volume: 'pint' is not a unit that is read here. Remedy: use one of L, mL, uL.", fault.ToString());
    }

    [Fact]
    public void Message_whenWhatWasFoundLooksLikeAPlaceholder_keepsItAsItIs()
    {
        var fault = Fault.Of(FaultKinds.UnknownUnit, "$", "{known} {unit}", ("unit", "{known}"), ("known", "{found}"));

        Assert.Equal("'{known}' is not a unit that is read here.", fault.Message);
        Assert.Equal("use one of {found}", fault.Remedy);
    }

    [Fact]
    public void Found_whenLong_isShortened()
    {
        var fault = Fault.Of(FaultKinds.Negative, "$", new string('7', 5000), ("expected", "volume"));

        Assert.Equal(120, fault.Found.Length);
        Assert.EndsWith("…", fault.Found, StringComparison.Ordinal);
        Assert.True(fault.Message.Length < 200);
    }

    [Fact]
    public void Arguments_whenLong_areShortened()
    {
        var fault = Fault.Of(FaultKinds.UnknownUnit, "$", "x", ("unit", new string('u', 1_000_000)), ("known", new string('k', 1_000_000)));

        Assert.True(fault.ToString().Length < 3000, $"{fault.ToString().Length} characters");
    }

    [Theory]
    [InlineData(118)]
    [InlineData(119)]
    [InlineData(120)]
    public void Found_whenCut_keepsNoHalfOfASurrogatePair(int before)
    {
        var fault = Fault.Of(FaultKinds.Negative, "$", new string('a', before) + string.Concat(Enumerable.Repeat("😀", 20)), ("expected", "volume"));

        for (var i = 0; i < fault.Found.Length; i++)
        {
            if (char.IsHighSurrogate(fault.Found[i]))
            {
                Assert.True(i + 1 < fault.Found.Length && char.IsLowSurrogate(fault.Found[i + 1]), $"half a pair at {i}");
                i++;
            }
            else
            {
                Assert.False(char.IsLowSurrogate(fault.Found[i]), $"half a pair at {i}");
            }
        }
    }

    [Theory]
    [InlineData("a\nb")]
    [InlineData("a\rb")]
    [InlineData("a\u0085b")]
    [InlineData("a\u2028b")]
    [InlineData("a\u001b[31mb")]
    [InlineData("a\0b")]
    public void ToString_whateverWasGiven_isOneLineWithoutControlCharacters(string hostile)
    {
        var fault = Fault.Of(FaultKinds.UnknownUnit, "$.stocks['" + hostile + "']", hostile, ("unit", hostile), ("known", hostile));

        FaultText.Check([fault]);
    }

    [Fact]
    public void Of_withoutArguments_throws()
    {
        Assert.Throws<ArgumentNullException>(() => Fault.Of(null!, "$", ""));
        Assert.Throws<ArgumentNullException>(() => Fault.Of(FaultKinds.Zero, null!, ""));
        Assert.Throws<ArgumentNullException>(() => Fault.Of(FaultKinds.Zero, "$", null!));
        Assert.Throws<ArgumentNullException>(() => Fault.Of(FaultKinds.Zero, "$", "", null!));
    }
}
