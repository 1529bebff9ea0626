using System;
using System.Diagnostics;
using System.Globalization;
using System.IO;
using System.Linq;
using System.Text;
using System.Threading;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Provenance;
using Lyonium.Qualification;
using Lyonium.Substances;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Qualification;

/// <summary>The published checks run in a host's own process, with its own layers, and say what came of them.</summary>
public sealed class QualifierTests
{
    private static readonly Lazy<QualificationReport> Default = new(() => new Qualifier().Run());

    [Fact]
    public void Run_defaults_nothing_fails()
    {
        var failed = Default.Value.Outcomes.Where(one => one.Verdict == CheckVerdict.Fails)
            .Select(one => FormattableString.Invariant($"{one.Check.Id} {one.Check.Expected} {one.Obtained:F5} {one.Failure}"));

        Assert.Equal([], failed);
        Assert.True(Default.Value.IsPassed);
    }

    [Fact]
    public void Run_has_at_least_400_checks_in_less_than_20_seconds()
    {
        var clock = Stopwatch.StartNew();
        var report = new Qualifier().Run();

        Assert.True(clock.Elapsed < TimeSpan.FromSeconds(20), clock.Elapsed.ToString());
        Assert.True(report.Outcomes.Count >= 400, report.Outcomes.Count.ToString(CultureInfo.InvariantCulture));
        Assert.True(report.Holds >= 200, "judged against figures that were read or derived");
        Assert.Equal(report.Outcomes.Count, report.Holds + report.HoldsAgainstDerived + report.AgreesValueNotRead + report.Fails + report.Reported);
    }

    [Fact]
    public void Checks_are_complete_and_have_ids_of_their_own()
    {
        Assert.All(Qualifier.Checks, check =>
        {
            Assert.NotEmpty(check.Source);
            Assert.NotEmpty(check.Reason);
            Assert.True(check.Tolerance is null or > 0, check.Id);
        });
        Assert.Equal(Qualifier.Checks.Count, Qualifier.Checks.Select(check => check.Id).Distinct(StringComparer.Ordinal).Count());
        Assert.Equal(Qualifier.Checks, Default.Value.Outcomes.Select(one => one.Check));
    }

    // A row that is not judged has no tolerance, and the reason says so.
    [Fact]
    public void Checks_without_tolerance_say_that_they_are_not_judged() =>
        Assert.All(
            Qualifier.Checks.Where(check => check.Tolerance is null),
            check => Assert.StartsWith("not judged: ", check.Reason, StringComparison.Ordinal));

    [Fact]
    public void Files_of_checks_hold_to_their_schema()
    {
        var files = Directory.GetFiles(Path.Combine(Repository.Root, "src", "Lyonium", "Data", "checks"), "*.json");

        Assert.NotEmpty(files);
        Assert.All(files, file => Schemas.Checks.Hold(File.ReadAllText(file)));
    }

    [Fact]
    public void ToJson_holds_to_its_schema_and_tells_the_sum()
    {
        var json = Default.Value.ToJson();

        Schemas.Qualification.Hold(json);
        using var document = System.Text.Json.JsonDocument.Parse(json);
        Assert.Equal(Default.Value.AgreesValueNotRead, document.RootElement.GetProperty("sum").GetProperty("agreesValueNotRead").GetInt32());
        Assert.Equal(Default.Value.Outcomes.Count, document.RootElement.GetProperty("checks").GetArrayLength());
        Assert.Equal("holds", document.RootElement.GetProperty("checks")[0].GetProperty("verdict").GetString());
    }

    [Fact]
    public void ToText_names_where_it_ran_and_what_it_is_evidence_of()
    {
        var text = Default.Value.ToText();

        Assert.Contains("installation qualification", text, StringComparison.Ordinal);
        Assert.Contains("operational", text, StringComparison.Ordinal);
        Assert.Contains("agrees, value not read", text, StringComparison.Ordinal);
        var environment = Default.Value.Environment;
        Assert.All(
            new[] { environment.AssemblySha256, environment.Runtime, environment.Processor, environment.Culture, environment.Table.Sha256 },
            part => Assert.Contains(part, text, StringComparison.Ordinal));
    }

    [Fact]
    public void Environment_hash_is_that_of_the_assembly_file()
    {
        var bytes = File.ReadAllBytes(typeof(Qualifier).Assembly.Location);
        var hash = Convert.ToHexStringLower(System.Security.Cryptography.SHA256.HashData(bytes));

        Assert.Equal(hash, Default.Value.Environment.AssemblySha256);
    }

