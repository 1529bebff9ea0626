using System;
using System.Globalization;
using System.IO;
using System.Linq;
using System.Text.Json;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Records;
using Xunit;

namespace Lyonium.Tests.Records;

public sealed class RecordJsonTests
{
    private static readonly Prediction Predicted = new Predictor().Predict(RecipeJson.Read(RecipeText.OfTheContract));
    private static readonly JsonElement Record = JsonDocument.Parse(RecordJson.Write(Predicted)).RootElement;

    [Fact]
    public void Write_pH_isTheShortestTextOfTheDouble()
    {
        Assert.Equal(BitConverter.DoubleToInt64Bits(Predicted.PH), BitConverter.DoubleToInt64Bits(Record.GetProperty("pH").GetDouble()));
        Assert.Equal(Predicted.PH.ToString("R", CultureInfo.InvariantCulture), Record.GetProperty("pH").GetRawText());
        Assert.Equal(Predicted.PHydrogenConcentration, Record.GetProperty("pHydrogenConcentration").GetDouble());
    }

    [Fact]
    public void Write_namesMethodModelAndWhatItRestsOn()
    {
        Assert.Equal("lyonium-record/1.1", Record.GetProperty("format").GetString());
        Assert.Equal("exact", Record.GetProperty("method").GetString());
        Assert.Equal("bates-guggenheim", Record.GetProperty("activityModel").GetString());
        Assert.Equal("two decimals", Record.GetProperty("reported").GetProperty("rule").GetString());
        Assert.Equal(Predicted.Reported, Record.GetProperty("reported").GetProperty("pH").GetString());
        var evidence = Record.GetProperty("evidence");
        Assert.Equal("net10.0", evidence.GetProperty("software").GetProperty("target").GetString());
        Assert.Equal(Lyonium.Substances.SubstanceTable.Default.Identity.Sha256, evidence.GetProperty("table").GetProperty("sha256").GetString());
        var bracket = evidence.GetProperty("bracket").EnumerateArray().Select(one => one.GetDouble()).ToArray();
        Assert.Equal(2, bracket.Length);
        Assert.InRange(Predicted.PH, bracket[0], bracket[1]);
        Assert.InRange(bracket[1] - bracket[0], 0, 1e-9);
    }

    [Fact]
    public void Write_quantities_areOfTheMixture()
    {
        Assert.Equal("250 mL", Quantity("volume"));
        Assert.Equal("25 Cel", Quantity("temperature"));
        Assert.Equal(Predicted.Mixture.WaterKg, Record.GetProperty("water").GetProperty("value").GetDouble());
        Assert.Equal(Predicted.IonicStrengthMolPerKg, Record.GetProperty("ionicStrength").GetProperty("value").GetDouble());
    }

    [Fact]
    public void Write_recipe_isTheRecipeWithIds_soThatARecordCanBePredictedAgain()
    {
        var inside = Record.GetProperty("recipe").GetRawText();
        var again = RecipeJson.Read(inside);

        Assert.Equal(Predicted.Recipe, again);
        Assert.Contains("\"hydrochloric-acid\"", inside, StringComparison.Ordinal);
        Assert.Equal(BitConverter.DoubleToInt64Bits(Predicted.PH), BitConverter.DoubleToInt64Bits(new Predictor().Predict(again).PH));
    }

    [Fact]
    public void Write_species_areComplete()
    {
        var species = Record.GetProperty("species").EnumerateArray().ToArray();

        Assert.Equal(Predicted.Species.Count, species.Length);
        Assert.Equal(["water:2", "water:0"], species.Take(2).Select(one => one.GetProperty("id").GetString()!));
        Assert.False(species[0].TryGetProperty("fraction", out _));
        var citrate = species.Where(one => one.GetProperty("family").GetString() == "citrate").ToArray();
        Assert.Equal(["citrate:0", "citrate:1", "citrate:2", "citrate:3"], citrate.Select(one => one.GetProperty("id").GetString()!));
        Assert.Equal([-3, -2, -1, 0], citrate.Select(one => one.GetProperty("charge").GetInt32()));
        Assert.Equal(1, citrate.Sum(one => one.GetProperty("fraction").GetDouble()), 1e-12);
    }

    [Fact]
    public void Write_twice_givesTheSameText() =>
        Assert.Equal(RecordJson.Write(Predicted), RecordJson.Write(new Predictor().Predict(RecipeJson.Read(RecipeText.OfTheContract))));

    [Fact]
    public void Write_withoutNotes_hasNone()
    {
        var recipe = RecipeJson.Read(RecipeText.With("{ \"substance\": \"water\", \"mass\": \"1 kg\" }"));
        using var record = JsonDocument.Parse(RecordJson.Write(new Predictor().With(new IdealModel()).Predict(recipe)));

        Assert.False(record.RootElement.TryGetProperty("notes", out _));
        Assert.Equal("ideal", record.RootElement.GetProperty("activityModel").GetString());
    }

    [Fact]
    public void Write_null_throws()
    {
        Assert.Throws<ArgumentNullException>(() => RecordJson.Write(null!));
        Assert.Throws<ArgumentNullException>(() => FaultsJson.Write(null!));
    }

    [Fact]
    public void FaultsWrite_hasEveryMemberOfTheContract()
    {
        var faults = RecipeText.FaultsOf(RecipeText.With("{ \"substance\": \"acetic acid\", \"concentration\": \"0.1 mol/L\", \"volume\": \"10 g\" }"));
        using var document = JsonDocument.Parse(FaultsJson.Write(faults));

        Assert.Equal("lyonium-faults/1", document.RootElement.GetProperty("format").GetString());
        var fault = Assert.Single(document.RootElement.GetProperty("faults").EnumerateArray());
        Assert.Equal("LYO0101", fault.GetProperty("code").GetString());
        Assert.Equal("$.parts[0].volume", fault.GetProperty("path").GetString());
        Assert.Equal("10 g", fault.GetProperty("found").GetString());
        Assert.Contains("volume", fault.GetProperty("message").GetString()!, StringComparison.Ordinal);
        Assert.Equal("give a quantity of the kind 'volume', such as 10 mL", fault.GetProperty("remedy").GetString());
    }

    [Fact]
    public void Examples_ifThereAreAny_areAnsweredWithinTheirScale()
    {
        foreach (var file in Repository.Examples())
        {
            var prediction = new Predictor().Predict(RecipeJson.Read(File.ReadAllText(file)));
            Assert.InRange(prediction.PH, -1, 15);
        }
    }

    private static string Quantity(string name) =>
        Record.GetProperty(name).GetProperty("value").GetRawText() + " " + Record.GetProperty(name).GetProperty("unit").GetString();
}
