using System;
using System.IO;
using System.Linq;
using System.Text;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Records;
using Lyonium.Substances;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Predictions;

/// <summary>Ion pairs, dimers and polymers come in sets that belong to activity models; a prediction says which it used.</summary>
public sealed class PairSetTests
{
    private const string Kilogram = "{ \"substance\": \"water\", \"mass\": \"1 kg\" }";
    private const string Lime = "{ \"substance\": \"calcium hydroxide\", \"amount\": \"0.0203 mol\" }, " + Kilogram;

    private static Prediction Of(Predictor predictor, string parts) => predictor.Predict(RecipeJson.Read(RecipeText.With(parts)));

    // Ca²⁺ + OH⁻ = CaOH⁺: the molalities and coefficients of the answer fulfil log K = 1.30.
    [Theory]
    [InlineData("bates-guggenheim")]
    [InlineData("specific-ion")]
    [InlineData("davies")]
    public void CalciumHydroxidePair_fulfilsItsConstant(string model)
    {
        var prediction = Of(new Predictor().With(ActivityModels.Find(model)!), Lime);
        double Activity(string id) => prediction.Species.Where(one => one.Id == id).Select(one => one.MolalityMolPerKg * one.ActivityCoefficient).Single();

        Assert.Equal(1.30, Math.Log10(Activity("calcium-hydroxide-pair") / (Activity("calcium:0") * Activity("water:0"))), 1e-9);
        Assert.Equal(0.0203, prediction.Species.Where(one => one.Family == "calcium").Sum(one => one.MolalityMolPerKg), 1e-12);
        Assert.Equal(1, prediction.Species.Where(one => one.Family == "calcium").Sum(one => one.Fraction!.Value), 1e-12);
        Assert.Equal(0, prediction.Species.Sum(one => one.Charge * one.MolalityMolPerKg), 1e-9);
        Assert.Contains("hydroxide-pairs", prediction.PairSets);
        Assert.Contains(prediction.Evidence.Constants, one => one.Id == "calcium-hydroxide-pair" && one.Quantity == "log10 K");
    }

    // 1 mol/kg of hydrofluoric acid: with the hydrogen difluoride counted the pH is about 0.3 lower, as h² = Ka · HF · (1 + K · HF) asks.
    [Fact]
    public void HydrogenDifluoride_lowersThePHOfConcentratedHydrofluoricAcid()
    {
        const string acid = "{ \"substance\": \"hydrofluoric acid\", \"amount\": \"1 mol\" }, " + Kilogram;
        var with = Of(new Predictor(), acid);
        var without = Of(new Predictor().WithPairSets(), acid);
        double Molality(string id) => with.Species.Single(one => one.Id == id).MolalityMolPerKg;

        Assert.InRange(without.PH - with.PH, 0.25, 0.35);
        Assert.Equal(1, Molality("fluoride:0") + Molality("fluoride:1") + (2 * Molality("hydrogen-difluoride")), 1e-12);
        Assert.NotNull(with.Buffer);
    }

    // The worked steps show the pairs' formation, fulfilled by the answer, and start with nothing paired.
    [Fact]
    public void Work_showsTheFormationOfPairs()
    {
        var working = Of(new Predictor(), Lime).Work();
        var pair = working.Reactions.Single(one => one.IsFormation && one.Id == "calcium-hydroxide-pair");

        Assert.Equal(("Ca²⁺ + OH⁻ ⇌ CaOH⁺", "[CaOH⁺] / ([Ca²⁺][OH⁻])"), (pair.Equation, pair.MassAction));
        Assert.Equal(-1.30, pair.PKa, 1e-12);
        Assert.Equal(1, pair.Quotient / pair.K, 1e-9);
        Assert.Equal([0.0406, 0.0203, 0], working.Amounts.Skip(1).Select(one => Math.Round(one.StartMolPerKg!.Value, 12)));
        Assert.Contains("log K 1.3000", working.ToText(), StringComparison.Ordinal);
    }

    [Fact]
    public void WithPairSets_none_hasNoPairs()
    {
        var prediction = Of(new Predictor().WithPairSets(), Lime);

        Assert.Empty(prediction.PairSets);
        Assert.DoesNotContain(prediction.Species, one => one.Id == "calcium-hydroxide-pair");
        Assert.True(prediction.PH > Of(new Predictor(), Lime).PH + 0.03);
    }

    [Fact]
    public void ModelUncertainty_withChosenPairs_isNotStated()
    {
        Assert.NotNull(Of(new Predictor(), Lime).ModelUncertainty);
        Assert.Null(Of(new Predictor().WithPairSets("hydroxide-pairs"), Lime).ModelUncertainty);
    }

