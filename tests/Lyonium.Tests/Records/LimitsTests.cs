using System;
using System.Linq;
using System.Text;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;
using UnitsNet;
using Xunit;

namespace Lyonium.Tests.Records;

/// <summary>What a client sends to make the reader slow: it is read or refused, in bounded time and with few faults.</summary>
[Collection(Timing.Alone)]
public sealed class LimitsTests
{
    private const string Water = "{\"substance\":\"water\",\"mass\":\"1 g\"}";

    public LimitsTests() => _ = SubstanceTable.Default;

    [Fact]
    public void TryRead_aMillionParts_isRefusedInUnderASecond()
    {
        var text = "{\"format\":\"lyonium-recipe/1\",\"parts\":[" + string.Join(',', Enumerable.Repeat("{}", 1_000_000)) + "]}";

        Timing.Within(TimeSpan.FromSeconds(1), () => RecipeText.Try(text));

        var fault = Assert.Single(RecipeText.Try(text).Faults);
        Assert.Equal("LYO0410 $.parts", fault.Code + " " + fault.Path);
        Assert.Contains("1000000", fault.Message, StringComparison.Ordinal);
        Assert.Contains("10000", fault.Message, StringComparison.Ordinal);
        FaultText.Check([fault]);
    }

    [Fact]
    public void Build_aHundredThousandParts_isRefusedInUnderASecond()
    {
        var builder = Recipe.Named("too many");
        for (var i = 0; i < 100_000; i++)
        {
            builder.PourWater(Volume.FromLiters(1));
        }

        Timing.Within(TimeSpan.FromSeconds(1), () => Assert.False(builder.TryBuild(SubstanceTable.Default).Success));

        Assert.All(builder.TryBuild(SubstanceTable.Default).Faults, fault => Assert.Equal("LYO0410 $.parts", fault.Code + " " + fault.Path));
    }

    [Fact]
    public void TryRead_tenThousandParts_isReadAndAnsweredAndOneMoreIsRefused()
    {
        var acid = string.Join(',', Enumerable.Repeat("{\"substance\":\"HCl\",\"concentration\":\"0.01 mol/L\",\"volume\":\"1 mL\"}", 9_999));

        var recipe = RecipeJson.Read(RecipeText.With(acid + "," + Water));

        Assert.Equal(10_000, recipe.Parts.Count);
        Assert.Equal(2.0, new Predictor().Predict(recipe).PH, 0.1);
        Assert.Equal("LYO0410", Assert.Single(RecipeText.Try(RecipeText.With(acid + "," + Water + "," + Water)).Faults).Code);
    }

    [Fact]
    public void TryRead_tenThousandBadParts_tellsABoundedNumberOfFaults()
    {
        var attempt = RecipeText.Try(RecipeText.With(string.Join(',', Enumerable.Repeat("{\"substance\":\"water\",\"mass\":\"-1 g\"}", 10_000))));

        Assert.InRange(attempt.Faults.Count, 10, 1000);
    }

    [Fact]
    public void TryRead_unknownNamesByTheThousand_isRefusedInTime()
    {
        var parts = string.Join(',', Enumerable.Range(0, 10_000).Select(i => $"{{\"substance\":\"potassium hydrogen phthallicate number {i}\",\"mass\":\"1 g\"}}"));

        Within(3, RecipeText.With(parts));
    }

    [Fact]
    public void TryRead_unknownStocksBesideManyStocks_isRefusedInTime()
    {
        var stocks = string.Join(',', Enumerable.Range(0, 40_000).Select(i => $"\"s{i}\":{{\"substance\":\"HCl\",\"molality\":\"1 mol/kg\"}}"));
        var parts = string.Join(',', Enumerable.Repeat("{\"stock\":\"none\",\"mass\":\"1 g\"}", 10_000));

        Within(3, "{\"format\":\"lyonium-recipe/1\",\"stocks\":{" + stocks + "},\"parts\":[" + parts + "]}");
    }

    [Fact]
    public void TryRead_manyStocks_isReadInTime()
    {
        var stocks = string.Join(',', Enumerable.Range(0, 60_000).Select(i => $"\"s{i}\":{{\"substance\":\"HCl\",\"molality\":\"1 mol/kg\"}}"));

        Timing.Within(
            TimeSpan.FromSeconds(3),
            () => Assert.True(RecipeText.Try("{\"format\":\"lyonium-recipe/1\",\"stocks\":{" + stocks + "},\"parts\":[" + Water + "]}").Success));
    }

    [Fact]
    public void TryRead_manyUnknownProperties_isRefusedInTime() =>
        Within(2, "{\"format\":\"lyonium-recipe/1\"," + string.Join(',', Enumerable.Range(0, 300_000).Select(i => $"\"{i}\":0")) + "}");

    [Theory]
    [InlineData("{\"#\":1}")]
    [InlineData("{\"substance\":\"#\",\"mass\":\"1 g\"}")]
    [InlineData("{\"substance\":\"water\",\"mass\":\"#\"}")]
    [InlineData("{\"substance\":\"water\",\"mass\":\"# g\"}")]
    [InlineData("{\"substance\":\"water\",\"mass\":\"0.# g\"}")]
    [InlineData("{\"substance\":\"water\",\"mass\":{\"value\":#,\"unit\":\"g\"}}")]
    [InlineData("{\"substance\":\"water\",\"mass\":{\"value\":1,\"unit\":\"#\"}}")]
    [InlineData("{\"stock\":\"#\",\"mass\":\"1 g\"}")]
    public void TryRead_aTextOfMegabytes_isToldInTime(string part) =>
        Within(2, RecipeText.With(part.Replace("#", new string('9', 3_000_000), StringComparison.Ordinal) + ",{}"));

    private static void Within(double seconds, string text)
    {
        var bytes = Encoding.UTF8.GetBytes(text);
        Assert.True(bytes.Length <= RecipeJson.MostBytes, "the text is refused for its size alone");

        Timing.Within(TimeSpan.FromSeconds(seconds), () => RecipeText.Try(bytes));

        var attempt = RecipeText.Try(bytes);
        Assert.False(attempt.Success);
        FaultText.Check(attempt.Faults);
        Assert.InRange(attempt.Faults.Sum(one => one.ToString().Length), 1, 200_000);
    }
}
