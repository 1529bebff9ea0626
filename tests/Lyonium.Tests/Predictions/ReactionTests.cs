using System;
using System.Linq;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Predictions;

/// <summary>What consumes itself is told and cautioned; ordinary mixtures are left in peace.</summary>
public sealed class ReactionTests
{
    private const string Code = "no-reaction-but-proton-exchange";

    [Theory]
    [InlineData("sodium hypochlorite", "HCl", "acid-onto-hypochlorite")]
    [InlineData("sodium hypochlorite", "citric acid", "acid-onto-hypochlorite")]
    [InlineData("sodium hypochlorite", "ammonia", "ammonia-with-hypochlorite")]
    [InlineData("sodium hypochlorite", "ammonium chloride", "ammonia-with-hypochlorite")]
    [InlineData("sodium hypochlorite", "tris", "ammonia-with-hypochlorite")]
    [InlineData("sodium hypochlorite", "glycine", "hypochlorite-with-organic")]
    [InlineData("sodium hypochlorite", "sodium cyanide", "hypochlorite-with-cyanide")]
    [InlineData("sodium hypochlorite", "hydrogen peroxide", "peroxide-with-hypochlorite")]
    [InlineData("sodium hypochlorite", "sodium sulfite", "oxidant-with-reductant")]
    [InlineData("sodium hypochlorite", "sodium nitrite", "oxidant-with-reductant")]
    [InlineData("sodium hypochlorite", "sodium azide", "azide-with-hypochlorite")]
    [InlineData("hydrogen peroxide", "sodium metabisulfite", "oxidant-with-reductant")]
    [InlineData("hydrogen peroxide", "hydrazine", "oxidant-with-reductant")]
    [InlineData("potassium iodate", "sodium sulfite", "oxidant-with-reductant")]
    [InlineData("potassium iodate", "potassium iodide", "oxidant-with-reductant")]
    [InlineData("sodium nitrite", "HCl", "acid-onto-nitrite")]
    [InlineData("sodium nitrite", "dimethylamine", "nitrite-with-amine")]
    [InlineData("sodium nitrite", "sodium hydrogen sulfite", "sulfite-with-nitrite")]
    [InlineData("sodium nitrite", "sodium azide", "azide-with-nitrite")]
    [InlineData("sodium chlorite", "acetic acid", "acid-onto-chlorite")]
    [InlineData("sodium cyanate", "sulfuric acid", "acid-onto-cyanate")]
    public void Predict_whatConsumesItself_toldAndCautioned(string one, string other, string caution)
    {
        foreach (var recipe in new[] { Of(one, other), Of(other, one) })
        {
            var prediction = new Predictor().Predict(recipe);

            Assert.Contains("consumes itself", prediction.OutsideTheModel);
            Assert.Contains(prediction.Cautions, it => it.Code == caution);
            var check = prediction.Assumptions.First(it => it.Code == Code);
            Assert.False(check.Held);
            Assert.Null(check.Figure);
            Assert.Contains(", ", check.Of, StringComparison.Ordinal);
            Schemas.Record.Hold(RecordJson.Write(prediction));
        }
    }

    [Fact]
    public void Predict_strongAcidOnChlorate_toldFromOneMolPerLitre()
    {
        static Prediction With(string strength) => new Predictor().Predict(
            Recipe.Named("beaker").PourWater("1 kg").Add("0.01 mol", "potassium chlorate").Pour("10 mL", Stock.Of("HCl", strength)).Build());

        Assert.Equal(["consumes itself"], With("2 mol/L").OutsideTheModel);
        Assert.Empty(With("0.1 mol/L").OutsideTheModel);
    }

    [Fact]
    public void Predict_nitrousAcidAlone_told() =>
        Assert.Equal(["consumes itself"], new Predictor().Predict(Recipe.Named("beaker").PourWater("1 kg").Add("0.01 mol", "nitrous acid").Build()).OutsideTheModel);

