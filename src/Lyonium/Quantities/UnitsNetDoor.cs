using System;
using UnitsNet;
using UnitsNet.Units;

namespace Lyonium.Quantities;

/// <summary>
/// UnitsNet quantities become measures here, once: the number and the unit are taken as they stand where the unit has a UCUM code
/// that is read here (so that code, text and JSON give the same double), and are converted by UnitsNet where it has none.
/// </summary>
internal static class UnitsNetDoor
{
    public static Measure From(Volume volume) => volume.Unit switch
    {
        VolumeUnit.Liter => Of(volume.Value, "L"),
        VolumeUnit.Milliliter => Of(volume.Value, "mL"),
        VolumeUnit.Microliter => Of(volume.Value, "uL"),
        _ => Of(Converted(() => volume.Liters), "L"),
    };

    public static Measure From(Mass mass) => mass.Unit switch
    {
        MassUnit.Kilogram => Of(mass.Value, "kg"),
        MassUnit.Gram => Of(mass.Value, "g"),
        MassUnit.Milligram => Of(mass.Value, "mg"),
        MassUnit.Microgram => Of(mass.Value, "ug"),
        _ => Of(Converted(() => mass.Kilograms), "kg"),
    };

    public static Measure From(AmountOfSubstance amount) => amount.Unit switch
    {
        AmountOfSubstanceUnit.Mole => Of(amount.Value, "mol"),
        AmountOfSubstanceUnit.Millimole => Of(amount.Value, "mmol"),
        _ => Of(Converted(() => amount.Moles), "mol"),
    };

    public static Measure From(Molarity concentration) => concentration.Unit switch
    {
        MolarityUnit.MolePerLiter => Of(concentration.Value, "mol/L"),
        MolarityUnit.MillimolePerLiter => Of(concentration.Value, "mmol/L"),
        MolarityUnit.MicromolePerLiter => Of(concentration.Value, "umol/L"),
        _ => Of(Converted(() => concentration.MolesPerLiter), "mol/L"),
    };

    public static Measure From(Molality molality) => molality.Unit switch
    {
        MolalityUnit.MolePerKilogram => Of(molality.Value, "mol/kg"),
        _ => Of(Converted(() => molality.MolesPerKilogram), "mol/kg"),
    };

    public static Measure From(MassFraction fraction) => fraction.Unit switch
    {
        MassFractionUnit.Percent => Of(fraction.Value, "%"),
        _ => Of(Converted(() => fraction.Percent), "%"),
    };

    public static Measure From(Density density) => density.Unit switch
    {
        DensityUnit.GramPerMilliliter => Of(density.Value, "g/mL"),
        DensityUnit.KilogramPerLiter => Of(density.Value, "kg/L"),
        DensityUnit.GramPerLiter => Of(density.Value, "g/L"),
        _ => Of(Converted(() => density.KilogramsPerLiter), "kg/L"),
    };

    public static Measure From(Temperature temperature) => temperature.Unit switch
    {
        TemperatureUnit.DegreeCelsius => Of(temperature.Value, "Cel"),
        TemperatureUnit.Kelvin => Of(temperature.Value, "K"),
        _ => Of(Converted(() => temperature.Kelvins), "K"),
    };

    // UnitsNet throws where a conversion overflows; here that is a number that is not finite, and is told as such.
    private static double Converted(Func<double> conversion)
    {
        try
        {
            return conversion();
        }
        catch (ArgumentException)
        {
            return double.PositiveInfinity;
        }
    }

    private static Measure Of(double value, string code) => new(value, UcumUnit.Find(code)!);
}
