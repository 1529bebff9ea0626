using System;
using System.Linq;
using System.Text.Json.Nodes;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Substances;

/// <summary>How a table of version 1.1 states the course of a pKa with temperature, and ion sizes; version 1 knows neither.</summary>
public sealed class TemperatureCourseReadTests
{
    private const string Range = "\"validCelsius\": [ 5, 45 ]";

    [Fact]
    public void TryRead_equationWithItsRange_isRead()
    {
        var step = TemperatureCourse.Step(TemperatureCourse.Equation + ", " + Range);

        Assert.Equal(1000, step.Equation!.OverT);
        Assert.Equal(1, step.Equation.Constant);
        Assert.Equal(-0.01, step.Equation.TimesT);
        Assert.Equal(0, step.Equation.TimesLnT);
        Assert.Equal("own", step.Equation.Source.Key);
        Assert.Equal("page 3", step.Equation.Note);
        Assert.Equal(278.15, step.ValidRange!.LowK, 1e-9);
        Assert.Equal(318.15, step.ValidRange.HighK, 1e-9);
        Assert.True(step.ChangesWithTemperature);
    }

    // Without a range, common practice: 0 to 60 Cel with a heat capacity, 10 to 40 Cel with an enthalpy alone.
    [Fact]
    public void TryRead_enthalpyWithoutARange_hasTheRangeOfCommonPractice()
    {
        var both = TemperatureCourse.Step(TemperatureCourse.Enthalpy + ", " + TemperatureCourse.HeatCapacity).ValidRange!;
        var alone = TemperatureCourse.Step(TemperatureCourse.Enthalpy).ValidRange!;

        Assert.Equal((0.0, 50.0), (Math.Round(both.LowK - 273.15, 6), Math.Round(both.HighK - 273.15, 6)));
        Assert.Equal((10.0, 40.0), (Math.Round(alone.LowK - 273.15, 6), Math.Round(alone.HighK - 273.15, 6)));
        Assert.Null(UserTable.Sound().Families[0].Steps[0].ValidRange);
        Assert.False(UserTable.Sound().Families[0].Steps[0].ChangesWithTemperature);
    }

    [Theory]
    [InlineData("[ 45, 5 ]")]
    [InlineData("[ 25, 25 ]")]
    [InlineData("[ -1, 45 ]")]
    [InlineData("[ 5, 101 ]")]
    [InlineData("[ 5 ]")]
    [InlineData("[ ]")]
    [InlineData("[ 5, 25, 45 ]")]
    [InlineData("[ \"5\", 45 ]")]
    [InlineData("[ 5, null ]")]
    [InlineData("45")]
    public void TryRead_rangeThatIsNotTwoRisingTemperatures_isRefused(string range)
    {
        var faults = Faults(TemperatureCourse.Table(TemperatureCourse.Enthalpy + ", \"validCelsius\": " + range));

        Assert.Contains("LYO0318 $.families[0].steps[0].validCelsius", faults);
    }

    [Fact]
    public void TryRead_equationWithoutARange_isRefused() =>
        Assert.Equal(["LYO0207 $.families[0].steps[0]"], Faults(TemperatureCourse.Table(TemperatureCourse.Equation)));

    // 1000/298.15 + 1 - 0.01 * 298.15 = 1.37252: 0.0195 and 0.0205 away.
    [Theory]
    [InlineData(1.353, true)]
    [InlineData(1.352, false)]
    [InlineData(1.392, true)]
    [InlineData(1.393, false)]
    public void TryRead_equationThatMissesThePKa_isRefusedBeyond002(double pKa, bool isRead)
    {
        var faults = Faults(TemperatureCourse.Table(TemperatureCourse.Equation + ", " + Range, pKa));

        Assert.Equal(isRead ? [] : ["LYO0318 $.families[0].steps[0].equation"], faults);
    }

