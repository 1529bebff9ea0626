using System;
using System.CommandLine;
using Lyonium.Predictions;

namespace Lyonium.Tool;

/// <summary>The option that chooses sets of ion pairs.</summary>
internal static class PairsOption
{
    private const string None = "none";

    public static Option<string?> Create() => new("--pairs")
    {
        Description = "sets of ion pairs of the table, separated by commas, or none; without it those that belong to the activity model by default",
    };

    public static Predictor Apply(Predictor predictor, string? sets) => sets switch
    {
        null => predictor,
        None => predictor.WithPairSets(),
        _ => predictor.WithPairSets(sets.Split(',', StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries)),
    };
}
