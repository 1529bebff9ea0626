using System.Collections.Generic;
using System.Linq;
using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;
using Lyonium.Provenance;
using Lyonium.Records;

namespace Lyonium.Qualification;

// The JSON contract as types; docs/schemas has the same as JSON Schema. Names and order are those of the text.

internal sealed record CheckEntry(
    string Id,
    string Title,
    string Quantity,
    string Unit,
    string Source,
    string Known,
    string Inputs,
    double Expected,
    [property: JsonIgnore(Condition = JsonIgnoreCondition.Never)] double? Obtained,
    double? Deviation,
    double? Tolerance,
    double? IonicStrengthMolPerKg,
    string Reason,
    string Verdict,
    bool? ValueNotRead,
    string? Failure);

internal sealed record SumEntry(int Checks, int Holds, int HoldsAgainstDerived, int AgreesValueNotRead, int Fails, int Reported);

internal sealed record ModelErrorEntry(double LowMolPerKg, double HighMolPerKg, int Solutions, double RootMeanSquareDeviation);

internal sealed record EnvironmentLayerEntry(string Name, string Edition, string Sha256);

internal sealed record EnvironmentTableEntry(string Edition, string Sha256, IReadOnlyList<EnvironmentLayerEntry> Layers);

internal sealed record EnvironmentEntry(
    string Version,
    string Target,
    string? AssemblySha256,
    string ModuleVersionId,
    string Runtime,
    string OperatingSystem,
    string Processor,
    string Culture,
    EnvironmentTableEntry Table,
    string Method,
    string ActivityModel,
    IReadOnlyList<string>? PairSets);

internal sealed record QualificationDocument(
    string Format,
    string Statement,
    EnvironmentEntry Environment,
    SumEntry Sum,
    IReadOnlyList<ModelErrorEntry> ModelErrors,
    IReadOnlyList<CheckEntry> Checks);

[JsonSourceGenerationOptions(GenerationMode = JsonSourceGenerationMode.Metadata)]
[JsonSerializable(typeof(QualificationDocument))]
internal sealed partial class QualificationContext : JsonSerializerContext;

/// <summary>Writes a report as <c>lyonium-qualification/1</c>.</summary>
internal static class QualificationJson
{
    private static readonly QualificationContext Context = new(new JsonSerializerOptions
    {
        PropertyNamingPolicy = JsonNamingPolicy.CamelCase,
        DefaultIgnoreCondition = JsonIgnoreCondition.WhenWritingNull,
        WriteIndented = true,
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        Converters = { new ShortestDoubleConverter() },
    });

    public static string Write(QualificationReport report) => JsonSerializer.Serialize(Describe(report), Context.QualificationDocument);

    private static QualificationDocument Describe(QualificationReport report) => new(
        "lyonium-qualification/1",
        QualificationWords.WhatItIs,
        Describe(report.Environment),
        new SumEntry(report.Outcomes.Count, report.Holds, report.HoldsAgainstDerived, report.AgreesValueNotRead, report.Fails, report.Reported),
        report.ModelErrors.Select(one => new ModelErrorEntry(one.LowMolPerKg, one.HighMolPerKg, one.Solutions, one.RootMeanSquareDeviation)).ToArray(),
        report.Outcomes.Select(Describe).ToArray());

    private static EnvironmentEntry Describe(QualificationEnvironment one) => new(
        one.Software.Version,
        one.Software.Target,
        one.AssemblySha256.Length == 0 ? null : one.AssemblySha256,
        one.ModuleVersionId,
        one.Runtime,
        one.OperatingSystem,
        one.Processor,
        one.Culture,
        new EnvironmentTableEntry(
            one.Table.Edition,
            one.Table.Sha256,
            one.Table.Layers.Select(layer => new EnvironmentLayerEntry(layer.Name, layer.Edition, layer.Sha256)).ToArray()),
        one.Method,
        one.ActivityModel,
        one.PairSets);

    private static CheckEntry Describe(CheckOutcome one) => new(
        one.Check.Id,
        one.Check.Title,
        one.Check.Quantity,
        one.Check.Unit,
        one.Check.Source,
        KnownText.Of(one.Check.Known),
        QualificationWords.Inputs(one.Check),
        one.Check.Expected,
        double.IsNaN(one.Obtained) ? null : one.Obtained,
        double.IsNaN(one.Obtained) ? null : one.Deviation,
        one.Check.Tolerance,
        one.IonicStrengthMolPerKg,
        one.Check.Reason,
        QualificationWords.Word(one.Verdict),
        one.AgreesValueNotRead ? true : null,
        one.Failure.Length == 0 ? null : one.Failure);
}
