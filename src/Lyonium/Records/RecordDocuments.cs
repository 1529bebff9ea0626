using System.Collections.Generic;
using System.Text.Json.Serialization;
using Lyonium.Recipes;

namespace Lyonium.Records;

// The JSON contract as types; docs/schemas has the same as JSON Schema. Names and order are those of the text.

internal sealed record NumberWithUnit(double Value, string Unit);

internal sealed record ReportedEntry([property: JsonPropertyName("pH")] string PH, string Rule);

internal sealed record SpeciesEntry(
    string Id, int Charge, string Family, string Display, NumberWithUnit Molality, NumberWithUnit Concentration, double? Fraction);

internal sealed record AssumptionEntry(string Code, string Of, double? Figure, double? Limit, bool Held, string Basis);

internal sealed record IterateEntry([property: JsonPropertyName("pH")] double? PH, double? Correction);

internal sealed record CautionEntry(
    string Code, IReadOnlyList<string> Hazard, IReadOnlyList<string>? HazardEu, string Text, IReadOnlyList<string> Because);

internal sealed record SoftwareEntry(string Version, string Target, string ProcessArchitecture);

internal sealed record LayerEntry(string Name, string Edition, string Sha256);

internal sealed record TableEntry(string Edition, string Sha256, IReadOnlyList<LayerEntry> Layers);

internal sealed record ConstantEntry(string Id, string Quantity, double Value, string? At, string Source, string Known, string? Layer);

internal sealed record EvidenceEntry(
    SoftwareEntry Software,
    TableEntry Table,
    IReadOnlyList<ConstantEntry> Constants,
    IReadOnlyList<double>? Bracket,
    int Evaluations,
    double? Residual,
    double? InputResolution);

internal sealed record BufferEntry(
    NumberWithUnit Capacity,
    [property: JsonIgnore(Condition = JsonIgnoreCondition.Never)] double? DilutionValue,
    [property: JsonIgnore(Condition = JsonIgnoreCondition.Never)] NumberWithUnit? TemperatureCoefficient,
    IReadOnlyList<string>? TemperatureCoefficientLeavesOut);

internal sealed record BandEntry(double Low, double High, string Unit);

internal sealed record ModelUncertaintyEntry(double StandardUncertainty, int Solutions, BandEntry IonicStrength, string Scope);

internal sealed record UncertaintyEntry(ModelUncertaintyEntry Model);

internal sealed record RecordDocument(
    string Format,
    [property: JsonConverter(typeof(RecipeConverter))] Recipe Recipe,
    [property: JsonPropertyName("pH")] double PH,
    [property: JsonPropertyName("pHydrogenConcentration")] double PHydrogenConcentration,
    ReportedEntry Reported,
    string Method,
    string ActivityModel,
    IReadOnlyList<string> PairSets,
    NumberWithUnit IonicStrength,
    NumberWithUnit Volume,
    NumberWithUnit Water,
    NumberWithUnit Temperature,
    [property: JsonIgnore(Condition = JsonIgnoreCondition.Never)] BufferEntry? Buffer,
    [property: JsonIgnore(Condition = JsonIgnoreCondition.Never)] UncertaintyEntry? Uncertainty,
    IReadOnlyList<SpeciesEntry> Species,
    IReadOnlyList<AssumptionEntry> Assumptions,
    IReadOnlyList<IterateEntry> Iterates,
    IReadOnlyList<CautionEntry> Cautions,
    EvidenceEntry Evidence,
    [property: JsonConverter(typeof(RawJsonConverter))] string? Notes);

internal sealed record FaultEntry(string Code, string Path, string Found, string Message, string Remedy);

internal sealed record FaultsDocument(string Format, IReadOnlyList<FaultEntry> Faults, IReadOnlyList<IterateEntry>? Iterates);

internal sealed record ComparisonRowEntry(
    string Method,
    [property: JsonPropertyName("pH"), JsonIgnore(Condition = JsonIgnoreCondition.Never)] double? PH,
    double? Deviation,
    bool? WithinTolerance,
    string? Reason,
    IReadOnlyList<AssumptionEntry> Assumptions,
    IReadOnlyList<IterateEntry> Iterates);

internal sealed record ComparisonDocument(
    string Format, string? Id, string ActivityModel, double Tolerance, IReadOnlyList<ComparisonRowEntry> Rows);
