using Lyonium.Recipes;
using Lyonium.Substances;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Concentrations of commonly used acids and bases as Lange's Handbook of Chemistry prints them, known from memory. Here the stock states
/// only its mass fraction, and the density is the table's.
/// </summary>
public sealed class LangeConcentratedReagentsTests(ITestOutputHelper output)
{
    [Fact]
    public void Prepare_OneLitreByMassFraction_HasPrintedConcentration()
    {
        var table = new DeviationTable(
            output,
            "mol in 1 L of the reagent with the density of the table",
            "half of the printed tenth, and 1 %: the densities behind it are printed to two decimals");
        foreach (var row in PublishedRow.ReadAll("lange-concentrated-reagents.csv"))
        {
            var stock = Stock.Of(row.Text("substance"), row.Text("mass_percent") + " %");
            var recipe = Recipe.Named("bottle").Pour("1 L", stock).PourWater("1 kg").Build();
            var obtained = Assert.Single(Mixture.Prepare(recipe, SubstanceTable.Default).Amounts).AmountMol;
            var inputs = $"{row.Text("substance")} {row.Text("mass_percent")} %";
            if (row.Caution.Length > 0)
            {
                table.Report(row, $"{inputs} ({row.Caution})", row.Number("mol_L"), obtained);
            }
            else
            {
                table.Check(row, inputs, row.Number("mol_L"), obtained, 0.05 + (0.01 * row.Number("mol_L")));
            }
        }

        table.AssertHolds(9);
    }
}
