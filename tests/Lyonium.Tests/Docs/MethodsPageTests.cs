using System;
using System.Globalization;
using System.IO;
using System.Linq;
using System.Text;
using Lyonium.Equilibria;
using Lyonium.Tests.Solvers;
using Xunit;

namespace Lyonium.Tests.Docs;

/// <summary>
/// <c>docs/methods.md</c> shows how often each method answers and is right; with LYONIUM_UPDATE_DOCS=1 the figures are written anew. The
/// bars of the methods are held here as well.
/// </summary>
public sealed class MethodsPageTests
{
    private const string Page = "docs/methods.md";
    private const string Start = "<!-- figures -->\n";
    private const string End = "<!-- /figures -->";

    [Fact]
    public void Page_shows_the_figures()
    {
        var text = File.ReadAllText(Repository.File(Page)).Replace("\r\n", "\n", StringComparison.Ordinal);
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

    // Bar: within 0.02 for at least 95 % of single weak acids and bases in the gentle set.
    [Theory]
    [InlineData("ideal")]
    [InlineData("davies")]
    public void DominantAcid_single_gentle_acids_and_bases_within_0_02_for_95_percent(string model)
    {
        var singles = MethodFigures.Of(isGentle: true, Solving.Dominant, Model(model)).Singles;

        Assert.Equal(MethodFigures.Mixtures / 4, singles.All.Count);
        Assert.True(singles.Within(0.02) >= 0.95 * singles.All.Count, $"{singles.Within(0.02)} of {singles.All.Count}");
    }

    // Bar: within 0.001 whenever it says that it settled, in both sets.
    [Theory]
    [InlineData(false, "ideal")]
    [InlineData(false, "davies")]
    [InlineData(true, "ideal")]
    [InlineData(true, "davies")]
    public void SuccessiveApproximation_settled_always_within_0_001(bool isGentle, string model)
    {
        var figures = MethodFigures.Of(isGentle, Solving.Successive, Model(model));

        Assert.Equal(figures.Answered, figures.Within(0.001));
        Assert.True(figures.Answered > 0);
    }

    // Every assumption that a short-cut makes has its line on the page.
    [Fact]
    public void Page_names_every_assumption_and_formula()
    {
        var text = File.ReadAllText(Repository.File(Page));
        var codes = new[] { Solving.Dominant, (ISolver)Solving.Successive }
            .SelectMany(method => MethodFigures.Of(isGentle: false, method, Solving.Ideal).Answers)
            .SelectMany(one => one.Outcome.Assumptions)
            .Select(one => one.Code)
            .Distinct(StringComparer.Ordinal)
            .ToArray();

        Assert.True(codes.Length >= 8);
        Assert.All(codes, code => Assert.Contains("`" + code + "`", text, StringComparison.Ordinal));
    }

    private static string Write()
    {
        var page = new StringBuilder();
        page.Append("| set | activity coefficients | method | applies | answers | within 0.02 | within 0.001 | largest deviation | silent |\n");
        page.Append("|---|---|---|---|---|---|---|---|---|\n");
        foreach (var isGentle in new[] { false, true })
        {
            foreach (var model in new[] { "ideal", "davies" })
            {
                // The exact method is the yardstick: it answers every mixture of the sets, or the figures of the others cannot be made.
                page.Append(CultureInfo.InvariantCulture, $"| {Set(isGentle)} | {model} | exact | 100.0 % | 100.0 % | – | – | – | – |\n");
                foreach (var method in new ISolver[] { Solving.Successive, Solving.Dominant })
                {
                    var figures = MethodFigures.Of(isGentle, method, Model(model));
                    var silent = figures.Answers.Count(one => Math.Abs(one.Deviation) > 0.02 && one.Outcome.Assumptions.All(assumption => assumption.Held));
                    var applies = figures.All.Count - figures.With(SolverStatus.DoesNotApply);
                    page.Append(
                        CultureInfo.InvariantCulture,
                        $"| {Set(isGentle)} | {model} | {method.Name} | {Part(applies, figures.All.Count)} | {Part(figures.Answered, figures.All.Count)} | ");
                    page.Append(
                        CultureInfo.InvariantCulture,
                        $"{Part(figures.Within(0.02), figures.Answered)} | {Part(figures.Within(0.001), figures.Answered)} | {figures.Worst:G2} | {silent} |\n");
                }
            }
        }

        page.Append("\nOne weak acid or base alone, from the gentle set:\n\n");
        page.Append("| activity coefficients | method | mixtures | within 0.02 | within 0.001 | largest deviation |\n|---|---|---|---|---|---|\n");
        foreach (var model in new[] { "ideal", "davies" })
        {
            foreach (var method in new ISolver[] { Solving.Successive, Solving.Dominant })
            {
                var singles = MethodFigures.Of(isGentle: true, method, Model(model)).Singles;
                page.Append(
                    CultureInfo.InvariantCulture,
                    $"| {model} | {method.Name} | {singles.All.Count} | {Part(singles.Within(0.02), singles.All.Count)} | {Part(singles.Within(0.001), singles.All.Count)} | {singles.Worst:G2} |\n");
            }
        }

        return page.ToString();
    }

    private static string Set(bool isGentle) => isGentle ? "gentle" : "hard";

    private static string Part(int count, int of) => string.Create(CultureInfo.InvariantCulture, $"{100.0 * count / of:F1} %");

    private static IActivityModel Model(string name) => name == "ideal" ? Solving.Ideal : Solving.Davies;
}
