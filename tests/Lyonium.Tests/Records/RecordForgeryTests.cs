using System;
using System.IO;
using System.Linq;
using System.Text.Json.Nodes;
using Lyonium.Predictions;
using Lyonium.Records;
using Lyonium.Solvers;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Records;

/// <summary>A record that was edited is told, field by field.</summary>
public sealed class RecordForgeryTests
{
    private static readonly string Sound = Record("exact");

    [Theory]
    [InlineData("reported.pH", "\"7.00\"", "$.reported.pH")]
    [InlineData("reported.rule", "\"three decimals\"", "$.reported.rule")]
    [InlineData("pHydrogenConcentration", "4", "$.pHydrogenConcentration")]
    [InlineData("uncertainty", "{ }", "$.uncertainty")]
    [InlineData("temperature.value", "37", "$.temperature.value")]
    [InlineData("temperature.unit", "\"K\"", "$.temperature.unit")]
    [InlineData("volume.value", "1", "$.volume.value")]
    [InlineData("water.unit", "\"g\"", "$.water.unit")]
    [InlineData("ionicStrength.value", "0.01", "$.ionicStrength.value")]
    [InlineData("assumptions", "[]", "$.assumptions[ionic-strength-in-range bates-guggenheim]")]
    [InlineData("assumptions.0.held", "null", "$.assumptions[ionic-strength-in-range bates-guggenheim].held")]
    [InlineData("assumptions.0.basis", "\"hearsay\"", "$.assumptions[ionic-strength-in-range bates-guggenheim].basis")]
    [InlineData("assumptions.0.limit", "5", "$.assumptions[ionic-strength-in-range bates-guggenheim].limit")]
    [InlineData("species.0.concentration.value", "1", "$.species[water:2].concentration.value")]
    [InlineData("species.0.molality.value", "1", "$.species[water:2]")]
    [InlineData("species.0.molality.unit", "\"mol/L\"", "$.species[water:2].molality.unit")]
    [InlineData("species.2.fraction", "0.5", "$.species[*].fraction")]
    [InlineData("species.2.charge", "7", "$.species[*].charge")]
    [InlineData("evidence.constants.0.source", "\"hearsay\"", "$.evidence.constants[*].source")]
    [InlineData("evidence.constants.0.known", "\"guessed\"", "$.evidence.constants[*].known")]
    [InlineData("evidence.constants.0.value", "1", "$.evidence.constants[*]")]
    [InlineData("evidence.bracket", "[ 0, 14 ]", "$.evidence.bracket[0]")]
    [InlineData("evidence.evaluations", "1", "$.evidence.evaluations")]
    [InlineData("evidence.table.sha256", "\"0\"", "$.evidence.table.sha256")]
    [InlineData("evidence.table.layers", "[ { } ]", "$.evidence.table.layers")]
    [InlineData("buffer", "null", "$.buffer")]
    [InlineData("buffer", "[]", "$.buffer")]
    [InlineData("buffer.capacity.value", "1e999", "$.buffer.capacity.value")]
    [InlineData("buffer.capacity.unit", "\"mmol/L\"", "$.buffer.capacity.unit")]
    [InlineData("notes", "{ \"who\": \"somebody else\" }", "$.notes")]
    [InlineData("colours", "1", "")]
    [InlineData("evidence.colours", "1", "$.evidence.colours")]
    [InlineData("cautions", "{ }", "$.cautions")]
    [InlineData("iterates", "[ { \"pH\": 7, \"correction\": 0 } ]", "$.iterates[0]")]
    public void TryReplay_what_was_edited_is_told(string at, string value, string path)
    {
        var attempt = new RecordReplay(SubstanceTable.Default).TryReplay(Edited(Sound, at, JsonNode.Parse(value)));
        if (path.Length == 0)
        {
            Assert.Equal("LYO0205", Assert.Single(attempt.Faults).Code);
            return;
        }

        Assert.False(attempt.Value.Agrees);
        Assert.Contains(attempt.Value.Differences, one => Fits(one.Path, path));
    }

