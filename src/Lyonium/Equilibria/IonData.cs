using System;

namespace Lyonium.Equilibria;

/// <summary>What an activity model looks up of the ions beside their charges.</summary>
[Flags]
public enum IonData
{
    /// <summary>Nothing.</summary>
    None = 0,

    /// <summary>The ion-size parameters of the species.</summary>
    Sizes = 1,

    /// <summary>The specific interaction coefficients of pairs of species.</summary>
    Interactions = 2,
}
