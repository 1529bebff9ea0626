using System;

namespace Lyonium.Water;

/// <summary>The slopes of the Debye–Hückel equation in water at 0.1 MPa, molality scale.</summary>
/// <remarks>
/// Computed from <see cref="WaterDensity"/> and <see cref="WaterPermittivity"/> with the CODATA 2018 constants
/// (R. A. Robinson and R. H. Stokes, Electrolyte Solutions, give the equations). Valid from 273.15 K to 373.15 K. Thread-safe.
/// </remarks>
/// <param name="A">The limiting slope for log10 γ, in (kg/mol)^½.</param>
/// <param name="B">The slope of the ion-size term, in (kg/mol)^½ per ångström.</param>
public readonly record struct DebyeHuckelSlopes(double A, double B)
{
    /// <summary>The slopes at a temperature.</summary>
    /// <param name="temperatureK">The temperature in K, 273.15 to 373.15.</param>
    /// <returns>The slopes.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside 273.15 K to 373.15 K.</exception>
    public static DebyeHuckelSlopes At(double temperatureK)
    {
        if (!(temperatureK >= 273.15 && temperatureK <= 373.15))
        {
            throw new ArgumentOutOfRangeException(nameof(temperatureK), temperatureK, "Liquid water at 0.1 MPa: 273.15 K to 373.15 K.");
        }

        const double elementaryCharge = 1.602176634e-19;
        const double avogadro = 6.02214076e23;
        const double boltzmann = 1.380649e-23;
        const double vacuumPermittivity = 8.8541878128e-12;

        var density = WaterDensity.KgPerL(temperatureK);
        var permittivity = WaterPermittivity.Relative(temperatureK, density) * vacuumPermittivity;
        var densityKgPerM3 = density * 1000;
        var bjerrum = elementaryCharge * elementaryCharge / (4 * Math.PI * permittivity * boltzmann * temperatureK);
        var a = Math.Sqrt(2 * Math.PI * avogadro * densityKgPerM3) * Math.Pow(bjerrum, 1.5) / Math.Log(10);
        var b = Math.Sqrt(8 * Math.PI * avogadro * densityKgPerM3 * bjerrum) * 1e-10;
        return new DebyeHuckelSlopes(a, b);
    }
}
