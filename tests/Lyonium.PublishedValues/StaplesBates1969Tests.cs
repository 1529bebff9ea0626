using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>B. R. Staples and R. G. Bates, J. Res. NBS 73A (1969) 37, at 25 °C, read.</summary>
public sealed class StaplesBates1969Tests(ITestOutputHelper output)
{
    [Fact]
    public void Predict_StandardsByAmount_AgreesWithPrintedPH() =>
        StandardSolution.Compare(output, "Staples and Bates 1969 at 25 degC", "staples-bates-1969.csv", 0).AssertHolds(3);
}
