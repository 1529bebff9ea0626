using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using Lyonium.Faults;
using Lyonium.Provenance;

namespace Lyonium.Substances;

/// <summary>A table of substances and their constants, with the sources.</summary>
/// <remarks>An immutable value that is passed in where it is needed; safe to share between threads.</remarks>
public sealed class SubstanceTable
{
    private static readonly Lazy<SubstanceTable> BuiltIn = new(SubstanceTableReader.ReadEmbedded);

    private readonly Dictionary<string, Substance> _byName;
    private readonly Dictionary<string, Substance[]> _byFormula;
    private readonly Dictionary<string, int> _familyOrder;

    internal SubstanceTable(
        TableIdentity identity,
        IReadOnlyList<Source> sources,
        IReadOnlyList<AtomicWeight> atomicWeights,
        IReadOnlyList<Family> families,
        IReadOnlyList<Substance> substances,
        IReadOnlyList<InteractionCoefficient> interactions,
        IReadOnlyList<PairSet> pairSets)
    {
        Identity = identity;
        Sources = sources;
        AtomicWeights = atomicWeights;
        Families = families;
        Substances = substances;
        Interactions = interactions;
        PairSets = pairSets;
        _familyOrder = families.Select((family, index) => (family.Id, index)).ToDictionary(one => one.Id, one => one.index, StringComparer.Ordinal);
        _byName = new Dictionary<string, Substance>(StringComparer.Ordinal);
        foreach (var substance in substances)
        {
            foreach (var name in substance.Synonyms.Concat([substance.Name, substance.Id]))
            {
                _byName[NameFolding.Fold(name)] = substance;
            }
        }

        _byFormula = substances
            .SelectMany(substance => substance.OtherFormulas.Concat([substance.Formula.Text])
                .Select(ChemicalFormula.Normalize).Distinct(StringComparer.Ordinal).Select(formula => (formula, substance)))
            .GroupBy(pair => pair.formula, StringComparer.Ordinal)
            .ToDictionary(group => group.Key, group => group.Select(pair => pair.substance).ToArray(), StringComparer.Ordinal);
    }

    /// <summary>The table that is built into the library; read once, on first use.</summary>
    public static SubstanceTable Default => BuiltIn.Value;

    /// <summary>Which table this is.</summary>
    public TableIdentity Identity { get; }

    /// <summary>The sources, in the order of the table.</summary>
    public IReadOnlyList<Source> Sources { get; }

    /// <summary>The atomic weights that the molar masses are computed with.</summary>
    public IReadOnlyList<AtomicWeight> AtomicWeights { get; }

    /// <summary>The families, in the order of the table.</summary>
    public IReadOnlyList<Family> Families { get; }

    /// <summary>The substances, in the order of the table.</summary>
    public IReadOnlyList<Substance> Substances { get; }

    /// <summary>The specific interaction coefficients of pairs of ions.</summary>
    public IReadOnlyList<InteractionCoefficient> Interactions { get; }

    /// <summary>The sets of ion pairs, dimers and polymers.</summary>
    public IReadOnlyList<PairSet> PairSets { get; }

    /// <summary>Reads a table from JSON (<c>lyonium-table/1.1</c> or <c>/1</c>); at most 4 MiB.</summary>
    /// <param name="json">The stream; it is read to its end and left open.</param>
    /// <returns>The table.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="json"/> is <see langword="null"/>.</exception>
    /// <exception cref="LyoniumException">The table is refused; every fault is listed.</exception>
    public static SubstanceTable Read(Stream json) =>
        SubstanceTableReader.Read(json ?? throw new ArgumentNullException(nameof(json))).GetValueOrThrow();

    /// <summary>Reads a table from JSON, and says what is wrong with it as a value.</summary>
    /// <param name="json">The stream; it is read to its end and left open.</param>
    /// <returns>The table, or every fault.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="json"/> is <see langword="null"/>.</exception>
    public static Attempt<SubstanceTable> TryRead(Stream json) =>
        SubstanceTableReader.Read(json ?? throw new ArgumentNullException(nameof(json)));

    /// <summary>Lays a user's own table over this one.</summary>
    /// <remarks>
    /// A family, substance, source or element of the layer takes the place of the one with the same id here; the rest is added. A family that
    /// takes another's place must end in the same base form. Predictions name the layer of each constant.
    /// </remarks>
    /// <param name="name">The name by which records speak of the layer.</param>
    /// <param name="json">The layer as <c>lyonium-table/1.1</c> or <c>/1</c>, at most 4 MiB; sections that it does not need may be left out.</param>
    /// <returns>The layered table, or every fault.</returns>
    /// <exception cref="ArgumentNullException">A parameter is <see langword="null"/>.</exception>
    public Attempt<SubstanceTable> TryLayer(string name, Stream json) =>
        SubstanceTableReader.ReadLayer(
            json ?? throw new ArgumentNullException(nameof(json)), name ?? throw new ArgumentNullException(nameof(name)), this);

    /// <summary>Finds a substance by id, name or synonym (in any case) or by formula (case-sensitive).</summary>
    /// <param name="nameOrFormula">What to look for.</param>
    /// <returns>The substance; or the fault: unknown, with the nearest names, or ambiguous, with the candidates.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="nameOrFormula"/> is <see langword="null"/>.</exception>
    public Attempt<Substance> Find(string nameOrFormula)
    {
        _ = nameOrFormula ?? throw new ArgumentNullException(nameof(nameOrFormula));
        var faults = new FaultList();
        return faults.Attempt(Find(nameOrFormula, "$", faults));
    }

    internal Substance? Find(string nameOrFormula, string path, FaultList faults)
    {
        if (_byName.TryGetValue(NameFolding.Fold(nameOrFormula), out var named))
        {
            return named;
        }

        if (_byFormula.TryGetValue(ChemicalFormula.Normalize(nameOrFormula), out var candidates))
        {
            if (candidates.Length == 1)
            {
                return candidates[0];
            }

            faults.Add(
                FaultKinds.AmbiguousSubstance, path, nameOrFormula, ("candidates", string.Join(", ", candidates.Select(one => one.Name))));
            return null;
        }

        faults.Add(FaultKinds.UnknownSubstance, path, nameOrFormula, ("suggestion", faults.IsFull ? "" : Suggest(nameOrFormula)));
        return null;
    }

    internal Substance? ById(string id) => _byName.TryGetValue(NameFolding.Fold(id), out var substance) ? substance : null;

    /// <summary>The place of a family in the table, by which mixtures are ordered whatever the order of pouring.</summary>
    internal int OrderOf(Family family) => _familyOrder[family.Id];

    private string Suggest(string wanted)
    {
        var nearest = NearestNames.To(wanted, Substances.SelectMany(one => one.Synonyms.Concat([one.Name, one.Formula.Text])));
        return nearest.Count == 0
            ? "look it up with 'lyonium constants', or use a formula"
            : "perhaps " + string.Join(", or ", nearest.Select(name => "'" + name + "'"));
    }
}
