using System.Collections.Generic;
using System.Text.Json.Nodes;
using System.Text.Json.Serialization;

namespace Lyonium.Qualification;

// The files of published checks as types; docs/schemas has the same as JSON Schema.

internal sealed record CheckRowDocument(
    double Expected, IReadOnlyDictionary<string, string>? At, string? Known, double? Tolerance, string? Reason, string? Caution);

internal sealed record CheckSetDocument(
    string Id,
    string Title,
    string Source,
    string Known,
    string Quantity,
    double? Tolerance,
    string Reason,
    JsonObject? Recipe,
    IReadOnlyDictionary<string, string>? At,
    IReadOnlyList<CheckRowDocument> Rows);

internal sealed record CheckFileDocument(string Format, IReadOnlyList<CheckSetDocument> Sets);

[JsonSourceGenerationOptions(
    GenerationMode = JsonSourceGenerationMode.Metadata,
    PropertyNamingPolicy = JsonKnownNamingPolicy.CamelCase,
    UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow)]
[JsonSerializable(typeof(CheckFileDocument))]
internal sealed partial class CheckFileContext : JsonSerializerContext;
