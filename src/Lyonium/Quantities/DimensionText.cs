using System;

namespace Lyonium.Quantities;

/// <summary>How a dimension is named and shown in a fault.</summary>
internal static class DimensionText
{
    public static string NameOf(Dimension dimension) => dimension switch
    {
        Dimension.AmountConcentration => "amount concentration",
        Dimension.Molality => "molality",
        Dimension.MassFraction => "mass fraction",
        Dimension.Volume => "volume",
        Dimension.Mass => "mass",
        Dimension.Amount => "amount of substance",
        Dimension.Density => "density",
        Dimension.Temperature => "temperature",
        _ => throw new ArgumentOutOfRangeException(nameof(dimension), dimension, "Not a dimension of this library."),
    };

    public static string ExampleOf(Dimension dimension) => dimension switch
    {
        Dimension.AmountConcentration => "0.1 mol/L",
        Dimension.Molality => "0.1 mol/kg",
        Dimension.MassFraction => "37 %",
        Dimension.Volume => "10 mL",
        Dimension.Mass => "10 g",
        Dimension.Amount => "0.05 mol",
        Dimension.Density => "1.18 g/mL",
        Dimension.Temperature => "25 Cel",
        _ => throw new ArgumentOutOfRangeException(nameof(dimension), dimension, "Not a dimension of this library."),
    };
}
