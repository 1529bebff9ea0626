using System;
using Lyonium.Quantities;
using Lyonium.Recipes;
using Lyonium.Substances;
using UnitsNet;
using UnitsNet.Units;
using Xunit;

namespace Lyonium.Tests.Quantities;

/// <summary>Text, UnitsNet and JSON give bit-identical doubles, and a UnitsNet unit without a UCUM code is converted.</summary>
public sealed class UnitsNetDoorTests
{
    private const int Rounds = 300;

    [Fact]
    public void Volume_inEachUnit_isTheSameDoubleAsText() => Same(
        ("L", v => UnitsNetDoor.From(new Volume(v, VolumeUnit.Liter))),
        ("mL", v => UnitsNetDoor.From(new Volume(v, VolumeUnit.Milliliter))),
        ("uL", v => UnitsNetDoor.From(new Volume(v, VolumeUnit.Microliter))));

    [Fact]
    public void Mass_inEachUnit_isTheSameDoubleAsText() => Same(
        ("kg", v => UnitsNetDoor.From(new Mass(v, MassUnit.Kilogram))),
        ("g", v => UnitsNetDoor.From(new Mass(v, MassUnit.Gram))),
        ("mg", v => UnitsNetDoor.From(new Mass(v, MassUnit.Milligram))),
        ("ug", v => UnitsNetDoor.From(new Mass(v, MassUnit.Microgram))));

    [Fact]
    public void Amount_inEachUnit_isTheSameDoubleAsText() => Same(
        ("mol", v => UnitsNetDoor.From(new AmountOfSubstance(v, AmountOfSubstanceUnit.Mole))),
        ("mmol", v => UnitsNetDoor.From(new AmountOfSubstance(v, AmountOfSubstanceUnit.Millimole))));

    [Fact]
    public void Strength_inEachUnit_isTheSameDoubleAsText() => Same(
        ("mol/L", v => UnitsNetDoor.From(new Molarity(v, MolarityUnit.MolePerLiter))),
        ("mmol/L", v => UnitsNetDoor.From(new Molarity(v, MolarityUnit.MillimolePerLiter))),
        ("umol/L", v => UnitsNetDoor.From(new Molarity(v, MolarityUnit.MicromolePerLiter))),
        ("mol/kg", v => UnitsNetDoor.From(new Molality(v, MolalityUnit.MolePerKilogram))),
        ("%", v => UnitsNetDoor.From(new MassFraction(v, MassFractionUnit.Percent))));

    [Fact]
    public void DensityAndTemperature_inEachUnit_areTheSameDoubleAsText() => Same(
        ("g/mL", v => UnitsNetDoor.From(new Density(v, DensityUnit.GramPerMilliliter))),
        ("kg/L", v => UnitsNetDoor.From(new Density(v, DensityUnit.KilogramPerLiter))),
        ("g/L", v => UnitsNetDoor.From(new Density(v, DensityUnit.GramPerLiter))),
        ("Cel", v => UnitsNetDoor.From(new Temperature(v, TemperatureUnit.DegreeCelsius))),
        ("K", v => UnitsNetDoor.From(new Temperature(v, TemperatureUnit.Kelvin))));

    [Fact]
    public void UnitWithoutACode_isConverted()
    {
        // 1 US gallon = 3.785411784 L, 1 lb = 0.45359237 kg, both by definition; 32 °F = 273.15 K.
        Assert.Equal(3.785411784, UnitsNetDoor.From(new Volume(1, VolumeUnit.UsGallon)).Computed, 1e-9);
        Assert.Equal(0.45359237, UnitsNetDoor.From(new Mass(1, MassUnit.Pound)).Computed, 1e-9);
        Assert.Equal(0.001, UnitsNetDoor.From(new Volume(1, VolumeUnit.CubicCentimeter)).Computed, 1e-15);
        Assert.Equal(0.37, UnitsNetDoor.From(new MassFraction(0.37, MassFractionUnit.DecimalFraction)).Computed, 1e-12);
        Assert.Equal(1.18, UnitsNetDoor.From(new Density(1180, DensityUnit.KilogramPerCubicMeter)).Computed, 1e-12);
        Assert.Equal(273.15, UnitsNetDoor.From(new Temperature(32, TemperatureUnit.DegreeFahrenheit)).Computed, 1e-9);
        Assert.Equal(2e-9, UnitsNetDoor.From(new AmountOfSubstance(2, AmountOfSubstanceUnit.Nanomole)).Computed, 1e-21);
        Assert.Equal(5e-9, UnitsNetDoor.From(new Molarity(5, MolarityUnit.NanomolePerLiter)).Computed, 1e-21);
    }

