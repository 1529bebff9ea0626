using System;
using System.Buffers;
using System.Collections.Generic;

namespace Lyonium.Equilibria;

/// <summary>What an equilibrium consists of at a given pH: the molality and the activity coefficient of each species.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed class Speciation
{
    private Speciation(double pH, in ChargeBalance balance, double chargeMagnitude)
    {
        PH = pH;
        IonicStrengthMolPerKg = balance.IonicStrength;
        MolalitiesMolPerKg = Array.AsReadOnly(balance.Molalities.ToArray());
        Log10Gammas = Array.AsReadOnly(balance.Log10Gammas.ToArray());
        ChargeMolPerKg = balance.Charge;
        ChargeMagnitudeMolPerKg = chargeMagnitude;
    }

    /// <summary>The pH at which it was taken.</summary>
    public double PH { get; }

    /// <summary>The ionic strength in mol/kg, consistent with the activity coefficients.</summary>
    public double IonicStrengthMolPerKg { get; }

    /// <summary>The molality of each species in mol/kg, the two ions of water first.</summary>
    public IReadOnlyList<double> MolalitiesMolPerKg { get; }

    /// <summary>log10 γ of each species, in the same order.</summary>
    public IReadOnlyList<double> Log10Gammas { get; }

    /// <summary>The net charge in mol/kg: zero at the pH of the solution, positive at a lower pH, negative at a higher one.</summary>
    public double ChargeMolPerKg { get; }

    /// <summary>Σ|z|m over all species, in mol/kg, against which the net charge is judged.</summary>
    public double ChargeMagnitudeMolPerKg { get; }

    /// <summary>Speciates an equilibrium at a pH.</summary>
    /// <param name="equilibrium">The equilibrium.</param>
    /// <param name="model">The model of activity coefficients.</param>
    /// <param name="pH">−log10 of the hydrogen-ion activity; −300 to 300.</param>
    /// <returns>The speciation.</returns>
    /// <exception cref="ArithmeticException">The model's activity coefficients do not settle at this pH.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The pH is not in range.</exception>
    public static Speciation At(Equilibrium equilibrium, IActivityModel model, double pH)
    {
        _ = equilibrium ?? throw new ArgumentNullException(nameof(equilibrium));
        _ = model ?? throw new ArgumentNullException(nameof(model));
        if (!(pH >= -300 && pH <= 300))
        {
            throw new ArgumentOutOfRangeException(nameof(pH), pH, "A pH lies between -300 and 300 here.");
        }

        var buffer = ArrayPool<double>.Shared.Rent(ChargeBalance.BufferLength(equilibrium));
        try
        {
            var balance = new ChargeBalance(equilibrium, model, buffer);
            if (!balance.At(Math.Pow(10, -pH)))
            {
                throw new ArithmeticException($"The activity coefficients of '{model.Name}' do not settle at this pH.");
            }

            double magnitude = 0;
            for (var i = 0; i < equilibrium.SpeciesCount; i++)
            {
                magnitude += Math.Abs(equilibrium.Charges[i]) * balance.Molalities[i];
            }

            return new Speciation(pH, in balance, magnitude);
        }
        finally
        {
            ArrayPool<double>.Shared.Return(buffer);
        }
    }
}
