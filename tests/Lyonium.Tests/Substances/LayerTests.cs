using System.Linq;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Substances;

public sealed class LayerTests
{
    private static readonly string[] Acetate = ["CH3COOH", "CH3COO^-"];

    [Fact]
    public void TryLayer_family_of_the_same_id_takes_the_place_and_the_evidence_names_the_layer()
    {
        var table = Layer.TryOver(SubstanceTable.Default, Layer.With(Layer.Family("acetate", Acetate, Layer.Step(4.9)))).Value;
        var recipe = Recipe.Named("vinegar").Pour("10 mL", Stock.Of("acetic acid", "0.1 mol/L")).PourWater("90 mL").Build(table);

        var prediction = new Predictor(table).Predict(recipe);

        var constant = Assert.Single(prediction.Evidence.Constants, one => one.Id == "acetate:1");
        Assert.Equal((4.9, "house", "own"), (constant.Value.Value, constant.Layer, constant.Value.Source.Key));
        Assert.Equal(["house"], prediction.Evidence.Table.Layers.Select(layer => layer.Name));
        Assert.Equal(SubstanceTable.Default.Identity.Sha256, prediction.Evidence.Table.Sha256);
        Assert.True(prediction.PH > new Predictor().Predict(recipe).PH + 0.05);
        Assert.Contains("\"layer\": \"house\"", RecordJson.Write(prediction), System.StringComparison.Ordinal);
    }

    [Fact]
    public void TryLayer_new_substance_of_a_family_below_is_found_beside_the_others()
    {
        var table = Layer.TryOver(
            SubstanceTable.Default, Layer.With(substances: Layer.Substance("house-acetate", "LiC2H3O2", "\"lithium\": 1, \"acetate\": 1", 0))).Value;

        var found = table.Find("House Acetate").Value;

        Assert.Equal(("house", null), (found.Layer, table.Find("acetic acid").Value.Layer));

        // Li 6.94 + 2 C 24.022 + 3 H 3.024 + 2 O 31.998, CIAAW 2021 abridged weights.
        Assert.Equal(65.984, found.MolarMassGPerMol, 0.0005);
        Assert.Equal(SubstanceTable.Default.Substances.Count + 1, table.Substances.Count);
    }

    [Fact]
    public void TryLayer_twice_keeps_both_layers_in_order()
    {
        var first = Layer.TryOver(SubstanceTable.Default, Layer.With(Layer.Family("acetate", Acetate, Layer.Step(4.9)))).Value;
        var second = Layer.TryOver(first, Layer.With(Layer.Family("acetate", Acetate, Layer.Step(4.8)))).Value;

        Assert.Equal(2, second.Identity.Layers.Count);
        Assert.NotEqual(second.Identity.Layers[0].Sha256, second.Identity.Layers[1].Sha256);
        Assert.Equal(4.8, second.Families.Single(one => one.Id == "acetate").Steps[0].PKa.Value);
    }

    [Fact]
    public void TryLayer_step_out_of_order_is_refused_at_its_place()
    {
        var faults = Layer.TryOver(SubstanceTable.Default, Layer.With(Layer.Family(
            "oxalate", ["H2C2O4", "HC2O4^-", "C2O4^2-"], Layer.Step(4.2), Layer.Step(1.2)))).Faults;

        Assert.Equal(("LYO0311", "$.families[0].steps[1].pKa"), (Assert.Single(faults).Code, faults[0].Path));
    }

    [Fact]
    public void TryLayer_duplicate_within_the_layer_is_refused()
    {
        var family = Layer.Family("acetate", Acetate, Layer.Step(4.9));
        var faults = Layer.TryOver(SubstanceTable.Default, Layer.With(family + ", " + family)).Faults;

        Assert.Equal(("LYO0312", "$.families[1].id"), (Assert.Single(faults).Code, faults[0].Path));
    }

    [Fact]
    public void TryLayer_name_of_another_substance_is_refused()
    {
        var faults = Layer.TryOver(SubstanceTable.Default, Layer.With(substances: Layer.Substance("vinegar-acid", "CH3COOH", "\"acetate\": 1", 1)
            .Replace("\"name\": \"vinegar-acid\"", "\"name\": \"acetic acid\"", System.StringComparison.Ordinal))).Faults;

        Assert.Equal("LYO0312", Assert.Single(faults).Code);
        Assert.Contains("acetic-acid", faults[0].Message, System.StringComparison.Ordinal);
    }

    [Fact]
    public void TryLayer_another_base_form_is_refused()
    {
        var faults = Layer.TryOver(SubstanceTable.Default, Layer.With(Layer.Family("acetate", ["CH3COOH2^+", "CH3COOH"], Layer.Step(4.7)))).Faults;

        Assert.Equal("LYO0319", Assert.Single(faults).Code);
    }

    [Fact]
    public void TryLayer_value_without_its_source_is_refused()
    {
        var json = Layer.With(Layer.Family("acetate", Acetate, Layer.Step(4.9)))
            .Replace("\"source\": \"own\"", "\"source\": \"hearsay\"", System.StringComparison.Ordinal);

        Assert.Equal("LYO0313", Assert.Single(Layer.TryOver(SubstanceTable.Default, json).Faults).Code);
    }
}
