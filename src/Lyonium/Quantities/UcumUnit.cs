using System;
using System.Collections.Generic;
using System.Linq;

namespace Lyonium.Quantities;

/// <summary>
/// A unit by its code in the Unified Code for Units of Measure, and how it becomes the unit that the library computes in.
/// </summary>
/// <remarks>
/// A conversion moves the decimal point of the shortest text and rounds once: 250 mL and 0.25 L are the same double, and so are 0.7 mL
/// and 0.0007 L, which a division by 1000 tells apart.
/// </remarks>
internal sealed class UcumUnit
{
    private static readonly UcumUnit[] Units =
    [
        new("mol/L", Dimension.AmountConcentration, 0, "M"),
        new("mmol/L", Dimension.AmountConcentration, -3, "mM"),
        new("umol/L", Dimension.AmountConcentration, -6, "µM", "μM", "uM", "µmol/L", "μmol/L"),
        new("mol/kg", Dimension.Molality, 0),
        new("%", Dimension.MassFraction, -2),
        new("L", Dimension.Volume, 0),
        new("mL", Dimension.Volume, -3),
        new("uL", Dimension.Volume, -6, "µL", "μL"),
        new("kg", Dimension.Mass, 0),
        new("g", Dimension.Mass, -3),
        new("mg", Dimension.Mass, -6),
        new("ug", Dimension.Mass, -9, "µg", "μg"),
        new("mol", Dimension.Amount, 0),
        new("mmol", Dimension.Amount, -3),
        new("g/mL", Dimension.Density, 0),
        new("kg/L", Dimension.Density, 0),
        new("g/L", Dimension.Density, -3),
        new("Cel", Dimension.Temperature, 0, "°C", "degC"),
        new("K", Dimension.Temperature, 0),
    ];

    private static readonly Dictionary<string, UcumUnit> ByText = Units
        .SelectMany(unit => unit._typed.Concat([unit.Code]).Select(text => (Text: text, Unit: unit)))
        .ToDictionary(pair => pair.Text, pair => pair.Unit, StringComparer.Ordinal);

    private readonly int _power;
    private readonly string[] _typed;

    private UcumUnit(string code, Dimension dimension, int power, params string[] typed)
    {
        Code = code;
        Dimension = dimension;
        _power = power;
        _typed = typed;
    }

    /// <summary>The UCUM code, the only form that is written.</summary>
    public string Code { get; }

    public Dimension Dimension { get; }

    private bool HasZeroOfCelsius => string.Equals(Code, "Cel", StringComparison.Ordinal);

    public static UcumUnit? Find(string text) => ByText.TryGetValue(text, out var unit) ? unit : null;

    public static string CodesOf(Dimension dimension) =>
        string.Join(", ", Units.Where(unit => unit.Dimension == dimension).Select(unit => unit.Code));

    public double ToComputed(double value) => HasZeroOfCelsius ? NumberText.KelvinOfCelsius(value) : NumberText.MovePoint(value, _power);

    /// <summary>A difference (an uncertainty) in the unit that the library computes in: no zero point is added.</summary>
    public double DifferenceToComputed(double value) => NumberText.MovePoint(value, _power);
}
