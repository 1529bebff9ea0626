using System;
using System.Linq;
using Lyonium.Tests.Records;
using Xunit;
using static Lyonium.Tests.Recipes.Prepared;

namespace Lyonium.Tests.Recipes;

/// <summary>The water of a solution, by hand: mass less solute where a density is known, else what the solute leaves.</summary>
public sealed class SolutionWaterTests
{
    [Fact]
    public void MassFractionWithDensity_byVolume_isExact()
    {
        var part = Only("{ \"substance\": \"HCl\", \"massFraction\": \"37 %\", \"density\": \"1.18 g/mL\", \"volume\": \"10 mL\" }");

        // 11.8 g, of which 4.366 g is HCl.
        Assert.Equal(11.8e-3, part.MassKg, 1e-15);
        Assert.Equal(4.366e-3 / HCl, part.AmountMol, 1e-12);
        Assert.Equal(7.434e-3, part.WaterKg, 1e-12);
        Assert.Equal(0.010, part.VolumeL);
        Assert.Equal(0, part.EstimatedWaterKg);
        Assert.Null(part.TableDensity);
    }

    [Fact]
    public void MassFractionWithDensity_byMass_isExact()
    {
        var part = Only("{ \"substance\": \"HCl\", \"massFraction\": \"37 %\", \"density\": \"1.18 g/mL\", \"mass\": \"11.8 g\" }");

        Assert.Equal(4.366e-3 / HCl, part.AmountMol, 1e-12);
        Assert.Equal(7.434e-3, part.WaterKg, 1e-12);
        Assert.Equal(0.010, part.VolumeL, 1e-15);
    }

    [Fact]
    public void MolarWithDensity_byVolumeAndByMass_isExact()
    {
        // 1 L at 1.18 kg/L: 12.0 mol are 437.496 g, which leaves 742.504 g of water: 16.16 mol/kg.
        var litre = Only("{ \"substance\": \"HCl\", \"concentration\": \"12.0 mol/L\", \"density\": \"1.18 g/mL\", \"volume\": \"1 L\" }");
        var weighed = Only("{ \"substance\": \"HCl\", \"concentration\": \"12.0 mol/L\", \"density\": \"1.18 g/mL\", \"mass\": \"11.8 g\" }");

        Assert.Equal(12.0, litre.AmountMol, 1e-12);
        Assert.Equal(1.18 - (12 * HCl), litre.WaterKg, 1e-12);
        Assert.Equal(16.16, litre.AmountMol / litre.WaterKg, 0.01);
        Assert.Equal(0.12, weighed.AmountMol, 1e-12);
        Assert.Equal(7.42504e-3, weighed.WaterKg, 1e-10);
    }

    [Fact]
    public void StrongMolar_withoutDensity_takesTheTables()
    {
        // 437.5 g/L is above 150 g/L. The table has 36 % at 1.1789 (424.4 g/L) and 37 % at 1.1837 (438.0 g/L): 36.97 % at 1.1835.
        var part = Only("{ \"substance\": \"HCl\", \"concentration\": \"12.0 mol/L\", \"volume\": \"1 L\" }");

        Assert.NotNull(part.TableDensity);
        Assert.InRange(part.TableDensity!.Value, 1.1789, 1.1837);
        Assert.Equal(1.1835, part.TableDensity.Value, 2e-4);
        Assert.Equal(part.TableDensity.Value - (12 * HCl), part.WaterKg, 1e-12);
        Assert.Equal(16.1, part.AmountMol / part.WaterKg, 0.05);
        Assert.Equal(0, part.EstimatedWaterKg);
    }

    [Fact]
    public void WeakMolar_withoutDensity_isWhatTheMolarVolumeLeaves()
    {
        // NaCl takes 16.62 mL/mol: 0.1 mol leaves 998.338 mL of water.
        var part = Only("{ \"substance\": \"NaCl\", \"concentration\": \"0.1 mol/L\", \"volume\": \"1 L\" }");

        Assert.Equal(0.1, part.AmountMol, 1e-15);
        Assert.Equal(Water20 * 0.998338, part.WaterKg, 1e-6);
        Assert.Equal(1.0, part.VolumeL);
        Assert.Equal((Water20 * 0.998338) + (0.1 * NaCl), part.MassKg, 1e-6);
        Assert.Equal(0, part.EstimatedWaterKg);
        Assert.Null(part.TableDensity);
    }

