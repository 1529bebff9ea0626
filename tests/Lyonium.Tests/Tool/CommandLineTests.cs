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
    public void WrongCommandLine_isStatus2AndSaysWhy(params string[] arguments)
    {
        var run = ToolRun.Of(arguments);

        Assert.Equal((2, ""), (run.ExitStatus, run.Output));
        Assert.NotEmpty(run.ErrorLines);
        Assert.Contains("--help", run.ErrorLines[^1], StringComparison.Ordinal);
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
