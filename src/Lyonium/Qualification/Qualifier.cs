using System;
using System.Collections.Generic;
using System.Linq;
using System.Threading;
using Lyonium.Predictions;

namespace Lyonium.Qualification;

/// <summary>Holds the library, as it runs in this process, against published figures.</summary>
/// <remarks>
/// The checks ship with the library. They run with a host's own table layers, method and activity model as well as with the defaults; the
/// tolerances are those of the defaults. Immutable and thread-safe.
/// </remarks>
public sealed class Qualifier
{
    private readonly Predictor _predictor;

    /// <summary>Qualifies the defaults: the built-in table, the exact method, the default activity model.</summary>
    public Qualifier()
        : this(new Predictor())
    {
    }

    /// <summary>Qualifies a predictor.</summary>
    /// <param name="predictor">The predictor, with its table, method and activity model.</param>
    /// <exception cref="ArgumentNullException"><paramref name="predictor"/> is <see langword="null"/>.</exception>
    public Qualifier(Predictor predictor) => _predictor = predictor ?? throw new ArgumentNullException(nameof(predictor));

    /// <summary>The published checks, in the order in which they run.</summary>
    public static IReadOnlyList<PublishedCheck> Checks { get; } = CheckTable.All.Select(one => one.Check).ToArray();

    /// <summary>Runs every check.</summary>
    /// <param name="cancellationToken">Stops between two checks.</param>
    /// <returns>The report.</returns>
    /// <exception cref="OperationCanceledException">It was stopped.</exception>
    public QualificationReport Run(CancellationToken cancellationToken = default)
    {
        var outcomes = new List<CheckOutcome>(CheckTable.All.Count);
        foreach (var check in CheckTable.All)
        {
            cancellationToken.ThrowIfCancellationRequested();
            outcomes.Add(check.Run(_predictor));
        }

        return new QualificationReport(QualificationEnvironment.Of(_predictor), outcomes.ToArray());
    }
}
