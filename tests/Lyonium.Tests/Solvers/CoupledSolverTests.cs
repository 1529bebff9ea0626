using System;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Solvers;
using Lyonium.Tests.Equilibria;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.Tests.Solvers;

/// <summary>The exact method on coupled components and fixed activities.</summary>
public sealed class CoupledSolverTests(ITestOutputHelper output)
{

    private static readonly Solvent Water = new(298.15, 14, MixtureInput.Slope, 0.328);

    private static int Systems => Environment.GetEnvironmentVariable("LYONIUM_MILLION") == "1" ? 1_000_000 : 20_000;

    // In every run 20,000, and a million with LYONIUM_MILLION=1.
    [Theory]
    [InlineData("ideal")]
    [InlineData("bates-guggenheim")]
    public void Solve_random_systems_Million_are_certified(string name)
    {
        var model = ActivityModels.Find(name)!;
        int failures = 0, evaluations = 0;
        double widest = 0, worstBalance = 0;
        var first = "";
        for (var i = 0; i < Systems; i++)
        {
            var system = CoupledSystems.At(i);
            var outcome = new ExactSolver().Solve(system, model);
            if (outcome.Status != SolverStatus.Solved)
            {
                failures++;
                first = first.Length == 0 ? $"{i}: {outcome.Reason}" : first;
                continue;
            }

            widest = Math.Max(widest, outcome.BracketHigh - outcome.BracketLow);
            evaluations = Math.Max(evaluations, outcome.Evaluations);
            if (i % 20 == 0)
            {
                worstBalance = Math.Max(worstBalance, WorstBalance(system, Speciation.At(system, model, outcome.PH)));
                Assert.True(Speciation.At(system, model, outcome.BracketLow).ChargeMolPerKg > 0, $"{name}, {i}, low");
                Assert.True(Speciation.At(system, model, outcome.BracketHigh).ChargeMolPerKg < 0, $"{name}, {i}, high");
            }
        }

        output.WriteLine(FormattableString.Invariant(
            $"{name}: {Systems} systems, {failures} failures ({first}), widest bracket {widest:G2}, worst mass balance {worstBalance:G2}, most evaluations {evaluations}"));
        Assert.Equal((0, ""), (failures, first));
        Assert.True(widest <= 1e-9, FormattableString.Invariant($"{widest:G3}"));
        Assert.True(worstBalance <= 1e-12, FormattableString.Invariant($"{worstBalance:G3}"));
    }

    // A + B = AB alone: the product is the smaller root of x² − (a + b + 1/K) x + ab.
    [Theory]
    [InlineData(0.1, 0.05, 2)]
    [InlineData(0.1, 0.1, 12)]
    [InlineData(5, 1e-9, 3)]
    [InlineData(1e-6, 1e-6, -3)]
    public void Speciation_of_a_pair_is_the_root_of_its_quadratic(double a, double b, double log10K)
    {
        var pair = new Equilibrium(
            [Constraint.Total(a), Constraint.Total(b)],
            [new Species([new Term(0, 1)], 0, 1, 0), new Species([new Term(1, 1)], 0, -1, 0), new Species([new Term(0, 1), new Term(1, 1)], 0, 0, log10K)],
            Water);
        var k = Math.Pow(10, log10K);
        var sum = a + b + (1 / k);
        var product = 2 * a * b / (sum + Math.Sqrt((((a - b) * (a - b)) + ((2 * (a + b)) / k) + (1 / (k * k)))));

        var at = Speciation.At(pair, new IdealModel(), 7);

        Assert.Equal(1, at.MolalitiesMolPerKg[4] / product, 1e-12);
        Assert.Equal(1, at.MolalitiesMolPerKg[2] / (product / (k * at.MolalitiesMolPerKg[3])), 1e-12);
        Assert.Equal(1, (at.MolalitiesMolPerKg[2] + at.MolalitiesMolPerKg[4]) / a, 1e-12);
    }

    // 2 A = A2 alone: [A] is the positive root of 2 K x² + x − t.
    [Theory]
    [InlineData(0.1, 2)]
    [InlineData(1e-8, 12)]
    [InlineData(5, -3)]
    public void Speciation_of_a_dimer_is_the_root_of_its_quadratic(double total, double log10K)
    {
        var dimer = new Equilibrium(
            [Constraint.Total(total)], [new Species([new Term(0, 1)], 0, 0, 0), new Species([new Term(0, 2)], 0, 0, log10K)], Water);
        var k = Math.Pow(10, log10K);
        var single = 2 * total / (1 + Math.Sqrt(1 + (8 * k * total)));

        Assert.Equal(1, Speciation.At(dimer, new IdealModel(), 7).MolalitiesMolPerKg[2] / single, 1e-12);
    }

