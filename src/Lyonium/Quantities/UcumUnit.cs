using System;
using System.Collections.Generic;
using System.Linq;

namespace Lyonium.Quantities;

/// <summary>
/// A unit by its code in the Unified Code for Units of Measure, and how it becomes the unit that the library computes in.
/// </summary>
/// <remarks>
/// A conversion divides by an exact power of ten, so it rounds once: 250 mL and 0.25 L are the same double.
/// </remarks>
internal sealed class UcumUnit
{
    private static readonly UcumUnit[] Units =
    [
        new("mol/L", Dimension.AmountConcentration, 1, "M"),
        new("mmol/L", Dimension.AmountConcentration, 1e3, "mM"),
        new("umol/L", Dimension.AmountConcentration, 1e6, "µM", "μM", "uM", "µmol/L", "μmol/L"),
        new("mol/kg", Dimension.Molality, 1),
        new("%", Dimension.MassFraction, 1e2),
        new("L", Dimension.Volume, 1),
        new("mL", Dimension.Volume, 1e3),
        new("uL", Dimension.Volume, 1e6, "µL", "μL"),
        new("kg", Dimension.Mass, 1),
        new("g", Dimension.Mass, 1e3),
        new("mg", Dimension.Mass, 1e6),
        new("ug", Dimension.Mass, 1e9, "µg", "μg"),
        new("mol", Dimension.Amount, 1),
        new("mmol", Dimension.Amount, 1e3),
        new("g/mL", Dimension.Density, 1),
        new("kg/L", Dimension.Density, 1),
        new("g/L", Dimension.Density, 1e3),
        new("Cel", Dimension.Temperature, 1, "°C", "degC"),
        new("K", Dimension.Temperature, 1),
    ];

    private static readonly Dictionary<string, UcumUnit> ByText = Units
        .SelectMany(unit => unit._typed.Concat([unit.Code]).Select(text => (Text: text, Unit: unit)))
        .ToDictionary(pair => pair.Text, pair => pair.Unit, StringComparer.Ordinal);

    private readonly double _divisor;
    private readonly string[] _typed;

    private UcumUnit(string code, Dimension dimension, double divisor, params string[] typed)
    {
        Code = code;
        Dimension = dimension;
        _divisor = divisor;
        _typed = typed;
    }

    /// <summary>The UCUM code, the only form that is written.</summary>
    public string Code { get; }

    public Dimension Dimension { get; }

    private double Zero => string.Equals(Code, "Cel", StringComparison.Ordinal) ? 273.15 : 0;

    public static UcumUnit? Find(string text) => ByText.TryGetValue(text, out var unit) ? unit : null;

    public static string CodesOf(Dimension dimension) =>
        string.Join(", ", Units.Where(unit => unit.Dimension == dimension).Select(unit => unit.Code));

    public double ToComputed(double value) => (value / _divisor) + Zero;

    /// <summary>A difference (an uncertainty) in the unit that the library computes in: no zero point is added.</summary>
    public double DifferenceToComputed(double value) => value / _divisor;
}
