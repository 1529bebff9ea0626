using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>A pH standard: what it is made of, and the two ways of making it.</summary>
public sealed class StandardSolution(PublishedRow composition)
{
    /// <summary>The bar for the standards at 25 °C with the Davies equation.</summary>
    public const string ReasonForTolerance =
        "0.015, and 0.025 for carbonate and tris: a careful calculation reproduces the standards within 0.02 at 25 degC, and the Davies "
        + "equation gives all ions of a charge one coefficient; a value printed to two decimals adds the half digit 0.005";

    private static readonly Predictor Davies = new();

    public static IReadOnlyList<StandardSolution> All { get; } =
        PublishedRow.ReadAll("nbs-standards-composition.csv").Select(row => new StandardSolution(row)).ToArray();

    public string Id => Composition.Text("id");

    public PublishedRow Composition { get; } = composition;

    public string Description => $"{Id}: {Composition.Text("substances")}, {Composition.Text("molality_mol_kg")} mol/kg";

    /// <summary>The standard by its id; what follows an underscore names the scale that certified it.</summary>
    public static StandardSolution ById(string id) =>
        All.Single(one => string.Equals(one.Id, id.Split('_')[0], StringComparison.Ordinal));

    /// <summary>Every published pH of a file against the prediction for the standard made from amounts on 1 kg of water.</summary>
    public static DeviationTable Compare(ITestOutputHelper output, string title, string file, double halfDigit)
    {
        var table = new DeviationTable(output, title, ReasonForTolerance);
        foreach (var row in PublishedRow.ReadAll(file).Where(row => row.Text("id") != "Ca(OH)2"))
        {
            var standard = ById(row.Text("id"));
            var bar = standard.Id is "carbonate" or "tris" ? 0.025 : 0.015;
            var inputs = $"{row.Text("id")}: {standard.Composition.Text("molality_mol_kg")} mol/kg, 25 degC, davies";
            table.Check(row, inputs, row.Number("pH"), standard.OnOneKilogramOfWater().PH, bar + halfDigit);
        }

        return table;
    }

    /// <summary>By amount on 1 kg of water, of which a hydrate brings its share: its molality is that of the solution.</summary>
    public Prediction OnOneKilogramOfWater()
    {
        var builder = Recipe.Named(Id).At("25 Cel").PreparedAt("25 Cel");
        double crystalWaterKg = 0;
        foreach (var (substance, molality) in Composition.Several("substances").Zip(Composition.Several("molality_mol_kg")))
        {
            builder.Add(molality + " mol", substance);
            crystalWaterKg += double.Parse(molality, CultureInfo.InvariantCulture) * Composition.Number("crystal_water") * 0.018015;
        }

        builder.PourWater(string.Create(CultureInfo.InvariantCulture, $"{1 - crystalWaterKg} kg"));

        return Davies.Predict(builder.Build());
    }

    /// <summary>By the printed weights in air, made up to 1 L at 25 °C.</summary>
    public Prediction WeighedForOneLitre()
    {
        var builder = Recipe.Named(Id).At("25 Cel").PreparedAt("25 Cel");
        foreach (var (substance, grams) in Composition.Several("substances").Zip(Composition.Several("air_weight_g_L")))
        {
            builder.Weigh(grams + " g", substance);
        }

        return Davies.Predict(builder.MakeUpTo("1 L").Build());
    }
}
