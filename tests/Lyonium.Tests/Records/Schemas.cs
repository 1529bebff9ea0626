using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using System.Text.Json;
using Json.Schema;
using Xunit;

namespace Lyonium.Tests.Records;

/// <summary>The published JSON Schemas, each built once.</summary>
internal static class Schemas
{
    private static readonly EvaluationOptions Listed = new() { OutputFormat = OutputFormat.List };

    public static JsonSchema Recipe { get; } = Load("lyonium-recipe-1");

    public static JsonSchema Record { get; } = Load("lyonium-record-1.1");

    public static JsonSchema FirstRecord { get; } = Load("lyonium-record-1");

    public static JsonSchema Faults { get; } = Load("lyonium-faults-1");

    /// <summary>The latest version, which the built-in table is of.</summary>
    public static JsonSchema Table { get; } = Load("lyonium-table-1.1");

    /// <summary>The first version; users' tables of it are still read.</summary>
    public static JsonSchema FirstTable { get; } = Load("lyonium-table-1");

    public static JsonSchema Comparison { get; } = Load("lyonium-comparison-1");

    public static JsonSchema Qualification { get; } = Load("lyonium-qualification-1");

    public static JsonSchema Checks { get; } = Load("lyonium-checks-1");

    public static JsonSchema Cautions { get; } = Load("lyonium-cautions-1");

    /// <summary>What the schema has against a document; empty where it holds.</summary>
    public static IReadOnlyList<string> Objections(this JsonSchema schema, string json)
    {
        using var document = JsonDocument.Parse(json);
        var results = schema.Evaluate(document.RootElement, Listed);
        if (results.IsValid)
        {
            return [];
        }

        var told = (results.Details ?? []).Append(results)
            .Where(one => one.Errors is { Count: > 0 })
            .SelectMany(one => one.Errors!.Select(error => $"{one.InstanceLocation}: {error.Key}: {error.Value}"))
            .ToArray();
        return told.Length > 0 ? told : ["not valid"];
    }

    public static void Hold(this JsonSchema schema, string json)
    {
        var objections = schema.Objections(json);
        Assert.True(objections.Count == 0, string.Join(Environment.NewLine, objections.Take(20)));
    }

    private static JsonSchema Load(string name) => JsonSchema.FromText(File.ReadAllText(Repository.Schema(name)));
}
