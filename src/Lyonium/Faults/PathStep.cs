using System.Linq;

namespace Lyonium.Faults;

/// <summary>How a property name stands in the place of a fault: <c>.name</c>, or <c>['odd name']</c>.</summary>
internal static class PathStep
{
    private const int Longest = 60;

    public static string Of(string name) =>
        name.Length is > 0 and <= Longest && name.All(c => c is (>= 'a' and <= 'z') or (>= 'A' and <= 'Z') or (>= '0' and <= '9') or '_')
            ? "." + name
            : "['" + (name.Length > Longest ? name.Substring(0, Longest) + "…" : name).Replace("'", "\\'") + "']";
}
