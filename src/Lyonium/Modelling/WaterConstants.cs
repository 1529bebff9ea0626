using System.Collections.Generic;
using Lyonium.Equilibria;
using Lyonium.Provenance;
using Lyonium.Water;

namespace Lyonium.Modelling;

/// <summary>The constants of water that a prediction used, with their sources.</summary>
internal static class WaterConstants
{
    private static readonly Source Slopes = new(
        "debye-huckel-from-iapws",
        "Debye-Hückel limiting slope computed from the density (IAPWS SR6-08) and the permittivity (IAPWS R8-97) of water with CODATA 2018 constants");

    private static readonly Source Kielland = new(
        "kielland-1937", "J. Kielland, J. Am. Chem. Soc. 59 (1937) 1675");

    public const string IonSizeQuantity = "ion-size parameter in Å";

    /// <summary>The ion-size parameter of the hydrogen ion, in ångström.</summary>
    public static SourcedValue HydrogenIonSize { get; } = new(9, Kielland, Known.ReadAndMemory);

    /// <summary>The ion-size parameter of the hydroxide ion, in ångström.</summary>
    public static SourcedValue HydroxideIonSize { get; } = new(3.5, Kielland, Known.ReadAndMemory);

    public static Solvent SolventAt(double temperatureK)
    {
        var slopes = DebyeHuckelSlopes.At(temperatureK);
        return new Solvent(temperatureK, WaterIonization.PKw(temperatureK), slopes.A, slopes.B);
    }

    public static IEnumerable<UsedConstant> IonSizes(double temperatureK) =>
    [
        new("water", "Debye-Hückel B in (kg/mol)^½/Å", Of(DebyeHuckelSlopes.At(temperatureK).B, Slopes, Known.Derived, temperatureK), null),
        new("water:2", IonSizeQuantity, HydrogenIonSize, null),
        new("water:0", IonSizeQuantity, HydroxideIonSize, null),
    ];

    public static IEnumerable<UsedConstant> At(double temperatureK, double preparedAtK) =>
    [
        new("water", "pKw", Of(WaterIonization.PKw(temperatureK), WaterIonization.Source, Known.ReadAndMemory, temperatureK), null),
        new("water", "Debye-Hückel A in (kg/mol)^½", Of(DebyeHuckelSlopes.At(temperatureK).A, Slopes, Known.Derived, temperatureK), null),
        new("water", "density in kg/L", Of(WaterDensity.KgPerL(preparedAtK), WaterDensity.Source, Known.ReadAndMemory, preparedAtK), null),
    ];

    private static SourcedValue Of(double value, Source source, Known known, double temperatureK) =>
        new(value, source, known) { TemperatureK = temperatureK };
}
