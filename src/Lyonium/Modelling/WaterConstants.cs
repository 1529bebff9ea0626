using System.Collections.Generic;
using Lyonium.Provenance;
using Lyonium.Water;

namespace Lyonium.Modelling;

/// <summary>The constants of water that a prediction used, with their sources.</summary>
internal static class WaterConstants
{
    private static readonly Source Slopes = new(
        "debye-huckel-from-iapws",
        "Debye-Hückel limiting slope computed from the density (IAPWS SR6-08) and the permittivity (IAPWS R8-97) of water with CODATA 2018 constants");

    public static IEnumerable<UsedConstant> At(double temperatureK, double preparedAtK) =>
    [
        new("water", "pKw", Of(WaterIonization.PKw(temperatureK), WaterIonization.Source, Known.ReadAndMemory, temperatureK), null),
        new("water", "Debye-Hückel A in (kg/mol)^½", Of(DebyeHuckelSlopes.At(temperatureK).A, Slopes, Known.Derived, temperatureK), null),
        new("water", "density in kg/L", Of(WaterDensity.KgPerL(preparedAtK), WaterDensity.Source, Known.ReadAndMemory, preparedAtK), null),
    ];

    private static SourcedValue Of(double value, Source source, Known known, double temperatureK) =>
        new(value, source, known) { TemperatureK = temperatureK };
}
