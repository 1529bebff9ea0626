using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>The standards of JIS Z 8802 (2011) at 25 °C, read; printed to two decimals.</summary>
public sealed class JisZ8802Tests(ITestOutputHelper output)
{
    [Fact]
    public void Predict_StandardsByAmount_AgreesWithPrintedPH() =>
        StandardSolution.Compare(output, "JIS Z 8802 standards at 25 degC", "jis-z-8802-2011.csv", 0.005).AssertHolds(5);
}
