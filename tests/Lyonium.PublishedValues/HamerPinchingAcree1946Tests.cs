using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>W. J. Hamer, G. D. Pinching and S. F. Acree, J. Res. NBS 36 (1946) 47, at 25 °C, read.</summary>
public sealed class HamerPinchingAcree1946Tests(ITestOutputHelper output)
{
    [Fact]
    public void Predict_PhthalateByAmount_AgreesWithPrintedPH() =>
        StandardSolution.Compare(output, "Hamer, Pinching and Acree 1946 at 25 degC", "hamer-pinching-acree-1946.csv", 0).AssertHolds(1);
}
