using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Faults;
using Lyonium.Quantities;
using Lyonium.Substances;
using Lyonium.Water;

namespace Lyonium.Recipes;

/// <summary>Turns a recipe into a mixture: adds up what each part brings, and fills up to the mark.</summary>
/// <param name="recipe">The recipe.</param>
/// <param name="table">A table that has its substances.</param>
/// <param name="root">Where the recipe stands: <c>$</c>, or the place of a recipe inside another.</param>
/// <param name="pathOf">Where a part of the recipe stands in the input; its own place where it is left out.</param>
internal sealed class Preparation(Recipe recipe, SubstanceTable table, string root, Func<int, string>? pathOf = null)
{
    private const double MostKg = 1e9;
    private const double MostMol = 1e9;
    private const double MostMolPerKg = 1e6;

    private static readonly string MostParts = Recipe.MostParts.ToString(System.Globalization.CultureInfo.InvariantCulture);

    private readonly FaultList _faults = new();
    private readonly double _waterDensity = WaterDensity.KgPerL(recipe.PreparedAtK);

    public Attempt<Mixture> Run()
    {
        var parts = PrepareParts();
        if (_faults.Any)
        {
            return _faults.Attempt<Mixture>(null);
        }

        double Sum(Func<PreparedPart, double> of) => parts.Where(part => part.Inside is null).Sum(of);
        var water = Sum(part => part.WaterKg);
        var volume = Sum(part => part.VolumeL);
        var mass = Sum(part => part.MassKg);
        var estimated = Sum(part => part.EstimatedWaterKg);
        if (recipe.MakeUpTo is { } mark)
        {
            var fill = Fill(mark, volume, mass);
            water += fill;
            mass += fill;
            var isVolume = mark.Dimension == Dimension.Volume;
            volume = isVolume ? mark.Computed : volume + (fill / _waterDensity);
            estimated += isVolume ? Sum(part => part.EstimatedVolumeL) * _waterDensity : 0;
        }

        CheckTotals(parts, water, mass);
        return _faults.Any
            ? _faults.Attempt<Mixture>(null)
            : new Attempt<Mixture>(new Mixture(recipe, table, parts.ToArray(), water, volume, mass, estimated));
    }

    /// <summary>What is wrong with the parts one by one, where the recipe as a whole is refused already.</summary>
    public IReadOnlyList<Fault> FaultsOfParts()
    {
        PrepareParts();
        return _faults.ToList();
    }

    private List<PreparedPart> PrepareParts()
    {
        var parts = new List<PreparedPart>(recipe.Parts.Count);
        for (var i = 0; i < recipe.Parts.Count; i++)
        {
            var path = pathOf is null ? RecipeDraft.PathOf(root, i) : pathOf(i);
            if (recipe.Parts[i] is RecipePart inner)
            {
                parts.AddRange(PrepareRecipe(inner, path));
                if (parts.Count > Recipe.MostParts)
                {
                    // Recipes that pour each other twice double at every level.
                    _faults.Add(FaultKinds.TooManyParts, root + ".parts", "more than " + MostParts, ("limit", MostParts));
                    return parts;
                }
            }
            else if (Prepare(recipe.Parts[i], path) is { } prepared)
            {
                parts.Add(prepared);
            }
        }

        return parts;
    }

    private PreparedPart? Prepare(Part part, string path)
    {
        switch (part)
        {
            case WaterPart water:
                return PrepareWater(water);
            case SolutionPart solution:
                return Find(solution.Stock.Substance, path) is { } solute
                    ? new SolutionPreparation(solution, solute, _waterDensity, path, _faults).Run()
                    : null;
            default:
                var pure = (SubstancePart)part;
                return Find(pure.Substance, path) is { } substance ? PrepareSubstance(pure, substance) : null;
        }
    }

    private Substance? Find(string id, string path)
    {
        var substance = table.ById(id);
        if (substance is null)
        {
            _faults.Add(FaultKinds.NotInThisTable, path, id, ("edition", table.Identity.Edition));
        }

        return substance;
    }

