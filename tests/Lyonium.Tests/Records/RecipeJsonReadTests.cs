using System;
using System.Linq;
using Lyonium.Quantities;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Records;

/// <summary>What the reader takes, and what it refuses, at which place.</summary>
public sealed class RecipeJsonReadTests
{
    private const string Water = "{ \"substance\": \"water\", \"mass\": \"1 kg\" }";

    [Fact]
    public void Read_theRecipeOfTheContract_keepsEverything()
    {
        var recipe = RecipeJson.Read(RecipeText.OfTheContract);

        Assert.Equal("HB-7-2", recipe.Id);
        Assert.Equal("House brine, second fill", recipe.Name);
        Assert.Equal(298.15, recipe.TemperatureK);
        Assert.Equal(293.15, recipe.PreparedAtK);
        Assert.Equal(["acid", "lactic"], recipe.Stocks.Select(one => one.Name!));
        Assert.Equal(["hydrochloric-acid", "lactic-acid"], recipe.Stocks.Select(one => one.Substance));
        Assert.Equal("0.05 mol/L", recipe.Stocks[0].Strength.ToString());
        Assert.Equal("1.2 g/mL", recipe.Stocks[1].Density!.ToString());
        Assert.Equal(7, recipe.Parts.Count);
        Assert.Equal("p1", recipe.Parts[0].Id);
        Assert.Equal("12.5 mL", recipe.Parts[0].Taken.ToString());
        Assert.Equal("acetic-acid", Assert.IsType<SolutionPart>(recipe.Parts[2]).Stock.Substance);
        Assert.Equal("99.5 %", Assert.IsType<SubstancePart>(recipe.Parts[3]).Purity!.ToString());
        Assert.Equal(Dimension.Amount, recipe.Parts[4].Taken.Dimension);
        Assert.Equal(Dimension.Molality, Assert.IsType<SolutionPart>(recipe.Parts[5]).Stock.Strength.Dimension);
        Assert.Equal(0.001, recipe.Parts[5].Taken.StandardUncertainty);
        Assert.IsType<WaterPart>(recipe.Parts[6]);
        Assert.Equal(0.25, recipe.MakeUpTo!.Computed);
        Assert.Equal("{ \"sample\": \"free for the host\" }", recipe.Notes);
    }

    [Theory]
    [InlineData("lyonium-recipe/1.1", "LYO0204")]
    [InlineData("lyonium-recipe/2", "LYO0204")]
    [InlineData("lyonium-recipe/10", "LYO0204")]
    [InlineData("lyonium-recipe/0", "LYO0203")]
    [InlineData("lyonium-recipe/1.0", "LYO0203")]
    [InlineData("lyonium-recipe/", "LYO0203")]
    [InlineData("lyonium-recipe/x", "LYO0203")]
    [InlineData("lyonium-recipe", "LYO0203")]
    [InlineData("Lyonium-Recipe/1", "LYO0203")]
    [InlineData("lyonium-record/1", "LYO0203")]
    [InlineData("", "LYO0203")]
    public void TryRead_anotherFormat_saysWhich(string format, string code)
    {
        // A later version may have properties that are not known here: only the format is told.
        var fault = Assert.Single(RecipeText.FaultsOf("{ \"format\": \"" + format + "\", \"openTo\": { }, \"parts\": 5 }"));

        Assert.Equal(code + " $.format", fault.Code + " " + fault.Path);
        Assert.Contains("lyonium-recipe/1", fault.Message, StringComparison.Ordinal);
        if (code == "LYO0204")
        {
            Assert.Contains("newer", fault.Message, StringComparison.Ordinal);
        }
    }

    [Theory]
    [InlineData("{ }", "LYO0207 $")]
    [InlineData("{ \"format\": null }", "LYO0208 $.format")]
    [InlineData("{ \"format\": 1 }", "LYO0208 $.format")]
    [InlineData("[ ]", "LYO0208 $")]
    [InlineData("\"lyonium-recipe/1\"", "LYO0208 $")]
    [InlineData("null", "LYO0208 $")]
    [InlineData("true", "LYO0208 $")]
    public void TryRead_whatIsNoDocument_isRefused(string text, string expected) =>
        Assert.Equal([expected], RecipeText.CodesAndPathsOf(text));

