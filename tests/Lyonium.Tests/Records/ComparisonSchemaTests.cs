using System;
using System.IO;
using System.Linq;
using System.Text.Json.Nodes;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;
using Lyonium.Tests.Predictions;
using Xunit;

namespace Lyonium.Tests.Records;

/// <summary><c>lyonium-comparison/1</c>: what is written holds to its schema, and the schema refuses what breaks the contract.</summary>
public sealed class ComparisonSchemaTests
{
    [Fact]
    public void WrittenComparison_of_every_example_holds()
    {
        foreach (var file in Repository.Examples())
        {
            foreach (var model in ActivityModels.All)
            {
                Schemas.Comparison.Hold(Write(RecipeJson.Read(File.ReadAllText(file)), new Predictor(SubstanceTable.Default, activityModel: model)));
            }
        }
    }

    // Without an answer; figures that are no number in JSON; a method of somebody else's.
    [Theory]
    [InlineData("0.0001 mol", "formic acid")]
    [InlineData("1e-12 mol", "formic acid")]
    [InlineData("5 mol", "sulfuric acid")]
    [InlineData("0.1 mol", "sodium chloride")]
    public void WrittenComparison_of_odd_mixtures_holds(string amount, string substance)
    {
        var own = new FixedMethod("own method", _ => SolverOutcome.Answer(7) with
        {
            Assumptions = [new SolverAssumption("all-neglected", -1, double.PositiveInfinity, 0.02, Held: false, "a test")],
        });
        var recipe = Recipe.Named("odd").PourWater("1 kg").Add(amount, substance).Build();

        Schemas.Comparison.Hold(Write(recipe, new Predictor(SubstanceTable.Default, own)));
    }

    [Fact]
    public void WrittenComparison_says_what_the_comparison_says()
    {
        var comparison = new Predictor().TryCompare(Example(), 0.05).GetValueOrThrow();
        var written = JsonNode.Parse(ComparisonJson.Write(comparison))!;

        Assert.Equal("lyonium-comparison/1", (string?)written["format"]);
        Assert.Equal("TQ-FM-03", (string?)written["id"]);
        Assert.Equal(0.05, (double)written["tolerance"]!);
        Assert.Equal("bates-guggenheim", (string?)written["activityModel"]);
        foreach (var (row, text) in comparison.Rows.Zip(written["rows"]!.AsArray()))
        {
            Assert.Equal(row.Method, (string?)text!["method"]);
            Assert.Equal(row.PH, (double?)text["pH"]);
            Assert.Equal(row.Deviation, (double?)text["deviation"]);
            Assert.Equal(row.WithinTolerance, (bool?)text["withinTolerance"]);
            Assert.Equal(row.Assumptions.Select(one => (one.Code, one.Held)), text["assumptions"]!.AsArray().Select(one => ((string)one!["code"]!, (bool)one["held"]!)));
            Assert.Equal(row.Iterates.Select(one => one.PH), text["iterates"]!.AsArray().Select(one => (double)one!["pH"]!));
        }
    }

    [Fact]
    public void WrittenComparison_without_an_answer_pH_is_null_and_stands_there()
    {
        var recipe = Recipe.Named("thin").PourWater("1 kg").Add("0.0001 mol", "formic acid").Build();
        var row = JsonNode.Parse(Write(recipe, new Predictor()))!["rows"]![1]!.AsObject();

        Assert.True(row.ContainsKey("pH"));
        Assert.Null(row["pH"]);
        Assert.False(row.ContainsKey("deviation") || row.ContainsKey("withinTolerance"));
        Assert.NotNull(row["reason"]);
    }

    [Fact]
    public void ComparisonSchema_refuses_something_missing_or_changed()
    {
        var comparison = Write(Example(), new Predictor());
        Schemas.Comparison.Hold(comparison);
        foreach (var name in JsonNode.Parse(comparison)!.AsObject().Select(one => one.Key))
        {
            AssertRefused(comparison, root => root[name] = true);
            if (name != "id")
            {
                AssertRefused(comparison, root => root.Remove(name));
            }
        }

        foreach (var name in JsonNode.Parse(comparison)!["rows"]![1]!.AsObject().Select(one => one.Key))
        {
            AssertRefused(comparison, root => Row(root, 1).Remove(name));
            AssertRefused(comparison, root => Row(root, 1)[name] = new JsonObject());
        }

        AssertRefused(comparison, root => root["more"] = 1);
        AssertRefused(comparison, root => root["tolerance"] = 0);
        AssertRefused(comparison, root => root["format"] = "lyonium-comparison/2");
        AssertRefused(comparison, root => root["rows"] = new JsonArray());
        AssertRefused(comparison, root => Row(root, 1)["more"] = 1);
        AssertRefused(comparison, root => Row(root, 1)["pH"] = null);
        AssertRefused(comparison, root => Row(root, 1)["reason"] = "an answer has none");
        AssertRefused(comparison, root => Row(root, 1)["method"] = "exact");
        AssertRefused(comparison, root => Row(root, 0)["method"] = "other");
        AssertRefused(comparison, root => Row(root, 0)["deviation"] = 0.01);
        AssertRefused(comparison, root => Row(root, 0)["iterates"] = new JsonArray(1));
        AssertRefused(comparison, root => Row(root, 1)["iterates"]![0]!["correction"] = "none");
        AssertRefused(comparison, root => Row(root, 2)["assumptions"]![0]!["code"] = "No Code");
    }

    private static Recipe Example() =>
        RecipeJson.Read(File.ReadAllText(Path.Combine(Repository.Root, "docs", "examples", "weak-acids-close.json")));

    private static string Write(Recipe recipe, Predictor predictor) => ComparisonJson.Write(predictor.TryCompare(recipe).GetValueOrThrow());

    private static JsonObject Row(JsonObject root, int index) => root["rows"]![index]!.AsObject();

    private static void AssertRefused(string comparison, Action<JsonObject> change)
    {
        var changed = JsonNode.Parse(comparison)!.AsObject();
        change(changed);
        Assert.True(Schemas.Comparison.Objections(changed.ToJsonString()).Count > 0, changed.ToJsonString());
    }
}
