using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>The reference value of IUPAC: R. P. Buck et al., Pure Appl. Chem. 74 (2002) 2169, known from memory.</summary>
public sealed class Buck2002StandardsTests(ITestOutputHelper output)
{
    [Fact]
    public void Predict_PhthalateByAmount_AgreesWithReferenceValue() =>
        StandardSolution.Compare(output, "IUPAC 2002 phthalate at 25 degC", "buck-2002-standards-25C.csv", 0).AssertHolds(1);
}