    private PreparedPart PrepareWater(WaterPart part)
    {
        var isMass = part.Taken.Dimension == Dimension.Mass;
        return new PreparedPart
        {
            Part = part,
            WaterKg = isMass ? part.Taken.Computed : part.Taken.Computed * _waterDensity,
            VolumeL = isMass ? part.Taken.Computed / _waterDensity : part.Taken.Computed,
            MassKg = isMass ? part.Taken.Computed : part.Taken.Computed * _waterDensity,
        };
    }

    // What is not the substance counts as mass, and as neither water nor volume.
    private PreparedPart PrepareSubstance(SubstancePart part, Substance substance)
    {
        var massPerMol = substance.MolarMassGPerMol * 1e-3;
        var purity = part.Purity?.Computed ?? 1;
        var isAmount = part.Taken.Dimension == Dimension.Amount;
        var amount = isAmount ? part.Taken.Computed : part.Taken.Computed * purity / massPerMol;
        var crystalWater = amount * substance.CrystalWaterGPerMol * 1e-3;
        var solute = SoluteVolume.Of(substance);
        return new PreparedPart
        {
            Part = part,
            Substance = substance,
            AmountMol = amount,
            WaterKg = crystalWater,
            VolumeL = (amount * solute.LPerMol) + (crystalWater / _waterDensity),
            MassKg = isAmount ? amount * massPerMol : part.Taken.Computed,
            EstimatedVolumeL = amount * solute.ErrorLPerMol,
        };
    }

    // A volume is measured at this recipe's temperature of preparation; it holds the mass that it would hold of water.
    private IEnumerable<PreparedPart> PrepareRecipe(RecipePart part, string path)
    {
        var attempt = Mixture.TryPrepare(part.Recipe, table, path + ".recipe");
        if (!attempt.Success)
        {
            _faults.AddRange(attempt.Faults);
            return [];
        }

        var whole = attempt.Value;
        var volume = whole.VolumeL * WaterDensity.KgPerL(part.Recipe.PreparedAtK) / _waterDensity;
        var share = part.Taken.Dimension switch
        {
            Dimension.Volume => part.Taken.Computed / volume,
            Dimension.Mass => part.Taken.Computed / whole.MassKg,
            _ => part.Taken.Computed,
        };
        if (share > 1 + 1e-12)
        {
            var makes = part.Taken.Dimension == Dimension.Volume ? Rounded(volume) + " L" : Rounded(whole.MassKg) + " kg";
            _faults.Add(FaultKinds.MoreThanTheRecipeMakes, path, part.Taken.ToString(), ("makes", makes));
            return [];
        }

        var poured = new PreparedPart
        {
            Part = part,
            WaterKg = whole.WaterKg,
            VolumeL = volume,
            MassKg = whole.MassKg,
            EstimatedWaterKg = whole.EstimatedWaterKg,
        };
        return whole.Parts.Select(inner => inner.Scaled(share, part)).Prepend(poured.Scaled(share, part) with { Inside = null });
    }

    private double Fill(Measure mark, double volume, double mass)
    {
        var isVolume = mark.Dimension == Dimension.Volume;
        var contents = isVolume ? volume : mass;
        var missing = mark.Computed - contents;
        if (missing < -1e-12 * contents)
        {
            var unit = isVolume ? " L" : " kg";
            _faults.Add(FaultKinds.MarkBelowContents, root + ".makeUpTo", mark.ToString(), ("contents", Rounded(contents) + unit));
        }

        return missing <= 0 ? 0 : isVolume ? missing * _waterDensity : missing;
    }

    private void CheckTotals(List<PreparedPart> parts, double water, double mass)
    {
        var amount = parts.Sum(part => part.AmountMol);
        if (!(mass <= MostKg && amount <= MostMol && !(water > 0 && amount / water > MostMolPerKg)))
        {
            _faults.Add(FaultKinds.MixtureOverflows, root + ".parts", $"{Rounded(mass)} kg, {Rounded(amount)} mol and {Rounded(water)} kg of water");
        }
        else if (!(water > 0))
        {
            _faults.Add(FaultKinds.NoWater, root + ".parts", Rounded(water) + " kg of water");
        }
    }

    private static string Rounded(double value) => value.ToString("G6", System.Globalization.CultureInfo.InvariantCulture);
}
