using System;
using Lyonium.Equilibria;

namespace Lyonium.Activity;

/// <summary>Every activity coefficient is one: the textbook's ideal solution, right at infinite dilution.</summary>
/// <remarks>Stateless and thread-safe.</remarks>
public sealed class IdealModel : IActivityModel
{
    /// <inheritdoc/>
    public string Name => "ideal";

    /// <inheritdoc/>
    public double HighestIonicStrengthMolPerKg => 0.001;

    /// <inheritdoc/>
    public IonData Uses => IonData.None;

    /// <inheritdoc/>
    public string Source => "limiting behaviour at infinite dilution; the limit of 0.001 mol/kg is common practice";

    /// <inheritdoc/>
    public void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas) =>
        log10Gammas.Clear();
}
