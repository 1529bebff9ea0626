using System;
using System.Globalization;
using System.Text;
using Lyonium.Substances;

namespace Lyonium.Tool;

/// <summary>How a pKa changes with temperature, as text.</summary>
internal static class CourseText
{
    /// <summary>The equation with all its digits, such as <c>pK = 1049.05/T − 5.0273 + 0.014654 T</c>.</summary>
    public static string Equation(PKaEquation equation)
    {
        var text = new StringBuilder();
        Add(text, equation.OverT, "/T");
        Add(text, equation.Constant, "");
        Add(text, equation.TimesT, " T");
        Add(text, equation.TimesLnT, " ln T");
        return "pK = " + (text.Length == 0 ? "0" : text.ToString());
    }

    /// <summary>From where to where the pKa is carried, and with what.</summary>
    public static string Range(DissociationStep step)
    {
        if (!step.ChangesWithTemperature)
        {
            return "not at all: how it changes with temperature is not known";
        }

        var with = step.Equation is not null ? "the equation"
            : step.HeatCapacityJPerMolK is null ? "the enthalpy"
            : "the enthalpy and the heat capacity";
        return step.ValidRange is { } range ? $"{Celsius(range.LowK)} to {Celsius(range.HighK)} Cel with {with}" : "with " + with;
    }

    private static string Celsius(double kelvin) => NumberFormat.Short(Math.Round(kelvin - 273.15, 2));

    private static void Add(StringBuilder text, double coefficient, string times)
    {
        if (coefficient == 0)
        {
            return;
        }

        var sign = coefficient < 0 ? "−" : "+";
        text.Append(text.Length > 0 ? $" {sign} " : coefficient < 0 ? sign : "");
        text.Append(Math.Abs(coefficient).ToString("R", CultureInfo.InvariantCulture)).Append(times);
    }
}
