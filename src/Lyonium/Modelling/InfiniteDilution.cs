using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Provenance;
using Lyonium.Quantities;
using Lyonium.Substances;

namespace Lyonium.Modelling;

/// <summary>Carries constants that hold at another ionic strength to infinite dilution, with the activity model of the prediction.</summary>
/// <remarks>pKa(0) = pKa(I) + log10 γ(more protonated) − log10 γ(less protonated) − log10 γ(H⁺), at the I of the constant.</remarks>
internal sealed class InfiniteDilution
{
    private readonly string _modelName;
    private readonly Dictionary<string, double> _pKa = new(StringComparer.Ordinal);

    public InfiniteDilution(Equilibrium asPublished, IActivityModel model, Family[] families)
    {
        _modelName = model.Name;
        var first = Equilibrium.WaterIons;
        var log10Gammas = new double[asPublished.SpeciesCount];
        var molalities = new double[asPublished.SpeciesCount];
        foreach (var family in families)
        {
            foreach (var step in family.Steps.Where(step => step.PKa.IonicStrengthMolPerKg > 0))
            {
                model.Log10Gammas(asPublished, step.PKa.IonicStrengthMolPerKg, molalities, log10Gammas);
                var less = first + family.Steps.Count - step.Number;
                _pKa.Add(step.Id, step.PKa.Value + log10Gammas[less + 1] - log10Gammas[less] - log10Gammas[Equilibrium.HydrogenIon]);
            }

            first += family.Forms.Count;
        }
    }

    public bool IsNeeded => _pKa.Count > 0;

    public double PKa(DissociationStep step) => _pKa.TryGetValue(step.Id, out var carried) ? carried : step.PKa.Value;

    public SourcedValue Describe(DissociationStep step) =>
        new(PKa(step), step.PKa.Source, Known.Derived)
        {
            TemperatureK = step.PKa.TemperatureK,
            Note = $"carried from {NumberText.Shortest(step.PKa.IonicStrengthMolPerKg)} mol/kg with the activity model {_modelName}",
        };
}
