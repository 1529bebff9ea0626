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

    private const string Carried = """

        ## How a constant is carried with temperature

        The pKa of the table holds at the temperature beside it, at nearly every step 25 °C. To another temperature T it is carried by a difference,
        so that it is kept where it was published:

        - with a published **equation**, pK = a/T + b + c T + d ln T, by pK(T) − pK(T₀);
        - otherwise with the **enthalpy ΔH** and, where it is known, the **heat capacity ΔCp** of the dissociation, by the integrated van 't Hoff
          equation with three terms, ln K(T) = ln K(T₀) − ΔH/R · (1/T − 1/T₀) + ΔCp/R · (T₀/T − 1 + ln(T/T₀)).

        Which of them a step has follows a rule of sources, not of results ([decision 7](decisions/0007-temperature-courses.md)). A constant published at an
        ionic strength above zero is first carried to infinite dilution, at its own temperature.

        Each course has a **range**: of an equation the published one; 0 to 50 °C of ΔH and ΔCp, 10 to 40 °C of ΔH alone (common practice). A prediction
        outside it is made, and flagged as `constant-within-its-temperature-range`. A step without a course keeps its pKa; more than 0.5 K away from its
        temperature that is flagged as `constant-at-its-temperature`. Both the published pKa and the one that was used stand in the evidence.

        How near this comes to published measurements from 0 to 50 °C is checked in `tests/Lyonium.PublishedValues` (`PKaEquationsTests`, `PKaTablesTests`,
        `ReactionQuantitiesTests`).
        """;

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
        page.Append(Carried.Replace("\r\n", "\n", StringComparison.Ordinal)).Append('\n');
        WriteFamilies(page);
        WriteIonSizes(page);
        WriteInteractions(page);
        WritePairSets(page);
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
        Count(page, "steps carried with a published equation", Steps.Count(step => step.Equation is not null));
        Count(page, "steps carried with enthalpy and heat capacity", Steps.Count(step => step.Equation is null && step.HeatCapacityJPerMolK is not null));
        Count(page, "steps carried with an enthalpy alone", Steps.Count(step => step.Equation is null && step.EnthalpyKJPerMol is not null && step.HeatCapacityJPerMolK is null));
        Count(page, "steps whose change with temperature is not known", Steps.Count(step => !step.ChangesWithTemperature));
        Count(page, "forms with an ion size", Table.Families.Sum(family => family.IonSizesAngstrom.Count(size => size is not null)));
        Count(page, "sources", Table.Sources.Count);
    }

    private static void WriteFamilies(StringBuilder page)
    {
        page.Append("\n## Families\n\n");
        page.Append("\"Others\" counts other published values of the pKa. ΔH in kJ/mol, ΔCp in J/(mol K), T in K; the range in °C, with the source of the course.\n\n");
        page.Append("| family | step | pKa | at | source | known | others | with temperature | range | its source | known |\n|---|---|---|---|---|---|---|---|---|---|---|\n");
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
                    Course(step),
                    step.ValidRange is { } range ? $"{Celsius(range.LowK)} to {Celsius(range.HighK)}" : "",
                    step.Equation?.Source.Key ?? step.EnthalpyKJPerMol?.Source.Key ?? "",
                    step.Equation?.KnownAs ?? step.EnthalpyKJPerMol?.KnownAs ?? "");
            }
        }

        page.Append("\nSpectators: ");
        page.AppendJoin(", ", Table.Families.Where(family => family.IsSpectator).Select(family => $"{family.Name} {family.Base.Display}"));
        page.Append(".\n");
    }

    private static void WriteIonSizes(StringBuilder page)
    {
        page.Append("\n## Ion sizes\n\nThe ion-size parameter of the extended Debye–Hückel equation, in Å, after Kielland (1937), who lists H⁺ with 9 and OH⁻ with 3.5. A form that\nis not listed here has none in the table.\n\n| Å | forms |\n|---|---|\n");
        var sizes = Table.Families.SelectMany(family => family.Forms.Zip(family.IonSizesAngstrom, (form, size) => (family.Name, form.Display, Size: size?.Value)));
        foreach (var size in sizes.Where(one => one.Size is not null).GroupBy(one => one.Size!.Value).OrderByDescending(one => one.Key))
        {
            Row(page, Number(size.Key), string.Join(", ", size.Select(one => $"{one.Display} ({one.Name})")));
        }
    }

    private static void WriteInteractions(StringBuilder page)
    {
        page.Append("\n## Interaction coefficients\n\nOf specific ion interaction theory, in kg/mol, at 25 °C; u is the standard uncertainty.\n\n");
        page.Append("| cation | anion | ε | u | source | known |\n|---|---|---|---|---|---|\n");
        foreach (var one in Table.Interactions)
        {
            Row(page, Display(one.Cation), Display(one.Anion), Signed(one.KgPerMol.Value), one.KgPerMol.StandardUncertainty is double u ? Number(u) : "", one.KgPerMol.Source.Key, one.KgPerMol.KnownAs);
        }
    }

    private static void WritePairSets(StringBuilder page)
    {
        page.Append("\n## Ion pairs, dimers and polymers\n\nlog K of the formation at infinite dilution and 25 °C; water set free or taken up is not written. ΔH in kJ/mol.\n");
        foreach (var set in Table.PairSets)
        {
            page.Append("\n`").Append(set.Id).Append("`: ").Append(set.Name).Append(set.IsDefault ? ", a default of " : ", on request with ").AppendJoin(", ", set.Models).Append(".\n\n");
            page.Append("| species | formed from | log K | ΔH | source | known |\n|---|---|---|---|---|---|\n");
            foreach (var one in set.Species)
            {
                var parts = string.Join(" + ", one.FormedFrom.Select(part => (part.Value == 1 ? "" : part.Value.ToString(CultureInfo.InvariantCulture) + " ") + Display(part.Key)));
                Row(page, one.Formula.Display, parts, Signed(one.Log10K.Value), one.EnthalpyKJPerMol is { } enthalpy ? Signed(enthalpy.Value) : "", one.Log10K.Source.Key, one.Log10K.KnownAs);
            }
        }
    }

    private static string Display(string speciesId)
    {
        if (speciesId.StartsWith("water:", StringComparison.Ordinal))
        {
            return speciesId == "water:2" ? "H⁺" : "OH⁻";
        }

        var parts = speciesId.Split(':');
        var family = Table.Families.Single(one => one.Id == parts[0]);
        return family.Forms[family.Forms.Count - 1 - int.Parse(parts[1], CultureInfo.InvariantCulture)].Display;
    }

    private static string Course(DissociationStep step)
    {
        if (step.Equation is not { } equation)
        {
            var heatCapacity = step.HeatCapacityJPerMolK is { } capacity ? ", ΔCp " + Signed(capacity.Value) : "";
            return step.EnthalpyKJPerMol is { } enthalpy ? "ΔH " + Signed(enthalpy.Value) + heatCapacity : "";
        }

        (double Coefficient, string Times)[] terms = [(equation.OverT, "/T"), (equation.Constant, ""), (equation.TimesT, " T"), (equation.TimesLnT, " ln T")];
        var parts = terms.Where(term => term.Coefficient != 0)
            .Select((term, index) => (term.Coefficient < 0 ? "− " : index == 0 ? "" : "+ ") + Number(Math.Abs(term.Coefficient)) + term.Times);
        return string.Join(" ", parts);
    }

    private static string Signed(double value) => (value < 0 ? "−" : "") + Number(Math.Abs(value));

    private static string Celsius(double kelvin) => Number(Math.Round(kelvin - 273.15, 2));

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
