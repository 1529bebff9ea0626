using System;
using System.Globalization;
using System.IO;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Qualification;
using Lyonium.Records;
using Lyonium.Substances;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Qualification;

/// <summary>The uncertainty that a prediction carries is the error that the published checks give its activity model.</summary>
public sealed class ModelErrorTests
{
    // With LYONIUM_UPDATE_DOCS=1 the file is written anew.
    [Fact]
    public void Data_is_what_the_published_checks_give()
    {
        var models = ActivityModels.All
            .Select(model => (model.Name, Bands: new Qualifier(new Predictor(SubstanceTable.Default, null, model)).Run().ModelErrors))
            .Select(one => $"    \"{one.Name}\": [\n{string.Join(",\n", one.Bands.Select(Line))}\n    ]");
        var text = "{\n  \"format\": \"lyonium-model-error/1\",\n  \"models\": {\n" + string.Join(",\n", models) + "\n  }\n}\n";
        var file = Path.Combine(Repository.Root, "src", "Lyonium", "Data", "model-error.json");
        if (Environment.GetEnvironmentVariable("LYONIUM_UPDATE_DOCS") == "1")
        {
            File.WriteAllText(file, text);
            return;
        }

        Assert.Equal(text, File.ReadAllText(file).ReplaceLineEndings("\n"));
    }

    // Against the deviations summed here anew.
    [Fact]
    public void ModelErrors_are_root_mean_square_deviations()
    {
        var report = new Qualifier().Run();
        var band = report.ModelErrors[1];
        var squares = report.Outcomes
            .Where(one => one.Check.Quantity == "pH" && one.Check.Tolerance > 0 && one.IonicStrengthMolPerKg >= band.LowMolPerKg && one.IonicStrengthMolPerKg < band.HighMolPerKg)
            .Select(one => (one.Obtained - one.Check.Expected) * (one.Obtained - one.Check.Expected))
            .ToArray();

        Assert.Equal(squares.Length, band.Count);
        Assert.Equal(Math.Sqrt(squares.Average()), band.StandardDeviation, 1e-12);
    }

    [Theory]
    [InlineData("0.01 mol", "25 Cel", true)]
    [InlineData("0.12 mol", "0 Cel", true)]
    [InlineData("0.12 mol", "50 Cel", true)]
    [InlineData("0.12 mol", "51 Cel", false)]
    [InlineData("2 mol", "25 Cel", false)]
    public void ModelUncertainty_is_there_where_published_values_are(string amount, string temperature, bool isThere)
    {
        var prediction = new Predictor().Predict(RecipeJson.Read(RecipeText.With(
            $"{{ \"substance\": \"sodium chloride\", \"amount\": \"{amount}\" }}, {{ \"substance\": \"water\", \"mass\": \"1 kg\" }}",
            $"\"temperature\": \"{temperature}\"")));

        Assert.Equal(isThere, prediction.ModelUncertainty is not null);
        if (prediction.ModelUncertainty is { } one)
        {
            Assert.InRange(one.StandardUncertainty, 0.002, 0.02);
            Assert.InRange(prediction.IonicStrengthMolPerKg, one.LowMolPerKg, one.HighMolPerKg);
            Assert.Contains("junction", ModelUncertainty.Scope, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void ModelUncertainty_of_a_mixture_outside_the_model_is_not_stated()
    {
        var prediction = new Predictor().Predict(RecipeJson.Read(RecipeText.With(
            "{ \"substance\": \"benzoic acid\", \"amount\": \"1 mol\" }, { \"substance\": \"water\", \"mass\": \"1 kg\" }")));

        Assert.NotEmpty(prediction.OutsideTheModel);
        Assert.Null(prediction.ModelUncertainty);
    }

    private static string Line(ModelErrorBand band) => string.Create(
        CultureInfo.InvariantCulture,
        $"      {{ \"lowMolPerKg\": {band.LowMolPerKg}, \"highMolPerKg\": {band.HighMolPerKg}, \"count\": {band.Count}, \"standardDeviation\": {band.StandardDeviation:F4} }}");
}
