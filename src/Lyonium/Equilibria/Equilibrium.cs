using System;
using System.Collections.Generic;
using System.Linq;

namespace Lyonium.Equilibria;

/// <summary>The numeric problem: components, species and constraints in plain numbers, ready for a solver.</summary>
/// <remarks>
/// It knows no unit and no name; an index stands for each component and species. The hydrogen ion and the hydroxide ion are always
/// there, as species 0 and 1, and belong to no component. Immutable; safe to share between threads.
/// </remarks>
public sealed class Equilibrium
{
    /// <summary>The index of the hydrogen ion among the species.</summary>
    public const int HydrogenIon = 0;

    /// <summary>The index of the hydroxide ion among the species.</summary>
    public const int HydroxideIon = 1;

    /// <summary>How many species stand before the first of <see cref="Species"/>: the two ions of water.</summary>
    public const int WaterIons = 2;

    private readonly int[] _charges;
    private readonly double[] _ionSizes;
    private readonly IonInteraction[] _interactions;

    /// <summary>Makes an equilibrium.</summary>
    /// <param name="constraints">One constraint for each component.</param>
    /// <param name="species">The species made of the components; every component is in at least one.</param>
    /// <param name="solvent">The water.</param>
    /// <param name="hydrogenIonSizeAngstrom">The ion-size parameter of the hydrogen ion, in ångström.</param>
    /// <param name="hydroxideIonSizeAngstrom">The ion-size parameter of the hydroxide ion, in ångström.</param>
    /// <param name="interactions">The specific interactions that are known; of other pairs of species nothing is.</param>
    /// <exception cref="ArgumentException">
    /// A species names a component that is not there, or its charge is not that of what it is made of; a component is in no species; or two rungs of one component differ in charge by
    /// something else than their protons, have the same protons, or have constants more than 300 decades apart; or pKw is not within ±300.
    /// </exception>
    public Equilibrium(
        IReadOnlyList<Constraint> constraints,
        IReadOnlyList<Species> species,
        Solvent solvent,
        double hydrogenIonSizeAngstrom = double.NaN,
        double hydroxideIonSizeAngstrom = double.NaN,
        IReadOnlyList<IonInteraction>? interactions = null)
    {
        _ = constraints ?? throw new ArgumentNullException(nameof(constraints));
        _ = species ?? throw new ArgumentNullException(nameof(species));
        Solvent = solvent ?? throw new ArgumentNullException(nameof(solvent));
        if (!(Math.Abs(solvent.PKw) <= 300))
        {
            throw new ArgumentException("pKw is a finite number within ±300.", nameof(solvent));
        }

        Constraints = Array.AsReadOnly(constraints.ToArray());
        Species = Array.AsReadOnly(species.ToArray());
        _charges = new[] { 1, -1 }.Concat(Species.Select(one => one.Charge)).ToArray();
        _ionSizes = new[] { hydrogenIonSizeAngstrom, hydroxideIonSizeAngstrom }.Concat(Species.Select(one => one.IonSizeAngstrom)).ToArray();
        _interactions = interactions?.ToArray() ?? [];
        if (_interactions.Any(one => one.First < 0 || one.Second < 0 || one.First >= _charges.Length || one.Second >= _charges.Length))
        {
            throw new ArgumentException("An interaction names a species that is not there.", nameof(interactions));
        }

        CheckComponents();
        Groups = CoupledGroup.Of(this);
        IsLadders = Groups.Length == 0;
        Ladders = new LadderSet(this, Groups.SelectMany(group => group.Members).ToArray());
    }

    /// <summary>One constraint for each component.</summary>
    public IReadOnlyList<Constraint> Constraints { get; }

    /// <summary>The species made of the components; the ions of water are not among them.</summary>
    public IReadOnlyList<Species> Species { get; }

    /// <summary>The water.</summary>
    public Solvent Solvent { get; }

    /// <summary>How many species there are with the two ions of water: the length of every span of species.</summary>
    public int SpeciesCount => _charges.Length;

    /// <summary>The charge numbers of the hydrogen ion, the hydroxide ion, and each of <see cref="Species"/>.</summary>
    public ReadOnlySpan<int> Charges => _charges;

    /// <summary>The ion-size parameters in ångström, in the order of <see cref="Charges"/>; NaN where one is not known.</summary>
    public ReadOnlySpan<double> IonSizesAngstrom => _ionSizes;

    /// <summary>The specific interactions that are known.</summary>
    public ReadOnlySpan<IonInteraction> Interactions => _interactions;

    /// <summary>Whether each species is a rung of one component's ladder and each component has a total: the closed form applies.</summary>
    public bool IsLadders { get; }

    /// <summary>The ladders, laid out for speed; the components that couple are not among them.</summary>
    internal LadderSet Ladders { get; }

    /// <summary>The components that couple, or hold a fixed activity; empty where all are ladders.</summary>
    internal CoupledGroup[] Groups { get; }

    private void CheckComponents()
    {
        var used = new bool[Constraints.Count];
        var rung = new Species?[Constraints.Count];
        foreach (var one in Species)
        {
            foreach (var term in one.Terms)
            {
                if (term.Component >= Constraints.Count)
                {
                    throw new ArgumentException($"A species names component {term.Component}, and there are {Constraints.Count}.");
                }

                used[term.Component] = true;
            }

            if (!one.IsRung)
            {
                continue;
            }

            ref var first = ref rung[one.Terms[0].Component];
            first ??= one;
            if (one.Charge - first.Charge != one.Protons - first.Protons)
            {
                throw new ArgumentException(
                    $"The rungs of component {one.Terms[0].Component} differ in charge by something else than their protons.");
            }
        }

        for (var i = 0; i < Constraints.Count; i++)
        {
            if (Constraints[i].Kind == ConstraintKind.FixedActivity && rung[i] is { } reservoir && reservoir.Charge != reservoir.Protons)
            {
                throw new ArgumentException($"Component {i} has a fixed activity and a charge; what is held by a gas or a solid has none.");
            }
        }

        foreach (var one in Species.Where(one => !one.IsRung && one.Terms.All(term => rung[term.Component] is not null)))
        {
            var made = one.Terms.Sum(term => term.Count * (rung[term.Component]!.Charge - rung[term.Component]!.Protons));
            if (one.Charge != made + one.Protons)
            {
                throw new ArgumentException($"A species of charge {one.Charge} is made of components and protons of charge {made + one.Protons}.");
            }
        }

        var missing = Array.IndexOf(used, false);
        if (missing >= 0)
        {
            throw new ArgumentException($"Component {missing} is in no species.");
        }
    }
}