    [Fact]
    public void WeakMolar_byMass_isTheSameSolution()
    {
        var litre = Only("{ \"substance\": \"NaCl\", \"concentration\": \"0.1 mol/L\", \"volume\": \"1 L\" }");
        var weighed = Only($"{{ \"substance\": \"NaCl\", \"concentration\": \"0.1 mol/L\", \"mass\": {{ \"value\": {litre.MassKg:R}, \"unit\": \"kg\" }} }}");

        Assert.Equal(litre.AmountMol, weighed.AmountMol, 1e-14);
        Assert.Equal(litre.WaterKg, weighed.WaterKg, 1e-14);
        Assert.Equal(litre.VolumeL, weighed.VolumeL, 1e-14);
    }

    [Fact]
    public void WeakMolar_withoutAnyVolume_isEstimatedAndFlagged()
    {
        // Tris has neither: 12.1136 g at 0.5 ± 0.3 mL/g takes 6.0568 ± 3.6341 mL.
        var part = Only("{ \"substance\": \"tris\", \"concentration\": \"0.1 mol/L\", \"volume\": \"1 L\" }");

        Assert.Equal(Water20 * (1 - 6.0568e-3), part.WaterKg, 1e-6);
        Assert.Equal(Water20 * 3.6341e-3, part.EstimatedWaterKg, 1e-7);
    }

    [Fact]
    public void TableDensity_goesBeforeAnEstimate()
    {
        // Lactic acid has no molar volume; 0.25 mol/L are 22.52 g/L, between 2 % (1.0023, 20.05 g/L) and 4 % (1.0065, 40.26 g/L): 1.0028.
        var part = Only("{ \"substance\": \"lactic acid\", \"concentration\": \"0.25 mol/L\", \"volume\": \"1 L\" }");

        Assert.Equal(1.0028, part.TableDensity!.Value, 1e-4);
        Assert.Equal(part.TableDensity.Value - (0.25 * 90.078e-3), part.WaterKg, 1e-9);
        Assert.Equal(0, part.EstimatedWaterKg);
    }

    [Theory]
    [InlineData("0.78", true)] // 149.9 g/L
    [InlineData("0.79", false)] // 151.8 g/L
    public void Molar_above150GramsPerLitre_needsADensity(string strength, bool isRead)
    {
        var part = $"{{ \"substance\": \"citric acid\", \"concentration\": \"{strength} mol/L\", \"volume\": \"1 L\" }}";
        var faults = RecipeText.CodesAndPathsOf(RecipeText.With(part));

        Assert.Equal(isRead ? [] : ["LYO0407 $.parts[0]"], faults);
        Assert.Empty(RecipeText.FaultsOf(RecipeText.With(
            part.Replace("\"volume\"", "\"density\": \"1.06 g/mL\", \"volume\"", StringComparison.Ordinal))));
    }

    [Fact]
    public void Molality_byMass_isExact()
    {
        // 1 kg of water carries 1 mol: 1058.44 g hold 1 mol.
        var part = Only("{ \"substance\": \"NaCl\", \"molality\": \"1 mol/kg\", \"mass\": \"1058.44 g\" }");

        Assert.Equal(1.0, part.AmountMol, 1e-9);
        Assert.Equal(1.0, part.WaterKg, 1e-9);
    }

    [Fact]
    public void Molality_byVolume_isWaterAndSoluteVolume()
    {
        // 1 kg of water is 1001.796 mL at 20 °C, 1 mol of NaCl 16.62 mL: 1018.416 mL hold 1 mol.
        var part = Only("{ \"substance\": \"NaCl\", \"molality\": \"1 mol/kg\", \"volume\": \"1018.416 mL\" }");

        Assert.Equal(1.0, part.AmountMol, 2e-6);
        Assert.Equal(1.0, part.WaterKg, 2e-6);
    }

    [Fact]
    public void Molality_byVolumeWithDensity_isExact()
    {
        // 1 L at 1.0393 kg/L; 1058.44 g hold 1 mol.
        var part = Only("{ \"substance\": \"NaCl\", \"molality\": \"1 mol/kg\", \"density\": \"1.0393 g/mL\", \"volume\": \"1 L\" }");

        Assert.Equal(1039.3 / 1058.44, part.AmountMol, 1e-9);
        Assert.Equal(1039.3 / 1058.44, part.WaterKg, 1e-9);
    }

