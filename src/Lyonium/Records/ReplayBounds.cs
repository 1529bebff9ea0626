using System;
using System.Linq;
using System.Text.Json;
using Lyonium.Predictions;
using Lyonium.Quantities;

namespace Lyonium.Records;

/// <summary>How far the fields of a record may lie from those of its replay: not at all on the build that made it, a little elsewhere.</summary>
internal sealed class ReplayBounds(bool isSameBuild, double recordedPH, double replayedPH)
{
    public const string Bracket = "evidence.bracket";

    private const double InPH = 1e-9;

    // A molality moves by 2.3 times what the pH moves by, for each proton.
    private const double RelativeOfMolalities = 1e-7;
    private const double Relative = 1e-6;

    /// <summary>Whether a difference anywhere in the field is a difference of the whole: what the host itself said.</summary>
    public static bool IsOneValue(string rule) => rule is "recipe" or "notes" or "evidence.table.layers";

    /// <summary>What tells the entries of an array apart; <see langword="null"/> where only their order does.</summary>
    public static string? KeyOf(string rule, JsonElement item) => rule switch
    {
        "species" => JsonValues.MemberText(item, "id"),
        "cautions" => JsonValues.MemberText(item, "code"),
        "assumptions" => Pair(item, "code", "of"),
        "evidence.constants" => Pair(item, "id", "quantity"),
        _ => null,
    };

    /// <summary>An entry's main figure is told at the place of the entry.</summary>
    public static string ShownPath(string rule, string above, string path) => rule switch
    {
        "species.molality.value" => above.Substring(0, above.Length - ".molality".Length),
        "evidence.constants.value" => above,
        _ => path,
    };

    public bool IsSameNumber(string rule, double recorded, double replayed)
    {
        if (isSameBuild || double.IsInfinity(recorded))
        {
            return recorded.Equals(replayed);
        }

        var (relative, absolute) = Of(rule);
        return Math.Abs(recorded - replayed) <= absolute + (relative * Math.Abs(replayed));
    }

    public bool IsSameText(string rule, string recorded, string replayed)
    {
        // Which software made the record is told by ReplayReport.IsSameBuild; elsewhere a pH may fall to the other side of a half.
        return rule.StartsWith("evidence.software.", StringComparison.Ordinal)
            || string.Equals(recorded, replayed, StringComparison.Ordinal)
            || (!isSameBuild
                && rule == "reported.pH"
                && IsSameNumber("pH", recordedPH, replayedPH)
                && string.Equals(recorded, Prediction.Report(recordedPH), StringComparison.Ordinal));
    }

    /// <summary>Whether these are two ends around the answer; on another build they need not be the same.</summary>
    public bool IsBracket(JsonElement array)
    {
        if (isSameBuild || array.GetArrayLength() != 2 || array.EnumerateArray().Any(end => end.ValueKind != JsonValueKind.Number))
        {
            return false;
        }

        var ends = array.EnumerateArray().Select(end => NumberText.Parse(end.GetRawText())).ToArray();
        return ends[0] <= replayedPH + InPH && ends[1] >= replayedPH - InPH && ends[0] <= ends[1] && !double.IsInfinity(ends[1]);
    }

    private static (double Relative, double Absolute) Of(string rule) => rule switch
    {
        "pH" or "pHydrogenConcentration" or "iterates.pH" => (0, InPH),

        // Differences of pH are as sure as the two of which they are the difference.
        "buffer.dilutionValue" or "buffer.temperatureCoefficient.value" => (0, 2 * InPH),
        "assumptions.figure" or "iterates.correction" => (Relative, 2 * InPH),
        "ionicStrength.value" or "water.value" or "species.molality.value" or "species.concentration.value" or "species.fraction" => (RelativeOfMolalities, 0),
        "evidence.evaluations" or "evidence.residual" or "evidence.inputResolution" => (0, double.PositiveInfinity),
        _ => (Relative, 0),
    };

    private static string? Pair(JsonElement item, string first, string second) =>
        JsonValues.MemberText(item, first) is { } one && JsonValues.MemberText(item, second) is { } other ? one + " " + other : null;
}
