using System;
using System.IO;
using System.Linq;
using System.Text.RegularExpressions;
using Xunit;

namespace Lyonium.Tests.Docs;

/// <summary>
/// A file that a guide shows is shown as it is: the comment <c>&lt;!-- file PATH --&gt;</c> stands before the block. With LYONIUM_UPDATE_DOCS=1
/// the blocks are written anew.
/// </summary>
public sealed partial class ShownFileTests
{
    [Fact]
    public void Guides_show_files_as_they_are()
    {
        var pages = Directory.EnumerateFiles(Repository.File("docs/guides"), "*.md").Order(StringComparer.Ordinal).ToArray();
        var shown = 0;
        foreach (var page in pages)
        {
            var text = File.ReadAllText(page).Replace("\r\n", "\n", StringComparison.Ordinal);
            var current = Block().Replace(text, block =>
            {
                shown++;
                var file = File.ReadAllText(Repository.File(block.Groups["path"].Value)).Replace("\r\n", "\n", StringComparison.Ordinal);
                return block.Groups["before"].Value + file + block.Groups["after"].Value;
            });
            if (Environment.GetEnvironmentVariable("LYONIUM_UPDATE_DOCS") == "1")
            {
                File.WriteAllText(page, current);
            }
            else
            {
                Assert.Equal(current, text);
            }
        }

        Assert.True(shown >= 3, "The guide to a method of one's own shows three files.");
    }

    [GeneratedRegex(
        @"(?<before><!-- file (?<path>\S+) -->\n+```[a-z]*\n)(?<shown>.*?)(?<after>```)",
        RegexOptions.Singleline | RegexOptions.ExplicitCapture,
        matchTimeoutMilliseconds: 10_000)]
    private static partial Regex Block();
}