    [Fact]
    public void MassFraction_byMass_hasItsWaterWithoutADensity()
    {
        var weak = Only("{ \"substance\": \"tris\", \"massFraction\": \"10 %\", \"mass\": \"100 g\" }");
        var strong = Only("{ \"substance\": \"tris\", \"massFraction\": \"60 %\", \"mass\": \"100 g\" }");

        Assert.Equal(0.090, weak.WaterKg, 1e-15);
        Assert.Equal(0.010 / Tris, weak.AmountMol, 1e-12);
        Assert.Equal(0, weak.EstimatedWaterKg);
        Assert.Equal(0.040, strong.WaterKg, 1e-15);
        Assert.Equal(0, strong.EstimatedWaterKg);
        Assert.True(strong.EstimatedVolumeL > 0);
    }

    [Fact]
    public void MassFraction_byVolumeWithoutADensity_isRefusedWhereItIsStrong() =>
        Assert.Equal(
            ["LYO0407 $.parts[0]"],
            RecipeText.CodesAndPathsOf(RecipeText.With("{ \"substance\": \"tris\", \"massFraction\": \"60 %\", \"volume\": \"100 mL\" }")));

    [Fact]
    public void Hydrate_asAStock_addsItsWater()
    {
        // 10 % trisodium citrate dihydrate: 10 g hold 10/294.099 mol and 36.030/294.099 × 10 g of water beside the 90 g.
        var part = Only("{ \"substance\": \"trisodium citrate dihydrate\", \"massFraction\": \"10 %\", \"mass\": \"100 g\" }");

        Assert.Equal(0.010 / (SodiumCitrate + TwoWaters), part.AmountMol, 1e-12);
        Assert.Equal(0.090 + (0.010 * TwoWaters / (SodiumCitrate + TwoWaters)), part.WaterKg, 1e-12);
    }

    [Fact]
    public void SoluteHeavierThanTheSolution_isRefused()
    {
        var fault = Assert.Single(RecipeText.FaultsOf(RecipeText.With(
            "{ \"substance\": \"H2SO4\", \"concentration\": \"17.5 mol/L\", \"density\": \"1.5 g/mL\", \"volume\": \"1 mL\" }")));

        // 17.5 mol are 1716 g, in 1500 g.
        Assert.Equal("LYO0408 $.parts[0]", fault.Code + " " + fault.Path);
    }

    [Fact]
    public void PureLiquid_asAHundredPercent_hasNoWater()
    {
        var part = Only("{ \"substance\": \"acetic acid\", \"massFraction\": \"100 %\", \"volume\": \"10 mL\" }");

        Assert.Equal(0, part.WaterKg, 1e-15);
        Assert.Equal(10.495e-3 / 60.052e-3, part.AmountMol, 1e-9);
    }

    [Fact]
    public void TemperatureOfPreparation_setsTheDensityOfWater()
    {
        // Steam tables: 0.99997 kg/L at 4 °C, 0.98803 kg/L at 50 °C.
        foreach (var (celsius, density) in new[] { ("4 Cel", 0.99997), ("50 Cel", 0.98803), ("20 Cel", Water20), ("25 Cel", 0.997047) })
        {
            var mixture = Of("{ \"substance\": \"water\", \"volume\": \"1 L\" }", $"\"preparedAt\": \"{celsius}\"");
            Assert.Equal(density, mixture.WaterKg, 1e-5);
            Assert.Equal(1.0, mixture.VolumeL);
        }
    }

    [Fact]
    public void ZeroOfAStock_bringsNothing()
    {
        var part = Only("{ \"substance\": \"HCl\", \"concentration\": \"0.1 mol/L\", \"volume\": \"0 mL\" }");

        Assert.Equal((0.0, 0.0, 0.0, 0.0), (part.AmountMol, part.WaterKg, part.VolumeL, part.MassKg));
        Assert.Equal(0, Only("{ \"substance\": \"HCl\", \"massFraction\": \"37 %\", \"mass\": \"0 g\" }").AmountMol);
    }

    [Fact]
    public void Parts_addUp()
    {
        var mixture = Of("{ \"substance\": \"HCl\", \"concentration\": \"0.1 mol/L\", \"volume\": \"0.25 L\" }, { \"substance\": \"HCl\", \"amount\": \"0.01 mol\" }, { \"substance\": \"water\", \"mass\": \"1 kg\" }");

        Assert.Equal(0.035, mixture.AmountOf("hydrochloric-acid"), 1e-15);
        Assert.Equal(mixture.Parts.Sum(one => one.WaterKg), mixture.WaterKg, 1e-15);
        Assert.Single(mixture.Amounts);
    }
}
