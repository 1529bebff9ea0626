using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;

namespace Lyonium.Solvers;

/// <summary>The dominant-acid short-cut: the single largest giver of protons against the single largest taker, dissociation neglected.</summary>
/// <remarks>
/// <para>
/// The protons at hand fill the dissociation steps from the highest pKa on. An excess of strong acid or base beyond them is the answer
/// itself; a step that is partly filled is a buffer pair, h = K · filled / empty; filling that ends between two steps gives
/// h = √(most protons offered / most protons wanted): √(K c) for a weak acid, √(K₁ K₂) for an ampholyte, √(Kw K / c) for a weak base.
/// </para>
/// <para>
/// Range of use: one protolyte rules, it is dissociated by less than 5 %, and it gives many more protons than water. Each of these is
/// checked and reported with its figure (limits of 5 % are common practice); <c>all-neglected</c> bounds the error of the answer and
/// always tells when it is beyond 0.02. An answer that has more dissociated than there is does not apply. Activity coefficients are
/// taken at the ionic strength of the answer. Stateless and thread-safe.
/// </para>
/// </remarks>
public sealed class DominantAcidSolver : ISolver
{
    private const double Limit = 0.05;
    private const string CommonPractice = "common practice";

    /// <inheritdoc/>
    public string Name => "dominant-acid";

    /// <inheritdoc/>
    public SolverOutcome Solve(Equilibrium equilibrium, IActivityModel model)
    {
        _ = equilibrium ?? throw new ArgumentNullException(nameof(equilibrium));
        _ = model ?? throw new ArgumentNullException(nameof(model));
        var outcome = ShortCut.AtItsOwnIonicStrength(equilibrium, model, Solve);
        return ShortCut.WithAllNeglected(outcome, equilibrium, model);
    }

    private static SolverOutcome Solve(ProtonLevels levels, double log10GammaH)
    {
        var giver = Largest(levels.FilledLevels, level => Alone(level.K, level.Total));
        var taker = Largest(levels.EmptyLevels, level => Alone(levels.IonProduct / level.K, level.Total));
        var offered = Math.Max(levels.IonProduct, giver is { } g ? g.K * g.Total : 0);
        var wanted = Math.Max(1, taker is { } t ? t.Total / t.K : 0);
        var exchanged = Math.Sqrt(offered * wanted);
        var answer = new Answer(levels, giver, taker, log10GammaH);
        if (Math.Abs(levels.Rest) <= exchanged)
        {
            return answer.Between(offered, wanted);
        }

        if (levels.SharedLevel is not { } shared)
        {
            return answer.StrongExcess();
        }

        return answer.Pair(shared);
    }

    private static ProtonLevel? Largest(IEnumerable<ProtonLevel> levels, Func<ProtonLevel, double> protons)
    {
        ProtonLevel? largest = null;
        double most = 0;
        foreach (var level in levels)
        {
            var here = protons(level);
            if (here > most)
            {
                (largest, most) = (level, here);
            }
        }

        return largest;
    }

    // The protons that a level gives alone in water: K · c would mislead where K is near c.
    private static double Alone(double k, double total) => 2 * k * total / (k + Math.Sqrt((k * k) + (4 * k * total)));

    private sealed class Answer(ProtonLevels levels, ProtonLevel? giver, ProtonLevel? taker, double log10GammaH)
    {
        private readonly List<SolverAssumption> _assumptions = [];

        public SolverOutcome StrongExcess()
        {
            var h = levels.Rest > 0 ? levels.Rest : levels.IonProduct / -levels.Rest;
            var scale = Math.Abs(levels.Rest);
            AddOthers(h, scale);
            AddWater(levels.Rest > 0 ? levels.IonProduct / h / scale : h / scale);
            return Give(h, levels.Rest > 0 ? "strong acid in excess: h = excess" : "strong base in excess: h = Kw / excess");
        }

        public SolverOutcome Pair(ProtonLevel pair)
        {
            var filled = levels.Rest > 0 ? levels.Rest : pair.Total + levels.Rest;
            var empty = levels.Rest > 0 ? pair.Total - levels.Rest : -levels.Rest;
            var h = pair.K * filled / empty;
            var scale = Math.Min(filled, empty);
            AddOthers(h, scale, pair);
            AddWater(Math.Abs(h - (levels.IonProduct / h)) / scale);
            return Give(h, "buffer pair: h = K · filled / empty");
        }

        public SolverOutcome Between(double offered, double wanted)
        {
            var h = Math.Sqrt(offered / wanted);
            var scale = Math.Sqrt(offered * wanted);
            var gives = giver is { } g && g.K * g.Total >= levels.IonProduct ? giver : null;
            var takes = taker is { } t && t.Total / t.K >= 1 ? taker : null;
            if (gives is { } acid && !Add("dissociated-fraction", acid.Component, acid.K / h))
            {
                return TooMuch("dissociate");
            }

            if (takes is { } @base && !Add("protonated-fraction", @base.Component, h / @base.K))
            {
                return TooMuch("take a proton");
            }

            AddOthers(h, scale, gives, takes);
            AddWater(Math.Max(gives is null ? 0 : levels.IonProduct / offered, takes is null ? 0 : 1 / wanted));
            Add("rest-of-neutralisation", -1, Math.Abs(levels.Rest) / scale);
            return Give(h, (gives, takes) switch
            {
                (null, null) => "water alone: h = √Kw",
                (not null, null) => "weak acid alone: h = √(K · c)",
                (null, not null) => "weak base alone: h = √(Kw · K / c)",
                _ when gives.Value.Component == takes.Value.Component => "ampholyte: h = √(K₁ · K₂)",
                _ => "weak acid with weak base: h = √(K · c · K′ / c′)",
            });
        }

        private static SolverOutcome TooMuch(string what) =>
            SolverOutcome.Without(SolverStatus.DoesNotApply, $"more would {what} than there is, when dissociation is neglected");

        // Whether it is possible at all; whether it is small enough is for the reader to see.
        private bool Add(string code, int component, double figure)
        {
            _assumptions.Add(new SolverAssumption(code, component, figure, Limit, figure <= Limit, CommonPractice));
            return figure <= 1;
        }

        private void AddWater(double share) => Add("water-share", -1, share);

        // Each other step's protons at this answer, against those that the answer rests on.
        private void AddOthers(double h, double scale, params ProtonLevel?[] except)
        {
            for (var i = 0; i < levels.Levels.Count; i++)
            {
                var level = levels.Levels[i];
                if (except.Any(one => one == level))
                {
                    continue;
                }

                var moved = i < levels.Filled ? level.Total * level.K / (level.K + h) : level.Total * h / (level.K + h);
                var isNextStep = except.Any(one => one?.Component == level.Component);
                if (moved > 0)
                {
                    Add(isNextStep ? "next-step-share" : "other-protolyte-share", level.Component, moved / scale);
                }
            }
        }

        private SolverOutcome Give(double h, string formula) => SolverOutcome.Answer(-Math.Log10(h) - log10GammaH) with
        {
            Assumptions = _assumptions.ToArray(),
            Formula = formula,
        };
    }
}
