using System.Globalization;
using System.Linq;
using Lyonium.Predictions;
using Spectre.Console;

namespace Lyonium.Tool;

/// <summary>A comparison of methods as text.</summary>
internal sealed class ComparisonText(Comparison comparison)
{
    public void Print(IAnsiConsole console)
    {
        console.MarkupLineInterpolated($"[bold]{PlainText.Of(comparison.Recipe.Name ?? "Recipe")}[/]{(comparison.Recipe.Id is null ? "" : "  " + PlainText.Of(comparison.Recipe.Id))}");
        console.MarkupLineInterpolated(
            CultureInfo.InvariantCulture, $"every method against the exact one, tolerance {comparison.Tolerance}, activity coefficients {comparison.ActivityModel}");
        if (comparison.OutsideTheModel.Count > 0)
        {
            console.MarkupLineInterpolated($"of the homogeneous model only: {string.Join(", ", comparison.OutsideTheModel)}");
        }

        console.WriteLine();
        var grid = new Grid();
        for (var i = 0; i < 5; i++)
        {
            var column = new GridColumn { Padding = new Padding(i == 0 ? 2 : 1, 0, 1, 0) };
            grid.AddColumn(i is 1 or 2 ? column.RightAligned() : column);
        }

        Row(grid, "method", "pH", "deviation", "verdict", "");
        foreach (var row in comparison.Rows)
        {
            Row(
                grid,
                row.Method,
                row.PH?.ToString("F4", CultureInfo.InvariantCulture) ?? "–",
                row.Deviation?.ToString("+0.0000;-0.0000;0.0000", CultureInfo.InvariantCulture) ?? "–",
                Verdict(row),
                row.Reason ?? row.Formula ?? "");
        }

        console.Write(grid);
        foreach (var row in comparison.Rows.Skip(1))
        {
            PrintDetail(console, row);
        }
    }

    private static string Verdict(ComparisonRow row) => row.WithinTolerance switch
    {
        true => "within",
        false => "OUTSIDE",
        null => "no answer",
    };

    private static void PrintDetail(IAnsiConsole console, ComparisonRow row)
    {
        var checks = row.Assumptions.Where(one => one.Limit is not null).ToArray();
        if (checks.Length == 0 && row.Iterates.Count == 0)
        {
            return;
        }

        console.WriteLine();
        console.MarkupLineInterpolated($"[bold]{row.Method}[/]");
        var grid = new Grid().AddColumn(new GridColumn { Padding = new Padding(2, 0, 2, 0) }).AddColumn().AddColumn();
        foreach (var one in checks)
        {
            Row(
                grid,
                one.Held ? "held" : "NOT HELD",
                one.Code.Replace('-', ' ') + (one.Of == "mixture" ? "" : " (" + one.Of + ")"),
                $"{NumberFormat.Short(one.Figure ?? double.NaN, 3)} against {NumberFormat.Short(one.Limit ?? double.NaN, 3)}");
        }

        console.Write(grid);
        if (row.Iterates.Count > 0)
        {
            var shown = row.Iterates.Take(12).Select(one => one.PH.ToString("F4", CultureInfo.InvariantCulture));
            console.WriteLine("  estimates  " + string.Join(", ", shown) + (row.Iterates.Count > 12 ? ", …" : ""));
        }
    }

    private static void Row(Grid grid, params string[] cells) => grid.AddRow([.. cells.Select(cell => new Text(cell))]);
}
