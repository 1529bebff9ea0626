using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;

namespace Lyonium.Records;

/// <summary>The source-generated serialisation of records and faults.</summary>
[JsonSourceGenerationOptions(GenerationMode = JsonSourceGenerationMode.Metadata)]
[JsonSerializable(typeof(RecordDocument))]
[JsonSerializable(typeof(FaultsDocument))]
[JsonSerializable(typeof(ComparisonDocument))]
internal sealed partial class RecordContext : JsonSerializerContext;

/// <summary>The context as the contract wants it written: camel case, no nulls, formulas and signs as they are.</summary>
internal static class ContractJson
{
    public static RecordContext Context { get; } = new(new JsonSerializerOptions
    {
        PropertyNamingPolicy = JsonNamingPolicy.CamelCase,
        DefaultIgnoreCondition = JsonIgnoreCondition.WhenWritingNull,
        WriteIndented = true,
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        Converters = { new ShortestDoubleConverter() },
    });
}
