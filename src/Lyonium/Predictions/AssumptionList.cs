using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Quantities;
using Lyonium.Recipes;
using Lyonium.Substances;

namespace Lyonium.Predictions;

/// <summary>Gathers what a prediction takes for granted, the method's own assumptions first.</summary>
internal sealed class AssumptionList(SolvedMixture answer, Predictor predictor, double waterErrorInPH, double ionSizeErrorInPH)
{
    private const string CommonPractice = "common practice";
    private const string WholeMixture = "mixture";

    public IReadOnlyList<Assumption> ToList() =>
        OfTheMethod()
            .Concat(OfTheModel())
            .Concat(OfTheConstants())
            .Concat(OfTheWater())
            .Concat(OfTheScope())
            .Concat(OfTheRecipe())
            .ToArray();

    private Mixture Mixture => answer.Modelled.Mixture;

    private IEnumerable<Assumption> OfTheMethod()
    {
        if (answer.Outcome.Formula is { } formula)
        {
            yield return new Assumption("formula", WholeMixture, null, null, Held: true, formula);
        }

        foreach (var one in answer.Outcome.Assumptions)
        {
            var of = one.Component < 0 ? WholeMixture : answer.Modelled.Families[one.Component].Name;
            yield return new Assumption(one.Code, of, one.Figure, one.Limit, one.Held, one.Basis);
        }

        const double finest = 1e-9;
        if (answer.Outcome.InputResolution > finest)
        {
            yield return new Assumption(
                "inputs-resolve-the-answer",
                WholeMixture,
                answer.Outcome.InputResolution,
                finest,
                Held: false,
                "half a last digit of the amounts, as doubles, in pH");
        }
    }

    private IEnumerable<Assumption> OfTheModel()
    {
        var ionicStrength = answer.Speciation.IonicStrengthMolPerKg;

        // Ranges are stated to one figure: the standard of 0.1 mol/kg is within 0.1.
        const double rangeIsStatedTo = 1.005;
        var highest = predictor.ActivityModel.HighestIonicStrengthMolPerKg;
        yield return new Assumption(
            ModelScope.IonicStrengthInRange, predictor.ActivityModel.Name, ionicStrength, highest, ionicStrength <= highest * rangeIsStatedTo, predictor.ActivityModel.Source);

        if (predictor.ActivityModel.Uses.HasFlag(IonData.Sizes) && answer.UnlistedIonSizes() is { Count: > 0 } unlisted)
        {
            const double smallest = 0.005;
            yield return new Assumption(
                "ion-size-listed",
                string.Join(", ", unlisted),
                ionSizeErrorInPH,
                smallest,
                ionSizeErrorInPH <= smallest,
                "not listed; Güntelberg's 1/B taken, about 3 Å; the figure is what 9 Å would do to the pH");
        }

        if (predictor.ActivityModel.Uses.HasFlag(IonData.Interactions) && answer.UnlistedInteractions() is { Count: > 0 } missing)
        {
            const double mattersFrom = 0.1;
            yield return new Assumption(
                "interaction-listed",
                string.Join(", ", missing),
                ionicStrength,
                mattersFrom,
                ionicStrength <= mattersFrom,
                "no coefficient is listed and zero is taken; from 0.1 mol/kg on a usual one, 0.1 kg/mol, is 0.01 in log10 γ");
        }

        const double leastWater = 0.9;
        var water = Mixture.WaterKg / Mixture.MassKg;
        yield return new Assumption(ModelScope.WaterIsTheSolvent, WholeMixture, water, leastWater, water >= leastWater, CommonPractice);
    }

