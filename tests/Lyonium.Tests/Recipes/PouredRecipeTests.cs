using System;
using System.Linq;
using Lyonium.Faults;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;
using UnitsNet;
using Xunit;

namespace Lyonium.Tests.Recipes;

/// <summary>A recipe poured into a recipe: what it holds is that share of the whole, by hand arithmetic.</summary>
public sealed class PouredRecipeTests
{
    // 0.2 mol of NaCl and 0.1 mol of HCl on 1 kg of water.
    private static readonly Recipe Brine = Recipe.Named("brine").Add("0.2 mol", "NaCl").Add("0.1 mol", "HCl").PourWater("1 kg").Build();

    [Fact]
    public void PourAll_is_as_if_its_parts_stood_there()
    {
        var poured = Mix(Recipe.Named("x").PourAll(Brine).PourWater("1 kg"));
        var written = Mix(Recipe.Named("x").Add("0.2 mol", "NaCl").Add("0.1 mol", "HCl").PourWater("1 kg").PourWater("1 kg"));

        Assert.Equal(written.WaterKg, poured.WaterKg);
        Assert.Equal(written.Amounts.Select(one => (one.Substance.Id, one.AmountMol)), poured.Amounts.Select(one => (one.Substance.Id, one.AmountMol)));
        Assert.Equal(new Predictor().Predict(written).PH, new Predictor().Predict(poured).PH);
    }

    [Fact]
    public void Pour_half_its_mass_brings_half_of_everything()
    {
        var whole = Mixture.Prepare(Brine, SubstanceTable.Default);
        var half = Mix(Recipe.Named("x").Pour(Mass.FromKilograms(0.5 * whole.MassKg), Brine));

        Assert.Equal(0.5, half.WaterKg, 1e-15);
        Assert.Equal(0.1, half.Amounts.Single(one => one.Substance.Id == "sodium-chloride").AmountMol, 1e-15);
        Assert.Equal(0.5 * whole.VolumeL, half.VolumeL, 1e-15);
    }

    [Fact]
    public void Pour_volume_prepared_at_another_temperature_holds_the_mass_of_that_volume()
    {
        var warm = Recipe.Named("warm").PreparedAt("60 Cel").PourWater("1 L").Build();
        var mixture = Mix(Recipe.Named("x").Pour("500 mL", warm));

        // Half a litre at 20 degC holds 499.10 g of water: 0.9982071 kg/L, CRC Handbook (read).
        Assert.Equal(0.499104, mixture.WaterKg, 1e-6);
    }

    [Fact]
    public void Pour_more_than_it_makes_is_refused()
    {
        var fault = Assert.Single(Recipe.Named("x").Pour("3 kg", Brine).TryBuild(SubstanceTable.Default).Faults);

        Assert.Equal((FaultKinds.MoreThanTheRecipeMakes, "$.parts[0]"), (fault.Kind, fault.Path));
    }

    [Fact]
    public void Json_round_trips_and_names_places_inside()
    {
        var recipe = Recipe.Named("x").Pour("10 mL", Brine).PourAll(Brine).PourWater("1 kg").Build();
        Assert.Equal(recipe, RecipeJson.Read(RecipeJson.Write(recipe)));

        var json = RecipeJson.Write(recipe).Replace("\"0.2 mol\"", "\"-0.2 mol\"", StringComparison.Ordinal);
        var faults = RecipeJson.TryRead(json, SubstanceTable.Default).Faults;
        Assert.Equal(["$.parts[0].recipe.parts[0].amount", "$.parts[1].recipe.parts[0].amount"], faults.Select(one => one.Path));
    }

    [Fact]
    public void Pour_a_recipe_that_holds_a_recipe_counts_each_part_once()
    {
        var outer = Recipe.Named("outer").PourAll(Brine).PourWater("1 kg").Build();
        var mixture = Mix(Recipe.Named("x").PourAll(outer));

        Assert.Equal((2.0, 0.2), (mixture.WaterKg, mixture.Amounts.Single(one => one.Substance.Id == "sodium-chloride").AmountMol));
    }

    private static Mixture Mix(RecipeBuilder builder) => Mixture.Prepare(builder.Build(), SubstanceTable.Default);
}
