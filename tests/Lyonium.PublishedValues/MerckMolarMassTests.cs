using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>Molar masses as The Merck Index prints them, known from memory.</summary>
public sealed class MerckMolarMassTests(ITestOutputHelper output)
{
    [Fact]
    public void MolarMass_OfTableSubstances_AgreesWithTheIndex() =>
        MolarMassComparison.Compare(output, "The Merck Index, g/mol", "merck-molar-masses.csv").AssertHolds(9);
}
