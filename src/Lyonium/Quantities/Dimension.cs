namespace Lyonium.Quantities;

/// <summary>What a <see cref="Measure"/> measures, and the unit in which the library computes with it.</summary>
public enum Dimension
{
    /// <summary>Amount of substance per volume of solution; computed in mol/L.</summary>
    AmountConcentration,

    /// <summary>Amount of substance per mass of water; computed in mol/kg.</summary>
    Molality,

    /// <summary>Mass of solute per mass of solution; computed as a fraction of 1.</summary>
    MassFraction,

    /// <summary>Volume; computed in L.</summary>
    Volume,

    /// <summary>Mass; computed in kg.</summary>
    Mass,

    /// <summary>Amount of substance; computed in mol.</summary>
    Amount,

    /// <summary>Mass per volume; computed in kg/L.</summary>
    Density,

    /// <summary>Thermodynamic temperature; computed in K.</summary>
    Temperature,
}
