using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Faults;
using Lyonium.Quantities;
using Lyonium.Recipes;
using Lyonium.Substances;

namespace Lyonium.Modelling;

/// <summary>The one doorway from the chemist's side to the numeric side.</summary>
/// <remarks>
/// Families stand in the order of the table, so that the numeric problem does not depend on the order of pouring. A family's component is
/// its base form; each form above it takes its protons with the sum of the pKa of the steps between.
/// </remarks>
internal sealed class Doorway(Mixture mixture, IActivityModel model, IReadOnlyList<string>? pairSets)
{
    /// <summary>The temperature in K; that of the mixture unless another is set.</summary>
    public double TemperatureK { get; init; } = mixture.TemperatureK;

    /// <summary>The ion-size parameter in ångström of ions whose size is not listed; NaN leaves it to the activity model.</summary>
    public double SizeOfUnlistedIons { get; init; } = double.NaN;

    public Attempt<ModelledMixture> Run()
    {
        var faults = CheckPairSets();
        if (faults.Count > 0)
        {
            return new Attempt<ModelledMixture>(faults);
        }

        var sets = PairSets();
        var totals = Totals();
        var families = totals.Select(one => one.Family).ToArray();
        var constants = new StepConstants(families, model, TemperatureK);
        var solvent = WaterConstants.SolventAt(TemperatureK);
        var species = families.SelectMany((family, component) => FamilySpecies.Of(family, component, constants.PKa, SizeOfUnlistedIons)).ToArray();
        var pairs = new PairSpecies(sets, families, species, solvent);
        var described = Describe(totals);
        described.AddRange(pairs.All.Select(one => pairs.Describe(one.Pair, one.Species, totals.Select(total => total.MolPerKg).ToArray())));
        var interactions = model.Uses.HasFlag(IonData.Interactions) ? InteractionsOf(described) : [];
        var equilibrium = new Equilibrium(
            totals.Select(one => Constraint.Total(one.MolPerKg)).ToArray(),
            [.. species, .. pairs.All.Select(one => one.Species)],
            solvent,
            WaterConstants.HydrogenIonSize.Value,
            WaterConstants.HydroxideIonSize.Value,
            interactions.Select(one => new IonInteraction(one.First, one.Second, one.Coefficient.KgPerMol.Value)).ToArray());
        var used = Constants(families, constants);
        used.AddRange(pairs.Constants());
        used.AddRange(interactions.Select(one =>
            new UsedConstant(one.Coefficient.Cation + " " + one.Coefficient.Anion, "interaction coefficient in kg/mol", one.Coefficient.KgPerMol, one.Coefficient.Layer)));
        return new Attempt<ModelledMixture>(new ModelledMixture(mixture, equilibrium, families, described, used, pairs.All.Select(one => one.Pair).ToArray(), Array.ConvertAll(sets, set => set.Id)));
    }

    private PairSet[] PairSets() => mixture.Table.PairSets
        .Where(set => pairSets is null ? set.IsDefault && set.Models.Contains(model.Name, StringComparer.Ordinal) : pairSets.Contains(set.Id, StringComparer.Ordinal))
        .ToArray();

    private List<Fault> CheckPairSets()
    {
        var faults = new List<Fault>();
        foreach (var id in pairSets ?? [])
        {
            var set = mixture.Table.PairSets.FirstOrDefault(one => string.Equals(one.Id, id, StringComparison.Ordinal));
            if (set is null)
            {
                faults.Add(Fault.Of(FaultKinds.UnknownPairSet, "$", id, ("known", string.Join(", ", mixture.Table.PairSets.Select(one => one.Id)))));
            }
            else if (!set.Models.Contains(model.Name, StringComparer.Ordinal))
            {
                faults.Add(Fault.Of(FaultKinds.PairSetOfAnotherModel, "$", id, ("model", model.Name), ("models", string.Join(", ", set.Models))));
            }
        }

        return faults;
    }

    private (int First, int Second, InteractionCoefficient Coefficient)[] InteractionsOf(List<ModelledSpecies> species)
    {
        var index = species.Select((one, i) => (one.Id, i)).ToDictionary(one => one.Id, one => one.i, StringComparer.Ordinal);
        return mixture.Table.Interactions.Where(one => index.ContainsKey(one.Cation) && index.ContainsKey(one.Anion))
            .Select(one => (index[one.Cation], index[one.Anion], one)).ToArray();
    }

    /// <summary>The id of the species of a family that holds so many protons more than the base form.</summary>
    internal static string SpeciesId(Family family, int protons) => family.Id + ":" + protons.ToString(CultureInfo.InvariantCulture);

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

    private List<UsedConstant> Constants(Family[] families, StepConstants steps)
    {
        var constants = families.SelectMany(family => family.Steps.SelectMany(step => steps.Describe(step, family.Layer))).ToList();
        constants.AddRange(WaterConstants.At(TemperatureK, mixture.Recipe.PreparedAtK));
        if (model.Uses.HasFlag(IonData.Sizes))
        {
            constants.AddRange(WaterConstants.IonSizes(TemperatureK));
            constants.AddRange(families.SelectMany(IonSizes));
        }

        constants.AddRange(mixture.Parts.Where(part => part.TableDensity is not null)
            .GroupBy(part => part.Substance!.Id + NumberText.Shortest(part.TableDensity!.Value), StringComparer.Ordinal)
            .Select(group => new UsedConstant(group.First().Substance!.Id, "density of the solution in kg/L", group.First().TableDensity!, group.First().Substance!.Layer)));
        constants.AddRange(mixture.Amounts.Where(one => one.Substance.MolarVolumeMLPerMol is not null)
            .Select(one => new UsedConstant(one.Substance.Id, "molar volume in solution in mL/mol", one.Substance.MolarVolumeMLPerMol!, one.Substance.Layer)));
        return constants;
    }

    private static IEnumerable<UsedConstant> IonSizes(Family family) =>
        family.IonSizesAngstrom
            .Select((size, form) => (Size: size, Id: SpeciesId(family, family.Forms.Count - 1 - form)))
            .Where(one => one.Size is not null)
            .Select(one => new UsedConstant(one.Id, WaterConstants.IonSizeQuantity, one.Size!, family.Layer));
}
