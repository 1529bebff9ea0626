using System.Linq;
using System.Text.Json.Nodes;
using Lyonium.Substances;

namespace Lyonium.Tests.Substances;

/// <summary>A user's table of version 1.1 whose first step has a course with temperature.</summary>
internal static class TemperatureCourse
{
    public const string Enthalpy = "\"enthalpy\": { \"value\": 50, \"source\": \"own\", \"known\": \"read\" }";

    public const string HeatCapacity = "\"heatCapacity\": { \"value\": -200, \"source\": \"own\", \"known\": \"read\" }";

    // 1000/298.15 + 1 - 0.01 * 298.15 = 1.3725, beside a pKa of 1.372.
    public const string Equation =
        "\"equation\": { \"overT\": 1000, \"constant\": 1, \"timesT\": -0.01, \"source\": \"own\", \"known\": \"read\", \"note\": \"page 3\" }";

    /// <summary>The user's table with more properties in its first step, and its pKa.</summary>
    public static JsonNode Table(string properties, double pKa = 1.372, double celsius = 25, string version = "1.1")
    {
        var table = JsonNode.Parse(UserTable.Text)!;
        table["format"] = "lyonium-table/" + version;
        var step = (JsonObject)table["families"]![0]!["steps"]![0]!;
        step["pKa"]!["value"] = pKa;
        step["pKa"]!["temperatureCelsius"] = celsius;
        foreach (var property in ((JsonObject)JsonNode.Parse("{ " + properties + " }")!).ToArray())
        {
            step[property.Key] = property.Value!.DeepClone();
        }

        return table;
    }

    public static DissociationStep Step(string properties, double pKa = 1.372, double celsius = 25) =>
        UserTable.Read(Table(properties, pKa, celsius).ToJsonString()).GetValueOrThrow().Families[0].Steps[0];
}
