using Lyonium.Substances;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>The molar masses that the table computes from formulas, against printed ones.</summary>
public static class MolarMassComparison
{
    public static DeviationTable Compare(ITestOutputHelper output, string title, string file)
    {
        var table = new DeviationTable(
            output,
            title,
            "0.02: the abridged weights of CIAAW 2021 and the older ones behind the printed masses differ by up to 0.006 (S), 0.003 (Cl) and "
            + "0.001 (C, H, O, B) an atom, and the printed masses are rounded to 0.01 at worst");
        foreach (var row in PublishedRow.ReadAll(file))
        {
            var substance = SubstanceTable.Default.Find(row.Text("substance")).GetValueOrThrow();
            var inputs = $"{row.Text("substance")} {substance.Formula.Text}";
            table.Check(row, inputs, row.Number("molar_mass_g_mol"), substance.MolarMassGPerMol, 0.02);
        }

        return table;
    }
}
