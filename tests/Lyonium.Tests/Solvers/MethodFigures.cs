using System;
using System.Collections.Concurrent;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Tests.Equilibria;

namespace Lyonium.Tests.Solvers;

/// <summary>How a method does on many mixtures, beside the exact one; each combination is computed once for all tests.</summary>
internal sealed class MethodFigures
{
    public const int Mixtures = 10_000;

    private static readonly ConcurrentDictionary<(bool IsGentle, string Method, string Model), Lazy<MethodFigures>> Computed = new();

    private MethodFigures(IReadOnlyList<MethodFigure> all) => All = all;

    public IReadOnlyList<MethodFigure> All { get; }

    public IEnumerable<MethodFigure> Answers => All.Where(one => one.HasAnswer);

    /// <summary>The gentle mixtures of one weak acid or base alone; the whole must be of the gentle set.</summary>
    public MethodFigures Singles => new(All.Where(one => GentleMixtures.IsSingle(one.Index)).ToArray());

    public int Answered => Answers.Count();

    /// <summary>The largest deviation of an answer from the exact one, in pH.</summary>
    public double Worst => Answers.Max(one => Math.Abs(one.Deviation));

    /// <summary>The first 10,000 mixtures of the hard or of the gentle set.</summary>
    public static MethodFigures Of(bool isGentle, ISolver method, IActivityModel model) => Computed
        .GetOrAdd((isGentle, method.Name, model.Name), _ => new Lazy<MethodFigures>(() => Compute(isGentle, method, model))).Value;

    public int With(SolverStatus status) => All.Count(one => one.Outcome.Status == status);

    public int Within(double tolerance) => Answers.Count(one => Math.Abs(one.Deviation) <= tolerance);

    private static MethodFigures Compute(bool isGentle, ISolver method, IActivityModel model) =>
        new(Enumerable.Range(0, Mixtures).AsParallel().AsOrdered().Select(index =>
        {
            var mixture = isGentle ? GentleMixtures.At(index) : RandomMixtures.At(index);
            var exact = Solving.Solved(mixture, model).PH;
            var outcome = method.Solve(mixture.ToEquilibrium(), model);
            return new MethodFigure(index, mixture, outcome, exact);
        }).ToArray());
}

/// <summary>One mixture, what a method made of it, and the exact pH.</summary>
internal sealed record MethodFigure(int Index, MixtureInput Mixture, SolverOutcome Outcome, double Exact)
{
    public bool HasAnswer => Outcome.Status == SolverStatus.Solved;

    public double Deviation => Outcome.PH - Exact;

    /// <summary>A failing mixture by its index and as text.</summary>
    public override string ToString() =>
        FormattableString.Invariant($"[{Index}] {Outcome.Status} {Outcome.PH:R}, exact {Exact:R}, {Outcome.Reason}: {Mixture}");
}