    [Fact]
    public void IdealModel_hasNoPairs() => Assert.Empty(Of(new Predictor().With(new IdealModel()), Lime).PairSets);

    [Theory]
    [InlineData("no-such-set", "LYO0503")]
    [InlineData("alkali-sulfate-pairs", "LYO0504")]
    public void SetThatIsNotThere_orBelongsElsewhere_isRefused(string set, string code)
    {
        var predictor = new Predictor().With(new SpecificIonModel()).WithPairSets(set);

        Assert.Equal(code, Assert.Single(predictor.TryPredict(RecipeJson.Read(RecipeText.With(Lime))).Faults).Code);
    }

    // Borate in the presence of polymers: the mass balance counts each boron of a polymer.
    [Fact]
    public void Polyborates_shareTheBoron()
    {
        var prediction = Of(
            new Predictor().WithPairSets("polyborates"),
            "{ \"substance\": \"boric acid\", \"amount\": \"0.4 mol\" }, { \"substance\": \"sodium hydroxide\", \"amount\": \"0.1 mol\" }, " + Kilogram);
        double Molality(string id) => prediction.Species.Single(one => one.Id == id).MolalityMolPerKg;

        Assert.Equal(0.4, Molality("borate:0") + Molality("borate:1") + (2 * Molality("diborate")) + (3 * Molality("triborate")) + (4 * Molality("tetraborate")), 1e-12);
        Assert.True(Molality("triborate") > 0.001);
    }

    [Fact]
    public void Replay_keepsTheSetsOfTheRecord()
    {
        var record = RecordJson.Write(Of(new Predictor().WithPairSets(), Lime));

        Assert.True(new RecordReplay(SubstanceTable.Default).TryReplay(record).Value.IsBitIdentical);
    }

    // The short-cuts know ladders only: a mixture whose species couple is refused with the reason; so is lime, where hydroxide goes into the pair.
    [Fact]
    public void ShortCut_onCoupledSpecies_doesNotApply()
    {
        var shortCut = new Predictor().With(new Lyonium.Solvers.DominantAcidSolver());
        var faults = shortCut.TryPredict(RecipeJson.Read(RecipeText.With("{ \"substance\": \"hydrofluoric acid\", \"amount\": \"1 mol\" }, " + Kilogram))).Faults;

        Assert.StartsWith("LYO06", Assert.Single(faults).Code, StringComparison.Ordinal);
        Assert.StartsWith("LYO06", Assert.Single(shortCut.TryPredict(RecipeJson.Read(RecipeText.With(Lime))).Faults).Code, StringComparison.Ordinal);
    }

    // Sodium citrate with specific interactions, over the whole range that is stated: settled, or the method says why, and never a failure.
    [Theory]
    [InlineData("25 Cel")]
    [InlineData("100 Cel")]
    public void SodiumCitrate_withSpecificInteractions_isAnsweredOverTheRange(string temperature)
    {
        foreach (var amount in new[] { "0.01", "0.05", "0.1", "0.15", "0.19", "0.2", "0.25", "0.3", "0.4" })
        {
            var recipe = RecipeJson.Read(RecipeText.With(
                $"{{ \"substance\": \"trisodium citrate dihydrate\", \"amount\": \"{amount} mol\" }}, {{ \"substance\": \"calcium chloride\", \"amount\": \"0.001 mol\" }}, " + Kilogram,
                $"\"temperature\": \"{temperature}\""));
            var attempt = new Predictor().With(new SpecificIonModel()).TryPredict(recipe);

            Assert.True(attempt.Success, amount + ": " + string.Join("; ", attempt.Success ? [] : attempt.Faults.Select(fault => fault.Found)));
        }
    }

    [Theory]
    [InlineData("{ \"chloride:0\": -1, \"sodium:0\": 1 }")]
    [InlineData("{ \"chloride:0\": 0, \"sodium:0\": 1 }")]
    [InlineData("{ \"water:2\": 2 }")]
    [InlineData("{ \"sodium:0\": 1 }")]
    [InlineData("{ \"acetate:0\": 1, \"water:2\": 1 }")]
    public void TryLayer_pairThatIsNone_isRefused(string formedFrom)
    {
        var table = $$"""
            { "format": "lyonium-table/1.1", "edition": "1", "sources": [ { "key": "own", "citation": "own" } ],
              "pairSets": [ { "id": "own-pairs", "name": "own", "models": [ "davies" ], "isDefault": true, "species": [
                { "id": "own-pair", "formula": "NaCl", "formedFrom": {{formedFrom}}, "log10K": { "value": 1, "source": "own", "known": "read" } } ] } ] }
            """;

        Assert.Contains(SubstanceTable.Default.TryLayer("own", new MemoryStream(Encoding.UTF8.GetBytes(table))).Faults, fault => fault.Code == "LYO0318");
    }

