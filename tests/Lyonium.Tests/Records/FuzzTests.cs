using System;
using System.Collections.Generic;
using System.Diagnostics;
using System.Globalization;
using System.IO;
using System.Linq;
using System.Text;
using Lyonium.Faults;
using Lyonium.Predictions;
using Lyonium.Records;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Records;

/// <summary>A hostile client: 20,000 mutations of the examples. Nothing but faults comes back, and never a hang.</summary>
[Collection(Timing.Alone)]
public sealed class FuzzTests
{
    private const int Mutations = 20_000;

    // Another seed can be tried with LYONIUM_FUZZ_SEED; a failure prints the one that it had.
    private static readonly int Seed =
        int.TryParse(Environment.GetEnvironmentVariable("LYONIUM_FUZZ_SEED"), NumberStyles.None, CultureInfo.InvariantCulture, out var own) ? own : 20_261_201;

    private static readonly string[] Tokens =
    [
        "null", "true", "-1", "0", "-0", "1e308", "1e999", "-1e999", "5e-324", "NaN", "[]", "{}", "\"\"", "\" \"", "\"\\ud800\"", "\"\\u0000\"", "\"\\u001b[31m\"",
        "\"1e308 kg\"", "\"1e-320 L\"", "\"0 mL\"", "\"-0 mL\"", "\"1e999 mol/L\"", "\"12,5 mL\"", "\"0.5 mol/L\"", "\"110 %\"", "\"1e-300 %\"", "\"1e300 mol/kg\"", "\"20 mol/L\"",
        "\"0 Cel\"", "\"100 Cel\"", "\"298.15 K\"", "\"water\"", "\"NaOH\"", "\"edta\"", "\"cyanide\"", "\"potassium cyanide\"", "\"sodium hypochlorite\"", "\"H2SO4\"", "\"1 g/L\"", "\"1e-9 g/mL\"",
        "{ \"value\": 1, \"unit\": \"mL\" }", "{ \"value\": 1e-300, \"unit\": \"kg\", \"standardUncertainty\": 1e300 }", "[[[[[[[[", "}}", "\"", ",", ":", "{", "\\", "\u0000", "\ud83d\ude00",
    ];

    private static readonly string[] Names =
    [
        "format", "id", "name", "temperature", "preparedAt", "stocks", "parts", "makeUpTo", "notes", "stock", "substance", "recipe", "concentration", "molality", "massFraction", "density",
        "volume", "mass", "amount", "purity", "value", "unit", "standardUncertainty", "\\ud800", "",
    ];

    [Fact]
    public void MutatedRecipes_giveAnAnswerOrFaultsAndNothingElse()
    {
        var predictor = new Predictor();
        var sources = Sources();
        var random = new Random(Seed);
        var (read, answered) = (0, 0);
        var slowest = TimeSpan.Zero;
        for (var i = 0; i < Mutations; i++)
        {
            var json = Mutate(sources[random.Next(sources.Length)], random);
            var watch = Stopwatch.StartNew();
            try
            {
                var recipe = RecipeJson.TryRead(json, SubstanceTable.Default);
                if (!recipe.Success)
                {
                    FaultText.Check(recipe.Faults);
                    continue;
                }

                read++;
                var prediction = predictor.TryPredict(recipe.Value);
                if (!prediction.Success)
                {
                    FaultText.Check(prediction.Faults);
                    continue;
                }

                answered++;
                Assert.True(double.IsFinite(prediction.Value.PH));
                var written = RecipeJson.Write(recipe.Value);
                Assert.Equal(recipe.Value, RecipeJson.Read(written));
                var record = RecordJson.Write(prediction.Value);
                if (answered % 20 == 0)
                {
                    Schemas.Recipe.Hold(written);
                    Schemas.Record.Hold(record);
                }
            }
            catch (Exception e) when (e is not Xunit.Sdk.XunitException)
            {
                Assert.Fail($"Mutation {i} of seed {Seed}: {e.GetType().Name}: {e.Message}{Environment.NewLine}{json}{Environment.NewLine}{e.StackTrace}");
            }
            catch (Xunit.Sdk.XunitException e)
            {
                Assert.Fail($"Mutation {i} of seed {Seed}: {e.Message}{Environment.NewLine}{json}");
            }
            finally
            {
                slowest = watch.Elapsed > slowest ? watch.Elapsed : slowest;
            }
        }

        Assert.InRange(read, Mutations / 100, Mutations);
        Assert.InRange(answered, Mutations / 200, Mutations);
        Assert.True(slowest < TimeSpan.FromSeconds(2), $"the slowest took {slowest}");
    }

    [Fact]
    public void MutatedBytes_giveFaultsAndNothingElse()
    {
        var random = new Random(Seed + 1);
        var sources = Sources().Select(Encoding.UTF8.GetBytes).ToArray();
        for (var i = 0; i < Mutations / 4; i++)
        {
            var bytes = (byte[])sources[random.Next(sources.Length)].Clone();
            for (var change = random.Next(1, 6); change > 0; change--)
            {
                bytes[random.Next(bytes.Length)] = (byte)random.Next(256);
            }

            var recipe = RecipeText.Try(bytes);
            Assert.True(recipe.Success || recipe.Faults.Count > 0);
            if (recipe.Success)
            {
                _ = RecipeJson.Write(recipe.Value);
            }
        }
    }

