using System;
using System.Linq;
using System.Text.Json.Nodes;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Substances;

/// <summary>What the schema of the table limits is refused by the reader, and so is a course that leads nowhere.</summary>
public sealed class TableLimitsTests
{
    private const string FirstStep = "$.families[0].steps[0]";

    [Theory]
    [InlineData("value", 40.5, "LYO0318 $.families[0].steps[1].pKa")]
    [InlineData("value", -20.5, "LYO0318 $.families[0].steps[1].pKa")]
    [InlineData("temperatureCelsius", -0.1, "LYO0318 $.families[0].steps[1].pKa.temperatureCelsius")]
    [InlineData("temperatureCelsius", 101, "LYO0318 $.families[0].steps[1].pKa.temperatureCelsius")]
    [InlineData("standardUncertainty", 0, "LYO0318 $.families[0].steps[1].pKa.standardUncertainty")]
    [InlineData("standardUncertainty", -1, "LYO0318 $.families[0].steps[1].pKa.standardUncertainty")]
    [InlineData("ionicStrength", -1, "LYO0318 $.families[0].steps[1].pKa.ionicStrength")]
    public void TryRead_a_pKa_beyond_its_limits_is_refused(string property, double value, string fault)
    {
        var faults = UserTable.FaultsOf(table => table["families"]![0]!["steps"]![1]!["pKa"]![property] = value);

        Assert.Contains(fault, FaultText.CodesAndPaths(faults));
    }

    [Fact]
    public void TryRead_an_alternative_beyond_its_limits_is_refused()
    {
        var faults = UserTable.FaultsOf(table => table["families"]![0]!["steps"]![1]!["alternatives"] = JsonNode.Parse(
            """[ { "value": 60, "temperatureCelsius": 25, "ionicStrength": 0, "source": "own", "known": "read" } ]"""));

        Assert.Equal(["LYO0318 $.families[0].steps[1].alternatives[0]", "LYO0207 $.families[0].steps[1]"], FaultText.CodesAndPaths(faults));
    }

    [Theory]
    [InlineData("")]
    [InlineData(", \"alternatives\": [ ]")]
    public void TryRead_a_reason_without_alternatives_is_refused(string more) =>
        Assert.Equal(["LYO0318 " + FirstStep + ".reason"], Faults("\"reason\": \"it was there\"" + more));

    [Theory]
    [InlineData("20", true)]
    [InlineData("20.5", false)]
    public void TryRead_an_ion_size_is_at_most_20(string value, bool isRead)
    {
        var table = TemperatureCourse.Table("");
        table["families"]![0]!["forms"]![1]!["ionSize"] = JsonNode.Parse($$"""{ "value": {{value}}, "source": "own", "known": "read" }""");
        var faults = UserTable.Read(table.ToJsonString()).Faults;

        Assert.Equal(isRead ? [] : ["LYO0318 $.families[0].forms[1].ionSize"], FaultText.CodesAndPaths(faults));
        Assert.All(faults, fault => Assert.Contains("an ionSize is at most 20", fault.Message, StringComparison.Ordinal));
    }

    [Fact]
    public void TryRead_a_range_without_a_course_is_refused() => Assert.Equal(["LYO0318 " + FirstStep + ".validCelsius"], Faults("\"validCelsius\": [ 5, 45 ]"));

    [Theory]
    [InlineData("[ 30, 45 ]", false)]
    [InlineData("[ 5, 20 ]", false)]
    [InlineData("[ 25, 45 ]", true)]
    public void TryRead_a_range_holds_the_temperature_of_the_pKa(string range, bool isRead) =>
        Assert.Equal(isRead ? [] : ["LYO0318 " + FirstStep + ".validCelsius"], Faults(TemperatureCourse.Enthalpy + ", \"validCelsius\": " + range));

