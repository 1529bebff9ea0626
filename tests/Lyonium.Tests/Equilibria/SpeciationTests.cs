using System;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Tests.Solvers;
using Xunit;

namespace Lyonium.Tests.Equilibria;

/// <summary>What a speciation says, checked by the laws it must obey and not by how it was found.</summary>
public sealed class SpeciationTests
{
    private const int Mixtures = 2_000;

    [Theory]
    [InlineData("ideal")]
    [InlineData("davies")]
    public void At_the_answer_mass_and_charge_balance(string modelName)
    {
        var model = Model(modelName);
        foreach (var mixture in RandomMixtures.Take(Mixtures))
        {
            var equilibrium = mixture.ToEquilibrium();
            var speciation = Speciation.At(equilibrium, model, Solving.Solved(mixture, model).PH);
            Rational charge = 0, magnitude = 0;
            var totals = new Rational[mixture.Ladders.Count];
            Array.Fill(totals, 0);
            for (var i = 0; i < equilibrium.SpeciesCount; i++)
            {
                var molality = Rational.Exactly(speciation.MolalitiesMolPerKg[i]);
                charge += equilibrium.Charges[i] * molality;
                magnitude += Math.Abs(equilibrium.Charges[i]) * molality;
                if (i >= Equilibrium.WaterIons)
                {
                    totals[equilibrium.Species[i - Equilibrium.WaterIons].Terms[0].Component] += molality;
                }
            }

            AssertWithin(charge, magnitude, 1e-12, "charge of " + mixture);
            for (var i = 0; i < totals.Length; i++)
            {
                var total = Rational.Exactly(mixture.Ladders[i].MolPerKg);
                AssertWithin(totals[i] - total, total, 2e-15, $"mass of component {i} of {mixture}");
            }
        }
    }

    // K = a(less protonated) · a(H+) / a(more protonated) for each step, with the speciation's own molalities and coefficients.
    [Theory]
    [InlineData("ideal")]
    [InlineData("davies")]
    public void At_random_pH_laws_of_mass_action(string modelName)
    {
        var model = Model(modelName);
        var random = new Random(RandomMixtures.Seed);
        foreach (var mixture in RandomMixtures.Take(Mixtures))
        {
            var pH = 14 * random.NextDouble();
            var speciation = Speciation.At(mixture.ToEquilibrium(), model, pH);
            double Log10Activity(int i) => Math.Log10(speciation.MolalitiesMolPerKg[i]) + speciation.Log10Gammas[i];
            Assert.Equal(-pH, Log10Activity(Equilibrium.HydrogenIon), 1e-12);
            Assert.Equal(pH - mixture.PKw, Log10Activity(Equilibrium.HydroxideIon), 1e-12);
            var first = Equilibrium.WaterIons;
            foreach (var ladder in mixture.Ladders)
            {
                for (var protons = 1; protons <= ladder.PKa.Length; protons++)
                {
                    var pKa = Log10Activity(first + protons) - Log10Activity(first + protons - 1) + pH;
                    Assert.Equal(ladder.PKa[^protons], pKa, 1e-11);
                }

                first += ladder.PKa.Length + 1;
            }
        }
    }

    // Recomputed from the molalities as ½ Σ z² m, and the Davies equation written out anew.
    [Fact]
    public void At_the_answer_Davies_ionic_strength_and_coefficients_agree_with_each_other()
    {
        foreach (var mixture in RandomMixtures.Take(Mixtures))
        {
            var equilibrium = mixture.ToEquilibrium();
            var speciation = Speciation.At(equilibrium, Solving.Davies, Solving.Solved(mixture, Solving.Davies).PH);
            double ionicStrength = 0;
            for (var i = 0; i < equilibrium.SpeciesCount; i++)
            {
                ionicStrength += 0.5 * Math.Pow(equilibrium.Charges[i], 2) * speciation.MolalitiesMolPerKg[i];
            }

            Assert.Equal(ionicStrength, speciation.IonicStrengthMolPerKg, 1e-13 * ionicStrength);
            for (var i = 0; i < equilibrium.SpeciesCount; i++)
            {
                var root = Math.Sqrt(ionicStrength);
                var expected = -MixtureInput.Slope * Math.Pow(equilibrium.Charges[i], 2) * ((root / (1 + root)) - (0.3 * ionicStrength));
                Assert.Equal(expected, speciation.Log10Gammas[i], 1e-12);
            }
        }
    }

    // A model may look at every molality. One ladder loses the charge that the other gains, so the ionic strength hardly moves while the
    // coefficients do.
    [Theory]
    [InlineData(0.4)]
    [InlineData(-0.4)]
    [InlineData(0.8)]
    [InlineData(-0.8)]
    public void At_model_of_single_molalities_coefficients_agree_with_the_molalities(double perMolPerKg)
    {
        var equilibrium = MixtureInput.Of(
            new LadderInput(0.5, 0, 7), new LadderInput(0.5, 1, 7), new LadderInput(0.3, 1), new LadderInput(0.3, -1)).ToEquilibrium();
        var model = new MolalityModel(perMolPerKg);

        var speciation = Speciation.At(equilibrium, model, 7.3);

        var again = new double[equilibrium.SpeciesCount];
        model.Log10Gammas(equilibrium, speciation.IonicStrengthMolPerKg, speciation.MolalitiesMolPerKg.ToArray(), again);
        Assert.All(again.Zip(speciation.Log10Gammas), pair => Assert.Equal(pair.First, pair.Second, 1e-14));
        Assert.True(Math.Abs(again[Equilibrium.WaterIons]) > 0.01, "The model must matter for the test to mean anything.");
    }

    [Fact]
    public void At_charge_falls_with_pH()
    {
        foreach (var mixture in RandomMixtures.Take(500))
        {
            var equilibrium = mixture.ToEquilibrium();
            var charges = Enumerable.Range(0, 141).Select(i => Speciation.At(equilibrium, Solving.Ideal, i * 0.1).ChargeMolPerKg).ToArray();
            Assert.All(charges.Zip(charges.Skip(1)), pair => Assert.True(pair.Second < pair.First, mixture.ToString()));
        }
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(300.1)]
    [InlineData(-300.1)]
    [InlineData(double.PositiveInfinity)]
    public void At_pH_out_of_range_throws(double pH) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Speciation.At(MixtureInput.Of().ToEquilibrium(), Solving.Ideal, pH));

    [Fact]
    public void At_model_without_a_number_throws() =>
        Assert.Throws<ArithmeticException>(() => Speciation.At(
            MixtureInput.Of(new LadderInput(1, 0, 5)).ToEquilibrium(), new OddModel((_, gammas) => gammas[2] = double.NaN), 7));

    private static IActivityModel Model(string name) => name == "ideal" ? Solving.Ideal : Solving.Davies;

    private static void AssertWithin(Rational difference, Rational size, double relative, string what) =>
        Assert.True((difference.Abs() - (Rational.Exactly(relative) * size)).Sign <= 0, what);

    private sealed class MolalityModel(double perMolPerKg) : IActivityModel
    {
        public string Name => "of single molalities";

        public double HighestIonicStrengthMolPerKg => 1;

        public IonData Uses => IonData.None;

        public string Source => "a test";

        public void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas)
        {
            for (var i = 0; i < log10Gammas.Length; i++)
            {
                log10Gammas[i] = perMolPerKg * molalities[(i + 1) % molalities.Length];
            }
        }
    }
}
