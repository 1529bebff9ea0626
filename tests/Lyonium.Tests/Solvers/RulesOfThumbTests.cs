using System;
using CsCheck;
using Lyonium.Tests.Equilibria;
using Xunit;

namespace Lyonium.Tests.Solvers;

/// <summary>Rules of thumb of common practice, which the methods must bear out.</summary>
public sealed class RulesOfThumbTests
{
    // Common practice: at 0.1 mol/L the neglect of dissociation moves [H+] by less than 1 % below K of about 1e-5.
    [Theory]
    [InlineData(1e-5)]
    [InlineData(3e-6)]
    [InlineData(1e-7)]
    [InlineData(1e-9)]
    public void Neglect_of_dissociation_of_a_very_weak_acid_moves_h_by_less_than_one_percent(double k) => Assert.InRange(Moved(k), 0, 0.01);

    // Common practice: and by more than 3 % at K = 5e-4.
    [Theory]
    [InlineData(5e-4)]
    [InlineData(5e-3)]
    public void Neglect_of_dissociation_of_a_stronger_acid_moves_h_by_more_than_three_percent(double k) => Assert.InRange(Moved(k), 0.03, 1);

    // Common practice: a weak acid beside a strong one moves the pH by at most K·c_w / (2.303 c_s²).
    [Fact]
    public void Weak_acid_beside_a_strong_one_moves_the_pH_by_no_more_than_the_rule_says()
    {
        var moved = 0;
        Gen.Select(Gen.Double[2, 9], Gen.Double[-4, 0], Gen.Double[-4, 0]).Check(
            (pK, log10Weak, log10Strong) =>
            {
                var strong = MixtureInput.Of(new LadderInput(Math.Pow(10, log10Strong), -1));
                var both = strong.With(new LadderInput(Math.Pow(10, log10Weak), 0, pK));
                var rule = Math.Pow(10, -pK + log10Weak - (2 * log10Strong)) / Math.Log(10);
                var alone = Solving.Ideally(strong).PH;
                var down = alone - Solving.Ideally(both).PH;
                Assert.InRange(down, -1e-12, rule + 1e-12);
                moved += down > 1e-4 ? 1 : 0;

                // So the short-cut, which takes the strong acid alone, is off by no more than that and the share of water.
                var outcome = Solving.Dominant.Solve(both.ToEquilibrium(), Solving.Ideal);
                if (outcome.Formula == "strong acid in excess: h = excess")
                {
                    Assert.InRange(outcome.PH - Solving.Ideally(both).PH, -1e-12, rule + (Math.Pow(10, -14 - (2 * log10Strong)) / Math.Log(10)) + 1e-12);
                }
            },
            iter: 2000);
        Assert.True(moved > 200, "Too few of the mixtures moved for the test to mean anything: " + moved);
    }

    private static double Moved(double k)
    {
        var mixture = MixtureInput.Of(new LadderInput(0.1, 0, -Math.Log10(k)));
        var neglected = Solving.Dominant.Solve(mixture.ToEquilibrium(), Solving.Ideal).PH;
        return Math.Abs(Math.Pow(10, Solving.Ideally(mixture).PH - neglected) - 1);
    }
}