    // A laboratory's own phosphate constant: the phosphate standards no longer come out, and the report names the layer.
    [Fact]
    public void Run_with_a_layer_that_changes_a_constant_fails_and_names_the_layer()
    {
        const string own = """
            { "format": "lyonium-table/1", "edition": "1", "sources": [ { "key": "own", "citation": "own measurement" } ],
              "families": [ { "id": "phosphate", "name": "phosphate",
                "forms": [ { "formula": "H3PO4" }, { "formula": "H2PO4^-" }, { "formula": "HPO4^2-" }, { "formula": "PO4^3-" } ],
                "steps": [
                  { "pKa": { "value": 2.15, "temperatureCelsius": 25, "ionicStrength": 0, "source": "own", "known": "read" } },
                  { "pKa": { "value": 7.0, "temperatureCelsius": 25, "ionicStrength": 0, "source": "own", "known": "read" } },
                  { "pKa": { "value": 12.35, "temperatureCelsius": 25, "ionicStrength": 0, "source": "own", "known": "read" } } ] } ] }
            """;
        var table = SubstanceTable.Default.TryLayer("own.json", new MemoryStream(Encoding.UTF8.GetBytes(own))).GetValueOrThrow();
        var report = new Qualifier(new Predictor(table)).Run();

        Assert.False(report.IsPassed);
        Assert.Contains(report.Outcomes, one => one.Verdict == CheckVerdict.Fails && one.Check.Id.StartsWith("nbs-phosphate11-1962", StringComparison.Ordinal));
        Assert.Equal("own.json", Assert.Single(report.Environment.Table.Layers).Name);
        Assert.Contains("own.json", report.ToText(), StringComparison.Ordinal);
    }

    [Fact]
    public void Run_with_a_table_that_lacks_the_substances_fails_with_the_reason()
    {
        var report = new Qualifier(new Predictor(Substances.UserTable.Sound())).Run();

        var failed = report.Outcomes.First(one => one.Failure.Length > 0);
        Assert.Equal(CheckVerdict.Fails, failed.Verdict);
        Assert.Contains("LYO0301", failed.Failure, StringComparison.Ordinal);
        Schemas.Qualification.Hold(report.ToJson());
    }

    [Fact]
    public void Run_without_activity_coefficients_misses_the_standards()
    {
        var report = new Qualifier(new Predictor(SubstanceTable.Default, null, new IdealModel())).Run();

        Assert.False(report.IsPassed);
        Assert.Equal("ideal", report.Environment.ActivityModel);
        Assert.True(report.ModelErrors[^1].RootMeanSquareDeviation > 0.1);
    }

    [Fact]
    public void Run_in_another_culture_gives_the_same_figures()
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = Quantities.CultureTests.Hostile();
            var report = new Qualifier().Run();

            Assert.Equal(Default.Value.Outcomes.Select(one => one.Obtained), report.Outcomes.Select(one => one.Obtained));
            Assert.Equal(Default.Value.ToMarkdown(), report.ToMarkdown());
            Assert.Equal(Default.Value.ToJson(), report.ToJson());
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Run_stopped_throws() =>
        Assert.Throws<OperationCanceledException>(() => new Qualifier().Run(new CancellationToken(canceled: true)));

    [Fact]
    public void Qualifier_null_throws() => Assert.Throws<ArgumentNullException>(() => new Qualifier(null!));

    [Theory]
    [InlineData(1.0, 0.1, Known.Read, CheckVerdict.Holds, false)]
    [InlineData(1.1, 0.1, Known.Read, CheckVerdict.Holds, false)]
    [InlineData(1.1001, 0.1, Known.Read, CheckVerdict.Fails, false)]
    [InlineData(0.8999, 0.1, Known.Memory, CheckVerdict.Fails, false)]
    [InlineData(1.05, 0.1, Known.Memory, CheckVerdict.Holds, true)]
    [InlineData(1.05, 0.1, Known.ReadAndMemory, CheckVerdict.Holds, false)]
    [InlineData(double.NaN, 0.1, Known.Read, CheckVerdict.Fails, false)]
    [InlineData(double.NaN, null, Known.Read, CheckVerdict.Fails, false)]
    [InlineData(7.0, null, Known.Memory, CheckVerdict.Reported, false)]
    public void Verdict_follows_from_the_deviation(double obtained, double? tolerance, Known known, CheckVerdict verdict, bool isNotRead)
    {
        var outcome = new CheckOutcome
        {
            Check = new PublishedCheck
            {
                Id = "a:1",
                Title = "a",
                Source = "a",
                Known = known,
                Quantity = "pH",
                Unit = "1",
                Inputs = [],
                Expected = 1,
                Tolerance = tolerance,
                Reason = "a",
            },
            Obtained = obtained,
        };

        Assert.Equal((verdict, isNotRead), (outcome.Verdict, outcome.AgreesValueNotRead));
    }
}