    private IEnumerable<Assumption> OfTheConstants()
    {
        foreach (var one in answer.Modelled.Constants.Where(one => one.Quantity == "pKa"))
        {
            if (one.Value.IonicStrengthMolPerKg > 0)
            {
                yield return new Assumption(
                    ModelScope.ConstantCarriedToInfiniteDilution,
                    one.Id,
                    one.Value.IonicStrengthMolPerKg,
                    predictor.ActivityModel.HighestIonicStrengthMolPerKg,
                    one.Value.IonicStrengthMolPerKg <= predictor.ActivityModel.HighestIonicStrengthMolPerKg,
                    "published at this ionic strength; carried with " + predictor.ActivityModel.Name);
            }

        }

        foreach (var pair in answer.Modelled.Pairs.Where(one => !one.ChangesWithTemperature))
        {
            const double nearK = 0.5;
            var away = Math.Abs((pair.Log10K.TemperatureK ?? Mixture.TemperatureK) - Mixture.TemperatureK);
            if (away > nearK)
            {
                yield return new Assumption(
                    ModelScope.ConstantAtItsTemperature, pair.Id, away, nearK, Held: false, "published at another temperature, and used as it is");
            }
        }

        foreach (var step in answer.Modelled.Families.Where((_, i) => answer.Modelled.Equilibrium.Constraints[i].Value > 0).SelectMany(family => family.Steps))
        {
            if (OffItsTemperature(step) is { } flag)
            {
                yield return flag;
            }
        }
    }

    // A constant near its own temperature needs no course; one with a course may be carried as far as the course was published.
    private Assumption? OffItsTemperature(DissociationStep step)
    {
        const double nearK = 0.5;
        var away = Math.Abs(step.PublishedAtK - Mixture.TemperatureK);
        if (away <= nearK)
        {
            return null;
        }

        if (!step.ChangesWithTemperature)
        {
            return new Assumption(
                ModelScope.ConstantAtItsTemperature, step.Id, away, nearK, Held: false, "published at another temperature, and used as it is");
        }

        var beyond = step.ValidRange?.Beyond(Mixture.TemperatureK) ?? 0;
        return beyond > 0
            ? new Assumption(
                ModelScope.ConstantWithinItsTemperatureRange, step.Id, beyond, 0, Held: false, $"carried beyond {RangeText(step.ValidRange!)}: an extrapolation")
            : null;
    }

    private static string RangeText(TemperatureRange range) =>
        $"{NumberText.Shortest(Math.Round(range.LowK - 273.15, 2))} to {NumberText.Shortest(Math.Round(range.HighK - 273.15, 2))} Cel";

    private IEnumerable<Assumption> OfTheWater()
    {
        if (Mixture.EstimatedWaterKg > 0)
        {
            const double smallest = 0.005;
            var estimated = Mixture.Parts.Where(part => part.EstimatedWaterKg > 0 || part.EstimatedVolumeL > 0)
                .Select(part => part.Substance!.Name).Distinct(StringComparer.Ordinal);
            yield return new Assumption(
                "solute-volume-estimated",
                string.Join(", ", estimated),
                waterErrorInPH,
                smallest,
                waterErrorInPH <= smallest,
                "0.5 ± 0.3 mL/g, common practice; the figure is what the 0.3 mL/g does to the pH");
        }

        foreach (var part in Mixture.Parts.Where(part => part.TableDensity is not null).GroupBy(part => part.Substance!.Id, StringComparer.Ordinal).Select(one => one.First()))
        {
            const double nearK = 5;
            var away = Math.Abs((part.TableDensity!.TemperatureK ?? Mixture.Recipe.PreparedAtK) - Mixture.Recipe.PreparedAtK);
            yield return new Assumption(
                "density-from-the-table", part.Substance!.Name, away, nearK, away <= nearK, "kelvins between the table's density and the preparation");
        }
    }

    // What the model leaves out is listed only where it shows.
    private IEnumerable<Assumption> OfTheScope() =>
        new SolubilityCheck(answer, predictor.ActivityModel).Exceeded().Concat(CautionTable.Default.ReactionsIn(Mixture));

    private IEnumerable<Assumption> OfTheRecipe()
    {
        if (Mixture.Recipe.Temperature is null)
        {
            yield return new Assumption("temperature-default", WholeMixture, 25, null, Held: true, "not stated; 25 Cel taken");
        }

        if (Mixture.Recipe.PreparedAt is null)
        {
            yield return new Assumption("preparation-temperature-default", WholeMixture, 20, null, Held: true, "not stated; 20 Cel taken");
        }

        yield return new Assumption(
            "closed-to-air", WholeMixture, null, null, Held: true, "taken for granted: no gas is taken up or given off");
        yield return new Assumption(
            "all-dissolved", WholeMixture, null, null, Held: true, "taken for granted: only listed solubilities are checked");
    }
}
