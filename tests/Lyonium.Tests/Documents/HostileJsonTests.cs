using System;
using System.Diagnostics;
using System.Linq;
using System.Text;
using Lyonium.Records;
using Lyonium.Substances;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Documents;

/// <summary>Text that is no document: broken, deep, huge, half characters. Each gives its fault, in no time.</summary>
public sealed class HostileJsonTests
{
    private const string Water = "{ \"substance\": \"water\", \"mass\": \"1 kg\" }";

    [Theory]
    [InlineData("")]
    [InlineData(" ")]
    [InlineData("{")]
    [InlineData("}")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", ")]
    [InlineData("{ \"format\": \"lyonium-recipe/1")]
    [InlineData("{ 'format': 'lyonium-recipe/1' }")]
    [InlineData("{ format: 1 }")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", \"parts\": [ ], }")]
    [InlineData("// a comment\n{}")]
    [InlineData("{} {}")]
    [InlineData("NaN")]
    [InlineData("{ \"format\": 01 }")]
    [InlineData("{ \"format\": \"\\x\" }")]
    [InlineData("<recipe/>")]
    [InlineData("\ufeff\ufeff{}")]
    public void TryRead_brokenJson_saysLineAndPosition(string text)
    {
        var fault = Assert.Single(RecipeText.FaultsOf(text));

        Assert.Equal("LYO0201 $", fault.Code + " " + fault.Path);
        Assert.True(int.Parse(fault.Arguments["line"], System.Globalization.CultureInfo.InvariantCulture) >= 1);
    }

    [Fact]
    public void TryRead_brokenOnTheThirdLine_saysSo()
    {
        var fault = Assert.Single(RecipeText.FaultsOf("{\n\"format\": \"lyonium-recipe/1\",\n\"parts\": [ ; ]\n}"));

        Assert.Contains("line 3, position 12", fault.Remedy, StringComparison.Ordinal);
    }

    [Fact]
    public void TryRead_truncatedAnywhere_isRefused()
    {
        var text = RecipeText.OfTheContract;
        for (var length = 0; length < text.Length - 1; length++)
        {
            var attempt = RecipeText.Try(text[..length]);
            Assert.Equal("LYO0201", Assert.Single(attempt.Faults).Code);
        }
    }

    [Fact]
    public void TryRead_byteOrderMark_isLetPass()
    {
        Assert.True(RecipeText.Try("\ufeff" + RecipeText.OfTheContract).Success);
        Assert.True(RecipeText.Try([0xEF, 0xBB, 0xBF, .. Encoding.UTF8.GetBytes(RecipeText.OfTheContract)]).Success);
    }

    [Fact]
    public void TryRead_anotherEncoding_isRefused()
    {
        Assert.Equal("LYO0201", Assert.Single(RecipeText.Try(Encoding.Unicode.GetPreamble().Concat(Encoding.Unicode.GetBytes(RecipeText.OfTheContract)).ToArray()).Faults).Code);
        Assert.Equal("LYO0201", Assert.Single(RecipeText.Try(Encoding.UTF32.GetBytes(RecipeText.OfTheContract)).Faults).Code);
        Assert.Equal("LYO0201", Assert.Single(RecipeText.Try([0x7B, 0x22, 0xFF, 0x22, 0x3A, 0x31, 0x7D]).Faults).Code);
    }

    [Fact]
    public void TryRead_bytesThatAreNoUtf8InTheNotes_areRefused()
    {
        var text = Encoding.UTF8.GetBytes(RecipeText.With(Water, "\"notes\": { \"a\": \"#\" }"));
        text[Array.IndexOf(text, (byte)'#')] = 0xFF;

        Assert.Equal("LYO0201", Assert.Single(RecipeText.Try(text).Faults).Code);
    }

    [Theory]
    [InlineData("[")]
    [InlineData("{\"a\":")]
    [InlineData("{\"format\":\"lyonium-recipe/1\",\"parts\":[")]
    [InlineData("{\"format\":\"lyonium-recipe/1\",\"parts\":[{\"recipe\":")]
    public void TryRead_nestingBomb_isRefusedAtOnce(string step)
    {
        var watch = Stopwatch.StartNew();
        var bomb = string.Concat(Enumerable.Repeat(step, 4_000_000 / step.Length));

        Assert.Equal("LYO0201", Assert.Single(RecipeText.Try(bomb).Faults).Code);
        Assert.True(watch.Elapsed < TimeSpan.FromSeconds(2), $"{watch.Elapsed}");
    }

    [Fact]
    public void TryRead_tenMegabytesOfNesting_isRefusedAtOnce()
    {
        var watch = Stopwatch.StartNew();

        Assert.Equal("LYO0202", Assert.Single(RecipeText.FaultsOf(new string('[', 10_000_000))).Code);
        Assert.True(watch.Elapsed < TimeSpan.FromSeconds(1), $"{watch.Elapsed}");
    }

    [Fact]
    public void TryRead_atTheLimitOfBytes_isReadAndOneMoreIsRefused()
    {
        var recipe = RecipeText.With(Water);
        var full = recipe + new string(' ', RecipeJson.MostBytes - recipe.Length);

        Assert.True(RecipeText.Try(full).Success);
        Assert.True(RecipeText.Try(Encoding.UTF8.GetBytes(full)).Success);
        var fault = Assert.Single(RecipeText.FaultsOf(full + " "));
        Assert.Equal("LYO0202 $", fault.Code + " " + fault.Path);
        Assert.Contains("4 MiB", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void TryRead_limitOfBytes_countsBytesAndNotLetters()
    {
        // 2 bytes each in UTF-8: fewer letters than the limit, more bytes.
        var text = RecipeText.With(Water, "\"name\": \"" + new string('é', 2_200_000) + "\"");

        Assert.True(text.Length < RecipeJson.MostBytes);
        Assert.Equal("LYO0202", Assert.Single(RecipeText.FaultsOf(text)).Code);
    }

    [Fact]
    public void TryRead_endlessStream_stopsAtTheLimit()
    {
        using var endless = new EndlessStream();

        Assert.Equal("LYO0202", Assert.Single(RecipeJson.TryRead(endless, SubstanceTable.Default).Faults).Code);
    }

    // Half a surrogate pair is legal JSON and no text: as value, as property name, as unit, as number's object.
    [Theory]
    [InlineData("{ \"format\": \"\\ud800\" }")]
    [InlineData("{ \"\\ud800\": 1 }")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", \"\\udc00\": 1, \"parts\": [ { \"substance\": \"water\", \"mass\": \"1 kg\" } ] }")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", \"name\": \"\\ud83d\", \"parts\": [ { \"substance\": \"water\", \"mass\": \"1 kg\" } ] }")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", \"parts\": [ { \"substance\": \"\\ud800\", \"mass\": \"1 kg\" } ] }")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", \"parts\": [ { \"substance\": \"water\", \"mass\": \"1 \\ud800\" } ] }")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", \"parts\": [ { \"substance\": \"water\", \"mass\": { \"value\": 1, \"unit\": \"\\ud800\" } } ] }")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", \"parts\": [ { \"substance\": \"water\", \"mass\": { \"value\": 1, \"\\ud800\": \"g\" } } ] }")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", \"parts\": [ { \"\\ud800\": \"water\", \"mass\": \"1 kg\" } ] }")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", \"parts\": [ { \"substance\": \"water\", \"mass\": \"1 kg\" } ], \"makeUpTo\": { \"value\": 1, \"unit\": \"\\ud800\" } }")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", \"parts\": [ { \"substance\": \"water\", \"mass\": \"1 kg\" } ], \"makeUpTo\": { \"value\": 1, \"\\ud800\": \"g\" } }")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", \"parts\": [ { \"substance\": \"water\", \"mass\": \"1 kg\" } ], \"makeUpTo\": \"\\ud800\" }")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", \"stocks\": { \"\\ud800\": { \"substance\": \"HCl\", \"concentration\": \"1 mol/L\" } }, \"parts\": [ { \"stock\": \"\\ud800\", \"volume\": \"1 L\" } ] }")]
    public void TryRead_halfASurrogatePair_isRefused(string text)
    {
        Assert.NotEmpty(RecipeText.FaultsOf(text));
    }

    [Fact]
    public void TryRead_halfASurrogatePairInTheNotes_isEchoedUntouched()
    {
        const string notes = "{ \"\\ud800\": \"\\udc00\" }";

        var recipe = RecipeJson.Read(RecipeText.With(Water, "\"notes\": " + notes));

        Assert.Equal(notes, recipe.Notes);
        Assert.Contains(notes, RecipeJson.Write(recipe), StringComparison.Ordinal);
    }

    [Fact]
    public void TryRead_duplicatePropertyNamedInEscapes_isToldAsOne()
    {
        Assert.Contains("LYO0206 $.name", RecipeText.CodesAndPathsOf(RecipeText.With(Water, "\"name\": \"a\", \"n\\u0061me\": \"b\"")));
    }

    [Fact]
    public void TryRead_controlCharactersInNames_neverReachAFaultLine()
    {
        // FaultsOf checks every line.
        RecipeText.FaultsOf(RecipeText.With(Water, "\"\\u001b[31m\\n\\u2028\": 1"));
        RecipeText.FaultsOf(RecipeText.With("{ \"stock\": \"\\u001b[2J\\r\\n\", \"volume\": \"1 L\" }"));
        RecipeText.FaultsOf(RecipeText.With("{ \"substance\": \"a\\nb\", \"mass\": \"1 g\\u001b[0m\" }"));
    }
}
