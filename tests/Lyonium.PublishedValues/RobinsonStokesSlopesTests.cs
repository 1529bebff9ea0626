using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Debye–Hückel slopes on the basis of volume: R. A. Robinson and R. H. Stokes, Electrolyte Solutions, as in Bates, Determination of pH
/// (1973), known from memory. They rest on the permittivity of Malmberg and Maryott 1956 (78.304 at 25 °C), the library's on IAPWS R8-97
/// (78.408): 0.13 %, of which A takes the power 1.5 and B the power 0.5.
/// </summary>
public sealed class RobinsonStokesSlopesTests(ITestOutputHelper output)
{
    private const string File = "robinson-stokes-slopes.csv";

    [Fact]
    public void A_From0To60Celsius_AgreesWithTheTable() =>
        SlopeComparison.OfA(
            output, "Robinson and Stokes", "0.3 %: 0.2 % of the permittivity and half a digit of four", File, isMolar: true, published => 0.003 * published)
            .AssertHolds(13);

    [Fact]
    public void B_From0To60Celsius_AgreesWithTheTable() =>
        SlopeComparison.OfB(
            output, "Robinson and Stokes", "0.1 %: 0.07 % of the permittivity and half a digit of four", File, isMolar: true, published => 0.001 * published)
            .AssertHolds(13);
}
