using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// The Debye–Hückel slope of the Bates–Guggenheim convention, molality basis: R. P. Buck et al., Pure Appl. Chem. 74 (2002) 2169, known
/// from memory.
/// </summary>
public sealed class Buck2002SlopesTests(ITestOutputHelper output)
{
    [Fact]
    public void A_From5To50Celsius_AgreesWithTheTable() =>
        SlopeComparison.OfA(
            output,
            "Buck et al. 2002",
            "0.3 %: the permittivity of Malmberg and Maryott 1956 is 0.13 % below that of IAPWS R8-97 at 25 degC, 0.2 % in A; half a digit of four",
            "buck-2002-slopes.csv",
            isMolar: false,
            published => 0.003 * published).AssertHolds(11);
}
