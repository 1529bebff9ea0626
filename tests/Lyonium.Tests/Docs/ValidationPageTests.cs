using System;
using System.IO;
using Lyonium.Qualification;
using Xunit;

namespace Lyonium.Tests.Docs;

/// <summary><c>docs/validation.md</c> is the report of the published checks; with LYONIUM_UPDATE_DOCS=1 it is written anew.</summary>
public sealed class ValidationPageTests
{
    [Fact]
    public void Page_is_the_report()
    {
        var page = new Qualifier().Run().ToMarkdown();
        var file = Path.Combine(Repository.Root, "docs", "validation.md");
        if (Environment.GetEnvironmentVariable("LYONIUM_UPDATE_DOCS") == "1")
        {
            File.WriteAllText(file, page);
            return;
        }

        Assert.Equal(page, File.ReadAllText(file).ReplaceLineEndings("\n"));
    }
}
