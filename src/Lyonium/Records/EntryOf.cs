using Lyonium.Equilibria;
using Lyonium.Predictions;

namespace Lyonium.Records;

/// <summary>What several documents write in the same way.</summary>
internal static class EntryOf
{
    public static AssumptionEntry Assumption(Assumption one) =>
        new(one.Code, one.Of, Finite(one.Figure), Finite(one.Limit), one.Held, one.Basis);

    public static IterateEntry Iterate(Iterate one) => new(Finite(one.PH), Finite(one.Correction));

    /// <summary>JSON has no NaN and no infinity; what is neither stands, the rest is left out.</summary>
    public static double? Finite(double? value) =>
        value is double number && !double.IsNaN(number) && !double.IsInfinity(number) ? number : null;
}
