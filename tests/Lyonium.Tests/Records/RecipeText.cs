using System;
using System.Collections.Generic;
using System.IO;
using System.Text;
using Lyonium.Faults;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;

namespace Lyonium.Tests.Records;

/// <summary>Recipes as JSON text, written short.</summary>
internal static class RecipeText
{
    /// <summary>A recipe with one part of each kind, but for a recipe poured into it.</summary>
    public const string OfTheContract = """
        {
          "format": "lyonium-recipe/1",
          "id": "HB-7-2",
          "name": "House brine, second fill",
          "temperature": "25 Cel",
          "preparedAt": "20 Cel",
          "stocks": {
            "acid": { "substance": "hydrochloric acid", "concentration": "0.0500 mol/L" },
            "lactic": { "substance": "lactic acid", "massFraction": "88 %", "density": "1.20 g/mL" }
          },
          "parts": [
            { "id": "p1", "stock": "acid", "volume": "12.5 mL" },
            { "stock": "lactic", "volume": "4 mL" },
            { "substance": "acetic acid", "concentration": "0.100 mol/L", "volume": "10 mL" },
            { "substance": "trisodium citrate dihydrate", "mass": "1.20 g", "purity": "99.5 %" },
            { "substance": "potassium chloride", "amount": "0.05 mol" },
            { "substance": "sodium acetate", "molality": "0.2 mol/kg", "mass": { "value": 3, "unit": "g", "standardUncertainty": 0.001 } },
            { "substance": "water", "volume": "100 mL" }
          ],
          "makeUpTo": "250 mL",
          "notes": { "sample": "free for the host" }
        }
        """;

    public static Attempt<Recipe> Try(string json) => RecipeJson.TryRead(json, SubstanceTable.Default);

    /// <summary>The same bytes through the stream.</summary>
    public static Attempt<Recipe> Try(byte[] utf8) => RecipeJson.TryRead(new MemoryStream(utf8), SubstanceTable.Default);

    /// <summary>A recipe of these parts, and perhaps more members.</summary>
    public static string With(string parts, string more = "") =>
        "{ \"format\": \"lyonium-recipe/1\", \"parts\": [ " + parts + " ]" + (more.Length == 0 ? "" : ", " + more) + " }";

    /// <summary>The faults of a recipe of one litre of water and these parts.</summary>
    public static IReadOnlyList<Fault> FaultsOf(string json)
    {
        var text = Try(json);
        var stream = Try(Encoding.UTF8.GetBytes(json));
        Xunit.Assert.Equal(FaultText.CodesAndPaths(text.Faults), FaultText.CodesAndPaths(stream.Faults), StringComparer.Ordinal);
        if (!text.Success)
        {
            FaultText.Check(text.Faults);
            FaultText.Check(stream.Faults);
        }

        return text.Faults;
    }

    public static string[] CodesAndPathsOf(string json) => FaultText.CodesAndPaths(FaultsOf(json));
}
