using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// The Debye–Hückel slope at 25 °C, molality basis: D. G. Archer and P. Wang, J. Phys. Chem. Ref. Data 19 (1990) 371, Aφ = 0.391475, known
/// from memory; A = 3 Aφ / ln 10.
/// </summary>
public sealed class ArcherWang1990SlopesTests(ITestOutputHelper output)
{
    [Fact]
    public void A_At25Celsius_AgreesWithTheTable() =>
        SlopeComparison.OfA(
            output,
            "Archer and Wang 1990",
            "0.1 %: their permittivity 78.38 (memory) is 0.04 % below that of IAPWS R8-97, 0.06 % in A",
            "archer-wang-1990-slopes.csv",
            isMolar: false,
            published => 0.001 * published).AssertHolds(1);
}
