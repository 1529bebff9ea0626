using System;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Tests.Equilibria;
using Xunit;

namespace Lyonium.Tests.Solvers;

/// <summary>The short-cuts own up: 10,000 hard and 10,000 gentle random mixtures, with and without activity coefficients, no exception.</summary>
public sealed class ShortCutRandomTests
{
    public static TheoryData<bool, string> Sets { get; } =
        new() { { false, "ideal" }, { false, "davies" }, { true, "ideal" }, { true, "davies" } };

    [Theory]
    [MemberData(nameof(Sets))]
    public void DominantAcid_off_by_more_than_0_02_an_assumption_is_not_held(bool isGentle, string model)
    {
        var off = MethodFigures.Of(isGentle, Solving.Dominant, Model(model)).Answers.Where(one => Math.Abs(one.Deviation) > 0.02).ToArray();

        Assert.True(off.Length > 500, "Too few were off for the test to mean anything: " + off.Length);
        Assert.All(off, one => Assert.True(one.Outcome.Assumptions.Any(assumption => !assumption.Held), one.ToString()));
    }

    // The sum of all that is neglected is an assumption of its own: it alone must tell, and not cry out where the answer is right.
    [Theory]
    [MemberData(nameof(Sets))]
    public void DominantAcid_all_neglected_tells_the_size_of_the_deviation(bool isGentle, string model)
    {
        foreach (var one in MethodFigures.Of(isGentle, Solving.Dominant, Model(model)).Answers)
        {
            var all = one.Outcome.Assumptions.Single(assumption => assumption.Code == "all-neglected");
            Assert.Equal(0.02, all.Limit);
            Assert.True(all.Figure >= Math.Abs(one.Deviation) - 1e-9, one.ToString());
            Assert.True(all.Figure <= Math.Max(0.001, 2.5 * Math.Abs(one.Deviation)) + 1e-9, one.ToString());
            Assert.True(all.Held == (all.Figure <= 0.02), one.ToString());
        }
    }

    [Theory]
    [MemberData(nameof(Sets))]
    public void SuccessiveApproximation_settled_within_0_001_of_exact(bool isGentle, string model)
    {
        var figures = MethodFigures.Of(isGentle, Solving.Successive, Model(model));

        Assert.True(figures.Answered > 3000, "Too few settled for the test to mean anything: " + figures.Answered);
        Assert.All(figures.Answers, one => Assert.True(Math.Abs(one.Deviation) <= 0.001, one.ToString()));
    }

    // An estimate, not a bound: on these mixtures the error is at most 6.5 times the figure.
    [Theory]
    [MemberData(nameof(Sets))]
    public void SuccessiveApproximation_figures_kept_tells_the_error_left(bool isGentle, string model) =>
        Assert.All(MethodFigures.Of(isGentle, Solving.Successive, Model(model)).Answers, one =>
        {
            var assumption = Assert.Single(one.Outcome.Assumptions);
            Assert.True(assumption.Held && assumption.Figure <= assumption.Limit, one.ToString());
            Assert.True(Math.Abs(one.Deviation) <= (10 * assumption.Figure) + 1e-10, $"{assumption.Figure}: {one}");
        });

    // The plain rule, to stop when a correction is below the figures wanted, stops early where corrections shrink slowly or a small one
    // follows by chance. Such mixtures are there, and the method gets them right or says that it did not settle.
    [Fact]
    public void SuccessiveApproximation_a_case_that_stops_moving_early_is_caught()
    {
        const double smallest = 0.5e-3 / 2.302585092994046;
        var caught = 0;
        foreach (var one in MethodFigures.Of(isGentle: false, Solving.Successive, Solving.Ideal).All)
        {
            var plain = one.Outcome.Iterates.Skip(1).FirstOrDefault(iterate => Math.Abs(iterate.Correction) <= smallest);
            if (plain is null || Math.Abs(plain.PH - one.Exact) <= 0.001)
            {
                continue;
            }

            caught++;
            Assert.True(!one.HasAnswer || Math.Abs(one.Deviation) <= 0.001, one.ToString());
        }

        Assert.True(caught > 0, "No mixture of the set stops moving early.");
    }

    [Theory]
    [MemberData(nameof(Sets))]
    public void ShortCuts_without_an_answer_give_a_reason_and_no_number(bool isGentle, string model)
    {
        foreach (var method in new ISolver[] { Solving.Dominant, Solving.Successive })
        {
            foreach (var one in MethodFigures.Of(isGentle, method, Model(model)).All.Where(one => !one.HasAnswer))
            {
                Assert.True(double.IsNaN(one.Outcome.PH) && double.IsNaN(one.Outcome.BracketLow) && double.IsNaN(one.Outcome.BracketHigh), one.ToString());
                Assert.True(one.Outcome.Status is SolverStatus.DoesNotApply or SolverStatus.NotSettled, one.ToString());
                Assert.False(string.IsNullOrWhiteSpace(one.Outcome.Reason), one.ToString());
                var hasNone = one.Outcome.Status == SolverStatus.DoesNotApply || one.Outcome.Reason == "the activity coefficients do not settle";
                Assert.True(hasNone || method == Solving.Dominant || one.Outcome.Iterates.Count > 0, one.ToString());
            }
        }
    }

    [Theory]
    [MemberData(nameof(Sets))]
    public void ShortCuts_components_in_another_order_same_answer(bool isGentle, string model)
    {
        foreach (var method in new ISolver[] { Solving.Dominant, Solving.Successive })
        {
            foreach (var one in MethodFigures.Of(isGentle, method, Model(model)).All.Take(2000))
            {
                var turned = method.Solve(new MixtureInput(one.Mixture.Ladders.Reverse().ToArray()).ToEquilibrium(), Model(model));
                Assert.True(turned.Status == one.Outcome.Status, $"{turned.Status}: {one}");
                Assert.True(!one.HasAnswer || Math.Abs(turned.PH - one.Outcome.PH) <= 1e-9, $"{turned.PH}: {one}");
            }
        }
    }

    // The mirror image: acids and bases, h and hydroxide change places, so pH becomes pKw − pH.
    [Fact]
    public void ShortCuts_mirrored_mixture_mirrored_answer()
    {
        foreach (var method in new ISolver[] { Solving.Dominant, Solving.Successive })
        {
            foreach (var one in MethodFigures.Of(isGentle: true, method, Solving.Ideal).All.Take(2000))
            {
                var mirrored = method.Solve(new MixtureInput(one.Mixture.Ladders.Select(Mirror).ToArray()).ToEquilibrium(), Solving.Ideal);
                Assert.True(mirrored.Status == one.Outcome.Status, $"{mirrored.Status} {mirrored.Reason}: {one}");
                Assert.True(!one.HasAnswer || Math.Abs(mirrored.PH + one.Outcome.PH - MixtureInput.TextbookPKw) <= 1e-9, $"{mirrored.PH}: {one}");
            }
        }
    }

    private static LadderInput Mirror(LadderInput one) => new(
        one.MolPerKg,
        one.PKa.Length - one.TopCharge,
        one.PKa.Select(pKa => MixtureInput.TextbookPKw - pKa).Reverse().ToArray());

    private static IActivityModel Model(string name) => name == "ideal" ? Solving.Ideal : Solving.Davies;
}