    [Fact]
    public void TryRead_unknownProperty_isRefusedByNameAtEveryLevel()
    {
        const string text = """
            { "format": "lyonium-recipe/1", "colour": 1, "Name": "x",
              "stocks": { "a": { "substance": "HCl", "concentration": "1 mol/L", "age": 1 } },
              "parts": [ { "stock": "a", "volume": { "value": 1, "unit": "mL", "standarduncertainty": 0 } }, { "substance": "water", "mass": "1 kg", "recipes": [] } ],
              "notes": { "anything": { "goes": [ 1, 1 ] } } }
            """;

        var faults = RecipeText.FaultsOf(text);

        Assert.Equal(
            ["LYO0205 $.colour", "LYO0205 $.Name", "LYO0205 $.stocks.a.age", "LYO0205 $.parts[0].volume.standarduncertainty", "LYO0205 $.parts[1].recipes"],
            FaultText.CodesAndPaths(faults));
        Assert.Equal("colour", faults[0].Found);
    }

    [Fact]
    public void TryRead_duplicateProperty_isRefusedAtEveryLevel()
    {
        const string text = """
            { "format": "lyonium-recipe/1", "format": "lyonium-recipe/1",
              "stocks": { "a": { "substance": "HCl", "substance": "HBr", "concentration": "1 mol/L" }, "a": { "substance": "HBr", "concentration": "1 mol/L" } },
              "parts": [ { "stock": "a", "stock": "b", "volume": { "value": 1, "value": 2, "unit": "mL" } } ] }
            """;

        Assert.Equal(
            ["LYO0206 $.format", "LYO0206 $.stocks.a", "LYO0206 $.stocks.a.substance", "LYO0206 $.parts[0].stock", "LYO0206 $.parts[0].volume.value"],
            RecipeText.CodesAndPathsOf(text).Order(StringComparer.Ordinal).ToArray().OrderBy(one => one.Contains("parts", StringComparison.Ordinal)).ToArray());
    }

    [Theory]
    [InlineData("\"id\": 5", "LYO0208 $.id")]
    [InlineData("\"id\": null", "LYO0208 $.id")]
    [InlineData("\"id\": \"\"", "LYO0403 $.id")]
    [InlineData("\"name\": [ ]", "LYO0208 $.name")]
    [InlineData("\"temperature\": 25", "LYO0208 $.temperature")]
    [InlineData("\"temperature\": null", "LYO0208 $.temperature")]
    [InlineData("\"temperature\": \"25 C\"", "LYO0104 $.temperature")]
    [InlineData("\"temperature\": \"101 Cel\"", "LYO0108 $.temperature")]
    [InlineData("\"temperature\": \"-0.01 Cel\"", "LYO0108 $.temperature")]
    [InlineData("\"temperature\": \"273.14 K\"", "LYO0108 $.temperature")]
    [InlineData("\"temperature\": \"25 mL\"", "LYO0101 $.temperature")]
    [InlineData("\"preparedAt\": \"100.1 Cel\"", "LYO0108 $.preparedAt")]
    [InlineData("\"preparedAt\": \"NaN Cel\"", "LYO0107 $.preparedAt")]
    [InlineData("\"makeUpTo\": \"0 mL\"", "LYO0106 $.makeUpTo")]
    [InlineData("\"makeUpTo\": \"-1 mL\"", "LYO0105 $.makeUpTo")]
    [InlineData("\"makeUpTo\": \"1 mol\"", "LYO0101 $.makeUpTo")]
    [InlineData("\"makeUpTo\": 250", "LYO0208 $.makeUpTo")]
    [InlineData("\"makeUpTo\": \"1 mL\"", "LYO0406 $.makeUpTo")]
    [InlineData("\"makeUpTo\": \"1 g\"", "LYO0406 $.makeUpTo")]
    [InlineData("\"makeUpTo\": { \"value\": 1, \"unit\": \"g\" }", "LYO0406 $.makeUpTo")]
    [InlineData("\"makeUpTo\": { \"value\": 1e999, \"unit\": \"L\" }", "LYO0107 $.makeUpTo.value")]
    [InlineData("\"makeUpTo\": { \"value\": \"2\", \"unit\": \"L\" }", "LYO0208 $.makeUpTo.value")]
    [InlineData("\"makeUpTo\": { \"value\": 2 }", "LYO0207 $.makeUpTo")]
    [InlineData("\"makeUpTo\": { \"unit\": \"L\" }", "LYO0207 $.makeUpTo")]
    [InlineData("\"makeUpTo\": { \"value\": 2, \"unit\": \"L\", \"standardUncertainty\": -1 }", "LYO0105 $.makeUpTo")]
    [InlineData("\"makeUpTo\": { \"value\": 2, \"unit\": \"L\", \"standardUncertainty\": \"1\" }", "LYO0208 $.makeUpTo.standardUncertainty")]
    [InlineData("\"makeUpTo\": { \"value\": 2, \"unit\": \"L\", \"standardUncertainty\": 1e999 }", "LYO0107 $.makeUpTo.standardUncertainty")]
    [InlineData("\"stocks\": [ ]", "LYO0208 $.stocks")]
    [InlineData("\"stocks\": null", "LYO0208 $.stocks")]
    [InlineData("\"stocks\": { \"a\": null }", "LYO0208 $.stocks.a")]
    [InlineData("\"stocks\": { \"a\": { } }", "LYO0403 $.stocks.a")]
    [InlineData("\"notes\": null", "LYO0208 $.notes")]
    [InlineData("\"notes\": \"text\"", "LYO0208 $.notes")]
    public void TryRead_badMember_isRefusedAtItsPlace(string member, string expected) =>
        Assert.Contains(expected, RecipeText.CodesAndPathsOf(RecipeText.With(Water, member)));