    [Theory]
    [InlineData("buffer", "$.buffer")]
    [InlineData("uncertainty", "$.uncertainty")]
    [InlineData("reported", "$.reported")]
    [InlineData("temperature", "$.temperature")]
    [InlineData("assumptions", "$.assumptions")]
    [InlineData("cautions", "$.cautions")]
    [InlineData("evidence.software", "$.evidence.software")]
    [InlineData("evidence.residual", "$.evidence.residual")]
    [InlineData("species.0.id", "$.species[water:2]")]
    [InlineData("evidence.constants.0", "$.evidence.constants[*]")]
    public void TryReplay_what_was_removed_is_told(string at, string path)
    {
        var report = Replayed(Edited(Sound, at, null, isRemoved: true));

        Assert.Contains(report.Differences, one => Fits(one.Path, path) && one.Replayed.Length > 0);
    }

    [Theory]
    [InlineData("species")]
    [InlineData("evidence.constants")]
    [InlineData("assumptions")]
    public void TryReplay_an_entry_that_stands_twice_is_told(string at)
    {
        var record = JsonNode.Parse(Sound)!;
        var list = (JsonArray)Find(record, at)!;
        list.Add(list[0]!.DeepClone());

        var difference = Assert.Single(Replayed(record.ToJsonString()).Differences);
        Assert.Equal("", difference.Replayed);
        Assert.NotEqual("", difference.Recorded);
    }

    [Fact]
    public void TryReplay_a_member_that_stands_twice_is_told()
    {
        var twice = Sound.Replace("\"rule\":", "\"rule\": \"another\", \"rule\":", StringComparison.Ordinal);

        Assert.All(Replayed(twice).Differences, one => Assert.Equal("$.reported.rule", one.Path));
        Assert.False(Replayed(twice).Agrees);
    }

    // What else is written differently says the same: blanks, order of members, digits of a number.
    [Fact]
    public void TryReplay_another_way_of_writing_agrees()
    {
        var record = JsonNode.Parse(Sound)!.AsObject();
        var notes = record["notes"]!;
        record.Remove("notes");
        record.Insert(1, "notes", notes);

        Assert.Equal([], Replayed(record.ToJsonString()).Differences);
    }

    [Theory]
    [InlineData("evidence.evaluations", "1", true)]
    [InlineData("evidence.residual", "1e-30", true)]
    [InlineData("evidence.inputResolution", "1e-15", true)]
    [InlineData("evidence.bracket", "[ 0, 14 ]", true)]
    [InlineData("evidence.bracket", "[ 13, 14 ]", false)]
    [InlineData("evidence.bracket", "[ 0 ]", false)]
    [InlineData("evidence.evaluations", "\"many\"", false)]
    [InlineData("assumptions.0.basis", "\"hearsay\"", false)]
    [InlineData("reported.pH", "\"7.00\"", false)]
    [InlineData("evidence.constants.0.source", "\"hearsay\"", false)]
    [InlineData("species.0.molality.value", "1", false)]
    public void TryReplay_of_another_build_allows_what_may_differ(string at, string value, bool agrees)
    {
        var record = Edited(Edited(Sound, "evidence.software.target", "netstandard2.0"), at, JsonNode.Parse(value));

        Assert.Equal((agrees, false), (Replayed(record).Agrees, Replayed(record).IsSameBuild));
    }

