using System;
using System.IO;
using System.Text.Json;
using Lyonium.Predictions;
using Lyonium.Records;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Tool;

/// <summary><c>lyonium predict</c> as a process: exit status, streams, files.</summary>
public sealed class PredictToolTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("lyonium-tests-").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void Predict_text_isDone()
    {
        var run = ToolRun.Of("predict", Write(RecipeText.OfTheContract));

        Assert.Equal((0, ""), (run.ExitStatus, run.Errors));
        Assert.Contains("House brine, second fill", run.Output, StringComparison.Ordinal);
        Assert.Contains("pH " + new Predictor().Predict(RecipeJson.Read(RecipeText.OfTheContract)).Reported, run.Output, StringComparison.Ordinal);
        Assert.All(run.Output.Split('\n'), line => Assert.InRange(line.TrimEnd('\r').Length, 0, 110));
    }

    [Fact]
    public void Predict_json_isExactlyOneRecordWithTheSameDouble()
    {
        var run = ToolRun.Of("predict", Write(RecipeText.OfTheContract), "--format", "json");

        Assert.Equal((0, ""), (run.ExitStatus, run.Errors));
        using var record = JsonDocument.Parse(run.Output);
        Assert.Equal("lyonium-record/1.1", record.RootElement.GetProperty("format").GetString());
        Assert.Equal(new Predictor().Predict(RecipeJson.Read(RecipeText.OfTheContract)).PH, record.RootElement.GetProperty("pH").GetDouble());
        Schemas.Record.Hold(run.Output);
    }

    [Fact]
    public void Predict_hyphen_readsStandardInput()
    {
        var run = ToolRun.WithInput("\ufeff" + RecipeText.OfTheContract, "predict", "-", "--format", "json", "--activity", "ideal");

        Assert.Equal(0, run.ExitStatus);
        using var record = JsonDocument.Parse(run.Output);
        Assert.Equal("ideal", record.RootElement.GetProperty("activityModel").GetString());
    }

    [Fact]
    public void Predict_refusedInput_isStatus1AndALineEach()
    {
        var run = ToolRun.Of("predict", Write(RecipeText.With("{ \"substance\": \"NaCl\", \"mass\": \"-1 g\" }, { \"substance\": \"na\\ncl\\u001b[31m\", \"mass\": \"1 g\" }")));

        Assert.Equal((1, ""), (run.ExitStatus, run.Output));
        Assert.Equal(2, run.ErrorLines.Length);
        Assert.StartsWith("LYO0105 at $.parts[0].mass: ", run.ErrorLines[0], StringComparison.Ordinal);
        Assert.StartsWith("LYO0301 at $.parts[1].substance: ", run.ErrorLines[1], StringComparison.Ordinal);
    }

    [Fact]
    public void Predict_refusedInputAsJson_isOneFaultsObjectAndTheLines()
    {
        var run = ToolRun.WithInput("{", "predict", "-", "--format", "json");

        Assert.Equal(1, run.ExitStatus);
        Schemas.Faults.Hold(run.Output);
        using var faults = JsonDocument.Parse(run.Output);
        Assert.Equal("LYO0201", faults.RootElement.GetProperty("faults")[0].GetProperty("code").GetString());
        Assert.StartsWith("LYO0201 at $: ", Assert.Single(run.ErrorLines), StringComparison.Ordinal);
    }

    [Fact]
    public void Predict_emptyStandardInput_isRefused() => Assert.Equal(1, ToolRun.WithInput("", "predict", "-").ExitStatus);

    [Fact]
    public void Predict_atBodyTemperature_isAnswered()
    {
        var run = ToolRun.Of("predict", Write(RecipeText.With("{ \"substance\": \"water\", \"mass\": \"1 kg\" }", "\"temperature\": \"37 Cel\"")));

        Assert.Equal(0, run.ExitStatus);
        Assert.Contains("pH 6.81 at 37 °C", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Predict_withoutAnAnswer_isStatus3WithTheReason()
    {
        // 1000 mol/kg of a trivalent salt: the Davies equation is far beyond its range.
        var run = ToolRun.Of(
            "predict",
            "--activity",
            "davies",
            Write(RecipeText.With("{ \"substance\": \"trisodium phosphate\", \"amount\": \"1000 mol\" }, { \"substance\": \"water\", \"mass\": \"1 kg\" }")),
            "--format",
            "json");

        Assert.Equal(3, run.ExitStatus);
        Schemas.Faults.Hold(run.Output);
        Assert.StartsWith("LYO06", Assert.Single(run.ErrorLines), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("no such file.json", "LYO0701")]
    [InlineData("no such folder/recipe.json", "LYO0701")]
    [InlineData(".", "LYO0702")]
    [InlineData("", "LYO0703")]
    public void Predict_whatIsNoFile_isRefused(string file, string code)
    {
        var run = ToolRun.Of("predict", file.Length == 0 ? file : Path.Combine(_folder, file), "--format", "json");

        Assert.Equal(1, run.ExitStatus);
        Assert.StartsWith(code + " at $: ", Assert.Single(run.ErrorLines), StringComparison.Ordinal);
        Schemas.Faults.Hold(run.Output);
    }

    [Fact]
    public void Predict_aFileThatCannotBeRead_isRefused()
    {
        // Linux: a file that opens and does not let itself be read, for root either.
        const string file = "/proc/self/mem";
        if (!File.Exists(file))
        {
            return;
        }

        var run = ToolRun.Of("predict", file);

        Assert.Equal(1, run.ExitStatus);
        Assert.StartsWith("LYO0703 at $: ", Assert.Single(run.ErrorLines), StringComparison.Ordinal);
    }

    [Fact]
    public void Predict_anEndlessFile_isRefusedAtTheLimit()
    {
        if (!File.Exists("/dev/zero"))
        {
            return;
        }

        Assert.StartsWith("LYO0202", Assert.Single(ToolRun.Of("predict", "/dev/zero").ErrorLines), StringComparison.Ordinal);
    }

    [Fact]
    public void Predict_namesWithControlCharacters_printNone()
    {
        // ToolRun refuses any escape in the output.
        var text = RecipeText.With(
            "{ \"stock\": \"a\\u001b[2J\\u0007\", \"volume\": \"1 mL\" }, { \"substance\": \"water\", \"mass\": \"1 kg\" }",
            "\"id\": \"\\u001b[31m\", \"name\": \"[red]x[/] \\u001b]0;title\\u0007 \\u009b31m\\nsecond\", \"stocks\": { \"a\\u001b[2J\\u0007\": { \"substance\": \"HCl\", \"concentration\": \"1 mol/L\" } }");
        var run = ToolRun.Of("predict", Write(text));

        Assert.Equal(0, run.ExitStatus);
        Assert.Contains("[red]x[/]", run.Output, StringComparison.Ordinal);
        Assert.DoesNotContain('\u0007', run.Output);
    }

    [Fact]
    public void Predict_withoutAReader_endsQuietly()
    {
        var file = Write(RecipeText.OfTheContract);

        Assert.Empty(ToolRun.WithClosedPipe("predict", file, "--format", "json").ErrorLines);
        Assert.Empty(ToolRun.WithClosedPipe("predict", file).ErrorLines);
    }

    [Theory]
    [InlineData("> /dev/full")]
    [InlineData(">&-")]
    public void Predict_ontoAFullDiskOrAClosedOutput_saysSoInALine(string redirection)
    {
        if (!File.Exists("/dev/full"))
        {
            return;
        }

        foreach (var format in new[] { "text", "json" })
        {
            var run = ToolRun.InShell($"{redirection} exec", "predict", Write(RecipeText.OfTheContract), "--format", format);

            Assert.Equal(1, run.ExitStatus);
            Assert.StartsWith("lyonium: the output cannot be written: ", Assert.Single(run.ErrorLines), StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Predict_withClosedErrors_keepsItsStatus()
    {
        if (!File.Exists("/dev/full"))
        {
            return;
        }

        Assert.Equal(1, ToolRun.InShell("2>&- exec", "predict", "no such file").ExitStatus);
        Assert.Equal(1, ToolRun.InShell("2>/dev/full exec", "predict", "no such file").ExitStatus);
    }

    private string Write(string text)
    {
        var file = Path.Combine(_folder, "recipe.json");
        File.WriteAllText(file, text);
        return file;
    }
}
