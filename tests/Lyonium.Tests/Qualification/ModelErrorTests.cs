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

    // Against the deviations summed here anew: solution by solution, then over the solutions.
    [Fact]
    public void ModelErrors_are_root_mean_square_deviations_over_solutions()
    {
        var report = new Qualifier().Run();
        var band = report.ModelErrors[1];
        var solutions = report.Outcomes
            .Where(one => one.Check.Quantity == "pH" && one.Check.Tolerance > 0)
            .GroupBy(one => one.Check.Title + string.Concat(one.Check.Inputs.Where(input => input.Key != "temperature").Select(input => input.Value)), StringComparer.Ordinal)
            .Where(one => one.Average(outcome => outcome.IonicStrengthMolPerKg) >= band.LowMolPerKg && one.Average(outcome => outcome.IonicStrengthMolPerKg) < band.HighMolPerKg)
            .Select(one => one.Average(outcome => (outcome.Obtained - outcome.Check.Expected) * (outcome.Obtained - outcome.Check.Expected)))
            .ToArray();

        Assert.Equal(solutions.Length, band.Solutions);
        Assert.Equal(Math.Sqrt(solutions.Average()), band.RootMeanSquareDeviation, 1e-12);
    }

    [Theory]
    [InlineData("0.01 mol", "25 Cel", true)]
    [InlineData("0.09 mol", "0 Cel", true)]
    [InlineData("0.09 mol", "50 Cel", true)]
    [InlineData("0.09 mol", "51 Cel", false)]
    [InlineData("4 mol", "25 Cel", false)]
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

    // Constants at another temperature than theirs, beyond their range, or carried from another ionic strength: no check has tried them.
    [Theory]
    [InlineData("tyrosine", "60 Cel")]
    [InlineData("aniline", "5 Cel")]
    [InlineData("EDTA", "25 Cel")]
    public void ModelUncertainty_of_a_constant_that_no_check_tried_is_not_stated(string substance, string temperature) =>
        Assert.Null(new Predictor().Predict(RecipeJson.Read(RecipeText.With(
            $"{{ \"substance\": \"{substance}\", \"amount\": \"0.01 mol\" }}, {{ \"substance\": \"water\", \"mass\": \"1 kg\" }}",
            $"\"temperature\": \"{temperature}\""))).ModelUncertainty);

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
        $"      {{ \"lowMolPerKg\": {band.LowMolPerKg}, \"highMolPerKg\": {band.HighMolPerKg}, \"solutions\": {band.Solutions}, \"rootMeanSquareDeviation\": {band.RootMeanSquareDeviation:F4} }}");
}
