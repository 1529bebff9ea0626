using Lyonium.Documents;
using Lyonium.Faults;
using Lyonium.Quantities;
using Xunit;

namespace Lyonium.Tests.Quantities;

/// <summary>Reads one measure from JSON as the formats do.</summary>
internal static class JsonMeasure
{
    public static Measure Read(string json, Dimension dimension)
    {
        var faults = new FaultList();
        var measure = JsonDocumentReader.Open(json, 1 << 20, faults)!.Measure(dimension);
        faults.ThrowIfAny();
        Assert.NotNull(measure);
        return measure;
    }
}
