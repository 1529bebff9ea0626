using System;
using System.Globalization;
using System.Linq;
using Lyonium.Predictions;
using Lyonium.Quantities;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;
using UnitsNet;
using Xunit;

namespace Lyonium.Tests.Records;

/// <summary>A recipe written is a recipe read; and text, JSON and API are one recipe with one pH.</summary>
public sealed class RecipeRoundTripTests
{
    [Fact]
    public void Write_thenRead_isEqual()
    {
        var recipe = RecipeJson.Read(RecipeText.OfTheContract);

        var again = RecipeJson.Read(RecipeJson.Write(recipe));

        Assert.Equal(recipe, again);
        Assert.Equal(recipe.GetHashCode(), again.GetHashCode());
        Assert.Equal(RecipeJson.Write(recipe), RecipeJson.Write(again));
        Assert.Equal(0.001, again.Parts[5].Taken.StandardUncertainty);
    }

    [Theory]
    [InlineData("{}")]
    [InlineData("{ \"a\": 1.0, \"a\": 1e5, \"b\": \"\\u00e9\\/ <>&+\" }")]
    [InlineData("{\n\t\"deep\" : [ [ [ null, true,  false ] ] ]\r\n}")]
    [InlineData("{ \"big\": 123456789012345678901234567890.1234567890e-5000 }")]
    public void Notes_areEchoedUntouched(string notes)
    {
        var text = RecipeText.With("{ \"substance\": \"water\", \"mass\": \"1 kg\" }", "\"notes\": " + notes);
        var recipe = RecipeJson.Read(text);

        Assert.Equal(notes, recipe.Notes);
        Assert.Contains(notes, RecipeJson.Write(recipe), StringComparison.Ordinal);
        Assert.Equal(recipe, RecipeJson.Read(RecipeJson.Write(recipe)));
        var record = RecordJson.Write(new Predictor().Predict(recipe));
        Assert.Equal(2, record.Split([notes], StringSplitOptions.None).Length - 1);
    }

    [Fact]
    public void Notes_asDeepAsTheReaderLetsPass_areEchoedInARecordThatIsReplayed()
    {
        // Depth 64 in all: the recipe's object is one.
        var notes = "{\"a\":" + new string('[', 62) + new string(']', 62) + "}";
        var recipe = RecipeJson.Read(RecipeText.With("{ \"substance\": \"water\", \"mass\": \"1 kg\" }", "\"notes\": " + notes));

        Assert.Contains(notes, RecipeJson.Write(recipe), StringComparison.Ordinal);
        var record = RecordJson.Write(new Predictor().Predict(recipe));
        Assert.Contains(notes, record, StringComparison.Ordinal);
        Assert.True(new RecordReplay(SubstanceTable.Default).TryReplay(record).Success);
    }

    [Fact]
    public void TextUnitsNetAndJson_giveOneRecipeAndOnePH()
    {
        var random = new Random(1234);
        var predictor = new Predictor();
        for (var i = 0; i < 200; i++)
        {
            var (acid, base1, salt, water) = (Typed(random, 100), Typed(random, 100), Typed(random, 5), Typed(random, 500));
            var (strength, mark) = (Typed(random, 1), 2000.0);
            var text = Recipe.Named("x")
                .Pour(acid + " mL", Stock.Of("hydrochloric acid", strength + " mol/L"))
                .Pour(base1 + " mL", Stock.Of("ammonia", "37.7 mmol/L"))
                .Weigh(salt + " g", "disodium hydrogen phosphate")
                .PourWater(water + " mL")
                .MakeUpTo("2000 mL")
                .Build();
            var api = Recipe.Named("x")
                .Pour(Volume.FromMilliliters(Number(acid)), Stock.Of("HCl", Molarity.FromMolesPerLiter(Number(strength))))
                .Pour(Volume.FromMilliliters(Number(base1)), Stock.Of("NH3", Molarity.FromMillimolesPerLiter(37.7)))
                .Weigh(Mass.FromGrams(Number(salt)), "Na2HPO4")
                .PourWater(Volume.FromMilliliters(Number(water)))
                .MakeUpTo(Volume.FromMilliliters(mark))
                .Build();
            var json = RecipeJson.Read($$"""
                { "format": "lyonium-recipe/1", "name": "x", "parts": [
                  { "substance": "muriatic acid", "concentration": "{{strength}} M", "volume": { "value": {{acid}}, "unit": "mL" } },
                  { "substance": "ammonia", "concentration": { "value": 37.7, "unit": "mM" }, "volume": "{{base1}} mL" },
                  { "substance": "disodium-hydrogen-phosphate", "mass": "{{salt}} g" },
                  { "substance": "H2O", "volume": "{{water}} mL" } ], "makeUpTo": "2 L" }
                """);

            Assert.Equal(text, api);
            Assert.Equal(text, json);
            Assert.Equal(text.GetHashCode(), json.GetHashCode());
            var bits = new[] { text, api, json }.Select(one => BitConverter.DoubleToInt64Bits(predictor.Predict(one).PH)).Distinct();
            Assert.Single(bits);
        }
    }

    [Fact]
    public void WriteThenRead_ofRandomRecipes_isEqual()
    {
        var random = new Random(77);
        var table = SubstanceTable.Default;
        string[] volumes = ["mL", "L", "uL"], masses = ["g", "mg", "kg", "ug"];
        for (var i = 0; i < 300; i++)
        {
            var builder = Recipe.Named("random " + i.ToString(CultureInfo.InvariantCulture)).PourWater("1 L").WithId("R-" + i.ToString(CultureInfo.InvariantCulture));
            for (var part = random.Next(1, 6); part > 0; part--)
            {
                var substance = table.Substances[random.Next(table.Substances.Count)].Name;
                _ = random.Next(4) switch
                {
                    0 => builder.Weigh(Typed(random, 1) + " " + masses[random.Next(masses.Length)], substance, Typed(random, 100) + " %"),
                    1 => builder.Add(Typed(random, 1) + " mmol", substance),
                    2 => builder.Pour(Typed(random, 10) + " " + volumes[random.Next(volumes.Length)], Stock.Of(substance, "0.01 mol/L")),
                    _ => builder.Pour(
                        Typed(random, 10) + " g",
                        Stock.Of(substance, Typed(random, 5) + " %").WithDensity("1.01 g/mL").Named("bottle " + part.ToString(CultureInfo.InvariantCulture))),
                };
            }

            var recipe = builder.Build();

            Assert.Equal(recipe, RecipeJson.Read(RecipeJson.Write(recipe)));
        }
    }

    private static string Typed(Random random, double most) =>
        NumberText.Shortest(Math.Round((random.NextDouble() * most) + (most * 1e-3), random.Next(2, 6)) + (most * 1e-4));

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
