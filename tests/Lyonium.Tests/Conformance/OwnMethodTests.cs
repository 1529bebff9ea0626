using System;
using System.Linq;
using Lyonium.Conformance;
using Lyonium.Equilibria;
using Lyonium.Predictions;
using Lyonium.Recipes;
using OwnMethod;
using Xunit;

namespace Lyonium.Tests.Conformance;

/// <summary>
/// The method of the guide, compiled from the guide's own file. <c>.ci/run</c> builds its project against the packed package as well.
/// </summary>
public sealed class OwnMethodTests
{
    private static readonly Recipe Vinegar = Recipe.Named("vinegar").Pour("10 mL", Stock.Of("acetic acid", "0.1 mol/L")).PourWater("90 mL").Build();

    [Fact]
    public void Predict_with_a_method_from_outside_names_it_and_is_near_the_exact_answer()
    {
        var prediction = new Predictor().With(new HalvingSolver()).Predict(Vinegar);
        Assert.Equal("halving", prediction.Method);
        Assert.Equal(new Predictor().Predict(Vinegar).PH, prediction.PH, 0.0005);
    }

    [Fact]
    public void Compare_with_a_method_from_outside_has_a_row_for_it()
    {
        var comparison = new Predictor().With(new HalvingSolver()).TryCompare(Vinegar).Value;
        Assert.Equal(["exact", "successive-approximation", "dominant-acid", "halving"], comparison.Rows.Select(row => row.Method));
        Assert.True(comparison.Rows[3].WithinTolerance);
    }

    [Fact]
    public void Check_method_of_the_guide_passes_the_conformance_kit() =>
        Assert.Equal([], SolverConformance.Check(new HalvingSolver()).Where(one => !one.Passed).Select(one => one.ToString()));

    // A record pins a method by its name; two of one name could not be told apart.
    [Fact]
    public void With_a_method_that_calls_itself_exact_is_refused()
    {
        var refused = Assert.Throws<ArgumentException>(() => new Predictor().With(new NamedExact()));
        Assert.Contains("'exact'", refused.Message, StringComparison.Ordinal);
        Assert.Contains(nameof(NamedExact), refused.Message, StringComparison.Ordinal);
    }

    private sealed class NamedExact : ISolver
    {
        public string Name => "exact";

        public SolverOutcome Solve(Equilibrium equilibrium, IActivityModel model) => SolverOutcome.Answer(7);
    }
}
