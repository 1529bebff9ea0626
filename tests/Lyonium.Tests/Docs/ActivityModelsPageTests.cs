using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Linq;
using System.Text;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Predictions;
using Lyonium.Qualification;
using Lyonium.Quantities;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Docs;

/// <summary>
/// <c>docs/activity-models.md</c> sets the models against the published checks; with LYONIUM_UPDATE_DOCS=1 the figures are written anew.
/// </summary>
public sealed class ActivityModelsPageTests
{
    private const string Page = "docs/activity-models.md";
    private const string Start = "<!-- figures -->\n";
    private const string End = "<!-- /figures -->";

    [Fact]
    public void Page_shows_the_figures()
    {
        var text = File.ReadAllText(Repository.File(Page)).ReplaceLineEndings("\n");
        var start = text.IndexOf(Start, StringComparison.Ordinal) + Start.Length;
        var end = text.IndexOf(End, StringComparison.Ordinal);
        Assert.True(start > Start.Length && end >= start, "The page has no place for the figures.");
        var current = text[..start] + "\n" + Write() + "\n" + text[end..];
        if (Environment.GetEnvironmentVariable("LYONIUM_UPDATE_DOCS") == "1")
        {
            File.WriteAllText(Repository.File(Page), current);
            return;
        }

        Assert.Equal(current, text);
    }

    [Fact]
    public void Page_names_every_model_with_its_source_and_range()
    {
        var text = File.ReadAllText(Repository.File(Page));
        Assert.All(ActivityModels.All, model =>
        {
            Assert.Contains("`" + model.Name + "`", text, StringComparison.Ordinal);
            Assert.Contains(model.Source, text, StringComparison.Ordinal);
            Assert.Contains(NumberText.Shortest(model.HighestIonicStrengthMolPerKg) + " mol/kg", text, StringComparison.Ordinal);
        });
    }

    [Fact]
    public void Readme_says_what_the_checks_give()
    {
        var report = Report(ActivityModels.Default);
        var at25 = Standards(report, 298.15, 298.15).ToArray();
        var text = File.ReadAllText(Repository.File("README.md")).ReplaceLineEndings("\n").Replace("\n  ", " ", StringComparison.Ordinal);

        var claim = string.Create(
            CultureInfo.InvariantCulture,
            $"within {Worst(at25.Where(IsPlain)):F3} at 25 °C (carbonate and tris {Worst(at25.Where(one => !IsPlain(one))):F3}) and within {Worst(Standards(report, 273.15, 323.15)):F3} from 0 to 50 °C");
        Assert.Contains(claim, text, StringComparison.Ordinal);
    }

    // The default is the model that the standards favour: no other has a smaller worst deviation over them.
    [Fact]
    public void Default_is_the_model_that_the_standards_favour()
    {
        var worst = ActivityModels.All.ToDictionary(model => model.Name, model => Worst(Standards(Report(model), 273.15, 323.15)), StringComparer.Ordinal);

        Assert.All(worst, one => Assert.True(one.Value >= worst[ActivityModels.Default.Name] - 1e-4, $"{one.Key}: {one.Value}"));
    }

    private static string Write()
    {
        var page = new StringBuilder();
        page.Append("| model | standards, 25 °C | carbonate, tris, 25 °C | standards, 0–50 °C | carbonate, tris, 0–50 °C | HCl–KCl, phthalate, phosphate series | all of these, root mean square |\n|---|---|---|---|---|---|---|\n");
        foreach (var model in ActivityModels.All)
        {
            var report = Report(model);
            var at25 = Standards(report, 298.15, 298.15).ToArray();
            var any = Standards(report, 273.15, 323.15).ToArray();
            var series = report.Outcomes.Where(one => one.Check.Id.StartsWith("bower-bates-1955-", StringComparison.Ordinal) && one.Check.Tolerance is not null).ToArray();
            var square = any.Concat(series).Average(one => one.Deviation * one.Deviation);
            page.Append(CultureInfo.InvariantCulture, $"| `{model.Name}` | {Worst(at25.Where(IsPlain)):F3} | {Worst(at25.Where(one => !IsPlain(one))):F3} ");
            page.Append(CultureInfo.InvariantCulture, $"| {Worst(any.Where(IsPlain)):F3} | {Worst(any.Where(one => !IsPlain(one))):F3} | {Worst(series):F3} | {Math.Sqrt(square):F4} |\n");
        }

        page.Append("\nMean activity coefficients at 25 °C, obtained over published (W. J. Hamer and Y.-C. Wu 1972, recalled):\n\n");
        page.Append("| model | ").Append(string.Join(" | ", Salts.Select(salt => salt + " 0.01 | " + salt + " 0.1"))).Append(" |\n|---|")
            .Append(string.Concat(Salts.Select(_ => "---|---|"))).Append('\n');
        foreach (var model in ActivityModels.All)
        {
            var report = Report(model);
            var cells = Salts.SelectMany(salt => new[] { "0.01 mol/kg", "0.1 mol/kg" }.Select(molality => Ratio(report, salt, molality)));
            page.Append(CultureInfo.InvariantCulture, $"| `{model.Name}` | {string.Join(" | ", cells)} |\n");
        }

        return page.ToString();
    }

    private static string[] Salts { get; } = ["HCl", "NaCl", "KCl", "NaOH"];

    private static readonly Dictionary<string, QualificationReport> Reports = new(StringComparer.Ordinal);

    private static QualificationReport Report(IActivityModel model)
    {
        lock (Reports)
        {
            if (!Reports.TryGetValue(model.Name, out var report))
            {
                report = new Qualifier(new Predictor(SubstanceTable.Default, null, model)).Run();
                Reports.Add(model.Name, report);
            }

            return report;
        }
    }

    private static string Ratio(QualificationReport report, string salt, string molality)
    {
        var one = report.Outcomes.Single(outcome =>
            outcome.Check.Id.StartsWith("hamer-wu-" + salt.ToLowerInvariant() + ":", StringComparison.Ordinal) && outcome.Check.Inputs.Any(input => input.Value == molality));
        return (one.Obtained / one.Check.Expected).ToString("F3", CultureInfo.InvariantCulture);
    }

    // The three-decimal values of the NBS and of IUPAC, lime apart.
    private static IEnumerable<CheckOutcome> Standards(QualificationReport report, double lowK, double highK) => report.Outcomes.Where(one =>
        one.Check.Quantity == "pH" && one.Check.Tolerance is not null
        && (one.Check.Id.StartsWith("nbs-", StringComparison.Ordinal) || one.Check.Id.StartsWith("iupac-phthalate-", StringComparison.Ordinal))
        && !one.Check.Id.Contains("two-decimals", StringComparison.Ordinal)
        && TemperatureK(one) >= lowK - 1e-6 && TemperatureK(one) <= highK + 1e-6);

    private static double TemperatureK(CheckOutcome one) =>
        Measure.Parse(one.Check.Inputs.Single(input => input.Key == "temperature").Value, Dimension.Temperature).Computed;

    private static bool IsPlain(CheckOutcome one) =>
        !one.Check.Id.Contains("carbonate", StringComparison.Ordinal) && !one.Check.Id.Contains("tris", StringComparison.Ordinal);

    private static double Worst(IEnumerable<CheckOutcome> outcomes) => outcomes.Max(one => Math.Abs(one.Deviation));
}
