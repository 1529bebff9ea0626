using System;
using System.Collections.Generic;
using System.Linq;
using System.Text.Json.Nodes;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Substances;

/// <summary>Listed solubilities: how they are read, and that they do not contradict each other.</summary>
public sealed class SolubilityDataTests
{
    [Fact]
    public void Default_solubilitiesOfForms_areOfUnchargedFormsWithConditions()
    {
        var listed = 0;
        foreach (var family in SubstanceTable.Default.Families)
        {
            Assert.Equal(family.Forms.Count, family.SolubilitiesMolPerKg.Count);
            for (var form = 0; form < family.Forms.Count; form++)
            {
                if (family.SolubilitiesMolPerKg[form] is { } solubility)
                {
                    listed++;
                    Assert.Equal(0, family.Forms[form].Charge);
                    Assert.NotNull(solubility.TemperatureK);
                    Assert.NotEqual("", solubility.Note);
                }
            }
        }

        Assert.True(listed >= 20, $"{listed} are listed");
    }

    // Hydrates bring the same ions, and are listed by the anhydrous amount in all the water.
    [Fact]
    public void Default_hydratesOfOneSalt_haveOneSolubility()
    {
        var groups = SubstanceTable.Default.Substances
            .Where(one => one.SolubilityMolPerKg is not null)
            .GroupBy(one => string.Join(" ", one.Brings.Select(brought => $"{brought.Count} {brought.Family.Id}")) + " " + one.Protons, StringComparer.Ordinal);

        Assert.All(groups, group => Assert.Single(group.Select(one => one.SolubilityMolPerKg!.Value).Distinct()));
    }

    [Fact]
    public void Read_solubilities_asWritten()
    {
        var json = JsonNode.Parse(UserTable.Text)!;
        json["families"]![0]!["forms"]![0]!["solubility"] = Value(0.5);
        json["substances"]![2]!["solubility"] = Value(25);

        var table = UserTable.Read(json.ToJsonString()).GetValueOrThrow();
        Assert.Equal([0.5, null, null], table.Families[0].SolubilitiesMolPerKg.Select(one => one?.Value));
        Assert.Equal(298.15, table.Families[0].SolubilitiesMolPerKg[0]!.TemperatureK);
        Assert.Equal([null, null, 25], table.Substances.Select(one => one.SolubilityMolPerKg?.Value));
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    public void Read_solubilityNotAboveZero_fault(double value)
    {
        Assert.Equal(["LYO0318"], UserTable.Codes(UserTable.FaultsOf(json => json["substances"]![2]!["solubility"] = Value(value))));
        Assert.Equal(["LYO0318"], UserTable.Codes(UserTable.FaultsOf(json => json["families"]![0]!["forms"]![0]!["solubility"] = Value(value))));
    }

    [Fact]
    public void Read_solubilityWithoutSource_fault()
    {
        var faults = UserTable.FaultsOf(json => json["families"]![0]!["forms"]![0]!["solubility"] = new JsonObject { ["value"] = 1 });

        Assert.All(faults, one => Assert.StartsWith("$.families[0].forms[0].solubility", one.Path, StringComparison.Ordinal));
        Assert.NotEmpty(faults);
    }

    private static JsonObject Value(double value) =>
        new(new Dictionary<string, JsonNode?> { ["value"] = value, ["temperatureCelsius"] = 25, ["source"] = "own", ["known"] = "read" });
}
