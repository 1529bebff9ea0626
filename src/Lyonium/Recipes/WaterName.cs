using System;
using System.Linq;
using Lyonium.Substances;

namespace Lyonium.Recipes;

/// <summary>The names under which a recipe speaks of water.</summary>
internal static class WaterName
{
    private static readonly string[] Names = ["water", "h2o", "purified water", "distilled water", "deionized water", "deionised water"];

    public static bool Is(string name) => Names.Contains(NameFolding.Fold(name), StringComparer.Ordinal);
}
