using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Equilibria;
using Lyonium.Faults;
using Lyonium.Modelling;
using Lyonium.Recipes;
using Lyonium.Solvers;
using Lyonium.Substances;

namespace Lyonium.Predictions;

/// <summary>The front door: predicts the pH of a recipe with a table, a method and a model of activity coefficients.</summary>
/// <remarks>Immutable and thread-safe; make one and share it.</remarks>
public sealed class Predictor
{
    /// <summary>Makes a predictor with the defaults: the built-in table, the exact method, the Bates–Guggenheim convention for every ion.</summary>
    public Predictor()
        : this(SubstanceTable.Default)
    {
    }

    /// <summary>Makes a predictor.</summary>
    /// <param name="table">The table of substances.</param>
    /// <param name="method">The method; <see langword="null"/> for the exact one.</param>
    /// <param name="activityModel">The model of activity coefficients; <see langword="null"/> for <see cref="ActivityModels.Default"/>.</param>
    /// <exception cref="ArgumentNullException"><paramref name="table"/> is <see langword="null"/>.</exception>
    /// <exception cref="ArgumentException">A method or model of a host's own has the name of one of the library.</exception>
    public Predictor(SubstanceTable table, ISolver? method = null, IActivityModel? activityModel = null)
    {
        Table = table ?? throw new ArgumentNullException(nameof(table));
        Method = PluginName.Checked(method ?? new ExactSolver(), nameof(method));
        ActivityModel = PluginName.Checked(activityModel ?? ActivityModels.Default, nameof(activityModel));
    }

    /// <summary>The table of substances.</summary>
    public SubstanceTable Table { get; }

    /// <summary>The method.</summary>
    public ISolver Method { get; }

    /// <summary>The model of activity coefficients.</summary>
    public IActivityModel ActivityModel { get; }

    /// <summary>The ids of the sets of ion pairs; <see langword="null"/> for the defaults of the activity model.</summary>
    public IReadOnlyList<string>? PairSets { get; private init; }

    /// <summary>The same predictor with other sets of ion pairs.</summary>
    /// <param name="ids">
    /// Ids of the table's sets, such as <c>polyborates</c>; none for no ion pairs at all. A prediction refuses a set that the table does not
    /// have, or that does not belong to the activity model.
    /// </param>
    /// <returns>A new predictor.</returns>
    public Predictor WithPairSets(params string[] ids) =>
        new(Table, Method, ActivityModel) { PairSets = Array.AsReadOnly((string[])(ids ?? throw new ArgumentNullException(nameof(ids))).Clone()) };

    /// <summary>The same predictor with another method.</summary>
    /// <param name="method">The method.</param>
    /// <returns>A new predictor.</returns>
    /// <exception cref="ArgumentNullException">It is <see langword="null"/>.</exception>
    /// <exception cref="ArgumentException">One of a host's own has the name of one of the library.</exception>
    public Predictor With(ISolver method) => new(Table, method ?? throw new ArgumentNullException(nameof(method)), ActivityModel) { PairSets = PairSets };

    /// <summary>The same predictor with another model of activity coefficients.</summary>
    /// <param name="activityModel">The model.</param>
    /// <returns>A new predictor.</returns>
    /// <exception cref="ArgumentNullException">It is <see langword="null"/>.</exception>
    /// <exception cref="ArgumentException">One of a host's own has the name of one of the library.</exception>
    public Predictor With(IActivityModel activityModel) =>
        new(Table, Method, activityModel ?? throw new ArgumentNullException(nameof(activityModel))) { PairSets = PairSets };

    /// <summary>Predicts the pH of a recipe.</summary>
    /// <param name="recipe">The recipe.</param>
    /// <returns>The prediction.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="recipe"/> is <see langword="null"/>.</exception>
    /// <exception cref="LyoniumException">The recipe is refused, or the method does not apply; every fault is listed.</exception>
    public Prediction Predict(Recipe recipe) => TryPredict(recipe).GetValueOrThrow();

    /// <summary>Predicts the pH of a mixture that was prepared already.</summary>
    /// <param name="mixture">The mixture.</param>
    /// <returns>The prediction.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="mixture"/> is <see langword="null"/>.</exception>
    /// <exception cref="LyoniumException">The mixture is refused, or the method does not apply; every fault is listed.</exception>
    public Prediction Predict(Mixture mixture) => TryPredict(mixture).GetValueOrThrow();

    /// <summary>Predicts the pH of a recipe, or tells every fault as a value; never throws on numbers.</summary>
    /// <param name="recipe">The recipe.</param>
    /// <returns>The prediction, or every fault.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="recipe"/> is <see langword="null"/>.</exception>
    public Attempt<Prediction> TryPredict(Recipe recipe)
    {
        var mixture = Mixture.TryPrepare(recipe ?? throw new ArgumentNullException(nameof(recipe)), Table);
        return mixture.Success ? TryPredict(mixture.Value) : new Attempt<Prediction>(mixture.Faults);
    }

