using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Faults;
using Lyonium.Quantities;
using Lyonium.Recipes;
using Lyonium.Substances;
using Lyonium.Water;

namespace Lyonium.Modelling;

/// <summary>The one doorway from the chemist's side to the numeric side.</summary>
/// <remarks>
/// Families stand in the order of the table, so that the numeric problem does not depend on the order of pouring. A family's component is
/// its base form; each form above it takes its protons with the sum of the pKa of the steps between.
/// </remarks>
internal sealed class Doorway(Mixture mixture, IActivityModel model)
{
    private const double ConstantsHoldAtK = 298.15;

    public Attempt<ModelledMixture> Run()
    {
        if (Math.Abs(mixture.TemperatureK - ConstantsHoldAtK) > 1e-6)
        {
            var found = mixture.Recipe.Temperature?.ToString() ?? NumberText.Shortest(mixture.TemperatureK) + " K";
            return new Attempt<ModelledMixture>([Fault.Of(FaultKinds.TemperatureNotModelled, "$.temperature", found)]);
        }

        var totals = Totals();
        var families = totals.Select(one => one.Family).ToArray();
        var solvent = SolventAt(mixture.TemperatureK);
        var constraints = totals.Select(one => Constraint.Total(one.MolPerKg)).ToArray();
        var asPublished = new Equilibrium(constraints, SpeciesOf(families, step => step.PKa.Value), solvent);
        var infiniteDilution = new InfiniteDilution(asPublished, model, families);
        var equilibrium = infiniteDilution.IsNeeded
            ? new Equilibrium(constraints, SpeciesOf(families, infiniteDilution.PKa), solvent)
            : asPublished;
        return new Attempt<ModelledMixture>(
            new ModelledMixture(mixture, equilibrium, families, Describe(totals), Constants(families, infiniteDilution)));
    }

    /// <summary>The id of the species of a family that holds so many protons more than the base form.</summary>
    internal static string SpeciesId(Family family, int protons) => family.Id + ":" + protons.ToString(CultureInfo.InvariantCulture);

    private static Solvent SolventAt(double temperatureK)
    {
        var slopes = DebyeHuckelSlopes.At(temperatureK);
        return new Solvent(temperatureK, WaterIonization.PKw(temperatureK), slopes.A, slopes.B);
    }

    private static List<Species> SpeciesOf(Family[] families, Func<DissociationStep, double> pKa)
    {
        var species = new List<Species>();
        for (var component = 0; component < families.Length; component++)
        {
            var family = families[component];
            double log10K = 0;
            for (var protons = 0; protons < family.Forms.Count; protons++)
            {
                if (protons > 0)
                {
                    log10K += pKa(family.Steps[family.Steps.Count - protons]);
                }

                var form = family.Forms[family.Forms.Count - 1 - protons];
                species.Add(new Species([new Term(component, 1)], protons, form.Charge, log10K));
            }
        }

        return species;
    }

    private (Family Family, double MolPerKg)[] Totals() =>
        mixture.Amounts
            .SelectMany(one => one.Substance.Brings.Select(brought => (brought.Family, Mol: brought.Count * one.AmountMol)))
            .GroupBy(one => one.Family.Id, StringComparer.Ordinal)
            .Select(group => (group.First().Family, MolPerKg: group.Sum(one => one.Mol) / mixture.WaterKg))
            .OrderBy(one => mixture.Table.OrderOf(one.Family))
            .ToArray();

    private static List<ModelledSpecies> Describe((Family Family, double MolPerKg)[] totals)
    {
        var species = new List<ModelledSpecies>
        {
            new("water:2", "water", "H⁺", 1, null),
            new("water:0", "water", "OH⁻", -1, null),
        };
        foreach (var (family, total) in totals)
        {
            for (var protons = 0; protons < family.Forms.Count; protons++)
            {
                var form = family.Forms[family.Forms.Count - 1 - protons];
                species.Add(new ModelledSpecies(SpeciesId(family, protons), family.Id, form.Display, form.Charge, total));
            }
        }

        return species;
    }

    private List<UsedConstant> Constants(Family[] families, InfiniteDilution infiniteDilution)
    {
        var constants = new List<UsedConstant>();
        foreach (var (step, layer) in families.SelectMany(family => family.Steps.Select(step => (step, family.Layer))))
        {
            constants.Add(new UsedConstant(step.Id, "pKa", step.PKa, layer));
            if (step.PKa.IonicStrengthMolPerKg > 0)
            {
                constants.Add(new UsedConstant(step.Id, "pKa at infinite dilution", infiniteDilution.Describe(step), layer));
            }
        }

        constants.AddRange(WaterConstants.At(mixture.TemperatureK, mixture.Recipe.PreparedAtK));
        constants.AddRange(mixture.Parts.Where(part => part.TableDensity is not null)
            .GroupBy(part => part.Substance!.Id + NumberText.Shortest(part.TableDensity!.Value), StringComparer.Ordinal)
            .Select(group => new UsedConstant(group.First().Substance!.Id, "density of the solution in kg/L", group.First().TableDensity!, group.First().Substance!.Layer)));
        constants.AddRange(mixture.Amounts.Where(one => one.Substance.MolarVolumeMLPerMol is not null)
            .Select(one => new UsedConstant(one.Substance.Id, "molar volume in solution in mL/mol", one.Substance.MolarVolumeMLPerMol!, one.Substance.Layer)));
        return constants;
    }
}
