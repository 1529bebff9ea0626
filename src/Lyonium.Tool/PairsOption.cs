using System;
using System.CommandLine;
using System.Linq;
using Lyonium.Predictions;

namespace Lyonium.Tool;

/// <summary>The option that chooses sets of ion pairs.</summary>
internal static class PairsOption
{
    private const string None = "none";

    public static Option<string?> Create()
    {
        var option = new Option<string?>("--pairs")
        {
            Description = "sets of ion pairs of the table, separated by commas, or none; without it those that belong to the activity model by default",
        };
        option.Validators.Add(result =>
        {
            var sets = Split(result.GetValueOrDefault<string?>() ?? "");
            if (sets.Length == 0 || (sets.Length > 1 && sets.Contains(None, StringComparer.Ordinal)))
            {
                result.AddError("--pairs takes ids of sets, separated by commas, or the word none alone.");
            }
        });
        return option;
    }

    public static Predictor Apply(Predictor predictor, string? sets) => sets switch
    {
        null => predictor,
        None => predictor.WithPairSets(),
        _ => predictor.WithPairSets(Split(sets)),
    };

    private static string[] Split(string sets) => sets.Split(',', StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries);
}
