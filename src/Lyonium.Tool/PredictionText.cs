using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Spectre.Console;

namespace Lyonium.Tool;

/// <summary>A prediction as a page that a chemist can pin to the wall.</summary>
internal sealed class PredictionText(Prediction prediction)
{
    // A form that makes up less of its family than this is left to the record.
    private const double SmallestShare = 0.0005;

    public void Print(IAnsiConsole console)
    {
        PrintAnswer(console);
        PrintContents(console);
        PrintSpecies(console);
        PrintAssumptions(console);
        PrintEvidence(console);
        PrintCautions(console);
    }

    private static Grid Columns(params int[] rightAligned)
    {
        var grid = new Grid();
        for (var i = 0; i < 4; i++)
        {
            var column = new GridColumn { Padding = new Padding(i == 0 ? 2 : 1, 0, 1, 0) };
            grid.AddColumn(rightAligned.Contains(i) ? column.RightAligned() : column);
        }

        return grid;
    }

    private static void Heading(IAnsiConsole console, string text)
    {
        console.WriteLine();
        console.MarkupLineInterpolated($"[bold]{text}[/]");
    }

    private void PrintAnswer(IAnsiConsole console)
    {
        var recipe = prediction.Recipe;
        var celsius = NumberFormat.Short(recipe.TemperatureK - 273.15);
        console.MarkupLineInterpolated($"[bold]{PlainText.Of(recipe.Name ?? "Recipe")}[/]{(recipe.Id is null ? "" : "  " + PlainText.Of(recipe.Id))}");
        console.MarkupLineInterpolated($"[bold green]pH {prediction.Reported}[/] at {celsius} °C{Scope()}");
        var brief = new Grid().AddColumn(new GridColumn { Padding = new Padding(2, 0, 2, 0) }).AddColumn();
        Row(brief, "pH", prediction.PH.ToString("F4", CultureInfo.InvariantCulture) + "  (activity, molality scale)");
        Row(brief, "p[H]", prediction.PHydrogenConcentration.ToString("F4", CultureInfo.InvariantCulture) + "  (concentration, mol/L)");
        Row(brief, "ionic strength", NumberFormat.Significant(prediction.IonicStrengthMolPerKg, 4) + " mol/kg");
        Row(brief, "volume", NumberFormat.Volume(prediction.Mixture.VolumeL) + " with " + NumberFormat.Mass(prediction.Mixture.WaterKg) + " of water");
        if (prediction.Buffer is { } buffer)
        {
            Row(brief, "buffer", BufferLine(buffer));
        }

        Row(brief, "model error", ModelErrorLine());
        Row(brief, "method", prediction.Method + ", activity coefficients " + prediction.ActivityModel + PairsInUse());
        console.Write(brief);
    }

    private static string BufferLine(BufferFigures buffer)
    {
        var dilution = double.IsNaN(buffer.DilutionValue) ? "" : ", dilution value " + Signed(buffer.DilutionValue, "F3");
        var leavesOut = buffer.TemperatureCoefficientLeavesOut.Count == 0 ? "" : " without " + string.Join(", ", buffer.TemperatureCoefficientLeavesOut);
        var coefficient = double.IsNaN(buffer.TemperatureCoefficientPerK) ? "not known" : Signed(buffer.TemperatureCoefficientPerK, "F4") + " per K";
        return $"capacity {NumberFormat.Significant(buffer.CapacityMolPerL, 3)} mol/L{dilution}, dpH/dT {coefficient}{leavesOut}";
    }

    private string PairsInUse()
    {
        var formed = prediction.Evidence.Constants.Where(one => one.Quantity == "log10 K").Select(one => one.Id).ToArray();
        return formed.Length == 0 ? "" : ", with " + string.Join(", ", formed).Replace('-', ' ');
    }

    private string ModelErrorLine() => prediction.ModelUncertainty is { } error
        ? string.Create(
            CultureInfo.InvariantCulture,
            $"±{error.StandardUncertainty:F3} (standard uncertainty, from {error.Solutions} published solutions; a glass electrode's junction comes on top)")
        : "no published value speaks for this mixture";

    private static string Signed(double value, string format)
    {
        var text = value.ToString(format, CultureInfo.InvariantCulture);
        return text.Trim('-', '0', '.').Length == 0 ? text.TrimStart('-') : value > 0 ? "+" + text : text;
    }

    private string Scope() =>
        prediction.OutsideTheModel.Count == 0 ? "" : ", of the homogeneous model only: " + string.Join(", ", prediction.OutsideTheModel);

    private static void Row(Grid grid, params string[] cells) => grid.AddRow([.. cells.Select(cell => new Text(cell))]);

    private void PrintContents(IAnsiConsole console)
    {
        Heading(console, "Poured and weighed");
        var grid = Columns(0, 2);
        foreach (var part in prediction.Mixture.Parts.Where(part => part.Inside is null || part.Substance is not null))
        {
            Row(
                grid,
                part.Inside is null ? Taken(part.Part) : "",
                (part.Inside is null ? "" : "  of which ") + Describe(part),
                part.Substance is null ? "" : NumberFormat.Amount(part.AmountMol),
                "");
        }

        if (prediction.Recipe.MakeUpTo is { } mark)
        {
            Row(grid, "to " + mark, "water to the mark", "", "");
        }

        console.Write(grid);
    }

