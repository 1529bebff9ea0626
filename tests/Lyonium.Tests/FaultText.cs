using System.Collections.Generic;
using System.Linq;
using System.Text.RegularExpressions;
using Lyonium.Faults;
using Xunit;

namespace Lyonium.Tests;

/// <summary>What every fault must be, wherever it was made.</summary>
internal static partial class FaultText
{
    /// <summary>Placeholders are filled, the texts stand on one line, and the place is a JSON path.</summary>
    public static void Check(IEnumerable<Fault> faults)
    {
        var all = faults.ToArray();
        Assert.NotEmpty(all);
        foreach (var fault in all)
        {
            var names = fault.Arguments.Keys.Select(name => "{" + name + "}").ToArray();
            foreach (Match hole in Placeholder().Matches(fault.Kind.Message + fault.Kind.Remedy))
            {
                Assert.True(names.Contains(hole.Value, System.StringComparer.Ordinal), $"{fault.Code}: nothing fills {hole.Value}");
            }

            Assert.StartsWith("$", fault.Path, System.StringComparison.Ordinal);
            Assert.False(string.IsNullOrWhiteSpace(fault.Message), fault.Code);
            Assert.False(string.IsNullOrWhiteSpace(fault.Remedy), fault.Code);
            Assert.DoesNotContain(fault.ToString(), c => char.IsControl(c) || c is '\u2028' or '\u2029');
        }
    }

    /// <summary>Codes and places, in order, such as <c>LYO0105 $.parts[0].volume</c>.</summary>
    public static string[] CodesAndPaths(IEnumerable<Fault> faults) => faults.Select(one => one.Code + " " + one.Path).ToArray();

    [GeneratedRegex(@"\{[A-Za-z]+\}", RegexOptions.None, matchTimeoutMilliseconds: 1000)]
    public static partial Regex Placeholder();
}
