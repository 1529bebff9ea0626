using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Solvers;
using Xunit;

namespace Lyonium.PublishedValues;

/// <summary>Identities that hold exactly in an ideal solution; each test names its own.</summary>
/// <remarks>Textbook algebra of the mass and charge balances, so the tolerance is 1e-9 and not that of a measurement.</remarks>
public sealed class ExactIdentitiesTests
{
    private const double PKw = 14;
    private const double Kw = 1e-14;
    private const double Tolerance = 1e-9;

    /// <summary>Identity "strong acid": [H] = C/2 + √(C²/4 + Kw).</summary>
    [Theory]
    [InlineData(1e-12)]
    [InlineData(1e-9)]
    [InlineData(1e-8)]
    [InlineData(1e-7)]
    [InlineData(1e-3)]
    [InlineData(5)]
    public void Strong_acid_and_its_mirror_strong_base(double total)
    {
        var hydrogen = (total / 2) + Math.Sqrt((total * total / 4) + Kw);

        Assert.Equal(-Math.Log10(hydrogen), PH(Of(total, -1)), Tolerance);
        Assert.Equal(PKw + Math.Log10(hydrogen), PH(Of(total, 1)), Tolerance);
    }

    /// <summary>Identity "strong acid", its published figure: 1e-8 mol/kg at pKw 14.000 has pH 6.9783.</summary>
    [Fact]
    public void Strong_acid_of_1e_8_printed_figure() =>
        Assert.Equal("6.9783", PH(Of(1e-8, -1)).ToString("F4", CultureInfo.InvariantCulture));

    /// <summary>
    /// Identity "half_equivalence": with [HA] = [A⁻], p[H] = pK. The strong base is half the acid less what water's ions take,
    /// so that the two forms are equal to the last digit.
    /// </summary>
    [Theory]
    [InlineData(3.2, 0.1)]
    [InlineData(4.756, 0.01)]
    [InlineData(7.2, 1e-6)]
    [InlineData(9.24, 0.05)]
    [InlineData(11.5, 0.02)]
    public void Half_equivalence_pH_is_pK(double pKa, double total)
    {
        var strongBase = (total / 2) - Math.Pow(10, -pKa) + Math.Pow(10, pKa - PKw);

        Assert.Equal(pKa, PH(Of(total, 0, pKa), Of(strongBase, 1)), Tolerance);
    }

    /// <summary>Identity "isoionic": [H]² = (K1 K2 m + K1 Kw) / (K1 + m), m the equilibrium amount of the ampholyte HA⁻.</summary>
    [Theory]
    [InlineData(6.35, 10.33, 0.01)]
    [InlineData(2.35, 9.78, 0.1)]
    [InlineData(1.3, 4.27, 1e-4)]
    [InlineData(4.2, 5.6, 0.05)]
    [InlineData(7, 7.05, 3)]
    public void Isoionic_ampholyte_by_its_equilibrium_amount(double pK1, double pK2, double total)
    {
        // The salt NaHA.
        var equilibrium = Mixture(Of(total, 0, pK1, pK2), Of(total, 1));
        var outcome = Solve(equilibrium);
        var ampholyte = Speciation.At(equilibrium, new IdealModel(), outcome.PH).MolalitiesMolPerKg[Equilibrium.WaterIons + 1];
        var (k1, k2) = (Math.Pow(10, -pK1), Math.Pow(10, -pK2));

        var hydrogenSquared = ((k1 * k2 * ampholyte) + (k1 * Kw)) / (k1 + ampholyte);

        Assert.Equal(-0.5 * Math.Log10(hydrogenSquared), outcome.PH, Tolerance);
        Assert.True(ampholyte < total, "The ampholyte takes and gives protons, so less of it is left than was put in.");
    }

