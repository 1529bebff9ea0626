using System;
using System.Globalization;

namespace Lyonium.Quantities;

/// <summary>Numbers as text that no culture changes.</summary>
internal static class NumberText
{
    /// <summary>The shortest text that reads back to the same double.</summary>
    public static string Shortest(double value)
    {
#if NETSTANDARD2_0
        // On .NET Framework "R" is neither always the shortest nor always right.
        for (var digits = 15; digits < 17; digits++)
        {
            var text = value.ToString("G" + digits.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
            if (Parse(text) == value)
            {
                return text;
            }
        }

        return value.ToString("G17", CultureInfo.InvariantCulture);
#else
        return value.ToString("R", CultureInfo.InvariantCulture);
#endif
    }

    /// <summary>Whether the text is a number as JSON writes it (a leading plus and a bare leading point are let pass).</summary>
    public static bool IsNumber(string text)
    {
        var at = 0;
        if (at < text.Length && text[at] is '+' or '-')
        {
            at++;
        }

        var digits = Digits(text, ref at);
        if (at < text.Length && text[at] == '.')
        {
            at++;
            digits += Digits(text, ref at);
        }

        if (digits == 0)
        {
            return false;
        }

        if (at < text.Length && text[at] is 'e' or 'E')
        {
            at++;
            if (at < text.Length && text[at] is '+' or '-')
            {
                at++;
            }

            if (Digits(text, ref at) == 0)
            {
                return false;
            }
        }

        return at == text.Length;
    }

    /// <summary>The number; infinite where it is beyond what a double holds.</summary>
    public static double Parse(string number) =>
        double.TryParse(number, NumberStyles.Float, CultureInfo.InvariantCulture, out var value) ? value : double.PositiveInfinity;

    /// <summary>The double nearest to the number's shortest text times a power of ten.</summary>
    public static double MovePoint(double value, int power)
    {
        if (power == 0 || value == 0 || double.IsNaN(value) || double.IsInfinity(value))
        {
            return value;
        }

        var text = Shortest(value);
        var exponentAt = text.IndexOf('E');
        var exponent = exponentAt < 0 ? 0 : int.Parse(text.Substring(exponentAt + 1), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        var digits = exponentAt < 0 ? text : text.Substring(0, exponentAt);
        return Parse(digits + "E" + (exponent + power).ToString(CultureInfo.InvariantCulture));
    }

    /// <summary>The double nearest to the number's shortest text plus 273.15.</summary>
    public static double KelvinOfCelsius(double celsius)
    {
        // Beyond what a decimal holds exactly there is no last digit to keep.
        return Math.Abs(celsius) is > 1e-9 and < 1e9
            ? Parse((decimal.Parse(Shortest(celsius), NumberStyles.Float, CultureInfo.InvariantCulture) + 273.15m).ToString(CultureInfo.InvariantCulture))
            : celsius + 273.15;
    }

    private static int Digits(string text, ref int at)
    {
        var start = at;
        while (at < text.Length && text[at] is >= '0' and <= '9')
        {
            at++;
        }

        return at - start;
    }
}
