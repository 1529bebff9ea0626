using System;
using System.Linq;
using System.Reflection;
using System.Text.RegularExpressions;
using Lyonium.Faults;
using Xunit;

namespace Lyonium.Tests.Faults;

public sealed partial class FaultKindsTests
{
    [Fact]
    public void All_holdsEveryDeclaredKindOnce()
    {
        var declared = typeof(FaultKinds)
            .GetProperties(BindingFlags.Public | BindingFlags.Static)
            .Where(property => property.PropertyType == typeof(FaultKind))
            .Select(property => (FaultKind)property.GetValue(null)!)
            .ToArray();

        Assert.NotEmpty(declared);
        Assert.Equal(declared.OrderBy(one => one.Code, StringComparer.Ordinal), FaultKinds.All.OrderBy(one => one.Code, StringComparer.Ordinal));
    }

    [Fact]
    public void All_standsInOrderOfCode()
    {
        var codes = FaultKinds.All.Select(one => one.Code).ToArray();

        Assert.Equal(codes.OrderBy(code => code, StringComparer.Ordinal).ToArray(), codes);
    }

    [Fact]
    public void Codes_areUniqueAndWellFormed()
    {
        Assert.Equal(FaultKinds.All.Count, FaultKinds.All.Select(one => one.Code).Distinct(StringComparer.Ordinal).Count());
        Assert.All(FaultKinds.All, one => Assert.Matches(Code(), one.Code));
    }

    [Fact]
    public void Titles_areUniqueAndShort()
    {
        Assert.Equal(FaultKinds.All.Count, FaultKinds.All.Select(one => one.Title).Distinct(StringComparer.Ordinal).Count());
        Assert.All(FaultKinds.All, one => Assert.InRange(one.Title.Length, 1, 40));
    }

    [Fact]
    public void Texts_haveBalancedBracesAroundNamesOnly()
    {
        foreach (var kind in FaultKinds.All)
        {
            foreach (var text in new[] { kind.Message, kind.Remedy })
            {
                Assert.False(string.IsNullOrWhiteSpace(text));
                var rest = FaultText.Placeholder().Replace(text, "");
                Assert.DoesNotContain('{', rest);
                Assert.DoesNotContain('}', rest);
            }
        }
    }

    [Fact]
    public void Remedies_endWithoutAPoint()
    {
        // Fault.ToString puts the point.
        Assert.All(FaultKinds.All, one => Assert.False(one.Remedy.EndsWith('.'), one.Code));
    }

    [GeneratedRegex("^LYO0[1-7][0-9]{2}$", RegexOptions.None, matchTimeoutMilliseconds: 1000)]
    private static partial Regex Code();
}
