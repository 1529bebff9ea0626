using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Quantities;
using Lyonium.Recipes;
using Lyonium.Solvers;
using UnitsNet;

namespace Lyonium.Predictions;

/// <summary>The answer, with its checks, cautions and evidence.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed class Prediction
{
    private readonly SolvedMixture _answer;
    private readonly Lazy<BufferFigures?> _buffer;
    private readonly bool _isOfTheLibrary;

    internal Prediction(SolvedMixture answer, ISolver method, IActivityModel activityModel)
    {
        _answer = answer;
        _buffer = new Lazy<BufferFigures?>(() => BufferFiguresOf.Find(answer, method, activityModel));
        _isOfTheLibrary = ActivityModels.Find(activityModel.Name)?.GetType() == activityModel.GetType()
            && Methods.Find(method.Name)?.GetType() == method.GetType();
        Method = method.Name;
        ActivityModel = activityModel.Name;
    }

    /// <summary>What was mixed.</summary>
    public Mixture Mixture => _answer.Modelled.Mixture;

    /// <summary>The recipe it was mixed from.</summary>
    public Recipe Recipe => Mixture.Recipe;

    /// <summary>The name of the method.</summary>
    public string Method { get; }

    /// <summary>The name of the model of activity coefficients.</summary>
    public string ActivityModel { get; }

    /// <summary>The ids of the sets of ion pairs in use; empty where none are.</summary>
    public IReadOnlyList<string> PairSets => _answer.Modelled.PairSets;

    /// <summary>−log10 of the hydrogen-ion activity, molality scale.</summary>
    public double PH => _answer.Outcome.PH;

    /// <summary>p[H]: −log10 of the hydrogen-ion concentration in mol/L, at the volume of preparation.</summary>
    public required double PHydrogenConcentration { get; init; }

    /// <summary>The pH to two decimals, as a report gives it.</summary>
    public string Reported => Report(PH);

    /// <summary>The ionic strength, in mol/kg.</summary>
    public double IonicStrengthMolPerKg => _answer.Speciation.IonicStrengthMolPerKg;

    /// <summary>The ionic strength.</summary>
    public Molality IonicStrength => Molality.FromMolesPerKilogram(IonicStrengthMolPerKg);

    /// <summary>
    /// Buffer capacity, dilution value and temperature coefficient; <see langword="null"/> where the equilibrium has no exact answer, and
    /// where the model, far beyond its range, gives no capacity above zero. Found when they are first asked for.
    /// </summary>
    public BufferFigures? Buffer => _buffer.Value;

    /// <summary>
    /// How far predictions with this activity model lie from published values at about this ionic strength; <see langword="null"/> where no
    /// published value speaks for it: a host's own model, method, constant or choice of ion pairs, another temperature than 0 to 50 °C, an ionic strength above the model's range, a
    /// constant that was not published for the mixture's temperature or for infinite dilution, or a mixture that is outside of the model.
    /// </summary>
    public ModelUncertainty? ModelUncertainty =>
        _isOfTheLibrary && HasDefaultPairs && Evidence.Constants.All(one => one.Layer is null) && !ModelScope.IsBeyondWhatWasChecked(Assumptions)
            ? ModelErrorTable.Find(ActivityModel, IonicStrengthMolPerKg, Mixture.TemperatureK)
            : null;

    /// <summary>Every species: the two ions of water, then family by family from the least protonated form on.</summary>
    public required IReadOnlyList<PredictedSpecies> Species { get; init; }

    /// <summary>What was taken for granted.</summary>
    public required IReadOnlyList<Assumption> Assumptions { get; init; }

    /// <summary>
    /// What the mixture does that the model leaves out, such as <c>may not dissolve</c> or <c>consumes itself</c>; empty where nothing of
    /// the kind is known.
    /// </summary>
    /// <remarks>
    /// The model knows one solution in which nothing but protons is exchanged. Where this is not empty, the number is the pH of that
    /// solution, not of what stands in the beaker; the assumptions that do not hold tell of what and why.
    /// </remarks>
    public IReadOnlyList<string> OutsideTheModel => ModelScope.Reasons(Assumptions);

    /// <summary>The formula of a short-cut, in words and symbols; <see langword="null"/> where the whole balance was solved.</summary>
    public string? Formula => _answer.Outcome.Formula;

    /// <summary>The estimates of a method that repeats itself; empty for others.</summary>
    public IReadOnlyList<Iterate> Iterates => _answer.Outcome.Iterates;

    /// <summary>What can hurt someone who makes the mixture.</summary>
    public required IReadOnlyList<Caution> Cautions { get; init; }

    /// <summary>What the answer rests on.</summary>
    public required Evidence Evidence { get; init; }

    /// <summary>Retraces the method step by step.</summary>
    /// <returns>The worked steps.</returns>
    public Working Work() => new WorkingBuilder(_answer).Build();

    private bool HasDefaultPairs => Mixture.Table.PairSets.All(set => set.Layer is null) && Mixture.Table.PairSets
        .Where(set => set.IsDefault && set.Models.Contains(ActivityModel, StringComparer.Ordinal))
        .Select(set => set.Id).SequenceEqual(PairSets, StringComparer.Ordinal);

    /// <summary>The reported pH in words.</summary>
    /// <returns>Such as <c>pH 2.35</c>; or <c>pH 2.35, of the homogeneous model only: may not dissolve</c>.</returns>
    public override string ToString() =>
        "pH " + Reported + (OutsideTheModel.Count == 0 ? "" : ", of the homogeneous model only: " + string.Join(", ", OutsideTheModel));

    /// <summary>A pH to two decimals.</summary>
    internal static string Report(double pH)
    {
        // The digits that a record shows are rounded, half away from zero: 1.005 is reported as 1.01, although its double lies below.
        const double largestDecimal = 1e20;
        if (!(Math.Abs(pH) < largestDecimal))
        {
            return NumberText.Shortest(pH);
        }

        var shown = decimal.Parse(NumberText.Shortest(pH), NumberStyles.Float, CultureInfo.InvariantCulture);
        var rounded = Math.Round(shown, 2, MidpointRounding.AwayFromZero);
        return (rounded == 0 ? 0m : rounded).ToString("F2", CultureInfo.InvariantCulture);
    }
}
