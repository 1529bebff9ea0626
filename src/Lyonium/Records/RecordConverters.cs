using System;
using System.Text.Json;
using System.Text.Json.Serialization;
using Lyonium.Quantities;
using Lyonium.Recipes;

namespace Lyonium.Records;

/// <summary>A recipe inside a record.</summary>
internal sealed class RecipeConverter : JsonConverter<Recipe>
{
    public override Recipe Read(ref Utf8JsonReader reader, Type typeToConvert, JsonSerializerOptions options) =>
        throw new NotSupportedException("Recipes are read by RecipeJson, which tells every fault.");

    public override void Write(Utf8JsonWriter writer, Recipe value, JsonSerializerOptions options) => RecipeWriter.Write(writer, value);
}

/// <summary>The host's own JSON, echoed as it was written.</summary>
internal sealed class RawJsonConverter : JsonConverter<string>
{
    public override string Read(ref Utf8JsonReader reader, Type typeToConvert, JsonSerializerOptions options) =>
        throw new NotSupportedException("Notes are read by RecipeJson.");

    public override void Write(Utf8JsonWriter writer, string value, JsonSerializerOptions options) => writer.WriteRawValue(value);
}

/// <summary>Doubles as the shortest text that reads back to the same double, on every target.</summary>
internal sealed class ShortestDoubleConverter : JsonConverter<double>
{
    public override double Read(ref Utf8JsonReader reader, Type typeToConvert, JsonSerializerOptions options) => reader.GetDouble();

    public override void Write(Utf8JsonWriter writer, double value, JsonSerializerOptions options) =>
        writer.WriteRawValue(NumberText.Shortest(value));
}
