using System;
using System.Globalization;

namespace Lyonium.Tool;

/// <summary>Numbers for people: a few significant digits, and the unit that keeps them short.</summary>
internal static class NumberFormat
{
    /// <summary>Some significant digits, with trailing zeros kept; powers of ten beyond four zeros.</summary>
    public static string Significant(double value, int digits)
    {
        if (value == 0)
        {
            return "0";
        }

        // The magnitude after rounding: 0.0099999 to four digits is 0.01000.
        var rounded = double.Parse(value.ToString("G" + digits.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        var magnitude = (int)Math.Floor(Math.Log10(Math.Abs(rounded)));
        if (magnitude is < -4 or > 5)
        {
            return value.ToString("0." + new string('0', digits - 1) + "e0", CultureInfo.InvariantCulture);
        }

        return value.ToString("F" + Math.Max(0, digits - 1 - magnitude).ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
    }

    /// <summary>At most so many significant digits, without trailing zeros.</summary>
    public static string Short(double value, int digits = 6) =>
        value.ToString("G" + digits.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);

    public static string Amount(double mol) => mol switch
    {
        0 => "0 mol",
        >= 1 => Significant(mol, 4) + " mol",
        >= 1e-3 => Significant(mol * 1e3, 4) + " mmol",
        _ => Significant(mol * 1e6, 4) + " µmol",
    };

    public static string Volume(double litres) => litres switch
    {
        >= 1 => Short(litres, 5) + " L",
        >= 1e-3 => Short(litres * 1e3, 5) + " mL",
        _ => Short(litres * 1e6, 5) + " µL",
    };

    public static string Mass(double kg) => kg switch
    {
        >= 1 => Short(kg, 5) + " kg",
        >= 1e-3 => Short(kg * 1e3, 5) + " g",
        _ => Short(kg * 1e6, 5) + " mg",
    };

    public static string Percent(double fraction) => fraction switch
    {
        >= 0.9999 => "100 %",
        >= 0.1 => (fraction * 100).ToString("F1", CultureInfo.InvariantCulture) + " %",
        _ => Significant(fraction * 100, 2) + " %",
    };
}
