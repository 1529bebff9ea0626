using System;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Solvers;
using Lyonium.Tests.Solvers;
using Xunit;

namespace Lyonium.Tests.Equilibria;

/// <summary>Derivatives of the pH against differences of exact answers.</summary>
public sealed class SensitivityTests
{
    private const int Mixtures = 400;

    public static TheoryData<string> Models() => new(ActivityModels.All.Select(one => one.Name));

    // Four answers give the difference with an error of the fourth order in the step. A step of 0.003 in pH leaves about 1e-8 of the slope.
    [Theory]
    [MemberData(nameof(Models))]
    public void PHPer_strongBase_agreesWithDifferences(string name)
    {
        var model = ActivityModels.Find(name)!;
        var compared = 0;
        foreach (var mixture in RandomMixtures.Take(Mixtures).Where(IsWithinTheModels))
        {
            var counterIons = mixture.Ladders.Sum(one => one.MolPerKg) + 1e-3;
            Equilibrium With(double base0) => mixture.With(new LadderInput(counterIons + base0, 1)).With(new LadderInput(counterIons, -1)).ToEquilibrium();
            var outcome = new ExactSolver().Solve(With(0), model);
            if (outcome.Status != SolverStatus.Solved || outcome.InputResolution > 1e-12)
            {
                continue;
            }

            var slope = new Sensitivity(With(0), model, Speciation.At(With(0), model, outcome.PH)).PHPer(Change.StrongBase);
            Assert.True(slope > 0, $"{slope:R}, {name}: {mixture}");
            var difference = Difference(step => new ExactSolver().Solve(With(step), model).PH, Math.Min(0.003 / slope, 0.1 * counterIons));
            Assert.True(Math.Abs(slope - difference) <= 1e-5 * Math.Abs(difference), $"{slope:R} against {difference:R}, {name}: {mixture}");
            compared++;
        }

        Assert.True(compared > Mixtures / 4, $"{compared} compared");
    }

    // Each pKa shifted in turn, and pKw.
    [Theory]
    [MemberData(nameof(Models))]
    public void PHPer_constants_agreesWithDifferences(string name)
    {
        var model = ActivityModels.Find(name)!;
        foreach (var mixture in RandomMixtures.Take(Mixtures / 4).Where(IsWithinTheModels))
        {
            var equilibrium = mixture.ToEquilibrium();
            var outcome = new ExactSolver().Solve(equilibrium, model);
            if (outcome.Status != SolverStatus.Solved || outcome.InputResolution > 1e-12)
            {
                continue;
            }

            var sensitivity = new Sensitivity(equilibrium, model, Speciation.At(equilibrium, model, outcome.PH));
            for (var i = 0; i < equilibrium.Species.Count; i++)
            {
                var per = new double[equilibrium.SpeciesCount];
                per[i + Equilibrium.WaterIons] = 1;
                var shifted = i;
                AssertClose(
                    sensitivity.PHPer(new Change { Log10K = per }),
                    Difference(step => PHWith(equilibrium, model, shifted, step, 0), 1e-3),
                    $"{name}, species {i}: {mixture}");
            }

            AssertClose(
                sensitivity.PHPer(new Change { PKw = 1 }), Difference(step => PHWith(equilibrium, model, -1, 0, step), 1e-3), $"{name}, pKw: {mixture}");
        }
    }

    // Coupled components: a constant shifted, and base added.
    [Theory]
    [InlineData("ideal")]
    [InlineData("bates-guggenheim")]
    public void PHPer_coupledSystems_agreesWithDifferences(string name)
    {
        var model = ActivityModels.Find(name)!;
        var compared = 0;
        for (var i = 0; i < 400; i++)
        {
            var system = CoupledSystems.At(i);
            var outcome = new ExactSolver().Solve(system, model);
            if (outcome.Status != SolverStatus.Solved || outcome.InputResolution > 1e-13 || Speciation.At(system, model, outcome.PH).IonicStrengthMolPerKg > 0.5)
            {
                continue;
            }

            var sensitivity = new Sensitivity(system, model, Speciation.At(system, model, outcome.PH));
            var per = new double[system.SpeciesCount];
            var shifted = i % system.Species.Count;
            per[shifted + Equilibrium.WaterIons] = 1;
            AssertClose(sensitivity.PHPer(new Change { Log10K = per }), Difference(step => PHWith(system, model, shifted, step, 0), 1e-3), $"{name}, {i}");
            compared++;
        }

        Assert.True(compared > 50, $"{compared} compared");
    }

