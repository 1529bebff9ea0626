using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Debye–Hückel slopes on the basis of volume: G. G. Manov, R. G. Bates, W. J. Hamer and S. F. Acree, J. Am. Chem. Soc. 65 (1943) 1765,
/// read. They are 0.6 to 1.3 % below the later ones of Robinson and Stokes (memory) on the same basis.
/// </summary>
public sealed class Manov1943SlopesTests(ITestOutputHelper output)
{
    private const string File = "manov-1943-slopes.csv";

    [Fact]
    public void A_From0To60Celsius_AgreesWithTheTable() =>
        SlopeComparison.OfA(
            output,
            "Manov et al. 1943",
            "1.5 %: the later table of Robinson and Stokes differs from it by up to 1.3 %, of older permittivities and constants",
            File,
            isMolar: true,
            published => 0.015 * published).AssertHolds(11);

    [Fact]
    public void B_From0To60Celsius_AgreesWithTheTable() =>
        SlopeComparison.OfB(
            output,
            "Manov et al. 1943",
            "1.1 %: the later table of Robinson and Stokes differs from it by up to 1.0 %, of older permittivities and constants",
            File,
            isMolar: true,
            published => 0.011 * published).AssertHolds(11);
}
