using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Faults;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;
using Lyonium.Tests.Records;
using Lyonium.Tests.Substances;
using Xunit;

namespace Lyonium.Tests.Faults;

/// <summary>Every kind of fault is made somewhere, and each that is made fills its placeholders.</summary>
public sealed class EveryKindTests
{
    private const string Kilogram = "{ \"substance\": \"water\", \"mass\": \"1 kg\" }";

    [Fact]
    public void EveryKind_isMadeSomewhereWithItsTextsFilled()
    {
        var faults = OfRecipes().Concat(OfTables()).Concat(OfLayers()).Concat(OfRecords()).Concat(OfMethods()).ToArray();
        FaultText.Check(faults);
        var made = faults.Select(one => one.Code).ToHashSet(StringComparer.Ordinal);

        // Files are opened by the tool; its own tests make these.
        var files = new[] { FaultKinds.FileNotFound, FaultKinds.IsAFolder, FaultKinds.CannotRead };
        var missing = FaultKinds.All.Except(files).Where(kind => !made.Contains(kind.Code)).Select(kind => kind.Code + " " + kind.Title);
        Assert.Empty(missing);
    }

    private static IReadOnlyList<Fault> OfLayers() => Layer.TryOver(SubstanceTable.Default, Layer.With(
        families: Layer.Family("acetate", ["CH3COOH2^+", "CH3COOH"], Layer.Step(4.7)))).Faults;

    private static IReadOnlyList<Fault> OfRecords()
    {
        var record = RecordJson.Write(new Predictor().Predict(RecipeJson.Read(RecipeText.With(Kilogram))));
        return new RecordReplay(SubstanceTable.Default).TryReplay(record.Replace("\"exact\"", "\"guess\"", StringComparison.Ordinal)).Faults;
    }

    private static IEnumerable<Fault> OfRecipes()
    {
        string[] documents =
        [
            "{", "{ \"format\": \"lyonium-recipe/1.1\" }", "{ \"format\": \"other/1\" }", new string(' ', RecipeJson.MostBytes + 1), "{ }",
            RecipeText.With(""), RecipeText.With(string.Join(',', Enumerable.Repeat("{}", 10_001))),
            RecipeText.With(Kilogram, "\"name\": \"a\", \"name\": \"b\", \"colour\": 1, \"temperature\": \"101 Cel\", \"makeUpTo\": \"0 L\""),
            RecipeText.With(Kilogram, "\"makeUpTo\": \"1 mL\""),
            RecipeText.With("{ \"id\": \"a\", \"substance\": \"water\", \"mass\": \"1 g\" }, { \"id\": \"a\", \"substance\": \"water\", \"mass\": \"1 g\" }"),
            RecipeText.With("{ \"substance\": \"NaCl\", \"mass\": \"1 g\" }"),
            RecipeText.With("{ \"substance\": \"water\", \"mass\": \"1e20 kg\" }"),
            RecipeText.With("{ \"substance\": \"citric acid\", \"concentration\": \"2 mol/L\", \"volume\": \"1 L\" }, { \"substance\": \"HCl\", \"concentration\": \"20 mol/L\", \"density\": \"0.5 g/mL\", \"volume\": \"1 L\" }"),
            RecipeText.With(string.Join(
                ',',
                "{ \"substance\": \"NaCl\", \"mass\": \"1 mL\" }",
                "{ \"substance\": \"NaCl\", \"mass\": \"much\" }",
                "{ \"substance\": \"NaCl\", \"mass\": \"1,5 g\" }",
                "{ \"substance\": \"NaCl\", \"mass\": \"1 oz\" }",
                "{ \"substance\": \"NaCl\", \"mass\": \"-1 g\" }",
                "{ \"substance\": \"NaCl\", \"mass\": \"1e999 g\" }",
                "{ \"substance\": \"NaCl\", \"mass\": { \"value\": 1 } }",
                "{ \"substance\": \"NaCl\", \"mass\": 1 }",
                "{ \"substance\": \"NaCl\" }",
                "{ \"substance\": \"NaCl\", \"mass\": \"1 g\", \"amount\": \"1 mol\" }",
                "{ \"substance\": \"unobtainium\", \"mass\": \"1 g\" }",
                "{ \"substance\": \"C4H4O4\", \"mass\": \"1 g\" }",
                "{ \"stock\": \"none\", \"volume\": \"1 L\" }",
                "{ \"recipe\": { \"format\": \"lyonium-recipe/1\", \"parts\": [ " + Kilogram + " ] }, \"mass\": \"2 kg\" }")),
            RecipeNestingTests.Nested(Recipe.MostNesting + 1),
        ];
        foreach (var fault in documents.SelectMany(one => RecipeText.Try(one).Faults))
        {
            yield return fault;
        }

        var warm = RecipeJson.Read(RecipeText.With("{ \"substance\": \"tris\", \"mass\": \"1 g\" }, " + Kilogram, "\"temperature\": \"37 Cel\""));
        foreach (var fault in new Predictor().TryPredict(warm).Faults.Concat(new Predictor(UserTable.Sound()).TryPredict(warm).Faults))
        {
            yield return fault;
        }
    }

    private static IEnumerable<Fault> OfTables() =>
        new (string From, string To)[]
        {
            ("\"value\": 4.27", "\"value\": 1"),
            ("\"id\": \"sodium\"", "\"id\": \"oxalate\""),
            ("\"source\": \"own\"", "\"source\": \"hearsay\""),
            ("\"formula\": \"NaOH\"", "\"formula\": \"lye\""),
            ("\"formula\": \"HC2O4^-\"", "\"formula\": \"H2C2O4^-\""),
            ("\"protons\": -1", "\"protons\": 1"),
            ("{ \"sodium\": 1 }", "{ \"sodum\": 1 }"),
            ("\"known\": \"read\"", "\"known\": \"heard\""),
        }.SelectMany(change => UserTable.Read(UserTable.Text.Replace(change.From, change.To, StringComparison.Ordinal)).Faults);

    private static IEnumerable<Fault> OfMethods()
    {
        var recipe = RecipeJson.Read(RecipeText.With(Kilogram));
        var pairs = new[] { "no-such-set", "polyborates" }
            .SelectMany(set => new Predictor().With(new IdealModel()).WithPairSets(set).TryPredict(recipe).Faults);
        return pairs.Concat(Enum.GetValues<SolverStatus>().SelectMany(status => new Predictor().With(new Refusing(status)).TryPredict(recipe).Faults));
    }

    private sealed class Refusing(SolverStatus status) : ISolver
    {
        public string Name => "refusing";

        public SolverOutcome Solve(Equilibrium equilibrium, IActivityModel model) => new() { Status = status, Reason = "it refuses", PH = double.NaN };
    }
}