    private static string Taken(Part part) => part is RecipePart { IsAll: true } ? "all" : part.Taken.ToString();

    private static string Describe(PreparedPart part) => part.Part switch
    {
        RecipePart { Recipe.Name: { } name } => PlainText.Of(name),
        RecipePart => "another recipe",
        SolutionPart { Stock: var stock } => part.Substance!.Name + " " + stock.Strength + (stock.Name is null ? "" : $"  ({PlainText.Of(stock.Name)})"),
        SubstancePart { Purity: { } purity } => part.Substance!.Name + ", " + purity,
        SubstancePart => part.Substance!.Name,
        _ => "water",
    };

    private void PrintSpecies(IAnsiConsole console)
    {
        Heading(console, "In solution");
        var grid = Columns(1, 2, 3);
        Row(grid, "", "mol/kg", "mol/L", "share");
        foreach (var one in prediction.Species.Where(one => one.Fraction is null or >= SmallestShare))
        {
            Row(
                grid,
                one.Display,
                NumberFormat.Significant(one.MolalityMolPerKg, 4),
                NumberFormat.Significant(one.ConcentrationMolPerL, 4),
                one.Fraction is double share ? NumberFormat.Percent(share) : "");
        }

        console.Write(grid);
        var hidden = prediction.Species.Count(one => one.Fraction < SmallestShare);
        if (hidden > 0)
        {
            console.MarkupLineInterpolated(CultureInfo.InvariantCulture, $"[dim]  {hidden} more below 0.05 % of their kind: see the record (--format json)[/]");
        }
    }

    private void PrintAssumptions(IAnsiConsole console)
    {
        var broken = prediction.Assumptions.Where(one => !one.Held).ToArray();
        Heading(console, "Taken for granted");
        var grid = new Grid().AddColumn(new GridColumn { Padding = new Padding(2, 0, 2, 0) }).AddColumn().AddColumn();
        foreach (var one in prediction.Assumptions)
        {
            grid.AddRow(
                new Text(one.Held ? (one.Limit is null ? "assumed" : "held") : "NOT HELD", one.Held ? Style.Plain : new Style(Color.Red, decoration: Decoration.Bold)),
                new Text(one.Code.Replace('-', ' ') + (one.Of == "mixture" ? "" : " (" + one.Of + ")")),
                new Text(Figure(one)));
        }

        console.Write(grid);
        if (broken.Length > 0)
        {
            console.MarkupLineInterpolated(CultureInfo.InvariantCulture, $"[red]  {broken.Length} not held: the number may be off by more than its digits say.[/]");
        }
    }

    private static string Figure(Assumption one)
    {
        if (one.Figure is not double figure)
        {
            return one.Basis;
        }

        return one.Limit is double limit
            ? $"{NumberFormat.Short(figure, 3)} against {NumberFormat.Short(limit, 3)}"
            : one.Basis;
    }

    private void PrintEvidence(IAnsiConsole console)
    {
        var evidence = prediction.Evidence;
        Heading(console, "Rests on");
        var grid = new Grid().AddColumn(new GridColumn { Padding = new Padding(2, 0, 2, 0) }).AddColumn();
        foreach (var one in evidence.Constants.Where(one => one.Quantity.StartsWith('p') || one.Quantity.StartsWith("log10 K", StringComparison.Ordinal)))
        {
            var uncertainty = one.Value.StandardUncertainty is double u ? " ± " + NumberFormat.Short(u) : "";
            Row(
                grid,
                one.Quantity + " " + one.Id,
                $"{NumberFormat.Short(one.Value.Value)}{uncertainty} at {one.Value.Conditions ?? "no stated temperature"}  [{one.Value.Source.Key}, {one.Value.KnownAs}{(one.Layer is null ? "" : "; " + PlainText.Of(one.Layer))}]");
        }

        if (!double.IsNaN(evidence.BracketLow))
        {
            var width = NumberFormat.Significant(evidence.BracketHigh - evidence.BracketLow, 1);
            Row(grid, "certificate", $"the charge balance changes sign within {width} of this pH ({evidence.Evaluations} evaluations)");
        }

        Row(grid, "table", $"edition {evidence.Table.Edition}, SHA-256 {evidence.Table.Sha256[..16]}…");
        foreach (var layer in evidence.Table.Layers)
        {
            Row(grid, "own table", $"{PlainText.Of(layer.Name)}, edition {PlainText.Of(layer.Edition)}, SHA-256 {layer.Sha256[..16]}…");
        }

        Row(grid, "software", $"Lyonium {evidence.Software.Version}, {evidence.Software.Target}, {evidence.Software.ProcessArchitecture}");
        console.Write(grid);
    }

    private void PrintCautions(IAnsiConsole console)
    {
        Heading(console, "Cautions");
        var grid = new Grid().AddColumn(new GridColumn { Padding = new Padding(2, 0, 2, 0) }).AddColumn();
        foreach (var one in prediction.Cautions)
        {
            IEnumerable<string> codes = one.Hazards.Concat(one.HazardsEu.Select(code => code + " (EU)"));
            Row(grid, string.Join(' ', codes), one.Text + (one.Because.Count == 0 ? "" : " (" + string.Join(", ", one.Because) + ")"));
        }

        console.Write(grid);
    }
}
