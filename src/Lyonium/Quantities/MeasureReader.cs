using System;
using Lyonium.Faults;

namespace Lyonium.Quantities;

/// <summary>Reads measures from text and from numbers, and says where and why one is refused.</summary>
internal static class MeasureReader
{
    public static Measure? Read(string text, Dimension dimension, string path, FaultList faults, double? standardUncertainty = null)
    {
        var trimmed = text.Trim();
        var gap = trimmed.LastIndexOf(' ');
        var number = gap < 0 ? trimmed : trimmed.Substring(0, gap).TrimEnd();
        if (IsNotFinite(number))
        {
            faults.Add(FaultKinds.NotFinite, path, text, Example(dimension));
            return null;
        }

        if (number.IndexOf(',') >= 0)
        {
            faults.Add(FaultKinds.DecimalComma, path, text, Example(dimension));
            return null;
        }

        if (gap < 0 || !NumberText.IsNumber(number))
        {
            faults.Add(FaultKinds.NotAQuantity, path, text, Expected(dimension), Example(dimension));
            return null;
        }

        return Read(NumberText.Parse(number), trimmed.Substring(gap + 1), dimension, path, text, faults, standardUncertainty);
    }

    public static Measure? Read(
        double value, string unitText, Dimension dimension, string path, string found, FaultList faults, double? standardUncertainty = null)
    {
        if (UcumUnit.Find(unitText) is not { } unit)
        {
            faults.Add(FaultKinds.UnknownUnit, path, found, ("unit", unitText), ("known", UcumUnit.CodesOf(dimension)));
            return null;
        }

        if (unit.Dimension != dimension)
        {
            faults.Add(FaultKinds.WrongDimension, path, found, Expected(dimension), Example(dimension), ("actual", DimensionText.NameOf(unit.Dimension)));
            return null;
        }

        return Check(new Measure(value, unit, standardUncertainty), path, found, faults);
    }

    /// <summary>The dimension of the unit at the end of a text, where it has one that is known.</summary>
    public static Dimension? DimensionOf(string text)
    {
        var trimmed = text.Trim();
        return UcumUnit.Find(trimmed.Substring(trimmed.LastIndexOf(' ') + 1))?.Dimension;
    }

    /// <summary>Finite, and not below zero (for a temperature, not below absolute zero).</summary>
    public static Measure? Check(Measure measure, string path, string found, FaultList faults)
    {
        if (!IsFinite(measure.Value) || (measure.StandardUncertainty is double u && !IsFinite(u)))
        {
            faults.Add(FaultKinds.NotFinite, path, found, Example(measure.Dimension));
            return null;
        }

        if (measure.Computed < 0 || measure.StandardUncertainty < 0)
        {
            faults.Add(FaultKinds.Negative, path, found, Expected(measure.Dimension));
            return null;
        }

        return measure;
    }

    public static (string Name, string Value) Expected(Dimension dimension) => ("expected", DimensionText.NameOf(dimension));

    private static (string Name, string Value) Example(Dimension dimension) => ("example", DimensionText.ExampleOf(dimension));

    private static bool IsFinite(double value) => !double.IsNaN(value) && !double.IsInfinity(value);

    private static bool IsNotFinite(string number)
    {
        var bare = number.TrimStart('+', '-');
        return bare is "∞"
            || bare.Equals("nan", StringComparison.OrdinalIgnoreCase)
            || bare.Equals("inf", StringComparison.OrdinalIgnoreCase)
            || bare.Equals("infinity", StringComparison.OrdinalIgnoreCase);
    }
}
