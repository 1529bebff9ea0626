using System;
using System.IO;
using System.Text;
using Lyonium.Faults;
using Xunit;

namespace Lyonium.Tests.Docs;

/// <summary><c>docs/faults.md</c> lists every kind of fault; with LYONIUM_UPDATE_DOCS=1 it is written anew.</summary>
public sealed class FaultsPageTests
{
    private const string Page = "docs/faults.md";

    [Fact]
    public void Page_lists_every_kind()
    {
        var current = Write();
        if (Environment.GetEnvironmentVariable("LYONIUM_UPDATE_DOCS") == "1")
        {
            File.WriteAllText(Repository.File(Page), current);
            return;
        }

        Assert.Equal(current, File.ReadAllText(Repository.File(Page)).Replace("\r\n", "\n", StringComparison.Ordinal));
    }

    private static string Write()
    {
        var page = new StringBuilder();
        page.Append("# Faults\n\n");
        page.Append("Everything that is refused, by code. A code is never reused for something else. Words in braces are filled from the\n");
        page.Append("fault's arguments, so that a host can say the same in its own language. Generated from `FaultKinds` by the tests.\n\n");
        page.Append("01 quantities, 02 JSON text, 03 substances and their table, 04 recipes, 05 modelling, 06 methods (the tool's exit status 3),\n");
        page.Append("07 files.\n\n");
        page.Append("| code | fault | message | remedy |\n|---|---|---|---|\n");
        foreach (var kind in FaultKinds.All)
        {
            page.Append("| ").Append(kind.Code).Append(" | ").Append(kind.Title).Append(" | ").Append(kind.Message).Append(" | ").Append(kind.Remedy).Append(" |\n");
        }

        return page.ToString();
    }
}
