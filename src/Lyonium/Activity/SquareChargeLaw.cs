using System;
using Lyonium.Equilibria;

namespace Lyonium.Activity;

/// <summary>What the models have in common that give every ion of a charge the same coefficient: log10 γ = −A z² f(I).</summary>
internal static class SquareChargeLaw
{
    public static void Fill(Equilibrium equilibrium, double function, Span<double> log10Gammas)
    {
        _ = equilibrium ?? throw new ArgumentNullException(nameof(equilibrium));
        var perSquareCharge = -equilibrium.Solvent.DebyeHuckelA * function;
        var charges = equilibrium.Charges;
        for (var i = 0; i < charges.Length; i++)
        {
            log10Gammas[i] = perSquareCharge * charges[i] * charges[i];
        }
    }
}
