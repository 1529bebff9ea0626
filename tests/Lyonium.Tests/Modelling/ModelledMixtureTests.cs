using System;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Modelling;
using Lyonium.Predictions;
using Lyonium.Provenance;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Modelling;

/// <summary>The doorway: which input and which constant became which number.</summary>
public sealed class ModelledMixtureTests
{
    private const string Kilogram = "{ \"substance\": \"water\", \"mass\": \"1 kg\" }";

    // Slope of Debye and Hückel in water at 25 °C, in (kg/mol)^½, as tables print it (0.5098 to 0.511).
    private const double A = 0.5098;

    private static ModelledMixture Of(string parts, IActivityModel? model = null) =>
        ModelledMixture.TryModel(Mixture.Prepare(RecipeJson.Read(RecipeText.With(parts)), SubstanceTable.Default), model ?? new DaviesModel()).GetValueOrThrow();

    [Fact]
    public void TryModel_acidAndSalt_becomeOneComponentWithProtons()
    {
        var modelled = Of("{ \"substance\": \"acetic acid\", \"amount\": \"0.1 mol\" }, { \"substance\": \"sodium acetate\", \"amount\": \"0.2 mol\" }, " + Kilogram);

        Assert.Equal(2, modelled.Families.Count);
        var acetate = modelled.Families.Select((family, index) => (family.Id, index)).Single(one => one.Id == "acetate").index;
        Assert.Equal(0.3, modelled.Equilibrium.Constraints[acetate].Value, 1e-15);
        Assert.Equal(ConstraintKind.Total, modelled.Equilibrium.Constraints[acetate].Kind);
        Assert.Equal(["water:2", "water:0"], modelled.Species.Take(2).Select(one => one.Id));
        var acid = modelled.Species.Single(one => one.Id == "acetate:1");
        Assert.Equal(0, acid.Charge);
        Assert.Equal(0.3, acid.FamilyTotalMolPerKg!.Value, 1e-15);
    }

    [Fact]
    public void TryModel_families_standInTheOrderOfTheTable()
    {
        var one = Of("{ \"substance\": \"tris\", \"amount\": \"0.1 mol\" }, { \"substance\": \"HCl\", \"amount\": \"0.1 mol\" }, { \"substance\": \"citric acid\", \"amount\": \"0.1 mol\" }, " + Kilogram);
        var other = Of("{ \"substance\": \"citric acid\", \"amount\": \"0.1 mol\" }, " + Kilogram + ", { \"substance\": \"HCl\", \"amount\": \"0.1 mol\" }, { \"substance\": \"tris\", \"amount\": \"0.1 mol\" }");

        Assert.Equal(one.Families.Select(family => family.Id), other.Families.Select(family => family.Id));
        var table = SubstanceTable.Default.Families.Select(family => family.Id).ToList();
        Assert.Equal(one.Families.Select(family => table.IndexOf(family.Id)).Order(), one.Families.Select(family => table.IndexOf(family.Id)));
    }

    [Fact]
    public void Constants_ofPhosphate_areListedWithConditionsAndSource()
    {
        var modelled = Of("{ \"substance\": \"phosphoric acid\", \"amount\": \"0.1 mol\" }, " + Kilogram);

        var constants = modelled.Constants.Where(one => one.Quantity == "pKa").ToArray();
        Assert.Equal(["phosphate:1", "phosphate:2", "phosphate:3"], constants.Select(one => one.Id));
        Assert.Equal([2.148, 7.198, 12.35], constants.Select(one => one.Value.Value), (a, b) => Math.Abs(a - b) < 0.03);
        Assert.All(constants, one => Assert.False(string.IsNullOrWhiteSpace(one.Value.Source.Citation)));
        Assert.All(constants, one => Assert.Equal("25 Cel", one.Value.Conditions));
        var water = modelled.Constants.Where(one => one.Id == "water").ToArray();
        Assert.Equal(13.995, water.Single(one => one.Quantity == "pKw").Value.Value, 0.005);
        Assert.Equal(0.998207, water.Single(one => one.Quantity.StartsWith("density", StringComparison.Ordinal)).Value.Value, 1e-6);
        Assert.Equal(A, water.Single(one => one.Quantity.StartsWith("Debye", StringComparison.Ordinal)).Value.Value, 1e-3);
        Assert.All(modelled.Constants, one => Assert.False(string.IsNullOrWhiteSpace(one.Value.KnownAs)));
    }