    [Fact]
    public void TryReplay_a_number_within_the_bound_agrees_only_on_another_build()
    {
        var record = JsonNode.Parse(Sound)!;
        var molality = record["species"]![0]!["molality"]!["value"]!.GetValue<double>();
        var nearly = Edited(Sound, "species.0.molality.value", JsonValue.Create(molality * (1 + 5e-8)));

        Assert.Equal(["$.species[water:2]"], Replayed(nearly).Differences.Select(one => one.Path));
        Assert.True(Replayed(Edited(nearly, "evidence.software.version", "0.0.1")).Agrees);
        var off = Edited(Sound, "species.0.molality.value", JsonValue.Create(molality * (1 + 2e-7)));
        Assert.False(Replayed(Edited(off, "evidence.software.version", "0.0.1")).Agrees);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    public void TryReplay_a_flag_turned_over_is_told_on_any_build(int which)
    {
        var held = JsonNode.Parse(Sound)!["assumptions"]![which]!["held"]!.GetValue<bool>();
        var turned = Edited(Sound, $"assumptions.{which}.held", !held);

        Assert.EndsWith("].held", Assert.Single(Replayed(turned).Differences).Path, StringComparison.Ordinal);
        Assert.False(Replayed(Edited(turned, "evidence.software.version", "0.0.1")).Agrees);
    }

    [Fact]
    public void TryReplay_an_edited_iterate_is_told()
    {
        var record = Record("successive-approximation");
        Assert.True(Replayed(record).Agrees);

        Assert.Equal(["$.iterates[0].pH"], Replayed(Edited(record, "iterates.0.pH", 1.5)).Differences.Select(one => one.Path));
    }

    // As deep as a recipe is read.
    [Fact]
    public void TryReplay_of_deep_notes_agrees()
    {
        const int deepest = 62;
        var recipe = RecipeText.With("{ \"substance\": \"water\", \"mass\": \"1 kg\" }", $"\"notes\": {{ \"a\": {new string('[', deepest)}1.50{new string(']', deepest)} }}");
        var record = RecordJson.Write(new Predictor().Predict(RecipeJson.Read(recipe)));

        Assert.Equal([], Replayed(record).Differences);
        Assert.Equal([], Replayed(record.Replace("1.50", "15e-1", StringComparison.Ordinal)).Differences);
    }

    // A number of the host's is compared to its last digit, also where a double has fewer.
    [Fact]
    public void TryReplay_notes_that_differ_in_a_digit_are_told()
    {
        var record = JsonNode.Parse(Sound)!;
        record["notes"]!["lot"] = JsonNode.Parse("12345678901234567891");

        Assert.Equal(["$.notes.lot"], Replayed(record.ToJsonString()).Differences.Select(one => one.Path));
    }

    [Fact]
    public void TryReplay_a_thousand_differences_are_enough()
    {
        var record = JsonNode.Parse(Sound)!;
        var species = (JsonArray)record["species"]!;
        for (var i = 0; i < 5000; i++)
        {
            species.Add(i);
        }

        Assert.Equal(1000, Replayed(record.ToJsonString()).Differences.Count);
    }

    private static bool Fits(string path, string wanted)
    {
        var star = wanted.IndexOf('*', StringComparison.Ordinal);
        return star < 0
            ? path == wanted || path.StartsWith(wanted + "[", StringComparison.Ordinal) || path.StartsWith(wanted + ".", StringComparison.Ordinal)
            : path.StartsWith(wanted[..star], StringComparison.Ordinal) && path.EndsWith(wanted[(star + 1)..], StringComparison.Ordinal);
    }

    private static ReplayReport Replayed(string record) => new RecordReplay(SubstanceTable.Default).TryReplay(record).Value;

    private static string Edited(string record, string at, JsonNode? value, bool isRemoved = false)
    {
        var root = JsonNode.Parse(record)!;
        var cut = at.LastIndexOf('.');
        var above = cut < 0 ? root : Find(root, at[..cut])!;
        var name = at[(cut + 1)..];
        if (above is JsonArray list)
        {
            list.RemoveAt(int.Parse(name, System.Globalization.CultureInfo.InvariantCulture));
        }
        else if (isRemoved)
        {
            above.AsObject().Remove(name);
        }
        else
        {
            above[name] = value;
        }

        return root.ToJsonString();
    }

    private static JsonNode? Find(JsonNode root, string at) => at.Split('.').Aggregate(
        (JsonNode?)root, (node, name) => node is JsonArray list ? list[int.Parse(name, System.Globalization.CultureInfo.InvariantCulture)] : node![name]);

    private static string Record(string method)
    {
        var recipe = JsonNode.Parse(File.ReadAllText(Repository.File("docs/examples/buffer.json")))!;
        recipe["notes"] = JsonNode.Parse("{ \"who\": \"Tern Quay\", \"lot\": 12345678901234567890 }");
        return RecordJson.Write(new Predictor(SubstanceTable.Default, Methods.Find(method)).Predict(RecipeJson.Read(recipe.ToJsonString())));
    }
}