    /// <summary>
    /// Identity "van_slyke": β = dC(base)/dpH = ln10 ([H] + [OH] + Σ C K [H] / (K + [H])²). Two solves to either side of the pH give it to
    /// the square of their distance; Richardson's extrapolation leaves the fourth power, so 1e-9 of β is within reach.
    /// </summary>
    [Theory]
    [InlineData(0.03)]
    [InlineData(0.055)]
    [InlineData(0.07)]
    public void Van_Slyke_buffer_value(double strongBase)
    {
        (double Total, double PKa)[] acids = [(0.05, 4.756), (0.02, 6.4), (0.03, 9.24)];
        double At(double added) => PH([.. acids.Select(one => Of(one.Total, 0, one.PKa)), Of(strongBase + added, 1)]);
        double Slope(double step) => (At(step) - At(-step)) / (2 * step);
        const double step = 2e-5;
        var derivative = ((4 * Slope(step)) - Slope(2 * step)) / 3;
        var hydrogen = Math.Pow(10, -At(0));

        var buffer = hydrogen + (Kw / hydrogen)
            + acids.Sum(one => one.Total * Math.Pow(10, -one.PKa) * hydrogen / Math.Pow(Math.Pow(10, -one.PKa) + hydrogen, 2));

        Assert.Equal(1, Math.Log(10) * buffer * derivative, 1e-8);
    }

    /// <summary>Identity "van_slyke": the protolyte's term alone is at most ln10/4 C = 0.5756 C, at p[H] = pK.</summary>
    [Fact]
    public void Van_Slyke_protolyte_term_peaks_at_pK()
    {
        const double total = 1;
        const double pKa = 7;
        var mixture = Mixture(Of(total, 0, pKa));
        double Term(double pH)
        {
            const double step = 1e-4;
            double Anion(double at) => Speciation.At(mixture, new IdealModel(), at).MolalitiesMolPerKg[Equilibrium.WaterIons];
            return (Anion(pH + step) - Anion(pH - step)) / (2 * step);
        }

        Assert.Equal(Math.Log(10) / 4 * total, Term(pKa), 1e-7);
        Assert.Equal("0.5756", Term(pKa).ToString("F4", CultureInfo.InvariantCulture));
        Assert.True(Term(pKa - 0.05) < Term(pKa) && Term(pKa + 0.05) < Term(pKa));
    }

    /// <summary>
    /// Identity "Gran", approximate: before the equivalence point of a strong acid with a strong base, (V0 + V) 10^-pH is linear in V and
    /// meets zero there. Water's ions bend it by [OH] alone, which at pH below 3 is under 1e-8 of it.
    /// </summary>
    [Fact]
    public void Gran_function_of_strong_acid_is_linear_and_meets_zero_at_equivalence()
    {
        const double acidVolume = 0.1, acid = 0.02, titrant = 0.1;
        double Gran(double volume)
        {
            var together = acidVolume + volume;
            return together * Math.Pow(10, -PH(Of(acid * acidVolume / together, -1), Of(titrant * volume / together, 1)));
        }

        var (first, second) = (Gran(0.002), Gran(0.012));
        var zero = 0.002 + (0.010 * first / (first - second));

        Assert.Equal(acid * acidVolume / titrant, zero, 1e-8);
        Assert.Equal((first + second) / 2, Gran(0.007), 1e-9 * first);
    }

    private static (double Total, int TopCharge, double[] PKa) Of(double total, int topCharge, params double[] pKa) => (total, topCharge, pKa);

    private static double PH(params (double Total, int TopCharge, double[] PKa)[] components) => Solve(Mixture(components)).PH;

    private static SolverOutcome Solve(Equilibrium equilibrium)
    {
        var outcome = new ExactSolver().Solve(equilibrium, new IdealModel());
        Assert.Equal(SolverStatus.Solved, outcome.Status);
        return outcome;
    }

    private static Equilibrium Mixture(params (double Total, int TopCharge, double[] PKa)[] components)
    {
        var species = new List<Species>();
        for (var component = 0; component < components.Length; component++)
        {
            var (_, topCharge, pKa) = components[component];
            double log10K = 0;
            for (var protons = 0; protons <= pKa.Length; protons++)
            {
                log10K += protons == 0 ? 0 : pKa[^protons];
                species.Add(new Species([new Term(component, 1)], protons, topCharge - pKa.Length + protons, log10K));
            }
        }

        return new Equilibrium(
            components.Select(one => Constraint.Total(one.Total)).ToArray(), species, new Solvent(298.15, PKw, 0.51, 0.328));
    }
}
