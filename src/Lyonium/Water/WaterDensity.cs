using System;
using Lyonium.Provenance;

namespace Lyonium.Water;

/// <summary>The density of liquid water at 0.1 MPa.</summary>
/// <remarks>
/// IAPWS SR6-08(2011), equation for the specific volume of liquid water at 0.1 MPa; valid from 253.15 K to 383.15 K. The coefficients
/// are known as read and from memory. Thread-safe.
/// </remarks>
public static class WaterDensity
{
    private static readonly double[] A = [6744.58446, -222521.604, 100231247.0, -1635521180.0, 8322996580.0];
    private static readonly int[] N = [4, 5, 7, 8, 9];
    private static readonly double[] B = [0.00578545292, -0.0153195665, 0.0311337859, -0.0423546241, 0.0338713507, -0.0119946761];
    private static readonly int[] M = [1, 2, 3, 4, 5, 6];

    /// <summary>Where the equation was published.</summary>
    public static Source Source { get; } = new(
        "iapws-sr6-08", "IAPWS SR6-08(2011), Revised supplementary release on properties of liquid water at 0.1 MPa");

    /// <summary>The density at a temperature.</summary>
    /// <param name="temperatureK">The temperature in K, 253.15 to 383.15.</param>
    /// <returns>The density in kg/L.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside the range of the equation.</exception>
    public static double KgPerL(double temperatureK)
    {
        if (!(temperatureK >= 253.15 && temperatureK <= 383.15))
        {
            throw new ArgumentOutOfRangeException(nameof(temperatureK), temperatureK, "The equation holds from 253.15 K to 383.15 K.");
        }

        const double specificGasConstant = 461.51805; // J/(kg K)
        const double reference = 10; // K
        var alpha = reference / (593 - temperatureK);
        var beta = reference / (temperatureK - 232);
        var sum = 1.93763157e-2;
        for (var i = 0; i < A.Length; i++)
        {
            sum += A[i] * Math.Pow(alpha, N[i]);
        }

        for (var i = 0; i < B.Length; i++)
        {
            sum += B[i] * Math.Pow(beta, M[i]);
        }

        var volumeM3PerKg = specificGasConstant * reference / 1e5 * sum;
        return 1e-3 / volumeM3PerKg;
    }
}