    // 1e5 kJ/mol carries a pKa by 1e8/(R ln 10) (1/T - 1/T0): -840 to 40 Cel, 928 to 10 Cel.
    [Fact]
    public void TryRead_a_course_beyond_every_pKa_is_refused()
    {
        var faults = Faults("\"enthalpy\": { \"value\": 1e5, \"source\": \"own\", \"known\": \"read\" }");

        Assert.Equal(2, faults.Count(one => one == "LYO0318 " + FirstStep + ".enthalpy"));
        Assert.Contains("LYO0318 " + FirstStep + ".enthalpy", Faults("\"enthalpy\": { \"value\": 1e308, \"source\": \"own\", \"known\": \"read\" }"));
    }

    // 400 kJ/mol: 1.372 + 400000/(R ln 10) (1/283.15 - 1/298.15) = 5.08 at 10 Cel, above the 4.27 of the second step.
    [Fact]
    public void TryRead_a_course_that_overtakes_the_next_step_is_refused()
    {
        var faults = UserTable.Read(TemperatureCourse.Table("\"enthalpy\": { \"value\": 400, \"source\": \"own\", \"known\": \"read\" }").ToJsonString()).Faults;

        Assert.Equal(["LYO0311 $.families[0].steps[1]"], FaultText.CodesAndPaths(faults));
        Assert.Contains("pKa 4.27 at 10 Cel, not above 5.08", faults[0].Message, StringComparison.Ordinal);
        FaultText.Check(faults);
    }

    [Fact]
    public void TryLayer_is_held_to_the_same_limits()
    {
        var faults = Layer.TryOver(SubstanceTable.Default, Layer.With(Layer.Family("formate", ["HCOOH", "HCOO^-"], Layer.Step(45)))).Faults;

        Assert.Equal(["LYO0318 $.families[0].steps[0].pKa"], FaultText.CodesAndPaths(faults));
    }

    [Theory]
    [InlineData("lyonium-table/1", "equation", "set \"format\" to \"lyonium-table/1.1\"")]
    [InlineData("lyonium-table/1", "validCelsius", "set \"format\" to \"lyonium-table/1.1\"")]
    [InlineData("lyonium-table/1", "colour", "use pKa, enthalpy")]
    [InlineData("lyonium-table/1.1", "colour", "use pKa, enthalpy")]
    public void TryRead_an_unknown_property_of_a_step_has_a_remedy(string format, string property, string remedy)
    {
        var table = TemperatureCourse.Table("");
        table["format"] = format;
        table["families"]![0]!["steps"]![0]![property] = 1;

        var fault = Assert.Single(UserTable.Read(table.ToJsonString()).Faults);
        Assert.Equal("LYO0205", fault.Code);
        Assert.StartsWith(remedy, fault.Remedy, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("interactions")]
    [InlineData("pairSets")]
    public void TryRead_a_later_section_in_a_first_table_has_a_remedy(string section)
    {
        var fault = Assert.Single(UserTable.FaultsOf(table => table[section] = new JsonArray()));

        Assert.Equal(("LYO0205", "set \"format\" to \"lyonium-table/1.1\", which has it"), (fault.Code, fault.Remedy));
    }

    [Theory]
    [InlineData("lyonium-tables/1", "LYO0203")]
    [InlineData("lyonium-table/1.2", "LYO0204")]
    public void TryRead_another_format_has_a_remedy_with_one_format(string format, string code)
    {
        var fault = Assert.Single(UserTable.FaultsOf(table => table["format"] = format));

        Assert.Equal(code, fault.Code);
        Assert.Contains("set \"format\" to \"lyonium-table/1.1\"", fault.Remedy, StringComparison.Ordinal);
    }

    // The ions of water are the species water:0 and water:2.
    [Fact]
    public void TryRead_a_family_called_water_is_refused() =>
        Assert.Contains("LYO0312 $.families[0].id", FaultText.CodesAndPaths(UserTable.FaultsOf(table => table["families"]![0]!["id"] = "water")));

    private static string[] Faults(string properties) => FaultText.CodesAndPaths(UserTable.Read(TemperatureCourse.Table(properties).ToJsonString()).Faults);
}
