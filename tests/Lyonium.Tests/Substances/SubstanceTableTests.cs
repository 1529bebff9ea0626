using System;
using System.IO;
using System.Linq;
using System.Security.Cryptography;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Substances;

/// <summary>The table that is built in.</summary>
public sealed class SubstanceTableTests
{
    private static SubstanceTable Table => SubstanceTable.Default;

    [Fact]
    public void Default_hasAsManySubstancesAndFamiliesAsAskedFor()
    {
        Assert.InRange(Table.Substances.Count, 60, 10_000);
        Assert.InRange(Table.Families.Count(one => !one.IsSpectator), 40, 10_000);
    }

    [Fact]
    public void Default_isReadOnce() => Assert.Same(SubstanceTable.Default, SubstanceTable.Default);

    [Fact]
    public void Identity_isEditionAndSha256OfTheBytes()
    {
        using var stream = typeof(SubstanceTable).Assembly.GetManifestResourceStream("Lyonium.Data.table.json")!;
        using var bytes = new MemoryStream();
        stream.CopyTo(bytes);

        Assert.Equal(Convert.ToHexStringLower(SHA256.HashData(bytes.ToArray())), Table.Identity.Sha256);
        Assert.Equal(File.ReadAllBytes(Path.Combine(Repository.Root, "src", "Lyonium", "Data", "table.json")), bytes.ToArray());
        Assert.Equal("2026.12", Table.Identity.Edition);
        Assert.Empty(Table.Identity.Layers);
    }

    [Fact]
    public void Families_haveRisingPKaAndOneProtonAStep()
    {
        foreach (var family in Table.Families)
        {
            Assert.Equal(family.Forms.Count - 1, family.Steps.Count);
            for (var i = 0; i < family.Steps.Count; i++)
            {
                Assert.Equal($"{family.Id}:{i + 1}", family.Steps[i].Id);
                Assert.Equal(i + 1, family.Steps[i].Number);
                Assert.Equal(family.Forms[i].Charge - 1, family.Forms[i + 1].Charge);
                Assert.True(i == 0 || family.Steps[i].PKa.Value > family.Steps[i - 1].PKa.Value, family.Steps[i].Id);
            }
        }
    }

    [Fact]
    public void Values_haveSourcesThatAreListed()
    {
        var listed = Table.Sources.ToHashSet();
        var values = Table.Families.SelectMany(family => family.Steps)
            .SelectMany(step => step.Alternatives.Append(step.PKa).Append(step.EnthalpyKJPerMol).Append(step.HeatCapacityJPerMolK))
            .Concat(Table.AtomicWeights.Select(one => one.Weight))
            .Concat(Table.Substances.SelectMany(one => new[] { one.DensityKgPerL, one.MolarVolumeMLPerMol }))
            .Concat(Table.Substances.SelectMany(one => one.SolutionDensities?.Points.Select(point => point.DensityKgPerL) ?? []))
            .OfType<Lyonium.Provenance.SourcedValue>()
            .ToArray();

        Assert.NotEmpty(values);
        Assert.All(values, one => Assert.Contains(one.Source, listed));
        Assert.All(listed, one => Assert.False(string.IsNullOrWhiteSpace(one.Citation)));
    }

    [Fact]
    public void ConflictingValues_standSideBySideWithAReason()
    {
        var chosen = Table.Families.SelectMany(family => family.Steps).Where(step => step.Alternatives.Count > 0).ToArray();

        Assert.NotEmpty(chosen);
        Assert.All(chosen, step => Assert.False(string.IsNullOrWhiteSpace(step.Reason), step.Id));
    }

    [Fact]
    public void Ids_areUniqueAcrossSubstancesAndWithinFamilies()
    {
        Assert.Equal(Table.Substances.Count, Table.Substances.Select(one => one.Id).Distinct(StringComparer.Ordinal).Count());
        Assert.Equal(Table.Families.Count, Table.Families.Select(one => one.Id).Distinct(StringComparer.Ordinal).Count());
        Assert.All(Table.Substances.Select(one => one.Id).Concat(Table.Families.Select(one => one.Id)), id => Assert.Matches("^[a-z0-9-]{1,80}$", id));
    }

    // Molar masses as handbooks and bottles print them, in g/mol.
    [Theory]
    [InlineData("hydrochloric acid", 36.46)]
    [InlineData("sulfuric acid", 98.08)]
    [InlineData("nitric acid", 63.01)]
    [InlineData("sodium hydroxide", 40.00)]
    [InlineData("potassium hydroxide", 56.11)]
    [InlineData("acetic acid", 60.05)]
    [InlineData("citric acid", 192.12)]
    [InlineData("citric acid monohydrate", 210.14)]
    [InlineData("trisodium citrate dihydrate", 294.10)]
    [InlineData("potassium hydrogen phthalate", 204.22)]
    [InlineData("potassium hydrogen tartrate", 188.18)]
    [InlineData("potassium tetroxalate dihydrate", 254.19)]
    [InlineData("borax", 381.37)]
    [InlineData("sodium carbonate", 105.99)]
    [InlineData("sodium carbonate decahydrate", 286.14)]
    [InlineData("sodium hydrogen carbonate", 84.01)]
    [InlineData("potassium dihydrogen phosphate", 136.09)]
    [InlineData("disodium hydrogen phosphate", 141.96)]
    [InlineData("tris", 121.14)]
    [InlineData("tris hydrochloride", 157.60)]
    [InlineData("ammonium acetate", 77.08)]
    [InlineData("sodium chloride", 58.44)]
    [InlineData("potassium chloride", 74.55)]
    [InlineData("calcium hydroxide", 74.09)]
    [InlineData("EDTA", 292.24)]
    public void MolarMass_isThePrintedOne(string name, double printed) =>
        Assert.Equal(printed, Table.Find(name).Value.MolarMassGPerMol, 0.0101);

    [Fact]
    public void Edta_isALadderFromPlusTwoToMinusFour()
    {
        var family = Table.Families.Single(one => one.Id == "edta");

        Assert.Equal([2, 1, 0, -1, -2, -3, -4], family.Forms.Select(form => form.Charge));
    }

    [Fact]
    public void Brings_strongStepIsAbsentFromTheLadder()
    {
        var sulfuric = Table.Find("H2SO4").Value;

        Assert.Equal("sulfate", Assert.Single(sulfuric.Brings).Family.Id);
        Assert.Single(sulfuric.Brings[0].Family.Steps);
        Assert.Equal(2, sulfuric.Protons);
    }

    [Fact]
    public void CrystalWater_isInTheMolarMass()
    {
        var hydrate = Table.Find("trisodium citrate dihydrate").Value;
        var anhydrous = Table.Find("trisodium citrate").Value;

        // 2 H2O: 2 (2 × 1.008 + 15.999) = 36.030 g/mol.
        Assert.Equal(36.030, hydrate.CrystalWaterGPerMol, 1e-9);
        Assert.Equal(36.030, hydrate.MolarMassGPerMol - anhydrous.MolarMassGPerMol, 1e-9);
        Assert.Equal(0, anhydrous.CrystalWaterGPerMol);
    }
}
