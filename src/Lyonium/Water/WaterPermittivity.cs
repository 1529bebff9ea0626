using System;
using Lyonium.Provenance;

namespace Lyonium.Water;

/// <summary>The static relative permittivity (dielectric constant) of water.</summary>
/// <remarks>
/// IAPWS R8-97, with the constants that the release states (they are older than the present SI, and the equation was fitted with them).
/// The coefficients are known as read and from memory. Thread-safe.
/// </remarks>
public static class WaterPermittivity
{
    private static readonly double[] N =
    [
        0.978224486826, -0.957771379375, 0.237511794148, 0.714692244396, -0.298217036956, -0.108863472196,
        0.949327488264e-1, -0.980469816509e-2, 0.165167634970e-4, 0.937359795772e-4, -0.123179218720e-9,
    ];

    private static readonly int[] I = [1, 1, 1, 2, 3, 3, 4, 5, 6, 7, 10];
    private static readonly double[] J = [0.25, 1, 2.5, 1.5, 1.5, 2.5, 2, 2, 5, 0.5, 10];

    /// <summary>Where the equation was published.</summary>
    public static Source Source { get; } = new(
        "iapws-r8-97", "IAPWS R8-97, Release on the static dielectric constant of ordinary water substance (1997)");

    /// <summary>The permittivity at a temperature and a density.</summary>
    /// <param name="temperatureK">The temperature in K, 238 to 873.</param>
    /// <param name="densityKgPerL">The density in kg/L, above 0.</param>
    /// <returns>The relative permittivity.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The temperature or the density is outside the range of the equation.</exception>
    public static double Relative(double temperatureK, double densityKgPerL)
    {
        if (!(temperatureK >= 238 && temperatureK <= 873))
        {
            throw new ArgumentOutOfRangeException(nameof(temperatureK), temperatureK, "The equation holds from 238 K to 873 K.");
        }

        if (!(densityKgPerL > 0 && densityKgPerL < 1.3))
        {
            throw new ArgumentOutOfRangeException(nameof(densityKgPerL), densityKgPerL, "The density of water lies above 0 and below 1.3 kg/L.");
        }

        const double criticalK = 647.096;
        const double criticalKgPerM3 = 322;
        const double molarMassKgPerMol = 0.018015268;
        const double avogadro = 6.0221367e23;
        const double boltzmann = 1.380658e-23;
        const double polarizability = 1.636e-40;
        const double dipole = 6.138e-30;
        var vacuum = 1 / (4e-7 * Math.PI * 299792458.0 * 299792458.0);

        var reduced = densityKgPerL * 1000 / criticalKgPerM3;
        var inverse = criticalK / temperatureK;
        var g = 1 + (0.196096504426e-2 * reduced * Math.Pow((temperatureK / 228) - 1, -1.2));
        for (var k = 0; k < N.Length; k++)
        {
            g += N[k] * Math.Pow(reduced, I[k]) * Math.Pow(inverse, J[k]);
        }

        var molarDensity = densityKgPerL * 1000 / molarMassKgPerMol;
        var a = avogadro * dipole * dipole * molarDensity * g / (vacuum * boltzmann * temperatureK);
        var b = avogadro * polarizability * molarDensity / (3 * vacuum);
        return (1 + a + (5 * b) + Math.Sqrt(9 + (2 * a) + (18 * b) + (a * a) + (10 * a * b) + (9 * b * b))) / (4 - (4 * b));
    }
}
