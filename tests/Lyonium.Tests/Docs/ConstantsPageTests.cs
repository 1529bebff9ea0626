using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Linq;
using System.Text;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Docs;

/// <summary><c>docs/constants.md</c> shows what the built-in table holds; with LYONIUM_UPDATE_DOCS=1 it is written anew.</summary>
public sealed class ConstantsPageTests
{
    private const string Page = "docs/constants.md";

    private static readonly SubstanceTable Table = SubstanceTable.Default;

    private static readonly DissociationStep[] Steps = [.. Table.Families.SelectMany(family => family.Steps)];

    [Fact]
    public void Page_shows_the_table()
    {
        var current = Write();
        if (Environment.GetEnvironmentVariable("LYONIUM_UPDATE_DOCS") == "1")
        {
            File.WriteAllText(Repository.File(Page), current);
            return;
        }

        Assert.Equal(current, File.ReadAllText(Repository.File(Page)).Replace("\r\n", "\n", StringComparison.Ordinal));
    }

    // Bar: at least 150 substances over 90 families with a pKa.
    [Fact]
    public void Table_is_as_large_as_was_asked_for()
    {
        Assert.True(Table.Substances.Count >= 150);
        Assert.True(Table.Families.Count(family => !family.IsSpectator) >= 90);
    }

    // A choice among published values that disagree has its reason.
    [Fact]
    public void Table_choices_have_their_reasons() => Assert.All(
        Steps.Where(step => step.Alternatives.Any(other => Math.Abs(other.Value - step.PKa.Value) > 0.05)),
        step => Assert.False(string.IsNullOrWhiteSpace(step.Reason), step.Id));

    private static string Write()
    {
        var page = new StringBuilder();
        page.Append("# Constants\n\n");
        page.Append("What the built-in table holds, edition ").Append(Table.Identity.Edition).Append(". Written by\n");
        page.Append("`LYONIUM_UPDATE_DOCS=1 dotnet test tests/Lyonium.Tests`, and kept true by the tests. `known` says how a figure reached the table: read in\n");
        page.Append("the source or a copy of it, recalled from memory with the source named, both, or derived from named inputs. `lyonium constants NAME`\n");
        page.Append("shows one substance with everything that is known of it.\n\n");
        WriteCounts(page);
        WriteFamilies(page);
        WriteSources(page);
        return page.ToString();
    }

    private static void WriteCounts(StringBuilder page)
    {
        var protolytes = Table.Families.Where(family => !family.IsSpectator).ToArray();
        page.Append("## How much\n\n| what | how many |\n|---|---|\n");
        Count(page, "substances", Table.Substances.Count);
        Count(page, "substances with densities of their solutions", Table.Substances.Count(one => one.SolutionDensities is not null));
        Count(page, "substances with a molar volume in solution", Table.Substances.Count(one => one.MolarVolumeMLPerMol is not null));
        Count(page, "families with a pKa", protolytes.Length);
        Count(page, "spectators", Table.Families.Count - protolytes.Length);
        Count(page, "dissociation steps", Steps.Length);
        foreach (var known in new[] { "read", "read+memory", "memory", "derived" })
        {
            Count(page, "pKa known as " + known, Steps.Count(step => step.PKa.KnownAs == known));
        }

        Count(page, "pKa with a published standard uncertainty", Steps.Count(step => step.PKa.StandardUncertainty is not null));
        Count(page, "pKa published at another ionic strength than 0", Steps.Count(step => step.PKa.IonicStrengthMolPerKg > 0));
        Count(page, "pKa published at another temperature than 25 °C", Steps.Count(step => step.PKa.TemperatureK is double kelvin && Math.Abs(kelvin - 298.15) > 0.01));
        Count(page, "pKa with other published values beside it", Steps.Count(step => step.Alternatives.Count > 0));
        Count(page, "steps with an enthalpy", Steps.Count(step => step.EnthalpyKJPerMol is not null));
        Count(page, "steps with a heat capacity", Steps.Count(step => step.HeatCapacityJPerMolK is not null));
        Count(page, "sources", Table.Sources.Count);
    }

    private static void WriteFamilies(StringBuilder page)
    {
        page.Append("\n## Families\n\n");
        page.Append("ΔH and ΔCp mark steps whose enthalpy and heat capacity are known; \"others\" counts other published values of the pKa.\n\n");
        page.Append("| family | step | pKa | at | source | known | others | ΔH | ΔCp |\n|---|---|---|---|---|---|---|---|---|\n");
        foreach (var family in Table.Families.Where(family => !family.IsSpectator))
        {
            foreach (var step in family.Steps)
            {
                var acid = family.Forms[step.Number - 1].Display;
                var @base = family.Forms[step.Number].Display;
                var uncertainty = step.PKa.StandardUncertainty is double u ? " ± " + Number(u) : "";
                Row(
                    page,
                    step.Number == 1 ? family.Name : "",
                    $"{acid} ⇌ {@base} + H⁺",
                    Number(step.PKa.Value) + uncertainty,
                    step.PKa.Conditions ?? "",
                    step.PKa.Source.Key,
                    step.PKa.KnownAs,
                    step.Alternatives.Count == 0 ? "" : step.Alternatives.Count.ToString(CultureInfo.InvariantCulture),
                    step.EnthalpyKJPerMol is null ? "" : "yes",
                    step.HeatCapacityJPerMolK is null ? "" : "yes");
            }
        }

        page.Append("\nSpectators: ");
        page.AppendJoin(", ", Table.Families.Where(family => family.IsSpectator).Select(family => $"{family.Name} {family.Base.Display}"));
        page.Append(".\n");
    }

    private static void WriteSources(StringBuilder page)
    {
        page.Append("\n## Sources\n\n| key | source |\n|---|---|\n");
        foreach (var source in Table.Sources)
        {
            Row(page, source.Key, source.Citation);
        }
    }

    private static void Count(StringBuilder page, string what, int count) => Row(page, what, count.ToString(CultureInfo.InvariantCulture));

    private static void Row(StringBuilder page, params IEnumerable<string> cells) =>
        page.Append("| ").AppendJoin(" | ", cells.Select(cell => cell.Replace("|", "\\|", StringComparison.Ordinal))).Append(" |\n");

    private static string Number(double value) => value.ToString("R", CultureInfo.InvariantCulture);
}
