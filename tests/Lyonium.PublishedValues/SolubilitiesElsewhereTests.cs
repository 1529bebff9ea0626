using System;
using System.Globalization;
using System.Linq;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Substances;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Listed solubilities against a second published figure. Of an acid, the figure is all that dissolves: that much of it is put into water, and
/// the molality of its uncharged form is held against the listed one.
/// </summary>
public sealed class SolubilitiesElsewhereTests(ITestOutputHelper output)
{
    private const string Tolerance =
        "per row: rounding of the printed figure (a part in so many parts, a litre of solution taken as a kilogram of water), what differs "
        + "between 20 and 25 °C, and what handbooks differ by; 20 and 25 % where they are at odds, which the notes of the table say";

    [Fact]
    public void Solubility_OfTheTable_AgreesWithASecondFigure()
    {
        var table = new DeviationTable(output, "solubilities elsewhere, ratio to the listed one", Tolerance);
        foreach (var row in PublishedRow.ReadAll("solubilities-elsewhere.csv"))
        {
            var substance = SubstanceTable.Default.Find(row.Text("substance")).GetValueOrThrow();
            var molality = row.Number("molality_mol_kg");
            var ratio = row.Has("species") ? OfTheForm(substance, row.Text("species"), molality) : molality / substance.SolubilityMolPerKg!.Value;
            table.Check(row, $"{substance.Name}, {row.Text("printed")}", 1, ratio, row.Number("tolerance_percent") / 100);
        }

        table.AssertHolds(20);
    }

    private static double OfTheForm(Substance substance, string species, double molality)
    {
        var recipe = Recipe.Named("saturated").PourWater("1 kg").Add(molality.ToString("R", CultureInfo.InvariantCulture) + " mol", substance.Id).Build();
        var family = substance.Brings.Single().Family;
        var protons = int.Parse(species.AsSpan(species.IndexOf(':', StringComparison.Ordinal) + 1), CultureInfo.InvariantCulture);
        var listed = family.SolubilitiesMolPerKg[family.Forms.Count - 1 - protons]!.Value;
        return new Predictor().Predict(recipe).Species.Single(one => one.Id == species).MolalityMolPerKg / listed;
    }
}
