using System;
using System.Linq;
using Lyonium.Predictions;
using Lyonium.Records;
using Lyonium.Tests.Records;
using Xunit;

namespace Lyonium.Tests.Predictions;

public sealed class CautionTests
{
    private const string Litre = ", { \"substance\": \"water\", \"volume\": \"1 L\" }";

    private static string[] CodesOf(string parts) =>
        new Predictor().Predict(RecipeJson.Read(RecipeText.With(parts + Litre))).Cautions.Select(one => one.Code).ToArray();

    private static string Solution(string substance, string strength) =>
        $"{{ \"substance\": \"{substance}\", \"{(strength.EndsWith('%') ? "massFraction" : "concentration")}\": \"{strength}\", \"volume\": \"10 mL\" }}";

    [Theory]
    [InlineData("potassium cyanide", "acid-onto-cyanide")]
    [InlineData("sodium sulfide", "acid-onto-sulfide")]
    [InlineData("sodium hypochlorite", "acid-onto-hypochlorite")]
    public void AcidOntoWhatSetsPoisonFree_isTold(string base1, string code)
    {
        foreach (var acid in new[] { Solution("HCl", "0.01 mol/L"), Solution("acetic acid", "0.1 mol/L"), "{ \"substance\": \"citric acid\", \"amount\": \"1 mmol\" }" })
        {
            var cautions = new Predictor().Predict(RecipeJson.Read(RecipeText.With(Solution(base1, "0.01 mol/L") + ", " + acid + Litre))).Cautions;
            var caution = cautions.Single(one => one.Code == code);

            Assert.NotEmpty(caution.Hazards);
            Assert.NotEmpty(caution.Text);
            Assert.Contains(base1, caution.Because);
            Assert.Equal(2, caution.Because.Count);
        }
    }

    [Theory]
    [InlineData("potassium cyanide", "acid-onto-cyanide")]
    [InlineData("sodium sulfide", "acid-onto-sulfide")]
    [InlineData("sodium hypochlorite", "acid-onto-hypochlorite")]
    public void WithoutTheAcidOrWithNoneOfIt_isNotTold(string base1, string code)
    {
        Assert.DoesNotContain(code, CodesOf(Solution(base1, "0.01 mol/L")));
        Assert.DoesNotContain(code, CodesOf(Solution(base1, "0.01 mol/L") + ", { \"substance\": \"HCl\", \"concentration\": \"1 mol/L\", \"volume\": \"0 mL\" }"));
        Assert.DoesNotContain(code, CodesOf(Solution("HCl", "0.1 mol/L")));
    }

    [Theory]
    [InlineData("HCl", "37 %", "corrosive", true)]
    [InlineData("HCl", "0.8 mol/L", "corrosive", true)]
    [InlineData("HCl", "0.79 mol/L", "corrosive", false)]
    [InlineData("HCl", "0.79 mol/L", "protect-eyes-acid", true)]
    [InlineData("HCl", "0.09 mol/L", "protect-eyes-acid", false)]
    [InlineData("HCl", "37 %", "acid-into-water", true)]
    [InlineData("HCl", "1 mol/L", "acid-into-water", false)]
    [InlineData("H2SO4", "96 %", "acid-into-water", true)]
    [InlineData("NaOH", "50 %", "corrosive-base", true)]
    [InlineData("NaOH", "0.1 mol/L", "corrosive-base", false)]
    [InlineData("NaOH", "50 %", "base-into-water", true)]
    [InlineData("acetic acid", "80 %", "corrosive-acetic", true)]
    [InlineData("acetic acid", "0.1 mol/L", "corrosive-acetic", false)]
    [InlineData("ammonia", "25 %", "corrosive-ammonia", true)]
    public void Strength_decidesFromItsLimitOn(string substance, string strength, string code, bool isTold) =>
        Assert.Equal(isTold, CodesOf(Solution(substance, strength)).Contains(code, StringComparer.Ordinal));

    [Fact]
    public void PureSubstance_fromTheBalance_isAsStrongAsCanBe()
    {
        Assert.Contains("corrosive-base", CodesOf("{ \"substance\": \"NaOH\", \"mass\": \"1 g\" }"));
        Assert.Contains("base-into-water", CodesOf("{ \"substance\": \"NaOH\", \"mass\": \"1 g\" }"));
    }

    [Theory]
    [InlineData("HCl")]
    [InlineData("NaOH")]
    [InlineData("H2SO4")]
    [InlineData("acetic acid")]
    public void MereAmounts_callForNoCautionOfStrength(string substance) =>
        Assert.Equal(["always"], CodesOf($"{{ \"substance\": \"{substance}\", \"amount\": \"1 mol\" }}"));

    [Theory]
    [InlineData("{ \"substance\": \"NaCl\", \"mass\": \"1 g\" }")]
    [InlineData("{ \"substance\": \"sodium acetate\", \"mass\": \"1 g\" }")]
    public void HarmlessSalts_callForTheGeneralOneOnly(string part) => Assert.Equal(["always"], CodesOf(part));

    [Fact]
    public void General_standsLastAndOnce()
    {
        var codes = CodesOf(Solution("HCl", "37 %") + ", " + Solution("potassium cyanide", "1 mol/L"));

        Assert.Equal("always", codes[^1]);
        Assert.Equal(codes.Length, codes.Distinct(StringComparer.Ordinal).Count());
    }

    [Fact]
    public void StrongAcidOntoStrongBase_isTold() =>
        Assert.Contains("acid-with-base", CodesOf(Solution("HCl", "37 %") + ", " + Solution("NaOH", "50 %")));
}
