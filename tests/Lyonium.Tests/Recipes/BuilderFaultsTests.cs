using System;
using System.Linq;
using Lyonium.Faults;
using Lyonium.Recipes;
using Lyonium.Substances;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Recipes;

/// <summary>The builder tells the same faults at the same places as the JSON of the same recipe.</summary>
public sealed class BuilderFaultsTests
{
    private static readonly Stock Acid = Stock.Of("HCl", "0.1 mol/L");

    [Fact]
    public void Build_manyFaults_areThoseOfTheJson()
    {
        var built = Recipe.Named("bad")
            .At("101 Cel")
            .PreparedAt("20 C")
            .Pour("10 mol", Acid)
            .Pour("-1 mL", Acid)
            .Weigh("12,5 g", "NaCl")
            .Weigh("1 g", "unobtainium")
            .Weigh("1 g", "NaCl", "120 %")
            .Add("1e999 mol", "NaCl")
            .PourWater("1 pint")
            .Pour("1 mL", Stock.Of("sulfuric acid", "17.5 mol/L").WithDensity("1.2 g/mL"))
            .MakeUpTo("0 mL");
        const string json = """
            { "format": "lyonium-recipe/1", "name": "bad", "temperature": "101 Cel", "preparedAt": "20 C", "parts": [
              { "substance": "HCl", "concentration": "0.1 mol/L", "volume": "10 mol" },
              { "substance": "HCl", "concentration": "0.1 mol/L", "volume": "-1 mL" },
              { "substance": "NaCl", "mass": "12,5 g" },
              { "substance": "unobtainium", "mass": "1 g" },
              { "substance": "NaCl", "mass": "1 g", "purity": "120 %" },
              { "substance": "NaCl", "amount": "1e999 mol" },
              { "substance": "water", "volume": "1 pint" },
              { "substance": "sulfuric acid", "concentration": "17.5 mol/L", "density": "1.2 g/mL", "volume": "1 mL" } ],
              "makeUpTo": "0 mL" }
            """;

        AssertSame(built, json);
    }

