using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Faults;
using Lyonium.Substances;
using UnitsNet;

namespace Lyonium.Recipes;

/// <summary>What is in the beaker: the amount of each substance, the water, and the volume at the temperature of preparation.</summary>
/// <remarks>
/// Amounts and water are fixed when the mixture is prepared; a later temperature changes constants, never molality. Immutable; safe to
/// share between threads.
/// </remarks>
public sealed class Mixture
{
    internal Mixture(
        Recipe recipe, SubstanceTable table, IReadOnlyList<PreparedPart> parts, double waterKg, double volumeL, double massKg, double estimatedWaterKg)
    {
        Recipe = recipe;
        Table = table;
        Parts = parts;
        WaterKg = waterKg;
        VolumeL = volumeL;
        MassKg = massKg;
        EstimatedWaterKg = estimatedWaterKg;
        Amounts = parts
            .Where(part => part.Substance is not null)
            .GroupBy(part => part.Substance!.Id, StringComparer.Ordinal)
            .Select(group => new SubstanceAmount(group.First().Substance!, group.Sum(part => part.AmountMol)))
            .OrderBy(one => one.Substance.Id, StringComparer.Ordinal)
            .ToArray();
    }

    /// <summary>The recipe it was prepared from.</summary>
    public Recipe Recipe { get; }

    /// <summary>The table that its substances come from.</summary>
    public SubstanceTable Table { get; }

    /// <summary>
    /// What each part of the recipe brought, in the order of the recipe; the parts of a recipe inside it follow that part, and are counted
    /// in it.
    /// </summary>
    public IReadOnlyList<PreparedPart> Parts { get; }

    /// <summary>The amount of each substance, by id, whatever the order of pouring.</summary>
    public IReadOnlyList<SubstanceAmount> Amounts { get; }

    /// <summary>The water, crystal water included, in kg.</summary>
    public double WaterKg { get; }

    /// <summary>The volume at the temperature of preparation, in L.</summary>
    public double VolumeL { get; }

    /// <summary>The mass, in kg.</summary>
    public double MassKg { get; }

    /// <summary>By how much <see cref="WaterKg"/> may be off because solute volumes were estimated, in kg; 0 where none were.</summary>
    public double EstimatedWaterKg { get; }

    /// <summary>The temperature at which the pH is asked for, in K.</summary>
    public double TemperatureK => Recipe.TemperatureK;

    /// <summary>The water.</summary>
    public Mass Water => Mass.FromKilograms(WaterKg);

    /// <summary>The volume at the temperature of preparation.</summary>
    public Volume Volume => Volume.FromLiters(VolumeL);

    /// <summary>Prepares a recipe.</summary>
    /// <param name="recipe">The recipe.</param>
    /// <param name="table">A table that has its substances.</param>
    /// <returns>The mixture.</returns>
    /// <exception cref="LyoniumException">The recipe cannot be prepared: there is no water, the mark is too low, a density is needed …</exception>
    public static Mixture Prepare(Recipe recipe, SubstanceTable table) => TryPrepare(recipe, table).GetValueOrThrow();

    /// <summary>Prepares a recipe, or tells every fault as a value.</summary>
    /// <param name="recipe">The recipe.</param>
    /// <param name="table">A table that has its substances.</param>
    /// <returns>The mixture, or every fault.</returns>
    public static Attempt<Mixture> TryPrepare(Recipe recipe, SubstanceTable table) =>
        TryPrepare(recipe ?? throw new ArgumentNullException(nameof(recipe)), table ?? throw new ArgumentNullException(nameof(table)), "$");

    internal static Attempt<Mixture> TryPrepare(Recipe recipe, SubstanceTable table, string root) => new Preparation(recipe, table, root).Run();

    /// <summary>The same mixture with another mass of water: what an error in the water does is found with it.</summary>
    internal Mixture WithWaterKg(double waterKg) => new(Recipe, Table, Parts, waterKg, VolumeL, MassKg, EstimatedWaterKg);

    /// <summary>A substance alone in a kilogram of water, under the same conditions; its volume and mass are those of the water.</summary>
    internal Mixture Alone(Substance substance, double amountMol)
    {
        var part = new PreparedPart
        {
            Part = Recipe.Parts[0],
            Substance = substance,
            AmountMol = amountMol,
            WaterKg = 1,
            VolumeL = 1,
            MassKg = 1,
        };
        return new Mixture(Recipe, Table, [part], part.WaterKg, part.VolumeL, part.MassKg, estimatedWaterKg: 0);
    }
}
