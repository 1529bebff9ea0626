using System;
using System.Collections.Generic;
using System.Linq;

namespace Lyonium.Equilibria;

/// <summary>A dissolved species: what it is made of, its charge, and its formation constant.</summary>
/// <remarks>
/// The reaction is Σ count · component + protons · H⁺ = species. Immutable; safe to share between threads.
/// </remarks>
public sealed class Species
{
    /// <summary>Makes a species.</summary>
    /// <param name="terms">The components it is made of; at least one, each once.</param>
    /// <param name="protons">The protons taken up from the components; negative where they are given off.</param>
    /// <param name="charge">The charge number.</param>
    /// <param name="log10K">The log10 of the formation constant at infinite dilution, molality scale; finite.</param>
    /// <param name="ionSizeAngstrom">The ion-size parameter in ångström; <see cref="double.NaN"/> where it is not known.</param>
    /// <exception cref="ArgumentException">A term is missing, repeated or without a count, or <paramref name="log10K"/> is not finite.</exception>
    public Species(IReadOnlyList<Term> terms, int protons, int charge, double log10K, double ionSizeAngstrom = double.NaN)
    {
        _ = terms ?? throw new ArgumentNullException(nameof(terms));
        if (terms.Count == 0 || terms.Any(term => term.Count < 1 || term.Component < 0)
            || terms.Select(term => term.Component).Distinct().Count() != terms.Count)
        {
            throw new ArgumentException("A species is made of at least one component, each once, with a count of one or more.", nameof(terms));
        }

        if (double.IsNaN(log10K) || double.IsInfinity(log10K))
        {
            throw new ArgumentOutOfRangeException(nameof(log10K), log10K, "A formation constant has a finite logarithm.");
        }

        Terms = Array.AsReadOnly(terms.ToArray());
        Protons = protons;
        Charge = charge;
        Log10K = log10K;
        IonSizeAngstrom = ionSizeAngstrom;
    }

    /// <summary>The components it is made of.</summary>
    public IReadOnlyList<Term> Terms { get; }

    /// <summary>The protons taken up from the components.</summary>
    public int Protons { get; }

    /// <summary>The charge number.</summary>
    public int Charge { get; }

    /// <summary>The log10 of the formation constant at infinite dilution, molality scale.</summary>
    public double Log10K { get; }

    /// <summary>The ion-size parameter in ångström; <see cref="double.NaN"/> where it is not known.</summary>
    public double IonSizeAngstrom { get; }

    /// <summary>Whether it is one unit of one component with some protons: a rung of a ladder.</summary>
    public bool IsRung => Terms.Count == 1 && Terms[0].Count == 1;

    /// <summary>The same species with another formation constant.</summary>
    /// <param name="log10K">The log10 of the formation constant at infinite dilution; finite.</param>
    /// <returns>A new species.</returns>
    public Species WithLog10K(double log10K) => new(Terms, Protons, Charge, log10K, IonSizeAngstrom);
}