    [Fact]
    public void NotFinite_afterConversion_isRefused()
    {
        // UnitsNet itself takes neither NaN nor infinity, but its conversions overflow.
        var attempt = Recipe.Named("hostile")
            .Pour(new Volume(double.MaxValue, VolumeUnit.UsGallon), Stock.Of("HCl", "0.1 mol/L"))
            .Weigh(new Mass(double.MaxValue, MassUnit.ShortTon), "NaCl")
            .PourWater(new Volume(double.MaxValue, VolumeUnit.CubicMeter))
            .MakeUpTo(new Volume(double.MaxValue, VolumeUnit.CubicMeter))
            .TryBuild(SubstanceTable.Default);

        Assert.False(attempt.Success);
        Assert.Equal(
            ["LYO0107 $.parts[0].volume", "LYO0107 $.parts[1].mass", "LYO0107 $.parts[2].volume", "LYO0107 $.makeUpTo"],
            FaultText.CodesAndPaths(attempt.Faults));
        FaultText.Check(attempt.Faults);
    }

    [Fact]
    public void AllDoors_whenNegative_areRefusedAtTheirPlace()
    {
        var attempt = Recipe.Named("hostile")
            .Pour(Volume.FromMilliliters(-1), Stock.Of("HCl", "0.1 mol/L"))
            .Weigh(Mass.FromGrams(-1), "NaCl")
            .Add(AmountOfSubstance.FromMoles(-1), "NaCl")
            .PourWater(Mass.FromGrams(-1))
            .MakeUpTo(Volume.FromLiters(-1))
            .At(Temperature.FromDegreesCelsius(-1))
            .PreparedAt(Temperature.FromDegreesCelsius(101))
            .TryBuild(SubstanceTable.Default);

        Assert.False(attempt.Success);
        Assert.Equal(
            [
                "LYO0105 $.parts[0].volume", "LYO0105 $.parts[1].mass", "LYO0105 $.parts[2].amount", "LYO0105 $.parts[3].mass",
                "LYO0105 $.makeUpTo", "LYO0108 $.temperature", "LYO0108 $.preparedAt",
            ],
            FaultText.CodesAndPaths(attempt.Faults));
        FaultText.Check(attempt.Faults);
    }

    private static void Same(params (string Code, Func<double, Measure> Through)[] doors)
    {
        var random = new Random(71);
        for (var i = 0; i < Rounds; i++)
        {
            // Numbers as people type them, and any double at all.
            var value = i % 2 == 0 ? random.Next(1, 100_000) / 1000.0 : Math.Pow(10, (random.NextDouble() * 20) - 10);
            foreach (var (code, through) in doors)
            {
                var text = NumberText.Shortest(value) + " " + code;
                var fromUnitsNet = through(value);
                var fromText = Measure.Parse(text, fromUnitsNet.Dimension);
                var fromJson = JsonMeasure.Read($$"""{ "value": {{NumberText.Shortest(value)}}, "unit": "{{code}}" }""", fromUnitsNet.Dimension);
                Assert.Equal(BitConverter.DoubleToInt64Bits(fromText.Computed), BitConverter.DoubleToInt64Bits(fromUnitsNet.Computed));
                Assert.Equal(BitConverter.DoubleToInt64Bits(fromText.Computed), BitConverter.DoubleToInt64Bits(fromJson.Computed));
                Assert.Equal(code, fromUnitsNet.Unit);
            }
        }
    }
}
