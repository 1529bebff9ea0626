using System;
using System.IO;
using System.Linq;
using System.Security.Cryptography;
using System.Text;
using System.Text.Json.Nodes;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Substances;

/// <summary>A bad table of a user is refused with every fault at its place.</summary>
public sealed class UserTableTests
{
    [Fact]
    public void TryRead_aSoundTable_isRead()
    {
        var table = UserTable.Sound();

        Assert.Equal(3, table.Substances.Count);
        // H2C2O4: 2 × 1.008 + 2 × 12.011 + 4 × 15.999 = 90.034; with 2 H2O (18.015 each) 126.064.
        Assert.Equal(90.034, table.Find("oxalic acid").Value.MolarMassGPerMol, 1e-9);
        Assert.Equal(126.064, table.Find("H2C2O4.2H2O").Value.MolarMassGPerMol, 1e-9);
        Assert.Equal(Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(UserTable.Text))), table.Identity.Sha256);
    }

    [Fact]
    public void TryRead_stepOutOfOrder_isRefused()
    {
        var faults = UserTable.FaultsOf(table => table["families"]![0]!["steps"]![1]!["pKa"]!["value"] = 1.25);

        var fault = Assert.Single(faults);
        Assert.Equal("LYO0311 $.families[0].steps[1].pKa", fault.Code + " " + fault.Path);
        Assert.Equal("Step 2 of 'oxalate' has pKa 1.25, not above 1.25 of the step before it.", fault.Message);
    }

    [Theory]
    [InlineData("families", 1, "id", "oxalate")]
    [InlineData("substances", 1, "id", "oxalic-acid")]
    [InlineData("substances", 1, "name", "Oxalic  Acid")]
    [InlineData("substances", 1, "name", "ETHANEDIOIC-ACID")]
    [InlineData("sources", 1, "key", "own")]
    [InlineData("elements", 1, "symbol", "H")]
    public void TryRead_duplicate_isRefused(string list, int index, string property, string value)
    {
        var faults = UserTable.FaultsOf(table => table[list]![index]![property] = value);

        Assert.Contains(faults, one => one.Code == "LYO0312" && one.Path.StartsWith($"$.{list}[{index}]", StringComparison.Ordinal));
    }

    [Fact]
    public void TryRead_missingSource_isRefused()
    {
        var unlisted = UserTable.FaultsOf(table => table["families"]![0]!["steps"]![0]!["pKa"]!["source"] = "hearsay");
        var absent = UserTable.FaultsOf(table => ((JsonObject)table["families"]![0]!["steps"]![0]!["pKa"]!).Remove("source"));
        var blank = UserTable.FaultsOf(table => table["sources"]![0]!["citation"] = " ");

        Assert.Contains(unlisted, one => one.Code + " " + one.Path == "LYO0313 $.families[0].steps[0].pKa.source");
        Assert.Contains(absent, one => one.Code + " " + one.Path == "LYO0207 $.families[0].steps[0].pKa");
        Assert.Contains(blank, one => one.Code + " " + one.Path == "LYO0318 $.sources[0].citation");
    }

    [Fact]
    public void TryRead_knownInOtherWords_isRefused()
    {
        var faults = UserTable.FaultsOf(table => table["elements"]![0]!["known"] = "guessed");

        Assert.Contains(faults, one => one.Code == "LYO0318" && one.Path == "$.elements[0].known");
    }

    [Theory]
    [InlineData("oxalicity")]
    [InlineData("H2C2O4.")]
    [InlineData("")]
    public void TryRead_badFormula_isRefused(string formula)
    {
        var ofSubstance = UserTable.FaultsOf(table => table["substances"]![0]!["formula"] = formula);
        var ofForm = UserTable.FaultsOf(table => table["families"]![0]!["forms"]![0]!["formula"] = formula);

        Assert.Equal("LYO0314 $.substances[0].formula", Assert.Single(FaultText.CodesAndPaths(ofSubstance)));
        Assert.Contains("LYO0314 $.families[0].forms[0].formula", FaultText.CodesAndPaths(ofForm));
    }

    [Theory]
    [InlineData("H2C2O4^-")]
    [InlineData("C2O4^-")]
    [InlineData("HC2O5^-")]
    [InlineData("NaC2O4^-")]
    public void TryRead_formNotOneProtonApart_isRefused(string second)
    {
        var faults = UserTable.FaultsOf(table => table["families"]![0]!["forms"]![1]!["formula"] = second);

        Assert.Contains(faults, one => one.Code == "LYO0315" && one.Path == "$.families[0].forms[1]");
    }

    [Fact]
    public void TryRead_stepsNotOneFewerThanForms_isRefused()
    {
        var faults = UserTable.FaultsOf(table => ((JsonArray)table["families"]![0]!["steps"]!).RemoveAt(1));

        Assert.Equal("LYO0315 $.families[0].steps", Assert.Single(FaultText.CodesAndPaths(faults)));
    }

    [Theory]
    [InlineData("protons", "1")]
    [InlineData("formula", "\"H2C2O5\"")]
    [InlineData("formula", "\"NaHC2O4\"")]
    [InlineData("brings", "{ \"oxalate\": 2 }")]
    [InlineData("brings", "{ \"oxalate\": 1, \"sodium\": 1 }")]
    [InlineData("brings", "{ }")]
    public void TryRead_substanceThatIsNotTheSumOfWhatItBrings_isRefused(string property, string value)
    {
        var faults = UserTable.FaultsOf(table => table["substances"]![0]![property] = JsonNode.Parse(value));

        Assert.Contains(faults, one => one.Code == "LYO0316" && one.Path == "$.substances[0].formula");
        Assert.All(faults, one => Assert.Equal("LYO0316", one.Code));
    }

    [Fact]
    public void TryRead_unknownFamily_isRefused()
    {
        var faults = UserTable.FaultsOf(table => table["substances"]![0]!["brings"] = JsonNode.Parse("{ \"oxalat\": 1 }"));

        Assert.Equal("LYO0317 $.substances[0].brings.oxalat", Assert.Single(FaultText.CodesAndPaths(faults)));
    }

    [Theory]
    [InlineData("0")]
    [InlineData("-1")]
    [InlineData("1.5")]
    [InlineData("\"1\"")]
    [InlineData("1e99")]
    [InlineData("null")]
    public void TryRead_badCountBrought_isRefused(string count)
    {
        var faults = UserTable.FaultsOf(table => table["substances"]![0]!["brings"] = JsonNode.Parse($$"""{ "oxalate": {{count}} }"""));

        Assert.NotEmpty(faults);
        Assert.All(faults, one => Assert.Equal("$.substances[0].brings.oxalate", one.Path));
    }

    [Fact]
    public void TryRead_missingElementWeight_isRefused()
    {
        var faults = UserTable.FaultsOf(table => ((JsonArray)table["elements"]!).RemoveAt(3));

        var fault = Assert.Single(faults);
        Assert.Equal("LYO0314 $.substances[2].formula", fault.Code + " " + fault.Path);
        Assert.Contains("'Na'", fault.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("1e999", "LYO0107")]
    [InlineData("51", "LYO0318")]
    [InlineData("\"4.27\"", "LYO0208")]
    [InlineData("null", "LYO0208")]
    [InlineData("[]", "LYO0208")]
    public void TryRead_badPKa_isRefused(string value, string code)
    {
        var json = UserTable.Text.Replace("\"value\": 4.27", "\"value\": " + value, StringComparison.Ordinal);

        var attempt = UserTable.Read(json);

        Assert.False(attempt.Success);
        Assert.Contains(code, UserTable.Codes(attempt.Faults));
        FaultText.Check(attempt.Faults);
    }

    [Theory]
    [InlineData("0.1", "-1")]
    [InlineData("0.1", "0")]
    [InlineData("0", "1.10")]
    [InlineData("1.1", "1.10")]
    [InlineData("0.25", "1.10")]
    public void TryRead_badDensities_areRefused(string fraction, string density)
    {
        var json = UserTable.Text.Replace("\"massFraction\": 0.1, \"value\": 1.10", $"\"massFraction\": {fraction}, \"value\": {density}", StringComparison.Ordinal);

        var attempt = UserTable.Read(json);

        Assert.False(attempt.Success);
        Assert.Contains("LYO0318", UserTable.Codes(attempt.Faults));
    }

    [Theory]
    [InlineData("substances", 0, "name")]
    [InlineData("families", 0, "name")]
    [InlineData("sources", 0, "key")]
    [InlineData("elements", 0, "symbol")]
    public void TryRead_blankName_isRefused(string list, int index, string property)
    {
        var faults = UserTable.FaultsOf(table => table[list]![index]![property] = " ");

        Assert.Contains(faults, one => one.Path == $"$.{list}[{index}].{property}");
    }

    [Theory]
    [InlineData(" ")]
    [InlineData("-")]
    [InlineData("Oxalic Acid Dihydrate")]
    public void TryRead_badSynonym_isRefused(string synonym)
    {
        var faults = UserTable.FaultsOf(table => table["substances"]![0]!["synonyms"] = new JsonArray(synonym));

        Assert.Single(faults);
    }

    [Fact]
    public void TryRead_everyPropertyLeftOut_isRefusedWithItsName()
    {
        foreach (var property in new[] { "format", "edition", "sources", "elements", "families", "substances" })
        {
            var faults = UserTable.FaultsOf(table => ((JsonObject)table).Remove(property));

            Assert.Contains(faults, one => one.Code == "LYO0207" && one.Arguments["property"] == property);
        }
    }

    [Fact]
    public void TryRead_manyFaults_tellsThemAtOnce()
    {
        var faults = UserTable.FaultsOf(table =>
        {
            table["families"]![0]!["steps"]![1]!["pKa"]!["value"] = 0;
            table["families"]![0]!["colour"] = "none";
            table["substances"]![0]!["protons"] = 1;
            table["elements"]![3]!["source"] = "hearsay";
        });

        Assert.Superset(
            new[] { "LYO0311", "LYO0205", "LYO0316", "LYO0313" }.ToHashSet(StringComparer.Ordinal), UserTable.Codes(faults).ToHashSet(StringComparer.Ordinal));
    }

    [Theory]
    [InlineData("", "LYO0201")]
    [InlineData("not json", "LYO0201")]
    [InlineData("{", "LYO0201")]
    [InlineData("[]", "LYO0208")]
    [InlineData("null", "LYO0208")]
    [InlineData("{}", "LYO0207")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\" }", "LYO0203")]
    [InlineData("{ \"format\": \"lyonium-table/1.2\" }", "LYO0204")]
    public void TryRead_whatIsNoTable_isRefused(string json, string code)
    {
        var attempt = UserTable.Read(json);

        Assert.Equal(code, Assert.Single(attempt.Faults).Code);
        FaultText.Check(attempt.Faults);
    }

    [Fact]
    public void TryRead_deepOrHuge_isRefusedAtOnce()
    {
        var watch = System.Diagnostics.Stopwatch.StartNew();
        var deep = UserTable.Read(new string('[', 3_000_000));
        var huge = UserTable.Read("{ \"format\": \"lyonium-table/1\", \"edition\": \"" + new string('9', 5_000_000) + "\" }");
        using var endless = new EndlessStream();
        var unending = SubstanceTable.TryRead(endless);

        Assert.Equal("LYO0201", Assert.Single(deep.Faults).Code);
        Assert.Equal("LYO0202", Assert.Single(huge.Faults).Code);
        Assert.Equal("LYO0202", Assert.Single(unending.Faults).Code);
        Assert.True(watch.Elapsed < TimeSpan.FromSeconds(2), $"{watch.Elapsed}");
    }

    [Fact]
    public void TryRead_leavesTheStreamOpen()
    {
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(UserTable.Text));
        _ = SubstanceTable.TryRead(stream);

        Assert.True(stream.CanRead);
    }

    [Fact]
    public void Read_aBadTable_throwsEveryFault()
    {
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes("{ \"format\": \"lyonium-table/1\" }"));
        var thrown = Assert.Throws<Lyonium.Faults.LyoniumException>(() => SubstanceTable.Read(stream));

        Assert.Equal(5, thrown.Faults.Count);
        Assert.Throws<ArgumentNullException>(() => SubstanceTable.Read(null!));
        Assert.Throws<ArgumentNullException>(() => SubstanceTable.TryRead(null!));
    }
}
