using System.Collections.Generic;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Solvers;

namespace Lyonium.Benchmarks;

/// <summary>What one ion pair costs: sodium sulfate beside an acetate buffer, over the ladders, and with NaSO₄⁻ over the coupled path.</summary>
public sealed class PairCase
{
    private readonly ExactSolver _solver = new();
    private readonly Equilibrium _ladders = Build(withPair: false);
    private readonly Equilibrium _coupled = Build(withPair: true);

    public double Ladders(IActivityModel model) => _solver.Solve(_ladders, model).PH;

    public double Coupled(IActivityModel model) => _solver.Solve(_coupled, model).PH;

    public static IReadOnlyList<IActivityModel> Models { get; } = [new IdealModel(), new BatesGuggenheimModel()];

    private static Equilibrium Build(bool withPair)
    {
        var species = new List<Species>
        {
            new([new Term(0, 1)], 0, 1, 0),
            new([new Term(1, 1)], 0, -2, 0),
            new([new Term(1, 1)], 1, -1, 1.987),
            new([new Term(2, 1)], 0, -1, 0),
            new([new Term(2, 1)], 1, 0, 4.756),
        };
        if (withPair)
        {
            species.Add(new Species([new Term(0, 1), new Term(1, 1)], 0, -1, 0.7));
        }

        return new Equilibrium(
            [Constraint.Total(0.3), Constraint.Total(0.1), Constraint.Total(0.15)], species, new Solvent(298.15, 14, 0.51, 0.328));
    }
}
