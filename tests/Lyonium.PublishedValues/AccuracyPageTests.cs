using System;
using System.IO;
using System.Linq;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary><c>docs/accuracy.md</c> shows the deviations from published pH; with LYONIUM_UPDATE_DOCS=1 it is written anew.</summary>
public sealed class AccuracyPageTests(ITestOutputHelper output)
{
    private const string Introduction = """
        # Accuracy against published pH

        Predictions with the exact method and the Davies equation at 25 °C, against published values; no constant was tuned or chosen by these
        checks. Written by `LYONIUM_UPDATE_DOCS=1 dotnet test tests/Lyonium.PublishedValues`, and kept true by the tests. `known` says how the
        published figure reached us. The standards carry an uncertainty of their own of about 0.005, and the convention for a single ion's
        activity coefficient adds about 0.01.

        """;

    [Fact]
    public void Page_shows_the_deviations()
    {
        DeviationTable[] tables =
        [
            StandardSolution.Compare(output, "NBS standards, amounts on 1 kg of water", "nbs-standards-25C.csv", 0),
            BowerBates1955Tests.Compare(output, "HCl-KCl", "potassium chloride", "hydrochloric acid"),
            BowerBates1955Tests.Compare(output, "phthalate-HCl", "potassium hydrogen phthalate", "hydrochloric acid"),
            BowerBates1955Tests.Compare(output, "phthalate-NaOH", "potassium hydrogen phthalate", "sodium hydroxide"),
        ];
        var page = Introduction.Replace("\r\n", "\n", StringComparison.Ordinal) + "\n" + string.Join('\n', tables.Select(table => table.ToMarkdown()))
            + "\n## Not within the model\n\nCalcium hydroxide, saturated at 25 °C: the prediction lies above the published 12.454, because the ion pair CaOH⁺ is\n"
            + "not modelled yet.\n";
        var file = Path.Combine(Root(), "docs", "accuracy.md");
        if (Environment.GetEnvironmentVariable("LYONIUM_UPDATE_DOCS") == "1")
        {
            File.WriteAllText(file, page);
            return;
        }

        Assert.Equal(page, File.ReadAllText(file).Replace("\r\n", "\n", StringComparison.Ordinal));
    }

    private static string Root()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "Library.sln")))
        {
            folder = folder.Parent;
        }

        return folder?.FullName ?? throw new InvalidOperationException("The tests run inside the repository.");
    }
}
