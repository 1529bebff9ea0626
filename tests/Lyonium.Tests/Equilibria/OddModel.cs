using System;
using Lyonium.Equilibria;

namespace Lyonium.Tests.Equilibria;

/// <summary>An activity model that does what a test asks of it; coefficients of one otherwise.</summary>
internal sealed class OddModel(OddModel.Rule rule) : IActivityModel
{
    public delegate void Rule(double ionicStrengthMolPerKg, Span<double> log10Gammas);

    public string Name => "odd";

    public double HighestIonicStrengthMolPerKg => 1;

    public IonData Uses => IonData.None;

    public string Source => "a test";

    public void Log10Gammas(Equilibrium equilibrium, double ionicStrengthMolPerKg, ReadOnlySpan<double> molalities, Span<double> log10Gammas)
    {
        log10Gammas.Clear();
        rule(ionicStrengthMolPerKg, log10Gammas);
    }
}
