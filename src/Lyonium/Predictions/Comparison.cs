using System.Collections.Generic;
using Lyonium.Recipes;

namespace Lyonium.Predictions;

/// <summary>Every method on the same mixture, beside the exact answer.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
/// <param name="Recipe">The recipe.</param>
/// <param name="ActivityModel">The name of the model of activity coefficients, the same for all.</param>
/// <param name="Tolerance">How far from the exact answer still counts as right, in pH.</param>
/// <param name="Rows">A row a method, the exact one first.</param>
public sealed record Comparison(Recipe Recipe, string ActivityModel, double Tolerance, IReadOnlyList<ComparisonRow> Rows)
{
    /// <summary>The tolerance unless another is asked for: 0.02 in pH.</summary>
    public const double DefaultTolerance = 0.02;

    /// <summary>
    /// What the mixture does that the model leaves out, by the exact answer; empty where nothing of the kind is known. See
    /// <see cref="Prediction.OutsideTheModel"/>.
    /// </summary>
    public IReadOnlyList<string> OutsideTheModel => ModelScope.Reasons(Rows[0].Assumptions);
}
