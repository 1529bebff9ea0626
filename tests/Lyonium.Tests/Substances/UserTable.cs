using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using System.Text;
using System.Text.Json.Nodes;
using Lyonium.Faults;
using Lyonium.Substances;

namespace Lyonium.Tests.Substances;

/// <summary>A small sound table of a user, and ways to break it.</summary>
internal static class UserTable
{
    public const string Text = """
        {
          "format": "lyonium-table/1",
          "edition": "2026.12",
          "sources": [ { "key": "own", "citation": "Own measurements, notebook 7" }, { "key": "weights", "citation": "CIAAW 2021" } ],
          "elements": [
            { "symbol": "H", "weight": 1.008, "source": "weights", "known": "memory" },
            { "symbol": "O", "weight": 15.999, "source": "weights", "known": "memory" },
            { "symbol": "C", "weight": 12.011, "source": "weights", "known": "memory" },
            { "symbol": "Na", "weight": 22.990, "source": "weights", "known": "memory" }
          ],
          "families": [
            { "id": "oxalate", "name": "oxalate",
              "forms": [ { "formula": "H2C2O4" }, { "formula": "HC2O4^-" }, { "formula": "C2O4^2-" } ],
              "steps": [
                { "pKa": { "value": 1.25, "temperatureCelsius": 25, "ionicStrength": 0, "source": "own", "known": "read" } },
                { "pKa": { "value": 4.27, "temperatureCelsius": 25, "ionicStrength": 0, "source": "own", "known": "read" } } ] },
            { "id": "sodium", "name": "sodium", "forms": [ { "formula": "Na^+" } ], "steps": [] }
          ],
          "substances": [
            { "id": "oxalic-acid", "name": "oxalic acid", "synonyms": [ "ethanedioic acid" ], "formula": "H2C2O4", "brings": { "oxalate": 1 }, "protons": 2 },
            { "id": "oxalic-acid-dihydrate", "name": "oxalic acid dihydrate", "formula": "H2C2O4.2H2O", "brings": { "oxalate": 1 }, "protons": 2 },
            { "id": "sodium-hydroxide", "name": "sodium hydroxide", "formula": "NaOH", "brings": { "sodium": 1 }, "protons": -1,
              "solutionDensities": [
                { "massFraction": 0.1, "value": 1.10, "temperatureCelsius": 20, "source": "own", "known": "read" },
                { "massFraction": 0.2, "value": 1.22, "temperatureCelsius": 20, "source": "own", "known": "read" },
                { "massFraction": 0.4, "value": 1.43, "temperatureCelsius": 20, "source": "own", "known": "read" } ] }
          ]
        }
        """;

    public static Attempt<SubstanceTable> Read(string json) => SubstanceTable.TryRead(new MemoryStream(Encoding.UTF8.GetBytes(json)));

    public static SubstanceTable Sound() => Read(Text).GetValueOrThrow();

    /// <summary>The faults of the table after a change.</summary>
    public static IReadOnlyList<Fault> FaultsOf(Action<JsonNode> change)
    {
        var table = JsonNode.Parse(Text)!;
        change(table);
        var attempt = Read(table.ToJsonString());
        if (!attempt.Success)
        {
            FaultText.Check(attempt.Faults);
        }

        return attempt.Faults;
    }

    public static string[] Codes(IEnumerable<Fault> faults) => faults.Select(one => one.Code).Distinct(StringComparer.Ordinal).ToArray();
}
