using System;

namespace Lyonium.Equilibria;

/// <summary>A model of activity coefficients: a plug-in point.</summary>
/// <remarks>
/// An implementation keeps no state, gives the same answer on every thread, and fills every entry. The coefficients are on the molality
/// scale, with the standard state of infinite dilution.
/// </remarks>
public interface IActivityModel
{
    /// <summary>The name by which records pin the model, such as <c>davies</c>.</summary>
    string Name { get; }

    /// <summary>The ionic strength in mol/kg above which a prediction is flagged as outside the model's range.</summary>
    double HighestIonicStrengthMolPerKg { get; }

    /// <summary>
    /// What the model looks up of the ions beside their charges: a prediction then lists it with its sources, and what is not known of it.
    /// </summary>
    IonData Uses { get; }

    /// <summary>The published source of the equation, as a citation.</summary>
    string Source { get; }

    /// <summary>Gives log10 γ of every species of an equilibrium.</summary>
    /// <param name="equilibrium">The equilibrium: charges, ion sizes, and the water's Debye–Hückel slopes.</param>
    /// <param name="ionicStrengthMolPerKg">The ionic strength in mol/kg, zero or more.</param>
    /// <param name="molalities">The molality of every species in mol/kg, the two ions of water first.</param>
    /// <param name="log10Gammas">Takes log10 γ of every species, in the same order; finite.</param>
    void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas);
}