    [Fact]
    public void Constants_ofVolumesAndDensitiesThatWereUsed_areListed()
    {
        var modelled = Of("{ \"substance\": \"HCl\", \"massFraction\": \"37 %\", \"volume\": \"1 mL\" }, { \"substance\": \"NaCl\", \"concentration\": \"0.1 mol/L\", \"volume\": \"1 L\" }");

        Assert.Contains(modelled.Constants, one => one.Id == "hydrochloric-acid" && one.Quantity.Contains("density", StringComparison.Ordinal) && one.Value.Value == 1.1837);
        Assert.Contains(modelled.Constants, one => one.Id == "sodium-chloride" && one.Quantity.Contains("volume", StringComparison.Ordinal) && Math.Abs(one.Value.Value - 16.62) < 1e-9);
    }

    // EDTA's last four constants hold at I = 0.1: √0.1/(1 + √0.1) − 0.03 = 0.210253; times A: D = 0.10719.
    // A step from charge z to z − 1: pKa(0) = pKa(0.1) − D(z² − (z − 1)² − 1) = pKa(0.1) + 2 D (1 − z).
    [Theory]
    [InlineData("edta:3", 2.0, 0)] // H4Y → H3Y⁻
    [InlineData("edta:4", 2.69, -1)]
    [InlineData("edta:5", 6.13, -2)]
    [InlineData("edta:6", 10.37, -3)] // HY³⁻ → Y⁴⁻
    public void Constants_atAnIonicStrength_areCarriedToInfiniteDilutionWithDavies(string step, double published, int charge)
    {
        var expected = published + (2 * A * 0.210253 * (1 - charge));
        var modelled = Of("{ \"substance\": \"EDTA\", \"amount\": \"0.01 mol\" }, " + Kilogram);

        var carried = modelled.Constants.Single(one => one.Id == step && one.Quantity == "pKa at infinite dilution").Value;
        Assert.Equal(expected, carried.Value, 2e-3);
        Assert.Equal(Known.Derived, carried.Known);
        Assert.Equal(published, modelled.Constants.Single(one => one.Id == step && one.Quantity == "pKa").Value.Value);
        Assert.Contains("davies", carried.Note, StringComparison.Ordinal);
    }

    [Fact]
    public void Constants_carriedAtI01_giveThePublishedOneBackAtI01()
    {
        // In 0.1 mol/kg NaCl a trace of half-neutralised HY³⁻/Y⁴⁻ has pH = pKa(mixed) = 10.37 − log γ(H⁺) of the concentration constant.
        var parts = "{ \"substance\": \"EDTA\", \"amount\": \"1e-6 mol\" }, { \"substance\": \"NaOH\", \"amount\": \"0.00023 mol\" }, { \"substance\": \"NaCl\", \"amount\": \"0.1 mol\" }, " + Kilogram;
        var prediction = new Predictor().Predict(RecipeJson.Read(RecipeText.With(parts)));
        var acid = prediction.Species.Single(one => one.Id == "edta:1");
        var base1 = prediction.Species.Single(one => one.Id == "edta:0");
        var hydrogen = prediction.Species[0].MolalityMolPerKg;

        Assert.Equal(10.37, -Math.Log10(hydrogen * base1.MolalityMolPerKg / acid.MolalityMolPerKg), 2e-3);
    }

    [Fact]
    public void Constants_underTheIdealModel_stayAsPublished()
    {
        var modelled = Of("{ \"substance\": \"EDTA\", \"amount\": \"0.01 mol\" }, " + Kilogram, new IdealModel());

        Assert.Equal(10.37, modelled.Constants.Single(one => one.Id == "edta:6" && one.Quantity == "pKa at infinite dilution").Value.Value);
    }

    [Fact]
    public void TryModel_null_throws()
    {
        Assert.Throws<ArgumentNullException>(() => ModelledMixture.TryModel(null!, new DaviesModel()));
        var mixture = Mixture.Prepare(RecipeJson.Read(RecipeText.With(Kilogram)), SubstanceTable.Default);
        Assert.Throws<ArgumentNullException>(() => ModelledMixture.TryModel(mixture, null!));
    }
}
