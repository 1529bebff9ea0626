using System;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;
using Lyonium.Tests.Records;
using Xunit;
using static Lyonium.Tests.Recipes.Prepared;

namespace Lyonium.Tests.Recipes;

/// <summary>Water, solids, hydrates, purity and the mark, by hand.</summary>
public sealed class PreparationTests
{
    private const string Kilogram = "{ \"substance\": \"water\", \"mass\": \"1 kg\" }";

    [Fact]
    public void WeighedWater_isExact()
    {
        var mixture = Of("{ \"substance\": \"water\", \"mass\": \"100.1 g\" }, { \"substance\": \"water\", \"mass\": \"0.4 kg\" }");

        Assert.Equal(0.1001 + 0.4, mixture.WaterKg);
        Assert.Equal(mixture.WaterKg, mixture.MassKg);
        Assert.Equal(0.5001 / Water20, mixture.VolumeL, 1e-6);
    }

    [Fact]
    public void AmountsOnOneKilogram_areExactlyTheirMolalities()
    {
        var mixture = Of("{ \"substance\": \"KCl\", \"amount\": \"0.05 mol\" }, { \"substance\": \"HCl\", \"amount\": \"10 mmol\" }, " + Kilogram);

        Assert.Equal(1.0, mixture.WaterKg);
        Assert.Equal(0.05, mixture.AmountOf("potassium-chloride"));
        Assert.Equal(0.01, mixture.AmountOf("hydrochloric-acid"));
        Assert.Equal(0, mixture.EstimatedWaterKg);
    }

    [Fact]
    public void HydrateOnOneKilogram_addsItsOwnWater()
    {
        // 0.1 mol of the dihydrate brings 0.2 mol of water, 3.603 g.
        var mixture = Of("{ \"substance\": \"trisodium citrate dihydrate\", \"amount\": \"0.1 mol\" }, " + Kilogram);

        Assert.Equal(1.003603, mixture.WaterKg, 1e-12);
        Assert.Equal(1 + (0.1 * (SodiumCitrate + TwoWaters)), mixture.MassKg, 1e-12);
    }

    [Fact]
    public void Hydrate_byMass_isTheAnhydrousSaltAndItsWater()
    {
        var hydrate = Of("{ \"substance\": \"trisodium citrate dihydrate\", \"mass\": \"29.4099 g\" }, " + Kilogram);
        var apart = Of("{ \"substance\": \"trisodium citrate\", \"mass\": \"25.8069 g\" }, { \"substance\": \"water\", \"mass\": \"3.6030 g\" }, " + Kilogram);

        Assert.Equal(0.1, hydrate.AmountOf("trisodium-citrate-dihydrate"), 1e-9);
        Assert.Equal(apart.WaterKg, hydrate.WaterKg, 1e-9);
        Assert.Equal(apart.MassKg, hydrate.MassKg, 1e-12);
        Assert.Equal(apart.VolumeL, hydrate.VolumeL, 1e-9);
    }

    [Theory]
    [InlineData("99.5 %", 0.995)]
    [InlineData("50 %", 0.5)]
    [InlineData("110 %", 1.1)]
    public void Purity_scalesTheAmountAndNotTheMass(string purity, double fraction)
    {
        var mixture = Of($"{{ \"substance\": \"NaCl\", \"mass\": \"5.844 g\", \"purity\": \"{purity}\" }}, " + Kilogram);

        Assert.Equal(0.1 * fraction, mixture.AmountOf("sodium-chloride"), 1e-12);
        Assert.Equal(1.005844, mixture.MassKg, 1e-12);
        Assert.Equal(1.0, mixture.WaterKg);
    }

    [Fact]
    public void ToTheMark_byVolume_isWhatTheSolutesLeave()
    {
        // 58.44 g of NaCl take 16.62 mL: 983.38 mL of water.
        var mixture = Of("{ \"substance\": \"NaCl\", \"mass\": \"58.44 g\" }", "\"makeUpTo\": \"1 L\"");

        Assert.Equal(1.0, mixture.VolumeL);
        Assert.Equal(0.98338 * Water20, mixture.WaterKg, 1e-6);
        Assert.Equal(mixture.WaterKg + 0.05844, mixture.MassKg, 1e-12);
        Assert.Equal(0, mixture.EstimatedWaterKg);
    }