    [Theory]
    [InlineData("5", "LYO0208 $.parts[0]")]
    [InlineData("null", "LYO0208 $.parts[0]")]
    [InlineData("[ ]", "LYO0208 $.parts[0]")]
    [InlineData("{ }", "LYO0403 $.parts[0]")]
    [InlineData("{ \"id\": \"p1\" }", "LYO0403 $.parts[0]")]
    [InlineData("{ \"id\": \"\", \"substance\": \"water\", \"mass\": \"1 g\" }", "LYO0403 $.parts[0].id")]
    [InlineData("{ \"substance\": \"water\" }", "LYO0403 $.parts[0]")]
    [InlineData("{ \"substance\": \"water\", \"mass\": \"1 g\", \"volume\": \"1 mL\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"substance\": \"water\", \"amount\": \"1 mol\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"substance\": \"water\", \"mass\": \"1 g\", \"purity\": \"99 %\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"substance\": \"water\", \"concentration\": \"1 mol/L\", \"volume\": \"1 L\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"substance\": \"NaCl\" }", "LYO0403 $.parts[0]")]
    [InlineData("{ \"substance\": \"NaCl\", \"volume\": \"1 L\" }", "LYO0403 $.parts[0]")]
    [InlineData("{ \"substance\": \"NaCl\", \"mass\": \"1 g\", \"amount\": \"1 mol\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"substance\": \"NaCl\", \"amount\": \"1 mol\", \"purity\": \"99 %\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"substance\": \"NaCl\", \"mass\": \"1 g\", \"density\": \"1 g/mL\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"substance\": \"NaCl\", \"concentration\": \"1 mol/L\", \"molality\": \"1 mol/kg\", \"volume\": \"1 L\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"substance\": \"NaCl\", \"concentration\": \"1 mol/L\", \"volume\": \"1 L\", \"mass\": \"1 g\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"substance\": \"NaCl\", \"concentration\": \"1 mol/L\", \"volume\": \"1 L\", \"purity\": \"99 %\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"substance\": \"NaCl\", \"concentration\": \"1 mol/L\", \"amount\": \"1 mol\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"substance\": \"NaCl\", \"concentration\": \"1 mol/L\" }", "LYO0403 $.parts[0]")]
    [InlineData("{ \"substance\": \"NaCl\", \"concentration\": \"0 mol/L\", \"volume\": \"1 L\" }", "LYO0106 $.parts[0].concentration")]
    [InlineData("{ \"substance\": \"NaCl\", \"concentration\": \"-1 mol/L\", \"volume\": \"1 L\" }", "LYO0105 $.parts[0].concentration")]
    [InlineData("{ \"substance\": \"NaCl\", \"concentration\": \"1 mol/kg\", \"volume\": \"1 L\" }", "LYO0101 $.parts[0].concentration")]
    [InlineData("{ \"substance\": \"NaCl\", \"molality\": \"1 mol/L\", \"volume\": \"1 L\" }", "LYO0101 $.parts[0].molality")]
    [InlineData("{ \"substance\": \"NaCl\", \"massFraction\": \"101 %\", \"volume\": \"1 L\" }", "LYO0108 $.parts[0].massFraction")]
    [InlineData("{ \"substance\": \"NaCl\", \"massFraction\": \"0 %\", \"volume\": \"1 L\" }", "LYO0106 $.parts[0].massFraction")]
    [InlineData("{ \"substance\": \"NaCl\", \"concentration\": \"1 mol/L\", \"density\": \"0 g/mL\", \"volume\": \"1 L\" }", "LYO0106 $.parts[0].density")]
    [InlineData("{ \"substance\": \"NaCl\", \"concentration\": \"1 mol/L\", \"density\": \"-1 g/mL\", \"volume\": \"1 L\" }", "LYO0105 $.parts[0].density")]
    [InlineData("{ \"substance\": \"NaCl\", \"concentration\": \"1 mol/L\", \"volume\": \"1 L/min\" }", "LYO0104 $.parts[0].volume")]
    [InlineData("{ \"substance\": \"NaCl\", \"mass\": \"1 g\", \"purity\": \"0 %\" }", "LYO0108 $.parts[0].purity")]
    [InlineData("{ \"substance\": \"NaCl\", \"mass\": \"1 g\", \"purity\": \"110.1 %\" }", "LYO0108 $.parts[0].purity")]
    [InlineData("{ \"substance\": \"NaCl\", \"mass\": \"1 g\", \"purity\": 99.5 }", "LYO0208 $.parts[0].purity")]
    [InlineData("{ \"substance\": \"NaCl\", \"mass\": \"10 mL\" }", "LYO0101 $.parts[0].mass")]
    [InlineData("{ \"substance\": \"NaCl\", \"mass\": \"12,5 g\" }", "LYO0103 $.parts[0].mass")]
    [InlineData("{ \"substance\": \"NaCl\", \"mass\": \"\" }", "LYO0102 $.parts[0].mass")]
    [InlineData("{ \"substance\": \"NaCl\", \"mass\": \"1e308 kg\" }", "LYO0412 $.parts")]
    [InlineData("{ \"substance\": \"NaCl\", \"amount\": \"1e308 mol\" }", "LYO0412 $.parts")]
    [InlineData("{ \"substance\": 5, \"mass\": \"1 g\" }", "LYO0208 $.parts[0].substance")]
    [InlineData("{ \"substance\": \"unobtainium\", \"mass\": \"1 g\" }", "LYO0301 $.parts[0].substance")]
    [InlineData("{ \"stock\": \"acid\", \"volume\": \"1 L\" }", "LYO0404 $.parts[0].stock")]
    [InlineData("{ \"stock\": 5, \"volume\": \"1 L\" }", "LYO0208 $.parts[0].stock")]
    [InlineData("{ \"stock\": \"acid\", \"substance\": \"HCl\", \"volume\": \"1 L\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"stock\": \"acid\", \"concentration\": \"1 mol/L\", \"volume\": \"1 L\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"stock\": \"acid\", \"amount\": \"1 mol\" }", "LYO0402 $.parts[0]")]
    [InlineData("{ \"recipe\": { } }", "LYO0207 $.parts[0].recipe")]
    [InlineData("{ \"recipe\": 5 }", "LYO0208 $.parts[0].recipe")]
    [InlineData("{ \"recipe\": { \"format\": \"lyonium-recipe/1\", \"parts\": [ ] } }", "LYO0401 $.parts[0].recipe.parts")]
    [InlineData("{ \"recipe\": { \"format\": \"lyonium-recipe/1.1\" } }", "LYO0204 $.parts[0].recipe.format")]
    [InlineData("{ \"recipe\": { \"format\": \"lyonium-recipe/1\", \"id\": \"\", \"parts\": [ { \"substance\": \"water\", \"mass\": \"-1 g\" } ] } }", "LYO0105 $.parts[0].recipe.parts[0].mass")]
    [InlineData("{ \"recipe\": { \"format\": \"lyonium-recipe/1\", \"id\": \"\", \"parts\": [ { \"substance\": \"water\", \"mass\": \"1 g\" } ] } }", "LYO0403 $.parts[0].recipe.id")]
    [InlineData("{ \"recipe\": { \"format\": \"lyonium-recipe/1\", \"parts\": [ { \"substance\": \"water\", \"mass\": \"1 g\" } ] }, \"mass\": \"2 g\" }", "LYO0411 $.parts[0]")]
    [InlineData("{ \"recipe\": { \"format\": \"lyonium-recipe/1\", \"parts\": [ { \"substance\": \"water\", \"mass\": \"1 g\" } ] }, \"mass\": \"1 g\", \"volume\": \"1 mL\" }", "LYO0402 $.parts[0]")]
    public void TryRead_badPart_isRefusedAtItsPlace(string part, string expected) =>
        Assert.Contains(expected, RecipeText.CodesAndPathsOf(RecipeText.With(part + ", " + Water)));

