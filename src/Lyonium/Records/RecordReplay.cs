using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Activity;
using Lyonium.Documents;
using Lyonium.Equilibria;
using Lyonium.Faults;
using Lyonium.Predictions;
using Lyonium.Solvers;
using Lyonium.Substances;

namespace Lyonium.Records;

/// <summary>Replays records: predicts their recipe again, and says what is the same and what differs.</summary>
/// <remarks>
/// Every field of the record is compared with what is written for its recipe now. On the build and processor architecture that made the
/// record all of it is the same, to the last bit; elsewhere a pH is within 1e-9, a molality within 1e-7 and any other figure within 1e-6 of
/// itself, and how often the balance was evaluated, the bracket, what is left of the balance and the input resolution may be others.
/// Immutable and thread-safe.
/// </remarks>
public sealed class RecordReplay
{
    private readonly SubstanceTable _table;
    private readonly IReadOnlyList<ISolver> _methods;
    private readonly IReadOnlyList<IActivityModel> _models;

    /// <summary>Replays with the methods and models of the library.</summary>
    /// <param name="table">The table to replay against.</param>
    public RecordReplay(SubstanceTable table)
        : this(table, Methods.All, ActivityModels.All)
    {
    }

    /// <summary>Replays with a host's own methods and models.</summary>
    /// <param name="table">The table to replay against.</param>
    /// <param name="methods">The methods that records may name.</param>
    /// <param name="models">The models of activity coefficients that records may name.</param>
    /// <exception cref="ArgumentNullException">A parameter is <see langword="null"/>.</exception>
    /// <exception cref="ArgumentException">A method or model of a host's own has the name of one of the library.</exception>
    public RecordReplay(SubstanceTable table, IReadOnlyList<ISolver> methods, IReadOnlyList<IActivityModel> models)
    {
        _table = table ?? throw new ArgumentNullException(nameof(table));
        _methods = (methods ?? throw new ArgumentNullException(nameof(methods))).Select(one => PluginName.Checked(one, nameof(methods))).ToArray();
        _models = (models ?? throw new ArgumentNullException(nameof(models))).Select(one => PluginName.Checked(one, nameof(models))).ToArray();
    }

    /// <summary>Replays a record.</summary>
    /// <param name="json">A <c>lyonium-record/1</c> or <c>lyonium-record/1.1</c>, at most 64 MiB.</param>
    /// <returns>What came of it; or the faults, where the text is no record or its recipe is refused.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="json"/> is <see langword="null"/>.</exception>
    public Attempt<ReplayReport> TryReplay(string json)
    {
        const int mostBytes = 64 * 1024 * 1024;
        var faults = new FaultList();

        // The recipe stands one level deeper than where it was read.
        const int deepest = JsonDocumentReader.DeepestNesting + 1;
        var root = JsonDocumentReader.Open(json ?? throw new ArgumentNullException(nameof(json)), mostBytes, faults, deepest);
        if (root is null || DocumentFormat.VersionOf(root, RecordJson.FormatName, RecordJson.Versions) is not { } version)
        {
            return faults.Attempt<ReplayReport>(null);
        }

        var record = new RecordReader(root, version);
        var method = Find(_methods, PluginName.Of, record.Method, root.Path + ".method", faults);
        var model = Find(_models, PluginName.Of, record.ActivityModel, root.Path + ".activityModel", faults);
        var recipe = record.ReadRecipe(_table);
        if (faults.Any || recipe is null || method is null || model is null)
        {
            return faults.Attempt<ReplayReport>(null);
        }

        var prediction = new Predictor(_table, method, model).WithPairSets(record.PairSets).TryPredict(recipe);
        return prediction.Success
            ? new Attempt<ReplayReport>(new ReplayComparison(record, prediction.Value).Report())
            : new Attempt<ReplayReport>(prediction.Faults);
    }

    private static T? Find<T>(IReadOnlyList<T> all, Func<T, string> nameOf, string? name, string path, FaultList faults)
        where T : class
    {
        var found = all.FirstOrDefault(one => string.Equals(nameOf(one), name, StringComparison.Ordinal));
        if (found is null && name is not null)
        {
            faults.Add(FaultKinds.NotAmongThese, path, name, ("known", string.Join(", ", all.Select(nameOf))));
        }

        return found;
    }
}
