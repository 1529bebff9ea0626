using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Predictions;
using Lyonium.Recipes;

namespace Lyonium.PublishedValues;

/// <summary>A pH standard: what it is made of, and the two ways of making it.</summary>
public sealed class StandardSolution(PublishedRow composition)
{
    public static IReadOnlyList<StandardSolution> All { get; } =
        PublishedRow.ReadAll("nbs-standards-composition.csv").Select(row => new StandardSolution(row)).ToArray();

    public string Id => Composition.Text("id");

    public PublishedRow Composition { get; } = composition;

    public string Description => $"{Id}: {Composition.Text("substances")}, {Composition.Text("molality_mol_kg")} mol/kg";

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

        return new Predictor().Predict(builder.Build());
    }

    /// <summary>By the printed weights in air, made up to 1 L at 25 °C.</summary>
    public Prediction WeighedForOneLitre()
    {
        var builder = Recipe.Named(Id).At("25 Cel").PreparedAt("25 Cel");
        foreach (var (substance, grams) in Composition.Several("substances").Zip(Composition.Several("air_weight_g_L")))
        {
            builder.Weigh(grams + " g", substance);
        }

        return new Predictor().Predict(builder.MakeUpTo("1 L").Build());
    }
}
