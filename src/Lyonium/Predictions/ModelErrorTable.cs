using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using System.Text.Json;
using System.Text.Json.Serialization;

namespace Lyonium.Predictions;

internal sealed record ModelErrorBandEntry(double LowMolPerKg, double HighMolPerKg, int Solutions, double RootMeanSquareDeviation);

internal sealed record ModelErrorDocument(string Format, IReadOnlyDictionary<string, IReadOnlyList<ModelErrorBandEntry>> Models);

[JsonSourceGenerationOptions(GenerationMode = JsonSourceGenerationMode.Metadata, PropertyNamingPolicy = JsonKnownNamingPolicy.CamelCase)]
[JsonSerializable(typeof(ModelErrorDocument))]
internal sealed partial class ModelErrorContext : JsonSerializerContext;

/// <summary>The error of each activity model in pH by band of ionic strength, as the published checks give it; a test keeps it true.</summary>
internal static class ModelErrorTable
{
    private const string Resource = "Lyonium.Data.model-error.json";
    private const double LowestK = 273.15;
    private const double HighestK = 323.15;

    private static readonly Lazy<ModelErrorDocument> BuiltIn = new(Read);

    /// <summary>The uncertainty at an ionic strength and temperature; <see langword="null"/> where no published check speaks for it.</summary>
    public static ModelUncertainty? Find(string activityModel, double ionicStrengthMolPerKg, double temperatureK)
    {
        if (temperatureK < LowestK || temperatureK > HighestK || !BuiltIn.Value.Models.TryGetValue(activityModel, out var bands))
        {
            return null;
        }

        var band = bands.FirstOrDefault(one => ionicStrengthMolPerKg >= one.LowMolPerKg && ionicStrengthMolPerKg < one.HighMolPerKg);
        return band is null ? null : new ModelUncertainty(band.RootMeanSquareDeviation, band.Solutions, band.LowMolPerKg, band.HighMolPerKg);
    }

    private static ModelErrorDocument Read()
    {
        using var stream = typeof(ModelErrorTable).Assembly.GetManifestResourceStream(Resource)
            ?? throw new InvalidDataException($"The library was built without '{Resource}'.");
        return JsonSerializer.Deserialize(stream, ModelErrorContext.Default.ModelErrorDocument)!;
    }
}