    // At 20 Cel the equation gives 1000/293.15 + 1 - 2.9315 = 1.4797; there it is held to the pKa, not at 25 Cel.
    [Fact]
    public void TryRead_equationOfAPKaElsewhere_isHeldToItAtItsTemperature()
    {
        Assert.Empty(Faults(TemperatureCourse.Table(TemperatureCourse.Equation + ", " + Range, 1.48, 20)));
        Assert.NotEmpty(Faults(TemperatureCourse.Table(TemperatureCourse.Equation + ", " + Range, 1.372, 20)));
    }

    [Fact]
    public void TryRead_heatCapacityWithoutEnthalpy_isRefused() => Assert.Equal(
        ["LYO0318 $.families[0].steps[0].heatCapacity"], Faults(TemperatureCourse.Table(TemperatureCourse.HeatCapacity)));

    [Theory]
    [InlineData("constant")]
    [InlineData("source")]
    [InlineData("known")]
    public void TryRead_equationWithoutWhatItNeeds_isRefused(string property)
    {
        var table = TemperatureCourse.Table(TemperatureCourse.Equation + ", " + Range);
        ((JsonObject)table["families"]![0]!["steps"]![0]!["equation"]!).Remove(property);

        Assert.Equal(["LYO0207 $.families[0].steps[0].equation"], Faults(table));
    }

    // A table of version 1 says nothing of a course by equation; a reader of version 1 would not understand it.
    [Fact]
    public void TryRead_propertiesOf11InATableOf1_areRefused()
    {
        var ofStep = Faults(TemperatureCourse.Table(TemperatureCourse.Equation + ", " + Range, version: "1"));
        var ofForm = Faults(WithIonSize("6", "1"));

        Assert.Equal(["LYO0205 $.families[0].steps[0].equation", "LYO0205 $.families[0].steps[0].validCelsius"], ofStep.Order(StringComparer.Ordinal));
        Assert.Equal(["LYO0205 $.families[0].forms[1].ionSize"], ofForm);
    }

    [Fact]
    public void TryRead_ionSize_isReadAndAboveZero()
    {
        var table = UserTable.Read(WithIonSize("4.5", "1.1").ToJsonString()).GetValueOrThrow();

        Assert.Equal([null, 4.5, null], table.Families[0].IonSizesAngstrom.Select(size => size?.Value));
        Assert.Equal(["LYO0318 $.families[0].forms[1].ionSize"], Faults(WithIonSize("0", "1.1")));
        Assert.Equal(["LYO0318 $.families[0].forms[1].ionSize"], Faults(WithIonSize("-3", "1.1")));
    }

    [Fact]
    public void TryRead_tablesOfBothVersions_areReadAndHoldToTheirSchemas()
    {
        var later = TemperatureCourse.Table(TemperatureCourse.Equation + ", " + Range);
        ((JsonArray)later["elements"]!).ToList().ForEach(element => element!["uncertainty"] = 0.001);
        var first = JsonNode.Parse(UserTable.Text)!;
        ((JsonArray)first["elements"]!).ToList().ForEach(element => element!["uncertainty"] = 0.001);

        Assert.True(UserTable.Read(later.ToJsonString()).Success);
        Assert.True(UserTable.Read(first.ToJsonString()).Success);
        Schemas.Table.Hold(later.ToJsonString());
        Schemas.FirstTable.Hold(first.ToJsonString());
        Assert.NotEmpty(Schemas.Table.Objections(first.ToJsonString()));
        later["format"] = "lyonium-table/1";
        Assert.NotEmpty(Schemas.FirstTable.Objections(later.ToJsonString()));
    }

    private static JsonNode WithIonSize(string value, string version)
    {
        var table = TemperatureCourse.Table("", version: version);
        table["families"]![0]!["forms"]![1]!["ionSize"] = JsonNode.Parse($$"""{ "value": {{value}}, "source": "own", "known": "read" }""");
        return table;
    }

    private static string[] Faults(JsonNode table)
    {
        var attempt = UserTable.Read(table.ToJsonString());
        if (!attempt.Success)
        {
            FaultText.Check(attempt.Faults);
        }

        return [.. FaultText.CodesAndPaths(attempt.Faults)];
    }
}
