using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using System.Text;
using System.Text.RegularExpressions;
using Xunit;

namespace Lyonium.Tests.Docs;

/// <summary>
/// What README and the guides show as printed is what the tool prints. A block is kept true by the comment before it:
/// <c>&lt;!-- lyonium predict docs/examples/buffer.json --&gt;</c>, with <c>(lines 3-9)</c> where only a part is shown.
/// With LYONIUM_UPDATE_DOCS=1 the blocks are written anew instead; read the difference before you commit it.
/// </summary>
public sealed partial class DocumentedOutputTests
{
    private static readonly bool Update = Environment.GetEnvironmentVariable("LYONIUM_UPDATE_DOCS") == "1";

    public static TheoryData<string> Pages => [.. PageNames()];

    [Theory]
    [MemberData(nameof(Pages))]
    public void Page_shows_what_the_tool_prints(string page)
    {
        var text = File.ReadAllText(Repository.File(page)).Replace("\r\n", "\n", StringComparison.Ordinal);
        var blocks = Block().Matches(text).ToArray();
        Assert.Equal(Regex.Count(text, "<!-- lyonium "), blocks.Length);
        var current = text;
        foreach (var shown in blocks.Reverse().Select(block => (Place: block.Groups["shown"], Output: Print(block))))
        {
            current = current.Remove(shown.Place.Index, shown.Place.Length).Insert(shown.Place.Index, shown.Output);
        }

        if (Update)
        {
            File.WriteAllText(Repository.File(page), current);
            return;
        }

        Assert.Equal(current, text);
    }

    [Fact]
    public void Every_example_is_predicted_and_shown_on_a_page()
    {
        var shown = string.Concat(PageNames().Select(page => File.ReadAllText(Repository.File(page))));
        var examples = Directory.EnumerateFiles(Repository.File("docs/examples"), "*.json").Select(file => Path.GetFileName(file)).ToArray();
        Assert.True(examples.Length >= 6);
        Assert.All(examples, example => Assert.Contains($"<!-- lyonium predict docs/examples/{example} -->", shown, StringComparison.Ordinal));
    }

    private static IEnumerable<string> PageNames() =>
        Directory.EnumerateFiles(Repository.Root, "*.md")
            .Concat(Directory.EnumerateFiles(Repository.File("docs"), "*.md", SearchOption.AllDirectories))
            .Where(file => File.ReadAllText(file).Contains("<!-- lyonium ", StringComparison.Ordinal))
            .Select(file => Path.GetRelativePath(Repository.Root, file).Replace('\\', '/'))
            .Order(StringComparer.Ordinal);

    private static string Print(Match block)
    {
        var (exitStatus, output, errors) = BuiltTool.Run(block.Groups["arguments"].Value.Trim());
        Assert.Equal(("", 0), (errors, exitStatus));
        IEnumerable<string> lines = output.TrimEnd('\n').Split('\n');
        if (block.Groups["first"].Success)
        {
            var first = int.Parse(block.Groups["first"].Value, System.Globalization.CultureInfo.InvariantCulture);
            var last = int.Parse(block.Groups["last"].Value, System.Globalization.CultureInfo.InvariantCulture);
            lines = lines.Skip(first - 1).Take(last - first + 1);
        }

        return new StringBuilder().AppendJoin('\n', lines).Append('\n').ToString();
    }

    [GeneratedRegex(
        @"(?<before><!-- lyonium (?<arguments>[^(\n]*?)( \(lines (?<first>\d+)-(?<last>\d+)\))? -->\n+```[a-z]*\n)(?<shown>.*?)(?<after>```)",
        RegexOptions.Singleline | RegexOptions.ExplicitCapture,
        matchTimeoutMilliseconds: 10_000)]
    private static partial Regex Block();
}