    [Fact]
    public void TryRead_unknownStock_namesThoseThatAreThere()
    {
        var fault = Assert.Single(RecipeText.FaultsOf(RecipeText.With(
            "{ \"stock\": \"acidd\", \"volume\": \"1 L\" }",
            "\"stocks\": { \"base\": { \"substance\": \"NaOH\", \"concentration\": \"1 mol/L\" }, \"acid\": { \"substance\": \"HCl\", \"concentration\": \"1 mol/L\" } }")));

        Assert.Contains("acid, base", fault.Remedy, StringComparison.Ordinal);
    }

    [Fact]
    public void TryRead_aBadStockThatIsPoured_isToldOnce()
    {
        var faults = RecipeText.CodesAndPathsOf(RecipeText.With(
            "{ \"stock\": \"my acid\", \"volume\": \"1 L\" }, { \"stock\": \"my acid\", \"volume\": \"2 L\" }",
            "\"stocks\": { \"my acid\": { \"substance\": \"unobtainium\", \"concentration\": \"1 mol/L\" } }"));

        Assert.Equal(["LYO0301 $.stocks['my acid'].substance"], faults);
    }

    [Fact]
    public void TryRead_duplicateIds_areRefused()
    {
        Assert.Equal(
            ["LYO0405 $.parts[1].id"],
            RecipeText.CodesAndPathsOf(RecipeText.With("{ \"id\": \"a\", \"substance\": \"water\", \"mass\": \"1 g\" }, { \"id\": \"a\", \"substance\": \"water\", \"mass\": \"1 g\" }")));
    }

