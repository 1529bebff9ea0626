using System;
using System.Linq;
using System.Text;

namespace Lyonium.Qualification;

/// <summary>The report as a page of documentation: the same on every machine, so without where it ran.</summary>
internal sealed class QualificationPage(QualificationReport report)
{
    public override string ToString()
    {
        var page = new StringBuilder();
        var environment = report.Environment;
        page.Append("# ").Append(QualificationWords.Title).Append("\n\n");
        page.Append(QualificationWords.WhatItIs).Append("\n\n");
        page.Append("Table edition ").Append(environment.Table.Edition).Append(", method `").Append(environment.Method)
            .Append("`, activity model `").Append(environment.ActivityModel).Append("`.\n\n");
        page.Append(QualificationWords.Sum(report)).Append(' ').Append(QualificationWords.WhatMemoryMeans).Append("\n\n");
        WriteModelErrors(page);
        foreach (var set in QualificationWords.BySet(report))
        {
            WriteSet(page, set.ToArray());
        }

        return page.ToString();
    }

    private void WriteModelErrors(StringBuilder page)
    {
        page.Append("## Error of the activity model in pH\n\nRoot mean square deviation of the judged pH below, 0 to 50 °C, each solution counted once.\n\n");
        page.Append("| ionic strength, mol/kg | error | solutions |\n|---|---|---|\n");
        foreach (var band in report.ModelErrors)
        {
            page.Append(FormattableString.Invariant($"| {band.LowMolPerKg} to {band.HighMolPerKg} | {band.RootMeanSquareDeviation:F4} | {band.Solutions} |\n"));
        }
    }

    private static void WriteSet(StringBuilder page, CheckOutcome[] set)
    {
        var first = set[0].Check;
        page.Append("\n## ").Append(QualificationWords.Heading(first)).Append("\n\n");
        page.Append("Source: ").Append(first.Source).Append('\n');
        foreach (var reason in QualificationWords.Reasons(set))
        {
            page.Append('\n').Append(char.ToUpperInvariant(reason[0])).Append(reason, 1, reason.Length - 1).Append('\n');
        }

        page.Append("\n| ").Append(string.Join(" | ", QualificationWords.Headings)).Append(" |\n|");
        page.Append(string.Concat(QualificationWords.Headings.Select(_ => "---|"))).Append('\n');
        foreach (var outcome in set)
        {
            page.Append("| ").Append(string.Join(" | ", QualificationWords.Cells(outcome))).Append(" |\n");
        }
    }
}