    [Fact]
    public void Predict_bothReasons_bothTold()
    {
        var prediction = new Predictor().Predict(
            Recipe.Named("beaker").PourWater("1 kg").Weigh("10 g", "benzoic acid").Pour("10 mL", Stock.Of("sodium hypochlorite", "0.5 mol/L")).Build());

        Assert.Equal(["may not dissolve", "consumes itself"], prediction.OutsideTheModel);
        Assert.EndsWith(", of the homogeneous model only: may not dissolve, consumes itself", prediction.ToString(), StringComparison.Ordinal);
    }

    // Weak acids do not set the gases of stronger ones free; hydrogen cyanide and sulfide are weaker than all of these.
    [Theory]
    [InlineData("potassium dihydrogen phosphate", "sodium nitrite")]
    [InlineData("HEPES", "sodium azide")]
    [InlineData("boric acid", "sodium fluoride")]
    [InlineData("tris hydrochloride", "sodium sulfite")]
    [InlineData("MOPS", "sodium hydrogen carbonate")]
    public void Predict_weakAcidWithSaltOfAStrongerOne_noCautionOnItsGas(string acid, string salt)
    {
        var prediction = new Predictor().Predict(Of(acid, salt));

        Assert.DoesNotContain(prediction.Cautions, one => one.Code.StartsWith("acid-onto-", StringComparison.Ordinal));
        Assert.DoesNotContain(prediction.Assumptions, one => one.Code == Code);
    }

    [Theory]
    [InlineData("potassium dihydrogen phosphate")]
    [InlineData("boric acid")]
    [InlineData("HEPES")]
    [InlineData("ammonium chloride")]
    public void Predict_weakAcidWithCyanideOrSulfide_cautioned(string acid)
    {
        Assert.Contains(new Predictor().Predict(Of(acid, "sodium cyanide")).Cautions, one => one.Code == "acid-onto-cyanide");
        Assert.Contains(new Predictor().Predict(Of(acid, "sodium sulfide")).Cautions, one => one.Code == "acid-onto-sulfide");
    }

    // A dilute buffer, weighed or poured, calls for nothing but the general reminder.
    [Theory]
    [InlineData("sodium acetate", "acetic acid")]
    [InlineData("potassium dihydrogen phosphate", "disodium hydrogen phosphate")]
    [InlineData("tris", "tris hydrochloride")]
    [InlineData("HEPES", "sodium hydroxide")]
    [InlineData("citric acid", "trisodium citrate")]
    [InlineData("sodium hydrogen carbonate", "sodium carbonate")]
    [InlineData("borax", "boric acid")]
    [InlineData("ammonium chloride", "ammonia")]
    [InlineData("glycine", "HCl")]
    [InlineData("sodium hydrogen carbonate", "acetic acid")]
    public void Predict_diluteBuffer_onlyTheGeneralCaution(string one, string other)
    {
        var recipe = Recipe.Named("buffer").PourWater("1 L").Pour("50 mL", Stock.Of(one, "0.05 mol/L")).Pour("50 mL", Stock.Of(other, "0.05 mol/L")).Build();

        var prediction = new Predictor().Predict(recipe);
        Assert.Equal(["always"], prediction.Cautions.Select(it => it.Code));
        Assert.Empty(prediction.OutsideTheModel);
    }

    [Fact]
    public void Groups_strongerAcids_areAcidsAndNoBuffersOfNeutralPH()
    {
        var stronger = SubstanceTable.Default.Substances.Where(one => one.Groups.Contains("stronger-acid", StringComparer.Ordinal)).ToArray();

        Assert.All(stronger, one => Assert.Contains("acid", one.Groups));
        Assert.All(SubstanceTable.Default.Substances.Where(one => one.Groups.Contains("strong-acid", StringComparer.Ordinal)), one => Assert.Contains(one, stronger));
        Assert.DoesNotContain(stronger, one => one.Id is "hepes" or "boric-acid" or "potassium-dihydrogen-phosphate" or "tris-hydrochloride");
    }

    private static Recipe Of(string one, string other) =>
        Recipe.Named("beaker").PourWater("1 kg").Add("0.01 mol", one).Add("0.01 mol", other).Build();
}
