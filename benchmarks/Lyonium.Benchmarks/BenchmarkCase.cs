using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Solvers;
using MathNet.Numerics.RootFinding;

namespace Lyonium.Benchmarks;

/// <summary>One mixture, solved by the exact method and by two general root finders on the same charge balance.</summary>
/// <remarks>
/// The peers have their constants as numbers already, as a careful programmer would. Brent searches in pH, where the balance has one zero
/// and no pole; Newton searches in ln h with the analytic derivative. Both are asked for 1e-12 in pH: near what their plain sums can give.
/// The exact method also returns a certified bracket, which they do not.
/// </remarks>
public sealed class BenchmarkCase
{
    private const double Kw = 1e-14;
    private const double Accuracy = 1e-12;
    private readonly (double Total, int TopCharge, double[] Constants)[] _components;
    private readonly Equilibrium _equilibrium;
    private readonly ExactSolver _solver = new();
    private readonly IdealModel _ideal = new();
    private readonly DaviesModel _davies = new();

    private BenchmarkCase(string name, params (double Total, int TopCharge, double[] PKa)[] components)
    {
        Name = name;
        _components = components
            .Select(one => (one.Total, one.TopCharge, one.PKa.Select(pKa => Math.Pow(10, -pKa)).ToArray()))
            .ToArray();
        _equilibrium = ToEquilibrium(components);
    }

    public static BenchmarkCase WeakAcidsAndStrong { get; } = new(
        "3 weak, 1 strong",
        (0.02, 0, [3.75]),
        (0.05, 0, [4.756]),
        (0.01, 0, [9.24]),
        (0.001, -1, []));

    public static BenchmarkCase FourSteps { get; } = new(
        "four-step ladder",
        (0.02, 0, [2.0, 2.68, 6.11, 10.17]),
        (0.05, 1, []));

    public static IReadOnlyList<BenchmarkCase> All { get; } = [WeakAcidsAndStrong, FourSteps];

    public string Name { get; }

    public double Exact() => _solver.Solve(_equilibrium, _ideal).PH;

    public double ExactDavies() => _solver.Solve(_equilibrium, _davies).PH;

    public double MathNetBrent() => Brent.FindRoot(pH => Charge(Math.Pow(10, -pH)).Value, -2, 16, Accuracy, 200);

    public double MathNetNewton() =>
        -RobustNewtonRaphson.FindRoot(
            logH => Charge(Math.Exp(logH)).Value, logH => Charge(Math.Exp(logH)).Derivative, -16 * Math.Log(10), 2 * Math.Log(10), Accuracy, 200)
        / Math.Log(10);

    public override string ToString() => Name;

    private static Equilibrium ToEquilibrium((double Total, int TopCharge, double[] PKa)[] components)
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
            components.Select(one => Constraint.Total(one.Total)).ToArray(), species, new Solvent(298.15, 14, 0.51, 0.328));
    }

    // The charge and its derivative with respect to ln h.
    private (double Value, double Derivative) Charge(double hydrogen)
    {
        var value = hydrogen - (Kw / hydrogen);
        var derivative = hydrogen + (Kw / hydrogen);
        foreach (var (total, topCharge, constants) in _components)
        {
            double amount = 1, sum = 1, lost = 0, lostSquared = 0;
            for (var j = 0; j < constants.Length; j++)
            {
                amount *= constants[j] / hydrogen;
                sum += amount;
                lost += (j + 1) * amount;
                lostSquared += (j + 1) * (j + 1) * amount;
            }

            lost /= sum;
            value += total * (topCharge - lost);
            derivative += total * ((lostSquared / sum) - (lost * lost));
        }

        return (value, derivative);
    }
}