    [Theory]
    [InlineData("1 mol/L", null)]
    [InlineData("20 mol/L", null)]
    [InlineData("60 %", null)]
    [InlineData("9 mol/L", "0.1 g/mL")]
    public void Build_oneStock_isThatOfTheJson(string strength, string? density)
    {
        foreach (var taken in new[] { "volume", "mass" })
        {
            var unit = taken == "volume" ? "mL" : "g";
            var stock = Stock.Of("citric acid", strength);
            var built = Recipe.Named("x").Pour("1 " + unit, density is null ? stock : stock.WithDensity(density));
            var strengthName = strength.EndsWith('%') ? "massFraction" : "concentration";
            var json = RecipeText.With(
                $"{{ \"substance\": \"citric acid\", \"{strengthName}\": \"{strength}\", \"{taken}\": \"1 {unit}\"{(density is null ? "" : $", \"density\": \"{density}\"")} }}");

            AssertSame(built, json);
        }
    }

    [Fact]
    public void Build_ofWaterAsSomethingElse_isThatOfTheJson()
    {
        AssertSame(Recipe.Named("x").PourWater("1 L").Add("1 mol", "water"), RecipeText.With("{ \"substance\": \"water\", \"volume\": \"1 L\" }, { \"substance\": \"water\", \"amount\": \"1 mol\" }"));
        AssertSame(Recipe.Named("x").PourWater("1 L").Weigh("1 g", "H2O", "99 %"), RecipeText.With("{ \"substance\": \"water\", \"volume\": \"1 L\" }, { \"substance\": \"H2O\", \"mass\": \"1 g\", \"purity\": \"99 %\" }"));
        AssertSame(Recipe.Named("x").Pour("1 L", Stock.Of("water", "1 mol/L")), RecipeText.With("{ \"substance\": \"water\", \"concentration\": \"1 mol/L\", \"volume\": \"1 L\" }"));
    }

    [Fact]
    public void Build_namedStocks_areThoseOfTheJson()
    {
        AssertSame(
            Recipe.Named("x").Pour("1 L", Stock.Of("unobtainium", "1 mol/L").Named("my 'best' acid")).Pour("1 L", Stock.Of("nonsensium", "1 mol/L").Named("plain")),
            RecipeText.With(
                "{ \"stock\": \"my 'best' acid\", \"volume\": \"1 L\" }, { \"stock\": \"plain\", \"volume\": \"1 L\" }",
                "\"stocks\": { \"my 'best' acid\": { \"substance\": \"unobtainium\", \"concentration\": \"1 mol/L\" }, \"plain\": { \"substance\": \"nonsensium\", \"concentration\": \"1 mol/L\" } }"));
    }

    [Fact]
    public void Build_twoStocksOfOneName_isRefused()
    {
        var attempt = Recipe.Named("x").Pour("1 L", Acid.Named("a")).Pour("1 L", Stock.Of("HCl", "0.2 mol/L").Named("a")).TryBuild(SubstanceTable.Default);

        Assert.Equal("LYO0405", Assert.Single(attempt.Faults).Code);
        FaultText.Check(attempt.Faults);
    }

    [Fact]
    public void Build_twoMarks_isRefused()
    {
        var attempt = Recipe.Named("x").PourWater("1 L").MakeUpTo("2 L").MakeUpTo("3 L").TryBuild(SubstanceTable.Default);

        Assert.Equal(["LYO0402 $.makeUpTo"], FaultText.CodesAndPaths(attempt.Faults));
        FaultText.Check(attempt.Faults);
    }

    [Fact]
    public void Build_nothing_isEmpty()
    {
        var thrown = Assert.Throws<LyoniumException>(() => Recipe.Named("nothing").Build());

        Assert.Equal(["LYO0401 $.parts"], FaultText.CodesAndPaths(thrown.Faults));
    }

    [Theory]
    [InlineData("0 mol/L", "LYO0106 $.concentration")]
    [InlineData("-1 mol/L", "LYO0105 $")]
    [InlineData("0 mol/kg", "LYO0106 $.molality")]
    [InlineData("0 %", "LYO0106 $.massFraction")]
    [InlineData("100.1 %", "LYO0108 $.massFraction")]
    [InlineData("1 g", "LYO0101 $")]
    [InlineData("", "LYO0102 $")]
    [InlineData("strong", "LYO0102 $")]
    public void StockOf_whatIsNoStrength_isRefusedAtOnce(string strength, string expected)
    {
        var thrown = Assert.Throws<LyoniumException>(() => Stock.Of("HCl", strength));

        Assert.Equal([expected], FaultText.CodesAndPaths(thrown.Faults));
        FaultText.Check(thrown.Faults);
    }

    [Theory]
    [InlineData("0 g/mL", "LYO0106 $.density")]
    [InlineData("-1 g/mL", "LYO0105 $")]
    [InlineData("1 mol/L", "LYO0101 $")]
    public void WithDensity_whatIsNone_isRefusedAtOnce(string density, string expected)
    {
        var thrown = Assert.Throws<LyoniumException>(() => Acid.WithDensity(density));

        Assert.Equal([expected], FaultText.CodesAndPaths(thrown.Faults));
        FaultText.Check(thrown.Faults);
    }

    [Fact]
    public void Builder_null_throws()
    {
        Assert.Throws<ArgumentNullException>(() => Recipe.Named(null!));
        var builder = Recipe.Named("x");
        Assert.Throws<ArgumentNullException>(() => builder.WithId(null!));
        Assert.Throws<ArgumentNullException>(() => builder.At(null!));
        Assert.Throws<ArgumentNullException>(() => builder.Pour("1 L", (Stock)null!));
        Assert.Throws<ArgumentNullException>(() => builder.Pour(null!, Acid));
        Assert.Throws<ArgumentNullException>(() => builder.Weigh(null!, "NaCl"));
        Assert.Throws<ArgumentNullException>(() => builder.Weigh("1 g", null!));
        Assert.Throws<ArgumentNullException>(() => builder.Weigh("1 g", "NaCl", null!));
        Assert.Throws<ArgumentNullException>(() => builder.PourWater(null!));
        Assert.Throws<ArgumentNullException>(() => builder.MakeUpTo(null!));
        Assert.Throws<ArgumentNullException>(() => builder.Build(null!));
        Assert.Throws<ArgumentNullException>(() => Stock.Of(null!, "1 mol/L"));
        Assert.Throws<ArgumentNullException>(() => Stock.Of("HCl", null!));
        Assert.Throws<ArgumentNullException>(() => Acid.WithDensity(null!));
        Assert.Throws<ArgumentException>(() => Acid.Named(" "));
    }

    [Fact]
    public void WithId_empty_isRefusedAsInJson() =>
        AssertSame(
            Recipe.Named("x").WithId("").PourWater("1 L"),
            "{ \"format\": \"lyonium-recipe/1\", \"id\": \"\", \"parts\": [ { \"substance\": \"water\", \"volume\": \"1 L\" } ] }");

    private static void AssertSame(RecipeBuilder built, string json)
    {
        var ofBuilder = built.TryBuild(SubstanceTable.Default);
        var ofJson = RecipeText.FaultsOf(json);

        Assert.Equal(
            FaultText.CodesAndPaths(ofJson).Order(StringComparer.Ordinal).ToArray(),
            FaultText.CodesAndPaths(ofBuilder.Faults).Order(StringComparer.Ordinal).ToArray());
        Assert.Equal(
            ofJson.Select(one => one.ToString()).Order(StringComparer.Ordinal).ToArray(),
            ofBuilder.Faults.Select(one => one.ToString()).Order(StringComparer.Ordinal).ToArray());
    }
}
