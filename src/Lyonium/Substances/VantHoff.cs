using System;

namespace Lyonium.Substances;

/// <summary>The integrated van 't Hoff equation with a constant heat capacity.</summary>
internal static class VantHoff
{
    /// <summary>25 °C, in K.</summary>
    public const double StandardK = 298.15;

    private const double GasConstant = 8.31446261815324; // J/(mol K), CODATA 2018, exact

    /// <summary>log10 K at one temperature less that at another.</summary>
    /// <param name="enthalpyJPerMol">The reaction enthalpy at the temperature it is carried from, in J/mol.</param>
    /// <param name="heatCapacityJPerMolK">The reaction heat capacity, in J/(mol K).</param>
    /// <param name="fromK">The temperature it is carried from, in K.</param>
    /// <param name="toK">The temperature it is carried to, in K.</param>
    public static double Log10Shift(double enthalpyJPerMol, double heatCapacityJPerMolK, double fromK, double toK) =>
        ((-enthalpyJPerMol / GasConstant * ((1 / toK) - (1 / fromK)))
            + (heatCapacityJPerMolK / GasConstant * ((fromK / toK) - 1 + Math.Log(toK / fromK))))
        / Math.Log(10);
}
