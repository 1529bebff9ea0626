using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// The reference solutions of the European Pharmacopoeia 2.2.3, table 2.2.3-2, at 25 °C, read; printed to two decimals. Calcium
/// hydroxide stands with <see cref="BatesBowerSmith1956Tests"/>.
/// </summary>
public sealed class PhEurTests(ITestOutputHelper output)
{
    [Fact]
    public void Predict_StandardsByAmount_AgreesWithPrintedPH() =>
        StandardSolution.Compare(output, "Ph. Eur. 2.2.3 reference solutions at 25 degC", "ph-eur-2-2-3.csv", 0.005).AssertHolds(8);
}
