using System;
using System.Collections.Generic;
using Lyonium.Equilibria;
using Lyonium.Faults;
using Lyonium.Recipes;
using Lyonium.Substances;

namespace Lyonium.Modelling;

/// <summary>A mixture as a numeric problem, and which input and which sourced constant became which number.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed class ModelledMixture
{
    internal ModelledMixture(
        Mixture mixture,
        Equilibrium equilibrium,
        IReadOnlyList<Family> families,
        IReadOnlyList<ModelledSpecies> species,
        IReadOnlyList<UsedConstant> constants,
        IReadOnlyList<PairedSpecies> pairs,
        IReadOnlyList<string> pairSets)
    {
        Mixture = mixture;
        Equilibrium = equilibrium;
        Families = families;
        Species = species;
        Constants = constants;
        Pairs = pairs;
        PairSets = pairSets;
    }

    /// <summary>The mixture.</summary>
    public Mixture Mixture { get; }

    /// <summary>The numeric problem.</summary>
    public Equilibrium Equilibrium { get; }

    /// <summary>The family of each component of the equilibrium.</summary>
    public IReadOnlyList<Family> Families { get; }

    /// <summary>What each species of the equilibrium is, the two ions of water first.</summary>
    public IReadOnlyList<ModelledSpecies> Species { get; }

    /// <summary>The constants, at the values at which they are used.</summary>
    public IReadOnlyList<UsedConstant> Constants { get; }

    /// <summary>The ion pairs, dimers and polymers that can form, in the order of the last species.</summary>
    public IReadOnlyList<PairedSpecies> Pairs { get; }

    /// <summary>The ids of the sets of ion pairs in use.</summary>
    public IReadOnlyList<string> PairSets { get; }

    /// <summary>Models a mixture.</summary>
    /// <param name="mixture">The mixture; its temperature lies within 0 to 100 °C.</param>
    /// <param name="model">The model of activity coefficients; it carries constants of another ionic strength to infinite dilution.</param>
    /// <param name="pairSets">The ids of the sets of ion pairs; <see langword="null"/> for the defaults of the model, empty for none.</param>
    /// <returns>The numeric problem, or every fault.</returns>
    /// <exception cref="ArgumentNullException">A parameter is <see langword="null"/>.</exception>
    public static Attempt<ModelledMixture> TryModel(Mixture mixture, IActivityModel model, IReadOnlyList<string>? pairSets = null) =>
        new Doorway(mixture ?? throw new ArgumentNullException(nameof(mixture)), model ?? throw new ArgumentNullException(nameof(model)), pairSets).Run();
}
