using System;
using System.Collections.Generic;
using System.Linq;
using System.Text.Json;
using Lyonium.Modelling;
using Lyonium.Predictions;
using Lyonium.Quantities;

namespace Lyonium.Records;

/// <summary>Predictions as JSON (<c>lyonium-record/1.1</c>): the recipe, the answer and its evidence.</summary>
/// <remarks>Thread-safe.</remarks>
public static class RecordJson
{
    internal const string FormatName = "lyonium-record";
    internal const string FormatVersion = "1.1";

    /// <summary>The versions that are read, the one that is written last.</summary>
    internal static readonly string[] Versions = ["1", FormatVersion];

    /// <summary>Writes the record of a prediction.</summary>
    /// <param name="prediction">The prediction.</param>
    /// <returns>The text, indented.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="prediction"/> is <see langword="null"/>.</exception>
    public static string Write(Prediction prediction)
    {
        _ = prediction ?? throw new ArgumentNullException(nameof(prediction));
        return JsonSerializer.Serialize(Describe(prediction), ContractJson.Context.RecordDocument);
    }

    private static RecordDocument Describe(Prediction prediction) => new(
        FormatName + "/" + FormatVersion,
        prediction.Recipe,
        prediction.PH,
        prediction.PHydrogenConcentration,
        new ReportedEntry(prediction.Reported, RuleOf(prediction)),
        prediction.Method,
        prediction.ActivityModel,
        prediction.PairSets,
        new NumberWithUnit(prediction.IonicStrengthMolPerKg, "mol/kg"),
        VolumeOf(prediction),
        new NumberWithUnit(prediction.Mixture.WaterKg, "kg"),
        TemperatureOf(prediction),
        prediction.Buffer is { } buffer ? Describe(buffer) : null,
        prediction.ModelUncertainty is { } uncertainty ? new UncertaintyEntry(Describe(uncertainty)) : null,
        prediction.Species.Select(Describe).ToArray(),
        prediction.Assumptions.Select(EntryOf.Assumption).ToArray(),
        prediction.Iterates.Select(EntryOf.Iterate).ToArray(),
        prediction.Cautions.Select(Describe).ToArray(),
        Describe(prediction.Evidence),
        prediction.Recipe.Notes);

    private static BufferEntry Describe(BufferFigures one) => new(
        new NumberWithUnit(one.CapacityMolPerL, "mol/L"),
        EntryOf.Finite(one.DilutionValue),
        EntryOf.Finite(one.TemperatureCoefficientPerK) is double coefficient ? new NumberWithUnit(coefficient, "K-1") : null,
        one.TemperatureCoefficientLeavesOut.Count == 0 ? null : one.TemperatureCoefficientLeavesOut);

    private static ModelUncertaintyEntry Describe(ModelUncertainty one) =>
        new(one.StandardUncertainty, one.Solutions, new BandEntry(one.LowMolPerKg, one.HighMolPerKg, "mol/kg"), ModelUncertainty.Scope);

    private static string RuleOf(Prediction prediction) =>
        "two decimals"
        + (prediction.OutsideTheModel.Count == 0 ? "" : "; homogeneous model only: " + string.Join(", ", prediction.OutsideTheModel));

    private static NumberWithUnit VolumeOf(Prediction prediction) =>
        prediction.Recipe.MakeUpTo is { Dimension: Dimension.Volume } mark
            ? new NumberWithUnit(mark.Value, mark.Unit)
            : new NumberWithUnit(prediction.Mixture.VolumeL, "L");

    private static NumberWithUnit TemperatureOf(Prediction prediction) =>
        prediction.Recipe.Temperature is { } stated
            ? new NumberWithUnit(stated.Value, stated.Unit)
            : new NumberWithUnit(25, "Cel");

    private static SpeciesEntry Describe(PredictedSpecies one) => new(
        one.Id,
        one.Charge,
        one.Family,
        one.Display,
        new NumberWithUnit(one.MolalityMolPerKg, "mol/kg"),
        new NumberWithUnit(one.ConcentrationMolPerL, "mol/L"),
        one.Fraction);

    private static CautionEntry Describe(Caution one) =>
        new(one.Code, one.Hazards, one.HazardsEu.Count == 0 ? null : one.HazardsEu, one.Text, one.Because);

    private static EvidenceEntry Describe(Evidence evidence) => new(
        new SoftwareEntry(evidence.Software.Version, evidence.Software.Target, evidence.Software.ProcessArchitecture),
        new TableEntry(
            evidence.Table.Edition,
            evidence.Table.Sha256,
            evidence.Table.Layers.Select(one => new LayerEntry(one.Name, one.Edition, one.Sha256)).ToArray()),
        evidence.Constants.Select(Describe).ToArray(),
        EntryOf.Finite(evidence.BracketLow) is double low && EntryOf.Finite(evidence.BracketHigh) is double high ? new List<double> { low, high } : null,
        evidence.Evaluations,
        EntryOf.Finite(evidence.Residual),
        EntryOf.Finite(evidence.InputResolution));

    private static ConstantEntry Describe(UsedConstant one) => new(
        one.Id, one.Quantity, one.Value.Value, one.Value.Conditions, one.Value.Source.Citation, one.Value.KnownAs, one.Layer);
}