    // An acid held at a fixed activity beside water: h² = Kw + K a, in closed form.
    [Theory]
    [InlineData(-5, -6.35)]
    [InlineData(-1, -1)]
    [InlineData(-12, -9)]
    public void Solve_acid_at_a_fixed_activity_is_the_closed_form(double log10Activity, double log10K)
    {
        var open = new Equilibrium(
            [Constraint.FixedActivity(log10Activity)],
            [new Species([new Term(0, 1)], 0, 0, 0), new Species([new Term(0, 1)], -1, -1, log10K)],
            Water);

        var outcome = new ExactSolver().Solve(open, new IdealModel());

        Assert.Equal(-0.5 * Math.Log10(1e-14 + Math.Pow(10, log10Activity + log10K)), outcome.PH, 1e-12);
    }

    // The same mixture over both paths: a complex of two components that hardly forms makes the coupled path take it.
    [Theory]
    [InlineData("ideal")]
    [InlineData("bates-guggenheim")]
    public void Solve_where_nothing_couples_is_what_the_ladders_give(string name)
    {
        var model = ActivityModels.Find(name)!;
        for (var i = 0; i < 2_000; i++)
        {
            var ladders = RandomMixtures.At(i).ToEquilibrium();
            if (ladders.Constraints.Count < 2 || ladders.Constraints.Any(one => one.Value <= 0))
            {
                continue;
            }

            var first = ladders.Species.First(one => one.Terms[0].Component == 0 && one.Protons == 0);
            var second = ladders.Species.First(one => one.Terms[0].Component == 1 && one.Protons == 0);
            var both = new Species([new Term(0, 1), new Term(1, 1)], 0, first.Charge + second.Charge, -250);
            var coupled = new Equilibrium(ladders.Constraints, [.. ladders.Species, both], ladders.Solvent);
            Assert.False(coupled.IsLadders);
            var expected = new ExactSolver().Solve(ladders, model);
            var outcome = new ExactSolver().Solve(coupled, model);
            var allowed = 1e-12 + (2 * expected.InputResolution);
            Assert.True(Math.Abs(expected.PH - outcome.PH) <= allowed, FormattableString.Invariant($"{i}: {expected.PH:R} and {outcome.PH:R}"));
        }
    }

    [Theory]
    [InlineData(1)]
    [InlineData(-1)]
    public void Equilibrium_with_a_charged_reservoir_is_refused(int charge) => Assert.Throws<ArgumentException>(() => new Equilibrium(
        [Constraint.FixedActivity(-3)], [new Species([new Term(0, 1)], 0, charge, 0)], Water));

    [Fact]
    public void Equilibrium_whose_complex_has_the_wrong_charge_is_refused() => Assert.Throws<ArgumentException>(() => new Equilibrium(
        [Constraint.Total(1), Constraint.Total(1)],
        [new Species([new Term(0, 1)], 0, 1, 0), new Species([new Term(1, 1)], 0, -1, 0), new Species([new Term(0, 1), new Term(1, 1)], 0, 1, 2)],
        Water));

    // A component of which there is nothing takes its complexes with it.
    [Fact]
    public void Solve_without_one_component_is_what_the_rest_gives()
    {
        var mixture = MixtureInput.Of(new LadderInput(0.1, 0, 4.7), new LadderInput(0.05, 1));
        var rest = mixture.ToEquilibrium();
        var more = new Equilibrium(
            [.. rest.Constraints, Constraint.Total(0)],
            [.. rest.Species, new Species([new Term(2, 1)], 0, 2, 0), new Species([new Term(2, 1), new Term(0, 1)], 0, 1, 5)],
            rest.Solvent);

        Assert.Equal(new ExactSolver().Solve(rest, new IdealModel()).PH, new ExactSolver().Solve(more, new IdealModel()).PH, 1e-12);
        Assert.Equal(0, Speciation.At(more, new IdealModel(), 5).MolalitiesMolPerKg[^1]);
    }

    private static double WorstBalance(Equilibrium system, Speciation at)
    {
        double worst = 0;
        for (var c = 0; c < system.Constraints.Count; c++)
        {
            var constraint = system.Constraints[c];
            var held = system.Species.Select((one, i) => one.Terms.Where(term => term.Component == c).Sum(term => term.Count) * at.MolalitiesMolPerKg[i + 2]).Sum();
            worst = constraint.Kind == ConstraintKind.Total ? Math.Max(worst, Math.Abs((held / constraint.Value) - 1)) : worst;
        }

        return worst;
    }
}
