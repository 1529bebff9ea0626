using System;
using System.Linq;
using Xunit;

namespace Lyonium.Tests.Tool;

/// <summary>Wrong command lines, help, and <c>lyonium constants</c>.</summary>
public sealed class CommandLineTests
{
    [Theory]
    [InlineData]
    [InlineData("predikt")]
    [InlineData("predict")]
    [InlineData("predict", "a.json", "b.json")]
    [InlineData("predict", "a.json", "--colour")]
    [InlineData("predict", "a.json", "--format", "xml")]
    [InlineData("predict", "a.json", "--format")]
    [InlineData("predict", "a.json", "--method", "guess")]
    [InlineData("predict", "a.json", "--activity", "pitzer")]
    [InlineData("predict", "a.json", "--activity", "Davies")]
    [InlineData("constants", "acetic", "acid")]
    [InlineData("predict", "-", "--table", "-")]
    [InlineData("compare", "-", "--table", "-")]
    [InlineData("qualify", "--method", "guess")]
    public void WrongCommandLine_isStatus2AndSaysWhy(params string[] arguments)
    {
        var run = ToolRun.Of(arguments);

        Assert.Equal((2, ""), (run.ExitStatus, run.Output));
        Assert.NotEmpty(run.ErrorLines);
        Assert.Contains("--help", run.ErrorLines[^1], StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("predict", "", "--format", "text")]
    [InlineData("constants", "--table", "")]
    [InlineData("constants", "--table", " ")]
    public void NoName_ofAFile_isRefusedInPlainWords(params string[] arguments)
    {
        var run = ToolRun.Of(arguments);

        Assert.Equal((1, ""), (run.ExitStatus, run.Output));
        Assert.StartsWith("LYO0703 at $", Assert.Single(run.ErrorLines), StringComparison.Ordinal);
        Assert.DoesNotContain("Parameter", run.Errors, StringComparison.Ordinal);
    }

    // The sum and what fails stand first, every line is within the width, and a short-cut fails the checks of the exact answer.
    [Fact]
    public void Qualify_withAShortCut_fails()
    {
        var run = ToolRun.Of("qualify", "--method", "dominant-acid");
        var lines = run.Output.Split('\n');

        Assert.Equal(3, run.ExitStatus);
        Assert.Contains(" checks: ", lines[0], StringComparison.Ordinal);
        Assert.InRange(Array.FindIndex(lines, line => line.StartsWith("FAILS", StringComparison.Ordinal)), 1, 2);
        Assert.All(lines, line => Assert.InRange(line.TrimEnd('\r').Length, 0, 96));
        Assert.Contains("  method     dominant-acid", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Help_isDoneAndNamesTheCommands()
    {
        var run = ToolRun.Of("--help");

        Assert.Equal((0, ""), (run.ExitStatus, run.Errors));
        Assert.Contains("predict", run.Output, StringComparison.Ordinal);
        Assert.Contains("constants", run.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("acetic acid")]
    [InlineData("ETHANOIC ACID")]
    [InlineData("acetic-acid")]
    [InlineData("acetate")]
    public void Constants_ofAName_showsThePKaWithItsSource(string name)
    {
        var run = ToolRun.Of("constants", name);

        Assert.Equal((0, ""), (run.ExitStatus, run.Errors));
        Assert.Contains("4.75", run.Output, StringComparison.Ordinal);
        Assert.Contains("acetate:1", run.Output, StringComparison.Ordinal);
        Assert.Contains("25 Cel", run.Output, StringComparison.Ordinal);
    }

    // The course of each step with its range, and the ion sizes of the forms.
    [Theory]
    [InlineData("chloroacetic acid", "pK = 1049.05/T − 5.0273 + 0.014654 T", "0 to 40 Cel with the equation", "ion size of ClCH₂COO⁻  4.5 Å")]
    [InlineData("TAPSO", "pK = 2254.0057/T − 4.9783 + 0.88672 ln T", "5 to 55 Cel with the equation")]
    [InlineData("phosphate", "heat capacity", "0 to 50 Cel with the enthalpy and the heat capacity", "ion size of PO₄³⁻")]
    [InlineData("edta", "10 to 40 Cel with the enthalpy", "how it changes with temperature is not known")]
    [InlineData("sodium chloride", "ion size of Na⁺", "ion size of Cl⁻")]
    [InlineData("sodium", "ion size of Na⁺", "4.25 Å")]
    public void Constants_ofAName_showsItsCourseAndIonSizes(string name, params string[] shown)
    {
        var run = ToolRun.Of("constants", name);

        Assert.Equal((0, ""), (run.ExitStatus, run.Errors));
        Assert.All(shown, text => Assert.Contains(text, run.Output, StringComparison.Ordinal));
    }

    [Fact]
    public void Constants_ofAll_listsEverySubstanceOnAlignedLines()
    {
        var run = ToolRun.Of("constants");

        Assert.Equal((0, ""), (run.ExitStatus, run.Errors));
        var names = Lyonium.Substances.SubstanceTable.Default.Substances.Select(one => one.Name).ToArray();
        Assert.All(names.Where(name => name.Length < 40), name => Assert.Contains(name, run.Output, StringComparison.Ordinal));
        Assert.Contains("edition 2026.12", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Constants_ofAnUnknownName_isRefusedWithTheNearest()
    {
        var run = ToolRun.Of("constants", "acetic acd");

        Assert.Equal((1, ""), (run.ExitStatus, run.Output));
        Assert.Contains("'acetic acid'", Assert.Single(run.ErrorLines), StringComparison.Ordinal);
    }

    [Fact]
    public void Constants_ofAHostileName_isRefusedOnOneLine() =>
        Assert.Single(ToolRun.Of("constants", "a\u001b[31m\nb").ErrorLines);

    [Fact]
    public void Constants_withoutAReader_endsQuietly() => Assert.Empty(ToolRun.WithClosedPipe("constants").ErrorLines);
}
