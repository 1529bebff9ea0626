using System;

namespace Lyonium.Equilibria;

/// <summary>What is changed about an equilibrium, for each unit of the change.</summary>
/// <remarks>The spans may be empty where nothing of the kind changes. Species stand in the order of the equilibrium, the ions of water first.</remarks>
internal readonly ref struct Change
{
    /// <summary>The change of log10 K of each species.</summary>
    public ReadOnlySpan<double> Log10K { get; init; }

    /// <summary>The change of log10 γ of each species at a given ionic strength.</summary>
    public ReadOnlySpan<double> Log10Gammas { get; init; }

    /// <summary>The change of pKw.</summary>
    public double PKw { get; init; }

    /// <summary>The charge of ions added that take part in nothing else, in mol/kg.</summary>
    public double AddedCharge { get; init; }

    /// <summary>The ionic strength of ions added that take part in nothing else, in mol/kg.</summary>
    public double AddedIonicStrength { get; init; }

    /// <summary>A strong base added: one mol/kg of a singly charged cation for each unit.</summary>
    public static Change StrongBase => new() { AddedCharge = 1, AddedIonicStrength = 0.5 };
}
