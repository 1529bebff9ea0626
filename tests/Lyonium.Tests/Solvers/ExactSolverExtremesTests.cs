using System;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Tests.Equilibria;
using Xunit;

namespace Lyonium.Tests.Solvers;

/// <summary>Mixtures that nobody pours, and that a typing error makes.</summary>
public sealed class ExactSolverExtremesTests
{
    [Fact]
    public void Solve_water_alone_half_of_pKw() => Assert.Equal(7, Solving.Ideally(MixtureInput.Of()).PH, 1e-14);

    [Theory]
    [InlineData("ideal")]
    [InlineData("davies")]
    public void Solve_totals_of_zero_half_of_pKw(string modelName)
    {
        var mixture = MixtureInput.Of(new LadderInput(0, 0, 4.75), new LadderInput(0, 1), new LadderInput(0, -1), new LadderInput(0, 2, 1, 2, 3));
        Assert.Equal(7, Solving.Solved(mixture, modelName == "ideal" ? Solving.Ideal : Solving.Davies).PH, 1e-14);
    }

    [Theory]
    [InlineData(1e-300)]
    [InlineData(double.Epsilon)]
    public void Solve_totals_next_to_nothing_half_of_pKw(double total) =>
        Assert.Equal(7, Solving.Ideally(MixtureInput.Of(new LadderInput(total, 0, 4.75), new LadderInput(total, -1))).PH, 1e-14);

    [Theory]
    [InlineData(-1, -5)]
    [InlineData(1, 19)]
    public void Solve_strong_excess_of_1e5_is_all_there_is(int charge, double pH) =>
        Assert.Equal(pH, Solving.Ideally(MixtureInput.Of(new LadderInput(1e5, charge))).PH, 1e-13);

    // Half neutralised: h is the constant, unless the constant lies beyond what water allows.
    [Theory]
    [InlineData(-40, 0.1, 1.3010299956639813)]
    [InlineData(45, 0.1, 12.698970004336019)]
    public void Solve_constants_beyond_water_act_as_strong(double pKa, double total, double pH)
    {
        var mixture = MixtureInput.Of(new LadderInput(total, 0, pKa), new LadderInput(total / 2, 1));
        Assert.Equal(pH, Solving.Ideally(mixture).PH, 1e-11);
    }

    // Thirty equal steps, half filled, and a total that water does not matter to: by symmetry h is the middle constant.
    [Theory]
    [InlineData("ideal", 0.0)]
    [InlineData("ideal", 0.2)]
    [InlineData("ideal", 1.5)]
    public void Solve_thirty_steps_half_filled_the_middle(string modelName, double apart)
    {
        var pKa = Enumerable.Range(0, 30).Select(i => 7 + (apart * (i - 14.5))).ToArray();
        var mixture = MixtureInput.Of(new LadderInput(0.1, 15, pKa));
        Assert.Equal(7, Solving.Solved(mixture, modelName == "ideal" ? Solving.Ideal : Solving.Davies).PH, 1e-12);
    }

    // Ten thousand components that are ten in a thousand pieces each.
    [Fact]
    public void Solve_ten_thousand_components_same_as_ten()
    {
        var ten = Enumerable.Range(0, 10).Select(i => new LadderInput(0.01 * (i + 1), i % 3, 1.5 + i, 4.5 + i)).ToArray();
        var many = Enumerable.Range(0, 10_000).Select(i => ten[i % 10] with { MolPerKg = ten[i % 10].MolPerKg / 1000 }).ToArray();

        Assert.Equal(Solving.Ideally(new MixtureInput(ten)).PH, Solving.Ideally(new MixtureInput(many)).PH, 1e-13);
        Assert.Equal(Solving.Solved(new MixtureInput(ten), Solving.Davies).PH, Solving.Solved(new MixtureInput(many), Solving.Davies).PH, 1e-11);
    }

    // 5 mol/kg of each sign with 1e-9 between them; the difference is a double, and exact arithmetic tells what it does.
    [Fact]
    public void Solve_five_molal_neutralised_to_a_rest_keeps_the_rest()
    {
        var acid = 5 + 1e-9;
        var rest = acid - 5;
        var expected = -Math.Log10((rest / 2) + Math.Sqrt((rest * rest / 4) + 1e-14));

        var outcome = Solving.Ideally(MixtureInput.Of(new LadderInput(acid, -1), new LadderInput(5, 1)));

        Assert.Equal(expected, outcome.PH, 1e-14);
        Assert.InRange(outcome.InputResolution, 1e-10, 1e-8);
    }

    [Theory]
    [InlineData(1e300)]
    [InlineData(double.MaxValue)]
    public void Solve_totals_beyond_any_vessel_says_so_or_answers(double total)
    {
        foreach (var model in new IActivityModel[] { Solving.Ideal, Solving.Davies })
        {
            var outcome = Solving.Exact.Solve(MixtureInput.Of(new LadderInput(total, 0, 4.75), new LadderInput(total, 1)).ToEquilibrium(), model);
            Assert.True(outcome.Status == SolverStatus.Solved ? outcome.BracketLow <= outcome.PH : outcome.Reason is not null);
        }
    }

    // A ladder that lacks its middle rung: hydrogen sulfide without HS−, say. m(2) / m(0) = K h², so h = K^(−1/2) at half.
    [Fact]
    public void Solve_ladder_with_a_rung_left_out_takes_two_protons_at_once()
    {
        var equilibrium = new Equilibrium(
            [Constraint.Total(0.1), Constraint.Total(0.1)],
            [
                new Species([new Term(0, 1)], 0, -2, 0),
                new Species([new Term(0, 1)], 2, 0, 14.5),
                new Species([new Term(1, 1)], 0, 1, 0),
            ],
            new Solvent(298.15, 14, 0.51, 0.328));

        Assert.Equal(7.25, Solving.Exact.Solve(equilibrium, Solving.Ideal).PH, 1e-5);
    }

    // An ampholyte alone: at its zero the ionic strength is at its lowest, and two rounds of it can be equal to the last digit.
    [Theory]
    [InlineData(0.17151657836338047, -1.9484952092170715, 6.5107086300849915, 7.454704105854034)]
    [InlineData(2.437573250231716, 1.7703326344490051, 8.243542075157166, 8.827558875083923)]
    public void Solve_Davies_ampholyte_alone_at_the_lowest_ionic_strength(double total, params double[] pKa)
    {
        // The outer two steps mirror each other, so the activity coefficients of the ampholyte's neighbours cancel.
        var outcome = Solving.Solved(MixtureInput.Of(new LadderInput(total, 2, pKa)), Solving.Davies);

        Assert.Equal((pKa[1] + pKa[2]) / 2, outcome.PH, 1e-4);
    }
}