    [Fact]
    public void ToTheMark_withAnEstimatedVolume_saysTheError()
    {
        // 12.1136 g of tris: 6.0568 ± 3.6341 mL.
        var mixture = Of("{ \"substance\": \"tris\", \"mass\": \"12.1136 g\" }", "\"makeUpTo\": \"1 L\"");

        Assert.Equal((1 - 6.0568e-3) * Water20, mixture.WaterKg, 1e-6);
        Assert.Equal(3.6341e-3 * Water20, mixture.EstimatedWaterKg, 1e-7);
    }

    [Fact]
    public void ToTheMark_byMass_needsNoVolume()
    {
        var mixture = Of("{ \"substance\": \"tris\", \"mass\": \"12.1136 g\" }", "\"makeUpTo\": \"1 kg\"");

        Assert.Equal(1 - 12.1136e-3, mixture.WaterKg, 1e-12);
        Assert.Equal(1.0, mixture.MassKg, 1e-15);
        Assert.Equal(0, mixture.EstimatedWaterKg);
    }

    [Fact]
    public void MarkAtTheContents_addsNothing()
    {
        var mixture = Of(Kilogram, "\"makeUpTo\": \"1 kg\"");

        Assert.Equal(1.0, mixture.WaterKg);
        Assert.Equal(0.3, Of("{ \"substance\": \"water\", \"volume\": \"0.1 L\" }, { \"substance\": \"water\", \"volume\": \"0.2 L\" }", "\"makeUpTo\": \"0.3 L\"").VolumeL);
    }

    [Theory]
    [InlineData("\"makeUpTo\": \"999 g\"")]
    [InlineData("\"makeUpTo\": \"1 L\"")] // 1 kg of water is 1.0018 L
    public void MarkBelowTheContents_isRefused(string mark)
    {
        var fault = Assert.Single(RecipeText.FaultsOf(RecipeText.With(Kilogram, mark)));

        Assert.Equal("LYO0406 $.makeUpTo", fault.Code + " " + fault.Path);
        Assert.Contains(mark.Contains('g', StringComparison.Ordinal) ? "1 kg" : "1.0018 L", fault.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("{ \"substance\": \"NaCl\", \"mass\": \"1 g\" }")]
    [InlineData("{ \"substance\": \"acetic acid\", \"massFraction\": \"100 %\", \"volume\": \"1 L\" }")]
    [InlineData("{ \"substance\": \"HCl\", \"concentration\": \"1 mol/L\", \"volume\": \"0 mL\" }")]
    [InlineData("{ \"substance\": \"water\", \"mass\": \"0 g\" }")]
    public void NoWater_isRefused(string part) =>
        Assert.Equal(["LYO0409 $.parts"], RecipeText.CodesAndPathsOf(RecipeText.With(part)));

    [Theory]
    [InlineData("{ \"substance\": \"water\", \"mass\": \"1e10 kg\" }")]
    [InlineData("{ \"substance\": \"NaCl\", \"amount\": \"1e10 mol\" }, " + Kilogram)]
    [InlineData("{ \"substance\": \"NaCl\", \"amount\": \"1 mol\" }, { \"substance\": \"water\", \"mass\": \"1e-7 kg\" }")]
    [InlineData("{ \"substance\": \"NaCl\", \"amount\": \"1 mol\" }, { \"substance\": \"water\", \"mass\": \"1e-320 kg\" }")]
    [InlineData("{ \"substance\": \"HCl\", \"concentration\": \"0.1 mol/L\", \"density\": \"1e300 g/mL\", \"volume\": \"1e20 L\" }")]
    public void AmountsNoVesselHolds_areRefused(string parts) =>
        Assert.Contains("LYO0412 $.parts", RecipeText.CodesAndPathsOf(RecipeText.With(parts)));

    [Fact]
    public void ASubstanceThatThisTableDoesNotHave_isRefused()
    {
        var recipe = RecipeJson.Read(RecipeText.With("{ \"substance\": \"NaCl\", \"mass\": \"1 g\" }, " + Kilogram));
        var fault = Assert.Single(Mixture.TryPrepare(recipe, Substances.UserTable.Sound()).Faults);

        Assert.Equal("LYO0502 $.parts[0]", fault.Code + " " + fault.Path);
        FaultText.Check([fault]);
    }

    [Fact]
    public void Prepare_null_throws()
    {
        Assert.Throws<ArgumentNullException>(() => Mixture.Prepare(null!, SubstanceTable.Default));
        Assert.Throws<ArgumentNullException>(() => Mixture.TryPrepare(RecipeJson.Read(RecipeText.With(Kilogram)), null!));
    }
}
