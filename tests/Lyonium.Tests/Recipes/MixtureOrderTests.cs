using System;
using System.Globalization;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Quantities;
using Lyonium.Records;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Recipes;

/// <summary>What must not change a pH does not: the order of pouring, the scale, a stock poured twice.</summary>
public sealed class MixtureOrderTests
{
    private static readonly string[] Substances =
    [
        "citric acid", "disodium hydrogen phosphate", "tris", "acetic acid", "sodium acetate", "ammonia", "boric acid", "sodium hydrogen carbonate",
        "oxalic acid", "EDTA", "NaCl", "potassium dihydrogen phosphate", "glycine", "HCl", "NaOH", "H2SO4", "Ca(OH)2", "sodium tetraborate decahydrate",
    ];

    private static readonly Predictor Default = new();
    private static readonly Predictor Ideal = new Predictor().With(new IdealModel());

    [Fact]
    public void Order_ofPouring_doesNotMatter()
    {
        var random = new Random(4242);
        var worst = 0.0;
        for (var i = 0; i < 150; i++)
        {
            var parts = Enumerable.Range(0, random.Next(2, 9)).Select(_ => Part(random)).Append("{ \"substance\": \"water\", \"volume\": \"1 L\" }").ToArray();
            var predictor = i % 2 == 0 ? Default : Ideal;
            var one = predictor.Predict(RecipeJson.Read(RecipeText.With(string.Join(", ", parts))));
            random.Shuffle(parts);
            var other = predictor.Predict(RecipeJson.Read(RecipeText.With(string.Join(", ", parts))));

            // The sums over parts round in another order: within 1e-9, or what half a last digit of the inputs does.
            var allowed = Math.Max(1e-9, one.Evidence.InputResolution);
            Assert.InRange(Math.Abs(one.PH - other.PH), 0, allowed);
            Assert.Equal(one.Species.Select(species => species.Id), other.Species.Select(species => species.Id));
            worst = one.Evidence.InputResolution < 1e-12 ? Math.Max(worst, Math.Abs(one.PH - other.PH)) : worst;
        }

        Assert.InRange(worst, 0, 1e-10);
    }

    [Fact]
    public void Order_whenNoSumRounds_givesTheSameBits()
    {
        // Sums of these masses and amounts are exact in binary, whatever their order.
        string[] parts =
        [
            "{ \"substance\": \"water\", \"mass\": \"0.5 kg\" }", "{ \"substance\": \"water\", \"mass\": \"0.25 kg\" }",
            "{ \"substance\": \"acetic acid\", \"amount\": \"0.125 mol\" }", "{ \"substance\": \"ammonia\", \"amount\": \"0.0625 mol\" }",
            "{ \"substance\": \"tris\", \"amount\": \"0.25 mol\" }", "{ \"substance\": \"acetic acid\", \"amount\": \"0.03125 mol\" }",
        ];
        var random = new Random(3);
        var expected = Default.Predict(RecipeJson.Read(RecipeText.With(string.Join(", ", parts)))).PH;
        for (var i = 0; i < 20; i++)
        {
            random.Shuffle(parts);
            Assert.Equal(BitConverter.DoubleToInt64Bits(expected), BitConverter.DoubleToInt64Bits(Default.Predict(RecipeJson.Read(RecipeText.With(string.Join(", ", parts)))).PH));
        }
    }

    [Fact]
    public void Scale_ofEveryAmount_doesNotMatter()
    {
        var random = new Random(99);
        for (var i = 0; i < 60; i++)
        {
            var amounts = Enumerable.Range(0, 4).Select(_ => (Name: Substances[random.Next(Substances.Length)], Mol: random.NextDouble() * 0.2)).ToArray();
            string Scaled(double by) => RecipeText.With(
                string.Join(", ", amounts.Select(one => $"{{ \"substance\": \"{one.Name}\", \"amount\": \"{NumberText.Shortest(one.Mol * by)} mol\" }}"))
                + $", {{ \"substance\": \"water\", \"mass\": \"{NumberText.Shortest(by)} kg\" }}");
            var one = Default.TryPredict(RecipeJson.Read(Scaled(1)));
            foreach (var by in new[] { 1e-6, 0.3, 7, 1e6 })
            {
                var other = Default.TryPredict(RecipeJson.Read(Scaled(by)));
                Assert.True(one.Success == other.Success, $"answered {one.Success}, and times {by} {other.Success}: {Scaled(by)}");
                if (one.Success)
                {
                    Assert.Equal(one.Value.PH, other.Value.PH, Math.Max(1e-9, 2 * one.Value.Evidence.InputResolution));
                }
            }
        }
    }

    [Fact]
    public void Pouring_oneStockTwice_isPouringItOnce()
    {
        const string water = ", { \"substance\": \"water\", \"mass\": \"1 kg\" }";
        const string stock = "{ \"substance\": \"acetic acid\", \"concentration\": \"0.5 mol/L\", \"volume\": \"# mL\" }";
        string Of(params int[] volumes) =>
            RecipeText.With(string.Join(", ", volumes.Select(one => stock.Replace("#", one.ToString(CultureInfo.InvariantCulture), StringComparison.Ordinal))) + water);

        Assert.Equal(Default.Predict(RecipeJson.Read(Of(30))).PH, Default.Predict(RecipeJson.Read(Of(10, 20))).PH, 1e-12);
    }

    [Fact]
    public void StrongAcid_addedAtFixedWater_neverRaisesThePH()
    {
        var random = new Random(17);
        for (var i = 0; i < 40; i++)
        {
            var rest = string.Join(", ", Enumerable.Range(0, 3).Select(_ => $"{{ \"substance\": \"{Substances[random.Next(Substances.Length)]}\", \"amount\": \"{NumberText.Shortest(random.NextDouble() * 0.1)} mol\" }}"));
            var before = double.PositiveInfinity;
            for (var acid = 0.0; acid < 0.3; acid += 0.02)
            {
                var pH = Ideal.Predict(RecipeJson.Read(RecipeText.With(
                    rest + $", {{ \"substance\": \"HCl\", \"amount\": \"{NumberText.Shortest(acid)} mol\" }}, {{ \"substance\": \"water\", \"mass\": \"1 kg\" }}"))).PH;
                Assert.True(pH <= before, $"{rest}: {pH} after {before} with {acid} mol of acid");
                before = pH;
            }
        }
    }

    private static string Part(Random random)
    {
        var substance = Substances[random.Next(Substances.Length)];
        var amount = NumberText.Shortest(Math.Round(random.NextDouble() * 20, 3) + 0.001);
        return random.Next(3) switch
        {
            0 => $"{{ \"substance\": \"{substance}\", \"mass\": \"{amount} g\" }}",
            1 => $"{{ \"substance\": \"{substance}\", \"amount\": \"{amount} mmol\" }}",
            _ => $"{{ \"substance\": \"{substance}\", \"concentration\": \"0.05 mol/L\", \"volume\": \"{amount} mL\" }}",
        };
    }
}
