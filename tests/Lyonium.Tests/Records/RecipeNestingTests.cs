using System;
using System.Linq;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Records;

/// <summary>Recipes poured into recipes: how deep, how many, and what a client cannot do with them.</summary>
public sealed class RecipeNestingTests
{
    /// <summary>A recipe inside a recipe, over so many levels, around a kilogram of water.</summary>
    public static string Nested(int levels)
    {
        var text = RecipeText.With("{ \"substance\": \"water\", \"mass\": \"1 kg\" }");
        for (var i = 0; i < levels; i++)
        {
            text = RecipeText.With("{ \"recipe\": " + text + " }");
        }

        return text;
    }

    [Fact]
    public void TryRead_atTheDeepestNesting_isReadAnsweredAndWrittenAgain()
    {
        var recipe = RecipeJson.Read(Nested(Recipe.MostNesting));
        var prediction = new Predictor().Predict(recipe);

        Assert.Equal(1.0, prediction.Mixture.WaterKg);
        Assert.Equal(recipe, RecipeJson.Read(RecipeJson.Write(recipe)));
        Schemas.Record.Hold(RecordJson.Write(prediction));
        Assert.True(new RecordReplay(SubstanceTable.Default).TryReplay(RecordJson.Write(prediction)).Success);
    }

    [Fact]
    public void TryRead_oneLevelDeeper_isRefused()
    {
        var faults = RecipeText.FaultsOf(Nested(Recipe.MostNesting + 1));

        Assert.Contains(faults, one => one.Code == "LYO0413" && one.Path.EndsWith(".recipe", StringComparison.Ordinal));
    }

    [Fact]
    public void TryBuild_recipesPouredForEver_areRefusedBeforeTheStackEnds()
    {
        var recipe = Recipe.Named("innermost").PourWater("1 kg").Build();
        for (var i = 0; i < Recipe.MostNesting; i++)
        {
            recipe = Recipe.Named("outer").PourAll(recipe).Build();
        }

        var fault = Assert.Single(Recipe.Named("one more").PourAll(recipe).TryBuild(SubstanceTable.Default).Faults, one => one.Code == "LYO0413");
        Assert.Equal("$.parts[0].recipe", fault.Path);
        FaultText.Check([fault]);
    }

    [Fact]
    public void TryBuild_recipesThatDoubleAtEveryLevel_areRefusedByCount()
    {
        var recipe = Recipe.Named("innermost").PourWater("1 kg").Build();
        for (var i = 0; i < Recipe.MostNesting; i++)
        {
            var attempt = Recipe.Named("double").Pour("1 g", recipe).Pour("1 g", recipe).PourWater("1 kg").TryBuild(SubstanceTable.Default);
            if (!attempt.Success)
            {
                Assert.Contains(attempt.Faults, one => one.Code == "LYO0410");
                FaultText.Check(attempt.Faults);
                return;
            }

            recipe = attempt.Value;
        }

        Assert.Fail("65,536 pours were taken.");
    }

    [Fact]
    public void TryRead_faultsBesideAnInnerRecipe_areToldWithThoseOfItsPouring()
    {
        var inner = RecipeText.With("{ \"substance\": \"water\", \"mass\": \"1 kg\" }");

        Assert.Equal(
            ["LYO0105 $.parts[0].mass", "LYO0411 $.parts[1]"],
            RecipeText.CodesAndPathsOf(RecipeText.With("{ \"substance\": \"NaCl\", \"mass\": \"-1 g\" }, { \"recipe\": " + inner + ", \"mass\": \"2 kg\" }")));
    }

    [Fact]
    public void PouringAll_isPouringItsParts()
    {
        const string acid = "{ \"substance\": \"acetic acid\", \"amount\": \"0.125 mol\" }, { \"substance\": \"water\", \"mass\": \"0.5 kg\" }";
        const string base1 = "{ \"substance\": \"NaOH\", \"amount\": \"0.0625 mol\" }, { \"substance\": \"water\", \"mass\": \"0.25 kg\" }";
        var flat = new Predictor().Predict(RecipeJson.Read(RecipeText.With(acid + ", " + base1)));
        var poured = new Predictor().Predict(RecipeJson.Read(RecipeText.With("{ \"recipe\": " + RecipeText.With(acid) + " }, " + base1)));

        Assert.Equal(flat.PH, poured.PH, 1e-12);
        Assert.Equal(flat.Mixture.WaterKg, poured.Mixture.WaterKg);
        Assert.Equal(flat.Cautions.Select(one => one.Code), poured.Cautions.Select(one => one.Code));
    }

    [Fact]
    public void PouringAHalfByMass_bringsHalfOfEverything()
    {
        // 1 kg of water and 58.44 g of NaCl; 529.22 g of it hold 0.5 kg and 0.5 mol.
        var inner = RecipeText.With("{ \"substance\": \"NaCl\", \"amount\": \"1 mol\" }, { \"substance\": \"water\", \"mass\": \"1 kg\" }");
        var mixture = Mixture.Prepare(RecipeJson.Read(RecipeText.With("{ \"recipe\": " + inner + ", \"mass\": \"529.22 g\" }")), SubstanceTable.Default);

        Assert.Equal(0.5, mixture.WaterKg, 1e-12);
        Assert.Equal(0.5, Assert.Single(mixture.Amounts).AmountMol, 1e-12);
        Assert.Equal(0.52922, mixture.MassKg, 1e-12);
    }
}
