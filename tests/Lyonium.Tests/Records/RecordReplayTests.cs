using System;
using System.IO;
using System.Linq;
using System.Text.Json.Nodes;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Records;
using Lyonium.Solvers;
using Lyonium.Substances;

using Lyonium.Tests.Substances;
using Xunit;

namespace Lyonium.Tests.Records;

public sealed class RecordReplayTests
{
    private static readonly RecordReplay Replay = new(SubstanceTable.Default);

    public static TheoryData<string, string, string> Cases
    {
        get
        {
            var cases = new TheoryData<string, string, string>();
            foreach (var file in Directory.EnumerateFiles(Repository.File("docs/examples"), "*.json").Order(StringComparer.Ordinal))
            {
                foreach (var model in ActivityModels.All)
                {
                    cases.Add(System.IO.Path.GetFileName(file), "exact", model.Name);
                }

                cases.Add(System.IO.Path.GetFileName(file), "successive-approximation", "davies");
            }

            return cases;
        }
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void TryReplay_own_record_is_bit_identical(string example, string method, string model)
    {
        var report = Replay.TryReplay(Record(example, method, model)).Value;

        Assert.Equal([], report.Differences);
        Assert.True(report is { Agrees: true, IsBitIdentical: true, IsSameBuild: true });
    }

    // What a /1 record lacks: buffer figures and the uncertainty of the model.
    [Fact]
    public void TryReplay_record_of_the_first_version_agrees()
    {
        var record = FirstVersion(Record("buffer.json", "exact", "bates-guggenheim"));
        Schemas.FirstRecord.Hold(record);

        Assert.True(Replay.TryReplay(record).Value is { Agrees: true, IsBitIdentical: true });
        var later = record.Replace("\"method\"", "\"buffer\": null, \"method\"", StringComparison.Ordinal);
        Assert.Equal(["LYO0205"], Replay.TryReplay(later).Faults.Select(fault => fault.Code));
    }

    [Theory]
    [InlineData("capacity")]
    [InlineData("temperatureCoefficient")]
    public void TryReplay_changed_buffer_figure_is_told(string figure)
    {
        var record = JsonNode.Parse(Record("buffer.json", "exact", "bates-guggenheim"))!;
        record["buffer"]![figure]!["value"] = 0.5;

        Assert.Equal([$"$.buffer.{figure}.value"], Replay.TryReplay(record.ToJsonString()).Value.Differences.Select(one => one.Path));
    }

    private static string FirstVersion(string record)
    {
        var node = JsonNode.Parse(record)!.AsObject();
        node["format"] = "lyonium-record/1";
        node.Remove("pairSets");
        node.Remove("buffer");
        node.Remove("uncertainty");
        return node.ToJsonString();
    }

    [Fact]
    public void TryReplay_changed_pH_is_told()
    {
        var record = Record("buffer.json", "exact", "bates-guggenheim");
        var pH = new Predictor().Predict(RecipeJson.Read(Example("buffer.json"))).PH;
        var changed = record.Replace(FormattableString.Invariant($"\"pH\": {pH:R},"), "\"pH\": 7.25,", StringComparison.Ordinal);
        Assert.NotEqual(record, changed);

        var report = Replay.TryReplay(changed).Value;

        Assert.False(report.Agrees);
        Assert.Equal(("$.pH", "7.25"), (Assert.Single(report.Differences).Path, report.Differences[0].Recorded));
    }

    [Fact]
    public void TryReplay_of_another_build_allows_a_billionth()
    {
        var pH = new Predictor().Predict(RecipeJson.Read(Example("buffer.json"))).PH;
        var nearly = FormattableString.Invariant($"\"pH\": {pH + 5e-10:R},");
        var record = Record("buffer.json", "exact", "bates-guggenheim").Replace(FormattableString.Invariant($"\"pH\": {pH:R},"), nearly, StringComparison.Ordinal);

        Assert.False(Replay.TryReplay(record).Value.Agrees);
        var older = Replay.TryReplay(record.Replace("\"target\": \"net10.0\"", "\"target\": \"netstandard2.0\"", StringComparison.Ordinal)).Value;
        Assert.True(older is { Agrees: true, IsBitIdentical: false, IsSameBuild: false });
    }

    [Fact]
    public void TryReplay_against_another_table_names_the_constants_that_differ()
    {
        var table = Layer.TryOver(SubstanceTable.Default, Layer.With(Layer.Family("formate", ["HCOOH", "HCOO^-"], Layer.Step(3.7)))).Value;

        var report = new RecordReplay(table).TryReplay(Record("weak-acids-close.json", "exact", "bates-guggenheim")).Value;

        var paths = report.Differences.Select(one => one.Path).ToArray();
        Assert.Contains("$.pH", paths);
        Assert.Contains("$.evidence.constants[formate:1 pKa]", paths);
        Assert.Contains("$.evidence.table.layers", paths);
        Assert.DoesNotContain("$.evidence.constants[lactate:1 pKa]", paths);
    }

    [Theory]
    [InlineData("{ }", "LYO0207")]
    [InlineData("[]", "LYO0208")]
    [InlineData("{ \"format\": \"lyonium-record/1.2\" }", "LYO0204")]
    [InlineData("{ \"format\": \"lyonium-recipe/1\" }", "LYO0203")]
    [InlineData("{ \"format\": \"lyonium-record/1\" }", "LYO0207")]
    [InlineData("{ \"format\": \"lyonium-record/1\", \"colour\": 1 }", "LYO0205")]
    public void TryReplay_what_is_no_record_is_refused(string json, string code) =>
        Assert.Contains(Replay.TryReplay(json).Faults, one => one.Code == code);

    [Fact]
    public void TryReplay_of_a_method_that_is_not_known_names_those_that_are()
    {
        var record = Record("buffer.json", "exact", "bates-guggenheim").Replace("\"method\": \"exact\"", "\"method\": \"guess\"", StringComparison.Ordinal);

        var fault = Assert.Single(Replay.TryReplay(record).Faults);

        Assert.Equal(("LYO0209", "$.method"), (fault.Code, fault.Path));
        Assert.Contains("successive-approximation", fault.Remedy, StringComparison.Ordinal);
    }

    private static string Record(string example, string method, string model) =>
        RecordJson.Write(new Predictor(SubstanceTable.Default, Methods.Find(method), ActivityModels.Find(model)).Predict(RecipeJson.Read(Example(example))));

    private static string Example(string name) => File.ReadAllText(Repository.File("docs/examples/" + name));
}