    /// <summary>Predicts the pH of a mixture that was prepared already, or tells every fault as a value; never throws on numbers.</summary>
    /// <param name="mixture">The mixture.</param>
    /// <returns>The prediction, or every fault.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="mixture"/> is <see langword="null"/>.</exception>
    public Attempt<Prediction> TryPredict(Mixture mixture)
    {
        var solved = TrySolve(mixture ?? throw new ArgumentNullException(nameof(mixture)));
        if (!solved.Success)
        {
            return new Attempt<Prediction>(solved.Faults);
        }

        try
        {
            var answer = solved.Value;
            var assumptions = new AssumptionList(answer, this, WaterErrorInPH(mixture, answer), IonSizeErrorInPH(mixture, answer)).ToList();
            return new Attempt<Prediction>(Describe(answer, assumptions));
        }
        catch (Exception e) when (e is not OutOfMemoryException)
        {
            // The model is asked for its range, name and source again.
            return new Attempt<Prediction>(SolvedMixture.Failed(e, Method, ActivityModel).Faults);
        }
    }

    /// <summary>Predicts a recipe with every method of the library side by side, and with this predictor's own.</summary>
    /// <remarks>A name stands once, and the row <c>exact</c> stands first.</remarks>
    /// <param name="recipe">The recipe.</param>
    /// <param name="tolerance">How far from the exact answer still counts as right, in pH, above 0.</param>
    /// <returns>The comparison, or every fault of the recipe.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="recipe"/> is <see langword="null"/>.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The tolerance is not a number above 0.</exception>
    public Attempt<Comparison> TryCompare(Recipe recipe, double tolerance = Comparison.DefaultTolerance)
    {
        if (!(tolerance > 0) || double.IsInfinity(tolerance))
        {
            throw new ArgumentOutOfRangeException(nameof(tolerance), tolerance, "A tolerance is a number above 0.");
        }

        var mixture = Mixture.TryPrepare(recipe ?? throw new ArgumentNullException(nameof(recipe)), Table);
        if (!mixture.Success)
        {
            return new Attempt<Comparison>(mixture.Faults);
        }

        var exact = With(new ExactSolver()).TryPredict(mixture.Value);
        if (!exact.Success)
        {
            return new Attempt<Comparison>(exact.Faults);
        }

        var others = Methods.All.Append(Method)
            .GroupBy(PluginName.Of, StringComparer.Ordinal)
            .Select(group => group.Last())
            .Where(method => !string.Equals(PluginName.Of(method), exact.Value.Method, StringComparison.Ordinal))
            .Select(method => ComparisonRow.Of(PluginName.Of(method), With(method).TryPredict(mixture.Value), exact.Value, tolerance));
        var rows = others.Prepend(ComparisonRow.Of(exact.Value.Method, exact, exact.Value, tolerance)).ToArray();
        return new Attempt<Comparison>(new Comparison(recipe, exact.Value.ActivityModel, tolerance, rows));
    }

    private Attempt<SolvedMixture> TrySolve(Mixture mixture) => SolvedMixture.TrySolve(mixture, PairSets, Method, ActivityModel);

    // What an error in estimated solute volumes does to the answer is found by answering again.
    private double WaterErrorInPH(Mixture mixture, SolvedMixture answer)
    {
        if (mixture.EstimatedWaterKg <= 0)
        {
            return 0;
        }

        var shifted = TrySolve(mixture.WithWaterKg(mixture.WaterKg + mixture.EstimatedWaterKg));
        return shifted.Success ? Math.Abs(shifted.Value.Outcome.PH - answer.Outcome.PH) : double.NaN;
    }

    // What another size of the ions whose size is not listed would do: 9 Å, the largest of Kielland's for an ion of one or two charges.
    private double IonSizeErrorInPH(Mixture mixture, SolvedMixture answer)
    {
        const double largestAngstrom = 9;
        if (!ActivityModel.Uses.HasFlag(IonData.Sizes) || answer.UnlistedIonSizes().Count == 0)
        {
            return 0;
        }

        var other = SolvedMixture.TrySolve(new Doorway(mixture, ActivityModel, PairSets) { SizeOfUnlistedIons = largestAngstrom }, Method, ActivityModel);
        return other.Success ? Math.Abs(other.Value.Outcome.PH - answer.Outcome.PH) : double.NaN;
    }

    private Prediction Describe(SolvedMixture answer, IReadOnlyList<Assumption> assumptions)
    {
        var mixture = answer.Modelled.Mixture;
        var species = answer.Species();
        return new Prediction(answer, Method, ActivityModel)
        {
            PHydrogenConcentration = -Math.Log10(species[Equilibrium.HydrogenIon].ConcentrationMolPerL),
            Species = species,
            Assumptions = assumptions,
            Cautions = CautionTable.Default.For(mixture),
            Evidence = new Evidence
            {
                Software = SoftwareIdentity.Running,
                Table = Table.Identity,
                Constants = answer.Modelled.Constants,
                BracketLow = answer.Outcome.BracketLow,
                BracketHigh = answer.Outcome.BracketHigh,
                Evaluations = answer.Outcome.Evaluations,
                Residual = answer.Speciation.ChargeMolPerKg / answer.Speciation.ChargeMagnitudeMolPerKg,
                InputResolution = answer.Outcome.InputResolution,
            },
        };
    }
}