    // A strong acid alone: pH = −log m − log γ with I = m, so dpH/db = 1/(ln 10 · m) · (1 + d ln γ/d ln I) for base that takes acid away
    // and leaves the ionic strength. Davies: d log γ/dI = −A (1/(2 √I (1 + √I)²) − 0.3).
    [Fact]
    public void PHPer_strongAcidAlone_isTheFormulaWorkedByHand()
    {
        const double m = 0.01;
        var equilibrium = MixtureInput.Of(new LadderInput(m, -1)).ToEquilibrium();
        var pH = new ExactSolver().Solve(equilibrium, Solving.Davies).PH;
        var slope = new Sensitivity(equilibrium, Solving.Davies, Speciation.At(equilibrium, Solving.Davies, pH)).PHPer(Change.StrongBase);

        // The hydrogen ion lost is the base added and the ionic strength stays: the cation takes its place.
        Assert.Equal(1 / (Math.Log(10) * m), slope, 1e-5 / m);
    }

    [Fact]
    public void PHPer_modelOfSingleMolalities_agreesWithDifferences()
    {
        var mixture = MixtureInput.Of(new LadderInput(0.05, 0, 4.7), new LadderInput(0.02, 1), new LadderInput(0.1, 1), new LadderInput(0.1, -1));
        var model = new MolalityModel();
        var equilibrium = mixture.ToEquilibrium();
        var pH = new ExactSolver().Solve(equilibrium, model).PH;
        var per = new double[equilibrium.SpeciesCount];
        per[3] = 1;

        AssertClose(
            new Sensitivity(equilibrium, model, Speciation.At(equilibrium, model, pH)).PHPer(new Change { Log10K = per }),
            Difference(step => PHWith(equilibrium, model, 1, step, 0), 1e-3),
            model.Name);
    }

    private static bool IsWithinTheModels(MixtureInput mixture) =>
        mixture.Ladders.Sum(one => one.MolPerKg * Math.Max(1, one.PKa.Length * one.PKa.Length)) < 0.2;

    private static double PHWith(Equilibrium equilibrium, IActivityModel model, int species, double shift, double pKwShift) =>
        new ExactSolver().Solve(
            new Equilibrium(
                equilibrium.Constraints,
                equilibrium.Species.Select((one, i) => i == species ? one.WithLog10K(one.Log10K + shift) : one).ToArray(),
                equilibrium.Solvent with { PKw = equilibrium.Solvent.PKw + pKwShift }),
            model).PH;

    private static double Difference(Func<double, double> pH, double step) =>
        ((8 * (pH(step) - pH(-step))) - (pH(2 * step) - pH(-2 * step))) / (12 * step);

    private static void AssertClose(double slope, double difference, string what) =>
        Assert.True(Math.Abs(slope - difference) <= 1e-8 + (1e-6 * Math.Abs(difference)), $"{slope:R} against {difference:R}, {what}");

    // Each species depends on its own molality and on its neighbour's, and none on the ionic strength.
    private sealed class MolalityModel : IActivityModel
    {
        public string Name => "of single molalities";

        public double HighestIonicStrengthMolPerKg => 1;

        public IonData Uses => IonData.None;

        public string Source => "a test";

        public void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas)
        {
            for (var i = 0; i < log10Gammas.Length; i++)
            {
                log10Gammas[i] = (-0.1 * Math.Sqrt(molalities[(i + 1) % molalities.Length])) - (0.2 * molalities[i]);
            }
        }
    }
}