    [Fact]
    public void MutatedTables_giveATableOrFaultsAndNothingElse()
    {
        var random = new Random(Seed + 2);
        var read = 0;
        for (var i = 0; i < Mutations / 4; i++)
        {
            var json = Mutate(Substances.UserTable.Text, random);
            try
            {
                var table = Substances.UserTable.Read(json);
                if (table.Success)
                {
                    read++;
                }
                else
                {
                    FaultText.Check(table.Faults);
                }
            }
            catch (Exception e) when (e is not Xunit.Sdk.XunitException)
            {
                Assert.Fail($"Mutation {i}: {e.GetType().Name}: {e.Message}{Environment.NewLine}{json}{Environment.NewLine}{e.StackTrace}");
            }
        }

        Assert.InRange(read, 1, Mutations);
    }

    [Fact]
    public void MutatedRecords_areReplayedOrGiveFaultsAndNothingElse()
    {
        var random = new Random(Seed + 4);
        var replay = new RecordReplay(SubstanceTable.Default);
        var record = RecordJson.Write(new Predictor().Predict(RecipeJson.Read(RecipeText.OfTheContract)));
        for (var i = 0; i < Mutations / 20; i++)
        {
            var json = Mutate(record, random);
            try
            {
                var report = replay.TryReplay(json);
                Assert.True(report.Success || report.Faults.Count > 0);
                if (!report.Success)
                {
                    FaultText.Check(report.Faults);
                }
            }
            catch (Exception e) when (e is not Xunit.Sdk.XunitException)
            {
                Assert.Fail($"Mutation {i}: {e.GetType().Name}: {e.Message}{Environment.NewLine}{json}{Environment.NewLine}{e.StackTrace}");
            }
        }
    }

    [Fact]
    public void Read_ofAMutation_throwsOnlyLyoniumException()
    {
        var random = new Random(Seed + 3);
        var sources = Sources();
        for (var i = 0; i < 2000; i++)
        {
            var json = Mutate(sources[random.Next(sources.Length)], random);
            try
            {
                _ = new Predictor().Predict(RecipeJson.Read(json));
            }
            catch (LyoniumException e)
            {
                Assert.NotEmpty(e.Faults);
            }
        }
    }

    private static string[] Sources()
    {
        var sources = new List<string>
        {
            RecipeText.OfTheContract,
            RecipeText.With("{ \"substance\": \"KCN\", \"mass\": \"1 g\" }, { \"substance\": \"HCl\", \"massFraction\": \"37 %\", \"volume\": \"1 mL\" }, { \"substance\": \"water\", \"mass\": \"1 kg\" }"),
            RecipeText.With("{ \"substance\": \"EDTA\", \"amount\": \"0.05 mol\" }, { \"substance\": \"NaOH\", \"molality\": \"2 mol/kg\", \"mass\": \"90 g\" }, { \"substance\": \"water\", \"volume\": \"1 L\" }"),
        };
        sources.Add(RecipeText.With("{ \"recipe\": " + RecipeText.With("{ \"substance\": \"NaCl\", \"mass\": \"5 g\" }, { \"substance\": \"water\", \"mass\": \"1 kg\" }") + ", \"volume\": \"10 mL\" }, { \"substance\": \"water\", \"volume\": \"1 L\" }"));
        sources.AddRange(Repository.Examples().Select(File.ReadAllText));
        return [.. sources];
    }

    // One to four changes: a value or a name for another, a piece cut out, doubled or moved, a letter changed.
    private static string Mutate(string text, Random random)
    {
        var json = new StringBuilder(text);
        for (var change = random.Next(1, 5); change > 0 && json.Length > 4; change--)
        {
            switch (random.Next(8))
            {
                case 0 or 1 or 2:
                    ReplaceText(json, random, ':', Tokens[random.Next(Tokens.Length)]);
                    break;
                case 3:
                    ReplaceText(json, random, '{', "\"" + Names[random.Next(Names.Length)] + "\"");
                    break;
                case 4:
                    json.Remove(random.Next(json.Length), 1);
                    break;
                case 5:
                    json.Insert(random.Next(json.Length), Tokens[random.Next(Tokens.Length)]);
                    break;
                case 6:
                    var from = random.Next(json.Length);
                    json.Insert(random.Next(json.Length), json.ToString(from, Math.Min(random.Next(1, 60), json.Length - from)));
                    break;
                default:
                    json[random.Next(json.Length)] = (char)random.Next(32, random.Next(2) == 0 ? 127 : 0x2100);
                    break;
            }
        }

        return json.ToString();
    }

    // Replaces the text that follows a sign somewhere, up to the next sign that ends a value or a name.
    private static void ReplaceText(StringBuilder json, Random random, char after, string replacement)
    {
        var text = json.ToString();
        var at = text.IndexOf(after, random.Next(text.Length));
        if (at < 0)
        {
            return;
        }

        var start = at + 1;
        while (start < text.Length && char.IsWhiteSpace(text[start]))
        {
            start++;
        }

        var end = start;
        if (start < text.Length && text[start] == '"')
        {
            end = text.IndexOf('"', start + 1);
            end = end < 0 ? text.Length : end + 1;
        }
        else
        {
            while (end < text.Length && text[end] is not (',' or '}' or ']' or '\n'))
            {
                end++;
            }
        }

        json.Remove(start, end - start).Insert(start, replacement);
    }
}
