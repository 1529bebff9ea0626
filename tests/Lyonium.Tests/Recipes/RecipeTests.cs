using System;
using System.Linq;
using Lyonium.Quantities;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Recipes;

/// <summary>Equality by value, and that a recipe does not change.</summary>
public sealed class RecipeTests
{
    private static RecipeBuilder Start() => Recipe.Named("Rinse").WithId("R-1").At("25 Cel").PreparedAt("20 Cel")
        .Pour("250 mL", Stock.Of("NaOH", "0.1 mol/L").Named("base"))
        .Weigh("1.5 g", "sodium carbonate", "99 %")
        .Add("0.05 mol", "NaCl")
        .PourWater("100 mL");

    [Fact]
    public void Equals_sameInOtherUnitsAndNames_isTrue()
    {
        var one = Start().MakeUpTo("1 L").Build();
        var other = Recipe.Named("Rinse").WithId("R-1").At("298.15 K").PreparedAt("293.15 K")
            .Pour("0.25 L", Stock.Of("caustic soda", "100 mmol/L").Named("base"))
            .Weigh("1500 mg", "soda ash", "99 %")
            .Add("50 mmol", "table salt")
            .PourWater("0.1 L")
            .MakeUpTo("1000 mL")
            .Build();

        Assert.Equal(one, other);
        Assert.True(one.Equals((object)other));
        Assert.Equal(one.GetHashCode(), other.GetHashCode());
    }

    [Fact]
    public void Equals_whenAnythingDiffers_isFalse()
    {
        var one = Start().MakeUpTo("1 L").Build();
        var json = RecipeJson.Write(one);
        string[] others =
        [
            json.Replace("R-1", "R-2", StringComparison.Ordinal),
            json.Replace("Rinse", "rinse", StringComparison.Ordinal),
            json.Replace("20 Cel", "21 Cel", StringComparison.Ordinal),
            json.Replace("250 mL", "251 mL", StringComparison.Ordinal),
            json.Replace("0.1 mol/L", "0.11 mol/L", StringComparison.Ordinal),
            json.Replace("\"base\"", "\"alkali\"", StringComparison.Ordinal),
            json.Replace("99 %", "98 %", StringComparison.Ordinal),
            json.Replace("sodium-carbonate", "potassium-carbonate", StringComparison.Ordinal),
            json.Replace("0.05 mol", "0.06 mol", StringComparison.Ordinal),
            json.Replace("1 L", "2 L", StringComparison.Ordinal),
            json.Replace("{\n      \"substance\": \"water\"", "{\n      \"id\": \"p\", \"substance\": \"water\"", StringComparison.Ordinal),
            json[..^1] + ", \"notes\": { } }",
        ];

        Assert.Equal(one, RecipeJson.Read(json));
        Assert.All(others, other => Assert.NotEqual(json, other));
        Assert.All(others, other => Assert.NotEqual(one, RecipeJson.Read(other)));
        Assert.False(one.Equals(null));
        Assert.False(one.Equals((object)"Rinse"));
    }

    [Fact]
    public void Equals_orderOfParts_matters()
    {
        var one = Recipe.Named("x").PourWater("1 L").Add("1 mol", "NaCl").Build();
        var other = Recipe.Named("x").Add("1 mol", "NaCl").PourWater("1 L").Build();

        Assert.NotEqual(one, other);
    }

    [Fact]
    public void Equals_uncertainty_matters()
    {
        static Recipe With(string uncertainty) => RecipeJson.Read(RecipeText.With(
            $"{{ \"substance\": \"water\", \"mass\": {{ \"value\": 1, \"unit\": \"kg\"{uncertainty} }} }}"));

        Assert.NotEqual(With(""), With(", \"standardUncertainty\": 0.1"));
        Assert.Equal(With(", \"standardUncertainty\": 0.1"), With(", \"standardUncertainty\": 1e-1"));
    }

    [Fact]
    public void Build_twice_givesEqualRecipesThatDoNotChange()
    {
        var builder = Start();
        var one = builder.Build();
        var parts = one.Parts.Count;
        builder.PourWater("1 L");
        var two = builder.Build();

        Assert.Equal(parts, one.Parts.Count);
        Assert.Equal(parts + 1, two.Parts.Count);
    }

    [Fact]
    public void Stock_isEqualByMeaning()
    {
        var one = Stock.Of("HCl", "0.5 mol/L").WithDensity("1.01 g/mL").Named("a");

        Assert.Equal(one, Stock.Of("HCl", "500 mmol/L").WithDensity("1010 g/L").Named("a"));
        Assert.Equal(one.GetHashCode(), Stock.Of("HCl", "500 mmol/L").WithDensity("1010 g/L").Named("a").GetHashCode());
        Assert.NotEqual(one, one.Named("b"));
        Assert.NotEqual(one, one.WithDensity("1.02 g/mL"));
        Assert.NotEqual(one, Stock.Of("HCl", "0.5 mol/kg").WithDensity("1.01 g/mL").Named("a"));
        Assert.Equal("HCl 0.5 mol/L", one.ToString());
    }

    [Fact]
    public void Named_sameStockTwice_isListedOnce()
    {
        var acid = Stock.Of("HCl", "0.1 mol/L").Named("acid");

        var recipe = Recipe.Named("x").Pour("1 mL", acid).PourWater("1 L").Pour("2 mL", acid).Build();

        Assert.Equal("acid", Assert.Single(recipe.Stocks).Name);
        Assert.Equal(3, recipe.Parts.Count);
    }

    [Fact]
    public void Parts_keepTheirKindsAndDimensions()
    {
        var recipe = Start().Build();

        Assert.Equal([typeof(SolutionPart), typeof(SubstancePart), typeof(SubstancePart), typeof(WaterPart)], recipe.Parts.Select(one => one.GetType()));
        Assert.Equal([Dimension.Volume, Dimension.Mass, Dimension.Amount, Dimension.Volume], recipe.Parts.Select(one => one.Taken.Dimension));
        Assert.Null(recipe.MakeUpTo);
    }
}
