using System;
using System.IO;
using System.Linq;
using System.Text.RegularExpressions;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Docs;

public sealed class ReadmeCountsTests
{
    [Fact]
    public void Readme_counts_the_table_right()
    {
        var table = SubstanceTable.Default;
        var families = table.Families.Count(one => !one.IsSpectator);
        var text = Regex.Replace(File.ReadAllText(Repository.File("README.md")), "\\s+", " ", RegexOptions.None, TimeSpan.FromSeconds(1));

        Assert.Contains($"{table.Substances.Count} substances over {families} families with pKa", text, StringComparison.Ordinal);
    }
}
