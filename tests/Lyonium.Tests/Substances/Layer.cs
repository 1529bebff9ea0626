using System.IO;
using System.Linq;
using System.Text;
using Lyonium.Faults;
using Lyonium.Substances;

namespace Lyonium.Tests.Substances;

/// <summary>A user's own table, built of its parts.</summary>
internal static class Layer
{
    public static string Step(double pKa) => System.FormattableString.Invariant(
        $"{{ \"pKa\": {{ \"value\": {pKa}, \"temperatureCelsius\": 25, \"ionicStrength\": 0, \"source\": \"own\", \"known\": \"read\" }} }}");

    public static string Family(string id, string[] forms, params string[] steps) =>
        $"{{ \"id\": \"{id}\", \"name\": \"{id}\", \"forms\": [ {string.Join(", ", forms.Select(form => $"{{ \"formula\": \"{form}\" }}"))} ], "
        + $"\"steps\": [ {string.Join(", ", steps)} ] }}";

    public static string Substance(string id, string formula, string brings, int protons) =>
        $"{{ \"id\": \"{id}\", \"name\": \"{id}\", \"formula\": \"{formula}\", \"brings\": {{ {brings} }}, \"protons\": {protons} }}";

    public static string With(string families = "", string substances = "") =>
        "{ \"format\": \"lyonium-table/1\", \"edition\": \"2026.1\", "
        + "\"sources\": [ { \"key\": \"own\", \"citation\": \"Tern Quay notebook 4, page 12\" } ], "
        + $"\"families\": [ {families} ], \"substances\": [ {substances} ] }}";

    public static Attempt<SubstanceTable> TryOver(SubstanceTable below, string json)
    {
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(json));
        return below.TryLayer("house", stream);
    }
}
