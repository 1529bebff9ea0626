using System;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Substances;
using Xunit;

namespace Lyonium.Tests.Activity;

/// <summary>Specific ion interaction theory.</summary>
public sealed class SpecificIonModelTests
{
    private static readonly Predictor SpecificIon = new(SubstanceTable.Default, null, new SpecificIonModel());

    // Without coefficients it is the Bates–Guggenheim convention for every ion, to the last digit.
    [Fact]
    public void Log10Gammas_withoutCoefficients_areBatesGuggenheims()
    {
        var equilibrium = new Equilibrium(
            [Constraint.Total(0.05), Constraint.Total(0.05)],
            [new Species([new Term(0, 1)], 0, 2, 0), new Species([new Term(1, 1)], 0, -2, 0)],
            new Solvent(298.15, 14, 0.51, 0.328));
        double[] molalities = [1e-7, 1e-7, 0.05, 0.05], with = new double[4], without = new double[4];
        new SpecificIonModel().Log10Gammas(equilibrium, 0.2, molalities, with);
        new BatesGuggenheimModel().Log10Gammas(equilibrium, 0.2, molalities, without);

        Assert.Equal(without, with);
    }

    // log γ±(NaCl, 1 mol/kg) = −A/2.5 + 0.03 · 1 by hand, A = 0.50978 (IAPWS, derived).
    [Fact]
    public void SodiumChloride_isTheEquationWorkedByHand()
    {
        var prediction = SpecificIon.Predict(Recipe.Named("salt").At("25 Cel").Add("1 mol", "sodium chloride").PourWater("1 kg").Build());
        var coefficient = prediction.Species.Single(one => one.Id == "sodium:0").ActivityCoefficient;

        Assert.Equal((-0.50978 / 2.5) + 0.03, Math.Log10(coefficient), 1e-5);
        Assert.Contains(prediction.Evidence.Constants, one => one.Id == "sodium:0 chloride:0");
        Assert.DoesNotContain(prediction.Assumptions, one => one.Code == "interaction-listed");
    }

    // What is not listed is said, with the ionic strength from which it matters.
    [Theory]
    [InlineData("0.05 mol", true)]
    [InlineData("0.5 mol", false)]
    public void UnlistedInteraction_isToldAndFlaggedWhereItMatters(string amount, bool held)
    {
        var prediction = SpecificIon.Predict(Recipe.Named("salt").At("25 Cel").Add(amount, "potassium hydrogen phthalate").PourWater("1 kg").Build());
        var told = prediction.Assumptions.Single(one => one.Code == "interaction-listed");

        Assert.Equal((held, 0.1), (told.Held, told.Limit));
        Assert.Contains("K⁺", told.Of, StringComparison.Ordinal);
    }
}