    [Fact]
    public void TryRead_noParts_isEmpty()
    {
        Assert.Equal(["LYO0401 $.parts"], RecipeText.CodesAndPathsOf(RecipeText.With("")));
        Assert.Contains("LYO0207 $", RecipeText.CodesAndPathsOf("{ \"format\": \"lyonium-recipe/1\" }"));
        Assert.Contains("LYO0208 $.parts", RecipeText.CodesAndPathsOf("{ \"format\": \"lyonium-recipe/1\", \"parts\": { } }"));
    }

    [Fact]
    public void TryRead_manyFaults_tellsThemAtOnceInTheOrderOfTheInput()
    {
        const string text = """
            { "format": "lyonium-recipe/1", "temperature": "-5 Cel", "stocks": { "a": { "substance": "unobtainium", "concentration": "1 mol/L" } },
              "parts": [ { "stock": "a", "volume": "1 g" }, { "substance": "NaCl", "mass": "-1 g" }, { "substance": "HCl", "concentration": "12 M", "density": "0 g/mL", "volume": "1 L" },
                         { "substance": "hydrochloric", "mass": "1 g" }, { "substance": "sulfuric acid", "concentration": "17.5 mol/L", "density": "1.2 g/mL", "volume": "1 mL" } ],
              "makeUpTo": "x" }
            """;

        Assert.Equal(
            [
                "LYO0108 $.temperature", "LYO0101 $.parts[0].volume", "LYO0105 $.parts[1].mass", "LYO0106 $.parts[2].density", "LYO0102 $.makeUpTo",
                "LYO0301 $.stocks.a.substance", "LYO0301 $.parts[3].substance", "LYO0408 $.parts[4]",
            ],
            RecipeText.CodesAndPathsOf(text));
    }

    [Fact]
    public void Read_null_throws()
    {
        Assert.Throws<ArgumentNullException>(() => RecipeJson.Read(null!));
        Assert.Throws<ArgumentNullException>(() => RecipeJson.TryRead((string)null!, SubstanceTable.Default));
        Assert.Throws<ArgumentNullException>(() => RecipeJson.TryRead(RecipeText.OfTheContract, null!));
        Assert.Throws<ArgumentNullException>(() => RecipeJson.Write(null!));
    }
}
