using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Provenance;
using Lyonium.Quantities;
using Lyonium.Substances;

namespace Lyonium.Modelling;

/// <summary>The pKa of every step of a mixture, at infinite dilution and at the temperature of the mixture.</summary>
/// <remarks>
/// A pKa published at another ionic strength is carried to infinite dilution with the activity model of the prediction:
/// pKa(0) = pKa(I) + log10 γ(more protonated) − log10 γ(less protonated) − log10 γ(H⁺), at its own temperature; at that of the mixture where
/// the enthalpy was published at that ionic strength too. And it is carried to the temperature of the mixture, where the table says how.
/// </remarks>
internal sealed class StepConstants
{
    private const double SameTemperatureK = 1e-9;

    private readonly double _temperatureK;
    private readonly string _modelName;
    private readonly Dictionary<string, double> _shiftToInfiniteDilution = new(StringComparer.Ordinal);

    public StepConstants(Family[] families, IActivityModel model, double temperatureK)
    {
        _temperatureK = temperatureK;
        _modelName = model.Name;
        foreach (var step in families.SelectMany(family => family.Steps).Where(step => step.PKa.IonicStrengthMolPerKg > 0))
        {
            _shiftToInfiniteDilution.Add(step.Id, ShiftToInfiniteDilution(families.First(family => family.Steps.Contains(step)), step, model, CarriedAtK(step)));
        }
    }

    /// <summary>The pKa as it is used.</summary>
    public double PKa(DissociationStep step) => AtInfiniteDilution(step) + step.ShiftTo(_temperatureK);

    /// <summary>The pKa as published, and each value that it was carried to, the one that is used last.</summary>
    public IEnumerable<UsedConstant> Describe(DissociationStep step, string? layer)
    {
        yield return new UsedConstant(step.Id, "pKa", step.PKa, layer);
        if (step.PKa.IonicStrengthMolPerKg > 0)
        {
            yield return new UsedConstant(step.Id, "pKa at infinite dilution", Derived(
                step,
                AtInfiniteDilution(step),
                CarriedAtK(step),
                $"carried from {NumberText.Shortest(step.PKa.IonicStrengthMolPerKg)} mol/kg with the activity model {_modelName}"), layer);
        }

        if (!step.ChangesWithTemperature || Math.Abs(_temperatureK - step.PublishedAtK) < SameTemperatureK)
        {
            yield break;
        }

        if (step.Equation is null)
        {
            yield return new UsedConstant(step.Id, "enthalpy in kJ/mol", step.EnthalpyKJPerMol!, layer);
            if (step.HeatCapacityJPerMolK is not null)
            {
                yield return new UsedConstant(step.Id, "heat capacity in J/(mol K)", step.HeatCapacityJPerMolK, layer);
            }
        }

        yield return new UsedConstant(step.Id, "pKa at the temperature of the mixture", AtTemperature(step), layer);
    }

    // An enthalpy published at the ionic strength of the constant carries it there, so the coefficients are those of the mixture's temperature.
    private double CarriedAtK(DissociationStep step) => step.EnthalpyKJPerMol is { IonicStrengthMolPerKg: > 0 } ? _temperatureK : step.PublishedAtK;

    private static double ShiftToInfiniteDilution(Family family, DissociationStep step, IActivityModel model, double temperatureK)
    {
        var alone = new Equilibrium(
            [Constraint.Total(0)],
            FamilySpecies.Of(family, 0, one => one.PKa.Value, double.NaN).ToArray(),
            WaterConstants.SolventAt(temperatureK),
            WaterConstants.HydrogenIonSize.Value,
            WaterConstants.HydroxideIonSize.Value);
        var log10Gammas = new double[alone.SpeciesCount];
        model.Log10Gammas(alone, step.PKa.IonicStrengthMolPerKg, new double[alone.SpeciesCount], log10Gammas);
        var less = Equilibrium.WaterIons + family.Steps.Count - step.Number;
        return log10Gammas[less + 1] - log10Gammas[less] - log10Gammas[Equilibrium.HydrogenIon];
    }

    private double AtInfiniteDilution(DissociationStep step) =>
        step.PKa.Value + (_shiftToInfiniteDilution.TryGetValue(step.Id, out var shift) ? shift : 0);

    private SourcedValue AtTemperature(DissociationStep step)
    {
        if (step.Equation is { } equation)
        {
            return Derived(step, PKa(step), _temperatureK, "carried with the published equation pK(T)", equation.Source);
        }

        var how = step.HeatCapacityJPerMolK is null ? "enthalpy" : "enthalpy and heat capacity";
        return Derived(step, PKa(step), _temperatureK, $"carried with {how}, integrated van 't Hoff equation", step.EnthalpyKJPerMol!.Source);
    }

    private static SourcedValue Derived(DissociationStep step, double value, double? temperatureK, string note, Source? source = null) =>
        new(value, source ?? step.PKa.Source, Known.Derived) { TemperatureK = temperatureK, Note = note };
}