    [Fact]
    public void TryLayer_pairIdThatIsTaken_isRefused()
    {
        const string table = """
            { "format": "lyonium-table/1.1", "edition": "1", "sources": [ { "key": "own", "citation": "own" } ],
              "pairSets": [ { "id": "own-pairs", "name": "own", "models": [ "davies" ], "isDefault": true, "species": [
                { "id": "calcium-hydroxide-pair", "formula": "CaOH^+", "formedFrom": { "calcium:0": 1, "water:0": 1 }, "log10K": { "value": 1, "source": "own", "known": "read" } } ] } ] }
            """;

        Assert.Equal("LYO0312", Assert.Single(SubstanceTable.Default.TryLayer("own", new MemoryStream(Encoding.UTF8.GetBytes(table))).Faults).Code);
    }

    [Fact]
    public void ModelUncertainty_withAnOwnSet_isNotStated()
    {
        const string table = """
            { "format": "lyonium-table/1.1", "edition": "1", "sources": [ { "key": "own", "citation": "own" } ],
              "pairSets": [ { "id": "hydroxide-pairs", "name": "own", "models": [ "davies" ], "isDefault": false, "species": [
                { "id": "own-pair", "formula": "CaOH^+", "formedFrom": { "calcium:0": 1, "water:0": 1 }, "log10K": { "value": 1, "source": "own", "known": "read" } } ] } ] }
            """;
        var layered = SubstanceTable.Default.TryLayer("own", new MemoryStream(Encoding.UTF8.GetBytes(table))).GetValueOrThrow();

        Assert.Null(Of(new Predictor(layered), Lime).ModelUncertainty);
    }

    [Theory]
    [InlineData("\"formula\": \"CaOH^2+\"", "LYO0318")]
    [InlineData("\"formula\": \"CaOH^+\", \"colour\": 1", "LYO0205")]
    public void TryLayer_pairOfAnotherCharge_isRefused(string formula, string code)
    {
        var table = $$"""
            { "format": "lyonium-table/1.1", "edition": "1", "sources": [ { "key": "own", "citation": "own" } ],
              "pairSets": [ { "id": "own-pairs", "name": "own", "models": [ "davies" ], "isDefault": false, "species": [
                { "id": "own-pair", {{formula}}, "formedFrom": { "calcium:0": 1, "water:0": 1 }, "log10K": { "value": 1.4, "source": "own", "known": "read" } } ] } ] }
            """;

        Assert.Equal(code, SubstanceTable.Default.TryLayer("own", new MemoryStream(Encoding.UTF8.GetBytes(table))).Faults[0].Code);
    }

    [Fact]
    public void TryLayer_ownInteractionAndPairs_areUsedAndNamed()
    {
        const string text = """
            { "format": "lyonium-table/1.1", "edition": "1", "sources": [ { "key": "own", "citation": "own" } ],
              "interactions": [ { "cation": "sodium:0", "anion": "chloride:0", "value": 0.5, "source": "own", "known": "read" } ],
              "pairSets": [ { "id": "own-pairs", "name": "own", "models": [ "specific-ion" ], "isDefault": true, "species": [
                { "id": "own-pair", "formula": "NaCl", "formedFrom": { "sodium:0": 1, "chloride:0": 1 }, "log10K": { "value": -0.5, "source": "own", "known": "read" } } ] } ] }
            """;
        var table = SubstanceTable.Default.TryLayer("own", new MemoryStream(Encoding.UTF8.GetBytes(text))).GetValueOrThrow();
        var prediction = Of(
            new Predictor(table, null, new SpecificIonModel()), "{ \"substance\": \"sodium chloride\", \"amount\": \"1 mol\" }, " + Kilogram);

        Assert.Contains("own-pairs", prediction.PairSets);
        Assert.Contains(prediction.Evidence.Constants, one => one.Id == "sodium:0 chloride:0" && one.Value.Value == 0.5 && one.Layer == "own");
        Assert.True(prediction.Species.Single(one => one.Id == "own-pair").MolalityMolPerKg > 0);
        Schemas.Record.Hold(RecordJson.Write(prediction));
    }
}
