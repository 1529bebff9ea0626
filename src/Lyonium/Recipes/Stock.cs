using System;
using Lyonium.Faults;
using Lyonium.Quantities;
using Lyonium.Substances;
using UnitsNet;

namespace Lyonium.Recipes;

/// <summary>What a bottle holds: a substance in water, and how strong it is.</summary>
/// <remarks>Equal when substance, strength, density and name mean the same. Immutable; safe to share between threads.</remarks>
public sealed record Stock
{
    private Stock(string substance, Measure strength)
    {
        Substance = substance;
        Strength = strength;
    }

    /// <summary>The substance: a name, id or formula as it was given; in a recipe that was built, the id.</summary>
    public string Substance { get; private init; }

    /// <summary>The strength: an amount concentration, a molality, or a mass fraction.</summary>
    public Measure Strength { get; }

    /// <summary>The density of the solution at the temperature of preparation; <see langword="null"/> where it was not stated.</summary>
    public Measure? Density { get; private init; }

    /// <summary>The name of the bottle; <see langword="null"/> where it has none.</summary>
    public string? Name { get; private init; }

    /// <summary>A stock of a stated strength.</summary>
    /// <param name="substance">A name, id or formula of the table.</param>
    /// <param name="strength">The strength as UCUM text: <c>"0.05 mol/L"</c>, <c>"0.1 mol/kg"</c> or <c>"37 %"</c> by mass; above zero.</param>
    /// <returns>The stock.</returns>
    /// <exception cref="ArgumentNullException">A parameter is <see langword="null"/>.</exception>
    /// <exception cref="LyoniumException">The strength cannot be read, or is not one.</exception>
    public static Stock Of(string substance, string strength)
    {
        _ = strength ?? throw new ArgumentNullException(nameof(strength));
        var dimension = MeasureReader.DimensionOf(strength) is Dimension.Molality or Dimension.MassFraction
            ? MeasureReader.DimensionOf(strength)!.Value
            : Dimension.AmountConcentration;
        return Checked(substance, Measure.Parse(strength, dimension));
    }

    /// <summary>A stock of a stated amount concentration.</summary>
    /// <param name="substance">A name, id or formula of the table.</param>
    /// <param name="concentration">The amount of substance per volume of solution, above zero.</param>
    /// <returns>The stock.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="substance"/> is <see langword="null"/>.</exception>
    /// <exception cref="LyoniumException">The strength is not a finite number above zero.</exception>
    public static Stock Of(string substance, Molarity concentration) => Checked(substance, UnitsNetDoor.From(concentration));

    /// <summary>A stock of a stated molality.</summary>
    /// <param name="substance">A name, id or formula of the table.</param>
    /// <param name="molality">The amount of substance per mass of water, above zero.</param>
    /// <returns>The stock.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="substance"/> is <see langword="null"/>.</exception>
    /// <exception cref="LyoniumException">The strength is not a finite number above zero.</exception>
    public static Stock Of(string substance, Molality molality) => Checked(substance, UnitsNetDoor.From(molality));

    /// <summary>A stock of a stated mass fraction.</summary>
    /// <param name="substance">A name, id or formula of the table.</param>
    /// <param name="massFraction">The mass of substance per mass of solution, above 0 and at most 100 %.</param>
    /// <returns>The stock.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="substance"/> is <see langword="null"/>.</exception>
    /// <exception cref="LyoniumException">The strength is not a finite number above zero, or is above 100 %.</exception>
    public static Stock Of(string substance, MassFraction massFraction) => Checked(substance, UnitsNetDoor.From(massFraction));

    /// <summary>The same stock with a stated density.</summary>
    /// <param name="density">The density of the solution as UCUM text, such as <c>"1.18 g/mL"</c>; above zero.</param>
    /// <returns>A new stock.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="density"/> is <see langword="null"/>.</exception>
    /// <exception cref="LyoniumException">The density cannot be read, or is not above zero.</exception>
    public Stock WithDensity(string density) => WithDensity(Measure.Parse(density, Dimension.Density));

    /// <summary>The same stock with a stated density.</summary>
    /// <param name="density">The density of the solution, above zero.</param>
    /// <returns>A new stock.</returns>
    /// <exception cref="LyoniumException">The density is not a finite number above zero.</exception>
    public Stock WithDensity(Density density) => WithDensity(UnitsNetDoor.From(density));

    /// <summary>The same stock with a name on the bottle, by which JSON refers to it.</summary>
    /// <param name="name">The name.</param>
    /// <returns>A new stock.</returns>
    /// <exception cref="ArgumentException"><paramref name="name"/> is empty.</exception>
    public Stock Named(string name) =>
        string.IsNullOrWhiteSpace(name) ? throw new ArgumentException("A name has letters.", nameof(name)) : this with { Name = name };

    /// <summary>The stock in words, such as <c>hydrochloric acid 0.05 mol/L</c>.</summary>
    /// <returns>Substance and strength.</returns>
    public override string ToString() => Substance + " " + Strength;

    internal static Stock Unchecked(string substance, Measure strength, Measure? density, string? name) =>
        new(substance, strength) { Density = density, Name = name };

    /// <summary>What is wrong with a strength, wherever it was stated.</summary>
    internal static bool CheckStrength(Measure strength, string path, FaultList faults)
    {
        if (MeasureReader.Check(strength, path, strength.ToString(), faults) is null)
        {
            return false;
        }

        if (strength.Computed == 0)
        {
            faults.Add(FaultKinds.Zero, path, strength.ToString(), MeasureReader.Expected(strength.Dimension));
            return false;
        }

        if (strength.Dimension == Dimension.MassFraction && strength.Computed > 1)
        {
            faults.Add(
                FaultKinds.OutOfRange, path, strength.ToString(), MeasureReader.Expected(strength.Dimension), ("low", "0 %"), ("high", "100 %"));
            return false;
        }

        return true;
    }

    internal static bool CheckDensity(Measure density, string path, FaultList faults)
    {
        if (MeasureReader.Check(density, path, density.ToString(), faults) is null)
        {
            return false;
        }

        if (density.Computed == 0)
        {
            faults.Add(FaultKinds.Zero, path, density.ToString(), MeasureReader.Expected(Dimension.Density));
            return false;
        }

        return true;
    }

    /// <summary>The name of the JSON property that states a strength of this dimension.</summary>
    internal static string StrengthProperty(Dimension dimension) => dimension switch
    {
        Dimension.Molality => "molality",
        Dimension.MassFraction => "massFraction",
        _ => "concentration",
    };

    internal Stock Resolved(Substance substance) => this with { Substance = substance.Id };

    private static Stock Checked(string substance, Measure strength)
    {
        var faults = new FaultList();
        CheckStrength(strength, "$." + StrengthProperty(strength.Dimension), faults);
        faults.ThrowIfAny();
        return new Stock(substance ?? throw new ArgumentNullException(nameof(substance)), strength);
    }

    private Stock WithDensity(Measure density)
    {
        var faults = new FaultList();
        CheckDensity(density, "$.density", faults);
        faults.ThrowIfAny();
        return this with { Density = density };
    }
}
