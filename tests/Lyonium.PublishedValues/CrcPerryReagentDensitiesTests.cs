using System.Linq;
using Lyonium.Recipes;
using Lyonium.Substances;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Densities of commercial acids and bases at 20 °C: CRC Handbook, Perry's Handbook; read and from memory, see the rows. They go through
/// stock and mixture, and come back as amount, water and volume.
/// </summary>
public sealed class CrcPerryReagentDensitiesTests(ITestOutputHelper output)
{
    private const string File = "crc-perry-reagent-densities.csv";

    // 37 % and 1.1837 kg/L by hand: 1 L weighs 1183.7 g; 0.37 of it is 437.969 g of HCl, and 36.458 g/mol (1.008 + 35.45) make it
    // 12.0130 mol; 745.731 g are water; 12.0130 / 0.745731 = 16.1090 mol/kg. Printed: 12.0 mol/L and 16.1 mol/kg.
    [Fact]
    public void Prepare_OneLitreOf37PercentHydrochloricAcid_HasAmountAndWaterByHand()
    {
        var stock = Stock.Of("hydrochloric acid", "37 %").WithDensity("1.1837 g/mL");
        var mixture = Mixture.Prepare(Recipe.Named("bottle").Pour("1 L", stock).Build(), SubstanceTable.Default);

        var amount = Assert.Single(mixture.Amounts).AmountMol;
        Assert.Equal(12.0130, amount, 0.00005);
        Assert.Equal(0.745731, mixture.WaterKg, 1e-9);
        Assert.Equal(1.1837, mixture.MassKg, 1e-12);
        Assert.Equal(1, mixture.VolumeL, 1e-12);
        Assert.Equal(16.1090, amount / mixture.WaterKg, 0.0001);
        Assert.Equal(12.0, amount, 0.05);
        Assert.Equal(16.1, amount / mixture.WaterKg, 0.05);
        Assert.Equal(0, mixture.EstimatedWaterKg);
    }

    // The same bottle labelled by its concentration: 12.0 mol/L weighs 1183.7 g, holds 437.496 g of HCl and 746.204 g of water.
    [Fact]
    public void Prepare_12MolarHydrochloricAcidWithDensity_Is16Point1Molal()
    {
        var stock = Stock.Of("hydrochloric acid", "12.0 mol/L").WithDensity("1.1837 g/mL");
        var mixture = Mixture.Prepare(Recipe.Named("bottle").Pour("10 mL", stock).Build(), SubstanceTable.Default);

        Assert.Equal(0.12, Assert.Single(mixture.Amounts).AmountMol, 1e-12);
        Assert.Equal(0.00746204, mixture.WaterKg, 1e-9);
        Assert.Equal(16.1, 0.12 / mixture.WaterKg, 0.05);
    }

    [Fact]
    public void Prepare_StatedDensity_GivesAmountByHandArithmetic()
    {
        var table = new DeviationTable(
            output,
            "mol in 1 L of the reagent with its published density stated",
            "0.03 %: 1000 x density x mass fraction over the molar mass printed by the CRC Handbook (memory), whose weights differ by that much");
        foreach (var row in PublishedRow.ReadAll(File))
        {
            var name = row.Text("substance");
            var molarMass = PublishedRow.ReadAll("crc-molar-masses.csv").Single(one => one.Text("substance") == name).Number("molar_mass_g_mol");
            var byHand = 1000 * row.Number("density_20C_kg_L") * row.Number("mass_percent") / 100 / molarMass;
            var stock = Stock.Of(name, row.Text("mass_percent") + " %").WithDensity(row.Text("density_20C_kg_L") + " g/mL");
            var mixture = Mixture.Prepare(Recipe.Named(name).Pour("1 L", stock).PourWater("1 kg").Build(), SubstanceTable.Default);

            table.Check(row, $"{name} {row.Text("mass_percent")} %", byHand, Assert.Single(mixture.Amounts).AmountMol, 3e-4 * byHand);
            var waterByHand = 1 + (row.Number("density_20C_kg_L") * (1 - (row.Number("mass_percent") / 100)));
            Assert.Equal(waterByHand, mixture.WaterKg, 1e-9);
        }

        table.AssertHolds(23);
    }

    [Fact]
    public void SolutionDensities_OfTheTable_AgreesWithPublishedDensities()
    {
        var table = new DeviationTable(
            output,
            "Density that the table gives, kg/L at 20 degC",
            "0.005 where the source prints two decimals, 0.0005 where three, 0.00005 where four: half of the last digit, and 0.001 for reading between points");
        foreach (var row in PublishedRow.ReadAll(File))
        {
            var substance = SubstanceTable.Default.Find(row.Text("substance")).GetValueOrThrow();
            var obtained = substance.SolutionDensities?.AtMassFraction(row.Number("mass_percent") / 100)?.Value ?? double.NaN;
            var inputs = $"{row.Text("substance")} {row.Text("mass_percent")} %";
            if (row.Caution.Length > 0)
            {
                table.Report(row, $"{inputs} ({row.Caution})", row.Number("density_20C_kg_L"), obtained);
            }
            else
            {
                var decimals = row.Text("density_20C_kg_L").Split('.')[1].Length;
                var halfDigit = 0.5 * System.Math.Pow(10, -System.Math.Max(decimals, 2));
                table.Check(row, inputs, row.Number("density_20C_kg_L"), obtained, halfDigit + 0.001);
            }
        }

        table.AssertHolds(21);
    }
}
