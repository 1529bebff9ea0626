using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>Molar masses as the CRC Handbook of Chemistry and Physics prints them, known from memory.</summary>
public sealed class CrcMolarMassTests(ITestOutputHelper output)
{
    [Fact]
    public void MolarMass_OfTableSubstances_AgreesWithTheHandbook() =>
        MolarMassComparison.Compare(output, "CRC Handbook, g/mol", "crc-molar-masses.csv").AssertHolds(74);
}
