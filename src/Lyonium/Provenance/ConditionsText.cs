using System;
using Lyonium.Quantities;

namespace Lyonium.Provenance;

/// <summary>The conditions of a value in words.</summary>
internal static class ConditionsText
{
    /// <summary>Such as <c>25 Cel, 0.1 mol/kg</c>; <see langword="null"/> where the value has no conditions.</summary>
    public static string? Of(SourcedValue value)
    {
        if (value.TemperatureK is not double kelvin)
        {
            return null;
        }

        var celsius = NumberText.Shortest(Math.Round(kelvin - 273.15, 6)) + " Cel";
        return value.IonicStrengthMolPerKg > 0 ? $"{celsius}, {NumberText.Shortest(value.IonicStrengthMolPerKg)} mol/kg" : celsius;
    }
}
