using System;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Recipes;
using Lyonium.Solvers;
using Xunit;

namespace Lyonium.Tests.Predictions;

/// <summary>Worked steps can be checked with a pocket calculator, as these tests do.</summary>
public sealed class WorkingTests
{
    private static readonly Recipe Neutralised = Recipe.Named("x")
        .Add("0.05 mol", "acetic acid").Add("0.02 mol", "NaOH").Add("0.01 mol", "ammonium chloride").PourWater("1 kg").Build();

    [Fact]
    public void Work_mass_action_of_the_molalities_gives_the_constant()
    {
        var working = new Predictor().Predict(Neutralised).Work();

        Assert.Equal(["acetate:1", "ammonia:1"], working.Reactions.Select(one => one.Id).Order(StringComparer.Ordinal));
        Assert.All(working.Reactions, one => Assert.Equal(1, one.Quotient / one.K, 1e-9));
        Assert.All(working.Reactions, one => Assert.Contains("⇌", one.Equation, StringComparison.Ordinal));
    }

    [Fact]
    public void Work_start_is_after_neutralisation()
    {
        var working = new Predictor().With(new DominantAcidSolver()).Predict(Neutralised).Work();
        double Start(string species) => working.Amounts.Single(one => one.Species == species).StartMolPerKg!.Value;

        // 0.05 acetic acid less 0.02 of base; the ammonium keeps its proton.
        Assert.Equal(0.03, Start("CH₃COOH"), 1e-12);
        Assert.Equal(0.02, Start("CH₃COO⁻"), 1e-12);
        Assert.Equal(0.01, Start("NH₄⁺"), 1e-12);
        Assert.Equal((0.0, 0.0, 0.0), (Start("NH₃"), Start("H⁺"), Start("OH⁻")));
    }

    [Fact]
    public void Work_excess_of_strong_base_starts_as_hydroxide()
    {
        var recipe = Recipe.Named("x").Add("0.05 mol", "acetic acid").Add("0.07 mol", "NaOH").PourWater("1 kg").Build();
        var working = new Predictor().Predict(recipe).Work();

        Assert.Equal(0.02, working.Amounts.Single(one => one.Species == "OH⁻").StartMolPerKg!.Value, 1e-12);
        Assert.Equal(0.05, working.Amounts.Single(one => one.Species == "CH₃COO⁻").StartMolPerKg!.Value, 1e-12);
    }

    [Fact]
    public void Work_start_and_equilibrium_hold_the_same_amount_of_each_kind()
    {
        var working = new Predictor().Predict(Neutralised).Work();
        double Sum(Func<WorkedAmount, double?> of, params string[] species) => working.Amounts.Where(one => species.Contains(one.Species)).Sum(one => of(one)!.Value);

        Assert.Equal(0.05, Sum(one => one.StartMolPerKg, "CH₃COOH", "CH₃COO⁻"), 1e-15);
        Assert.Equal(0.05, Sum(one => one.EquilibriumMolPerKg, "CH₃COOH", "CH₃COO⁻"), 1e-15);
        Assert.Equal(0, Sum(one => one.ChangeMolPerKg, "CH₃COOH", "CH₃COO⁻"), 1e-15);
    }

    [Fact]
    public void ToText_shows_formula_estimates_and_the_pH_by_its_own_figures()
    {
        var recipe = Recipe.Named("x").Add("0.1 mol", "formic acid").PourWater("1 kg").Build();
        var prediction = new Predictor().With(new IdealModel()).With(new SuccessiveApproximationSolver()).Predict(recipe);

        var text = prediction.Work().ToText();

        Assert.Contains("estimates of pH: 2.3760, ", text, StringComparison.Ordinal); // √(10^-3.752 · 0.1), by hand
        Assert.Contains($"= {prediction.PH.ToString("F4", System.Globalization.CultureInfo.InvariantCulture)}", text, StringComparison.Ordinal);
        Assert.DoesNotContain(" \n", text, StringComparison.Ordinal);
    }
}
