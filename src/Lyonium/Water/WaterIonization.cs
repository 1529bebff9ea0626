using System;
using Lyonium.Provenance;

namespace Lyonium.Water;

/// <summary>The ion product of water.</summary>
/// <remarks>
/// IAPWS R11-24, molality scale, standard state of infinite dilution; its check values are reproduced to 1e-6. At 0.1 MPa the density is
/// that of <see cref="WaterDensity"/>. Thread-safe.
/// </remarks>
public static class WaterIonization
{
    /// <summary>Where the equation was published.</summary>
    public static Source Source { get; } = new(
        "iapws-r11-24", "IAPWS R11-24, Release on the ionization constant of H2O (2024)");

    /// <summary>pKw at 0.1 MPa.</summary>
    /// <param name="temperatureK">The temperature in K, 273.15 to 373.15.</param>
    /// <returns>−log10 of the ion product, molality scale.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside 273.15 K to 373.15 K.</exception>
    public static double PKw(double temperatureK)
    {
        if (!(temperatureK >= 273.15 && temperatureK <= 373.15))
        {
            throw new ArgumentOutOfRangeException(nameof(temperatureK), temperatureK, "Liquid water at 0.1 MPa: 273.15 K to 373.15 K.");
        }

        return PKw(temperatureK, WaterDensity.KgPerL(temperatureK));
    }

    /// <summary>pKw at a temperature and a density.</summary>
    /// <param name="temperatureK">The temperature in K, 273.15 to 1273.15.</param>
    /// <param name="densityKgPerL">The density in kg/L, 0 to 1.25.</param>
    /// <returns>−log10 of the ion product, molality scale.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The temperature or the density is outside the range of the release.</exception>
    public static double PKw(double temperatureK, double densityKgPerL)
    {
        if (!(temperatureK >= 273.15 && temperatureK <= 1273.15))
        {
            throw new ArgumentOutOfRangeException(nameof(temperatureK), temperatureK, "The release holds from 273.15 K to 1273.15 K.");
        }

        if (!(densityKgPerL >= 0 && densityKgPerL <= 1.25))
        {
            throw new ArgumentOutOfRangeException(nameof(densityKgPerL), densityKgPerL, "The release holds up to 1.25 kg/L.");
        }

        const double n = 6;
        const double molarMassGPerMol = 18.015268;
        var t = temperatureK;
        var rho = densityKgPerL;
        var z = rho * Math.Exp(-0.702132 + (8681.05 / t) - (24145.1 / (t * t) * Math.Pow(rho, 2.0 / 3.0)));
        var dense = Math.Log10(1 + z) - (z / (1 + z) * rho * (0.813876 - (51.4471 / t) - (0.469920 * rho)));
        var idealGas = 0.61415 + (48251.33 / t) - (67707.93 / (t * t)) + (1.01021e7 / (t * t * t));
        return (-2 * n * dense) + idealGas + (2 * Math.Log10(molarMassGPerMol / 1000));
    }
}
