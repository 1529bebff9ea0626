using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Provenance;
using Lyonium.Substances;
using Spectre.Console;

namespace Lyonium.Tool;

/// <summary>Substances and families as text.</summary>
internal sealed class ConstantsText(SubstanceTable table, IAnsiConsole console)
{
    public void PrintAll()
    {
        var grid = new Grid().AddColumn(new GridColumn { NoWrap = true }).AddColumn(new GridColumn { NoWrap = true }).AddColumn(new GridColumn().RightAligned()).AddColumn();
        Row(grid, "substance", "formula", "g/mol", "pKa");
        foreach (var one in table.Substances.OrderBy(one => one.Name, System.StringComparer.OrdinalIgnoreCase))
        {
            var steps = one.Brings.SelectMany(brought => brought.Family.Steps).Select(step => NumberFormat.Short(step.PKa.Value));
            Row(grid, one.Name, one.Formula.Display, one.MolarMassGPerMol.ToString("F3", CultureInfo.InvariantCulture), string.Join("  ", steps));
        }

        console.Write(grid);
        console.WriteLine();
        var families = table.Families.Count(one => !one.IsSpectator);
        console.WriteLine($"{table.Substances.Count} substances over {families} families with pKa; edition {table.Identity.Edition}.");
        console.WriteLine("'lyonium constants NAME' shows one with its sources.");
    }

    public void Print(Substance substance)
    {
        console.MarkupLineInterpolated($"[bold]{substance.Name}[/]  {substance.Formula.Display}");
        var grid = Pairs();
        Row(grid, "id", substance.Id);
        if (substance.Synonyms.Count > 0)
        {
            Row(grid, "also", string.Join(", ", substance.Synonyms));
        }

        Row(grid, "molar mass", substance.MolarMassGPerMol.ToString("F3", CultureInfo.InvariantCulture) + " g/mol");
        Row(grid, "brings", Brings(substance));
        AddValue(grid, "density", substance.DensityKgPerL, "g/mL");
        AddValue(grid, "molar volume in solution", substance.MolarVolumeMLPerMol, "mL/mol");
        AddValue(grid, "solubility", substance.SolubilityMolPerKg, "mol/kg");
        if (substance.SolutionDensities is { Points: var points })
        {
            var (first, last) = (points[0], points[^1]);
            Row(
                grid,
                "density of solutions",
                $"{points.Count} points from {NumberFormat.Short(first.MassFraction * 100)} to {NumberFormat.Short(last.MassFraction * 100)} %: {Source(first.DensityKgPerL)}");
        }

        console.Write(grid);
        foreach (var one in substance.Brings.Select(brought => brought.Family))
        {
            console.WriteLine();
            Print(one);
        }
    }

    public void Print(Family family)
    {
        console.MarkupLineInterpolated($"[bold]{family.Name}[/]  (family {family.Id})");
        var grid = Pairs();
        foreach (var step in family.Steps)
        {
            var reaction = $"{family.Forms[step.Number - 1].Display} ⇌ {family.Forms[step.Number].Display} + H⁺";
            Row(grid, step.Id, reaction);
            AddValue(grid, "  pKa", step.PKa, "");
            AddValue(grid, "  enthalpy", step.EnthalpyKJPerMol, "kJ/mol");
            AddValue(grid, "  heat capacity", step.HeatCapacityJPerMolK, "J/(mol K)");
            if (step.Equation is { } equation)
            {
                Row(grid, "  equation", $"{CourseText.Equation(equation)}: {equation.Source.Citation} ({equation.KnownAs}){Note(equation.Note)}");
            }

            Row(grid, "  carried", CourseText.Range(step));
            foreach (var other in step.Alternatives)
            {
                AddValue(grid, "  also published", other, "");
            }

            if (step.Reason.Length > 0)
            {
                Row(grid, "  chosen because", step.Reason);
            }
        }

        for (var form = 0; form < family.SolubilitiesMolPerKg.Count; form++)
        {
            AddValue(grid, "solubility of " + family.Forms[form].Display, family.SolubilitiesMolPerKg[form], "mol/kg");
        }

        if (family.IsSpectator)
        {
            Row(grid, "form", family.Base.Display + ", takes no part in proton exchange");
        }

        AddIonSizes(grid, family);
        foreach (var (set, pair) in table.PairSets.SelectMany(set => set.Species.Select(pair => (set, pair))).Where(one => one.pair.FormedFrom.Any(part => IsOf(part.Key, family))))
        {
            AddValue(grid, "log K of " + pair.Formula.Display, pair.Log10K, "in " + set.Id + (set.IsDefault ? "" : ", on request"));
            AddValue(grid, "  enthalpy", pair.EnthalpyKJPerMol, "kJ/mol");
        }

        foreach (var one in table.Interactions.Where(one => IsOf(one.Cation, family) || IsOf(one.Anion, family)))
        {
            AddValue(grid, $"interaction {one.Cation} {one.Anion}", one.KgPerMol, "kg/mol");
        }

        if (family.Note.Length > 0)
        {
            Row(grid, "note", family.Note);
        }

        console.Write(grid);
    }

    private static bool IsOf(string speciesId, Family family) => speciesId.StartsWith(family.Id + ":", System.StringComparison.Ordinal);

    private static Grid Pairs() => new Grid().AddColumn(new GridColumn { Padding = new Padding(2, 0, 2, 0), NoWrap = true }).AddColumn();

    private static void Row(Grid grid, params string[] cells) => grid.AddRow([.. cells.Select(cell => new Text(cell))]);

    private static string Brings(Substance substance)
    {
        IEnumerable<string> parts = substance.Brings.Select(one => (one.Count == 1 ? "" : one.Count.ToString(CultureInfo.InvariantCulture) + " ") + one.Family.Base.Display);
        var protons = substance.Protons switch
        {
            0 => "",
            1 => " + H⁺",
            > 1 => $" + {substance.Protons} H⁺",
            -1 => " − H⁺",
            _ => $" − {-substance.Protons} H⁺",
        };
        return string.Join(" + ", parts) + protons;
    }

    private static void AddIonSizes(Grid grid, Family family)
    {
        for (var form = 0; form < family.IonSizesAngstrom.Count; form++)
        {
            AddValue(grid, "ion size of " + family.Forms[form].Display, family.IonSizesAngstrom[form], "Å");
        }
    }

    private static void AddValue(Grid grid, string name, SourcedValue? value, string unit)
    {
        if (value is null)
        {
            return;
        }

        var uncertainty = value.StandardUncertainty is double u ? " ± " + NumberFormat.Short(u) : "";
        var conditions = value.Conditions is { } at ? " at " + at : "";
        Row(grid, name, $"{NumberFormat.Short(value.Value)}{uncertainty}{(unit.Length == 0 ? "" : " " + unit)}{conditions}: {Source(value)}{Note(value.Note)}");
    }

    private static string Note(string note) => note.Length == 0 ? "" : "; " + note;

    private static string Source(SourcedValue value) => $"{value.Source.Citation} ({value.KnownAs})";
}
