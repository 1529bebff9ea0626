using System;
using System.IO;
using System.Text.Json.Nodes;
using Lyonium.Faults;
using Lyonium.Predictions;
using Lyonium.Records;
using Xunit;

namespace Lyonium.Tests.Records;

/// <summary>The published schemas hold for everything that is shipped and written, and refuse what breaks the contract.</summary>
public sealed class SchemaTests
{
    // What each record must show: carried constants, EU hazards, estimates, table densities, notes, marks by mass, uncertainties.
    public static TheoryData<string> Recipes { get; } =
    [
        RecipeText.OfTheContract,
        RecipeText.With("{ \"substance\": \"water\", \"volume\": \"1 L\" }"),
        RecipeText.With("{ \"substance\": \"EDTA\", \"amount\": \"0.01 mol\" }, { \"substance\": \"water\", \"mass\": \"1 kg\" }"),
        RecipeText.With("{ \"substance\": \"sodium hypochlorite\", \"concentration\": \"0.1 mol/L\", \"volume\": \"1 L\" }, { \"substance\": \"HCl\", \"massFraction\": \"37 %\", \"volume\": \"1 mL\" }"),
        RecipeText.With("{ \"substance\": \"tris\", \"mass\": \"10 g\" }, { \"substance\": \"water\", \"mass\": \"200 g\" }", "\"makeUpTo\": \"250 g\", \"notes\": { }"),
        RecipeText.With("{ \"substance\": \"citric acid\", \"concentration\": { \"value\": 0.1, \"unit\": \"M\", \"standardUncertainty\": 1e-4 }, \"volume\": \"0 mL\" }", "\"makeUpTo\": { \"value\": 0.5, \"unit\": \"L\", \"standardUncertainty\": 0.0002 }"),
        RecipeText.With("{ \"substance\": \"water\", \"mass\": \"-0 g\" }, { \"substance\": \"HCl\", \"molality\": \"1e-7 mol/kg\", \"mass\": \"1E3 g\" }", "\"temperature\": \"298.15 K\", \"preparedAt\": \"37 degC\""),
    ];

    [Fact]
    public void Table_holds() => Schemas.Table.Hold(File.ReadAllText(Path.Combine(Repository.Root, "src", "Lyonium", "Data", "table.json")));

    [Fact]
    public void Cautions_hold() => Schemas.Cautions.Hold(File.ReadAllText(Path.Combine(Repository.Root, "src", "Lyonium", "Data", "cautions.json")));

    [Fact]
    public void Examples_hold()
    {
        foreach (var file in Repository.Examples())
        {
            var text = File.ReadAllText(file);
            Schemas.Recipe.Hold(text);
            Schemas.Recipe.Hold(RecipeJson.Write(RecipeJson.Read(text)));
            Schemas.Record.Hold(RecordJson.Write(new Predictor().Predict(RecipeJson.Read(text))));
        }
    }

    [Theory]
    [MemberData(nameof(Recipes))]
    public void WrittenRecipe_holds(string text) => Schemas.Recipe.Hold(RecipeJson.Write(RecipeJson.Read(text)));

    [Theory]
    [MemberData(nameof(Recipes))]
    public void WrittenRecord_holds(string text) => Schemas.Record.Hold(RecordJson.Write(new Predictor().Predict(RecipeJson.Read(text))));

    [Theory]
    [InlineData("{")]
    [InlineData("{ \"format\": \"lyonium-recipe/9\" }")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\", \"\\u001b\\ud83d\\ude00\": 1, \"parts\": [ 1, { \"stock\": \"\\u0000\", \"volume\": \"NaN L\" } ] }")]
    public void WrittenFaults_hold(string text) => Schemas.Faults.Hold(FaultsJson.Write(RecipeText.FaultsOf(text)));

    [Fact]
    public void WrittenFaults_ofEveryKind_hold()
    {
        foreach (var kind in FaultKinds.All)
        {
            Schemas.Faults.Hold(FaultsJson.Write([Fault.Of(kind, "$.parts[0]", "\ud800 half")]));
        }
    }

    [Fact]
    public void RecipeSchema_refusesWhatTheReaderRefuses()
    {
        foreach (var part in new[]
        {
            "{ }", "5", "{ \"substance\": \"water\" }", "{ \"substance\": \"NaCl\", \"volume\": \"1 L\" }", "{ \"stock\": \"a\", \"amount\": \"1 mol\" }",
            "{ \"substance\": \"NaCl\", \"mass\": \"1,5 g\" }", "{ \"substance\": \"NaCl\", \"mass\": \"-1 g\" }", "{ \"substance\": \"NaCl\", \"mass\": \"1 mL\" }",
            "{ \"substance\": \"NaCl\", \"mass\": \"1 g\", \"purity\": \"111 %\" }", "{ \"substance\": \"NaCl\", \"amount\": \"1 mol\", \"purity\": \"99 %\" }",
            "{ \"substance\": \"water\", \"amount\": \"1 mol\" }", "{ \"id\": \"\", \"substance\": \"water\", \"mass\": \"1 g\" }",
        })
        {
            var text = RecipeText.With(part + ", { \"substance\": \"water\", \"mass\": \"1 kg\" }");
            Assert.NotEmpty(Schemas.Recipe.Objections(text));
            Assert.NotEmpty(RecipeText.FaultsOf(text));
        }

        Assert.NotEmpty(Schemas.Recipe.Objections(RecipeText.With("")));
        Assert.NotEmpty(Schemas.Recipe.Objections(RecipeText.OfTheContract.Replace("recipe/1", "recipe/1.1", StringComparison.Ordinal)));
        Assert.NotEmpty(Schemas.Recipe.Objections(RecipeText.OfTheContract.Replace("\"name\"", "\"nome\"", StringComparison.Ordinal)));
    }

    [Fact]
    public void RecordSchema_refusesARecordWithSomethingMissingOrChanged()
    {
        var record = RecordJson.Write(new Predictor().Predict(RecipeJson.Read(RecipeText.OfTheContract)));
        foreach (var property in JsonNode.Parse(record)!.AsObject())
        {
            if (property.Key == "notes")
            {
                continue;
            }

            var without = JsonNode.Parse(record)!.AsObject();
            without.Remove(property.Key);
            Assert.NotEmpty(Schemas.Record.Objections(without.ToJsonString()));
            var changed = JsonNode.Parse(record)!.AsObject();
            changed[property.Key] = true;
            Assert.NotEmpty(Schemas.Record.Objections(changed.ToJsonString()));
        }
    }

    [Fact]
    public void TableSchema_refusesANumberWithoutASource()
    {
        var text = Substances.UserTable.Text.Replace("\"ionicStrength\": 0, \"source\": \"own\",", "\"ionicStrength\": 0,", StringComparison.Ordinal);

        Assert.NotEqual(Substances.UserTable.Text, text);
        Assert.NotEmpty(Schemas.Table.Objections(text));
    }
}
