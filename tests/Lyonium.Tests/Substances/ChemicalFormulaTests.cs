using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Faults;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Substances;

public sealed class ChemicalFormulaTests
{
    [Theory]
    [InlineData("NaCl", "Cl1 Na1", 0, 0, "NaCl")]
    [InlineData("H2SO4", "H2 O4 S1", 0, 0, "H₂SO₄")]
    [InlineData("Ca(OH)2", "Ca1 H2 O2", 0, 0, "Ca(OH)₂")]
    [InlineData("(NH4)2HPO4", "H9 N2 O4 P1", 0, 0, "(NH₄)₂HPO₄")]
    [InlineData("HOC(CH2CO2H)2CO2H", "C6 H8 O7", 0, 0, "HOC(CH₂CO₂H)₂CO₂H")]
    [InlineData("Al2(SO4)3", "Al2 O12 S3", 0, 0, "Al₂(SO₄)₃")]
    [InlineData("((CH3)3C)2O", "C8 H18 O1", 0, 0, "((CH₃)₃C)₂O")]
    [InlineData("C12H22O11", "C12 H22 O11", 0, 0, "C₁₂H₂₂O₁₁")]
    [InlineData("SO4^2-", "O4 S1", -2, 0, "SO₄²⁻")]
    [InlineData("NH4^+", "H4 N1", 1, 0, "NH₄⁺")]
    [InlineData("Na^+", "Na1", 1, 0, "Na⁺")]
    [InlineData("Ca^2+", "Ca1", 2, 0, "Ca²⁺")]
    [InlineData("P3O10^5-", "O10 P3", -5, 0, "P₃O₁₀⁵⁻")]
    [InlineData("Na2CO3.10H2O", "C1 H20 Na2 O13", 0, 10, "Na₂CO₃·10H₂O")]
    [InlineData("Na2CO3·10H2O", "C1 H20 Na2 O13", 0, 10, "Na₂CO₃·10H₂O")]
    [InlineData("Na2CO3•10H2O", "C1 H20 Na2 O13", 0, 10, "Na₂CO₃·10H₂O")]
    [InlineData("Na2CO3*10H2O", "C1 H20 Na2 O13", 0, 10, "Na₂CO₃·10H₂O")]
    [InlineData("Na2CO3 . 10 H2O", "C1 H20 Na2 O13", 0, 10, "Na₂CO₃·10H₂O")]
    [InlineData("LiOH.H2O", "H3 Li1 O2", 0, 1, "LiOH·H₂O")]
    [InlineData("K2CO3.1.5H2O", "C1 H3 K2 O4.5", 0, 1.5, "K₂CO₃·1.5H₂O")]
    [InlineData("CaSO4.0.5H2O", "Ca1 H1 O4.5 S1", 0, 0.5, "CaSO₄·0.5H₂O")]
    public void Parse_aFormula_givesCompositionChargeWaterAndDisplay(string text, string composition, int charge, double water, string display)
    {
        var formula = ChemicalFormula.Parse(text);

        Assert.Equal(composition, string.Join(' ', formula.Composition.Select(one => one.Key + one.Value.ToString(CultureInfo.InvariantCulture))));
        Assert.Equal(charge, formula.Charge);
        Assert.Equal(water, formula.CrystalWater);
        Assert.Equal(display, formula.Display);
        Assert.Equal(text, formula.ToString());
    }

    [Theory]
    [InlineData("")]
    [InlineData(" ")]
    [InlineData("water")]
    [InlineData("nacl")]
    [InlineData("2H2O")]
    [InlineData("()")]
    [InlineData("(")]
    [InlineData(")")]
    [InlineData("Ca(OH")]
    [InlineData("CaOH)2")]
    [InlineData("Ca(OH)0")]
    [InlineData("H0")]
    [InlineData("H-1")]
    [InlineData("H1.5")]
    [InlineData("H9999999999")]
    [InlineData("SO4^")]
    [InlineData("SO4^2")]
    [InlineData("SO4^-2")]
    [InlineData("SO4^0-")]
    [InlineData("SO4^2-^2-")]
    [InlineData("SO4^100-")]
    [InlineData("^2-")]
    [InlineData("Na2CO3.")]
    [InlineData("Na2CO3.10")]
    [InlineData("Na2CO3.0H2O")]
    [InlineData("Na2CO3.-1H2O")]
    [InlineData("Na2CO3.1e2H2O")]
    [InlineData("Na2CO3.100H2O")]
    [InlineData("Na2CO3.H2O.H2O")]
    [InlineData("Na2CO3.10D2O")]
    [InlineData(".H2O")]
    [InlineData("H₂O")]
    [InlineData("H2O\n")]
    [InlineData("É2")]
    public void Parse_whatIsNoFormula_isRefused(string text)
    {
        if (text == "H2O\n")
        {
            // Blanks around a formula are let pass.
            Assert.Equal(2, ChemicalFormula.Parse(text).Composition["H"]);
            return;
        }

        var thrown = Assert.Throws<LyoniumException>(() => ChemicalFormula.Parse(text));

        Assert.Equal("LYO0314", Assert.Single(thrown.Faults).Code);
        FaultText.Check(thrown.Faults);
    }

    [Fact]
    public void Parse_hostileNesting_isRefusedAtOnce()
    {
        foreach (var text in new[] { new string('(', 100_000), new string('(', 90) + "H" + new string(')', 90), new string('H', 100_000) })
        {
            Assert.Throws<LyoniumException>(() => ChemicalFormula.Parse(text));
        }
    }

    [Fact]
    public void Parse_null_throws() => Assert.Throws<ArgumentNullException>(() => ChemicalFormula.Parse(null!));

    [Fact]
    public void Parse_randomText_neverThrowsAnythingElse()
    {
        var random = new Random(8);
        const string letters = "HNaCOClS()^+-.0129 ·e";
        var read = new List<string>();
        for (var i = 0; i < 20_000; i++)
        {
            var text = string.Concat(Enumerable.Range(0, random.Next(1, 12)).Select(_ => letters[random.Next(letters.Length)]));
            try
            {
                var formula = ChemicalFormula.Parse(text);
                Assert.All(formula.Composition.Values, count => Assert.True(count is > 0 and < 2e6));
                read.Add(text);
            }
            catch (LyoniumException e)
            {
                Assert.Equal("LYO0314", e.Faults[0].Code);
            }
        }

        Assert.InRange(read.Count, 100, 19_900);
    }
}
