using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Modelling;
using Lyonium.Solvers;
using Lyonium.Substances;
using Lyonium.Water;

namespace Lyonium.Predictions;

/// <summary>Finds the buffer figures of an answer: derivatives at its equilibrium, and a second answer for the diluted mixture.</summary>
internal sealed class BufferFiguresOf
{
    private const double LowestK = 273.15;
    private const double HighestK = 373.15;
    private const double StepK = 0.01;

    private readonly SolvedMixture _answer;
    private readonly IActivityModel _model;
    private readonly Sensitivity _sensitivity;

    private BufferFiguresOf(SolvedMixture answer, IActivityModel model)
    {
        _answer = answer;
        _model = model;
        _sensitivity = new Sensitivity(answer.Modelled.Equilibrium, model, answer.Speciation);
    }

    /// <summary>The figures; <see langword="null"/> where the equilibrium has no exact answer, or its coefficients give no derivative.</summary>
    public static BufferFigures? Find(SolvedMixture answer, ISolver method, IActivityModel model)
    {
        var exact = method is ExactSolver ? answer : ExactAnswer(answer, model);
        try
        {
            return exact is null ? null : new BufferFiguresOf(exact, model).Find();
        }
        catch (Exception e) when (e is not OutOfMemoryException)
        {
            // The model is other people's code: where it fails beside the answer, there is no figure.
            return null;
        }
    }

    private static SolvedMixture? ExactAnswer(SolvedMixture answer, IActivityModel model)
    {
        var attempt = SolvedMixture.TrySolve(answer.Modelled.Mixture, answer.Modelled.PairSets, new ExactSolver(), model);
        return attempt.Success ? attempt.Value : null;
    }

    private BufferFigures? Find()
    {
        var mixture = _answer.Modelled.Mixture;
        var capacity = mixture.WaterKg / mixture.VolumeL / _sensitivity.PHPer(Change.StrongBase);

        // A mixture whose pH falls when base comes in is none: a model far beyond its range says so.
        return !(capacity > 0) || double.IsInfinity(capacity)
            ? null
            : new BufferFigures
            {
                CapacityMolPerL = capacity,
                DilutionValue = DilutionValue(),
                TemperatureCoefficientPerK = StepsWithoutACourse().Any(BearsOnThePH) ? double.NaN : TemperatureCoefficient(),
                TemperatureCoefficientLeavesOut = StepsWithoutACourse().Select(step => step.Id).ToArray(),
            };
    }

    private IEnumerable<DissociationStep> StepsWithoutACourse() =>
        _answer.Modelled.Families.SelectMany(family => family.Steps).Where(step => !step.ChangesWithTemperature);

    private bool BearsOnThePH(DissociationStep step)
    {
        const double smallestShare = 1e-3;
        var family = _answer.Modelled.Families.First(one => one.Steps.Contains(step));
        var species = _answer.Species();
        var less = family.Steps.Count - step.Number;
        return species.Where(one => one.Id == Doorway.SpeciesId(family, less) || one.Id == Doorway.SpeciesId(family, less + 1))
            .All(one => one.Fraction > smallestShare);
    }

    private double DilutionValue()
    {
        var mixture = _answer.Modelled.Mixture;
        var equalVolumeKg = mixture.VolumeL * WaterDensity.KgPerL(mixture.Recipe.PreparedAtK);
        var diluted = SolvedMixture.TrySolve(mixture.WithWaterKg(mixture.WaterKg + equalVolumeKg), _answer.Modelled.PairSets, new ExactSolver(), _model);
        return diluted.Success ? diluted.Value.Outcome.PH - _answer.Outcome.PH : double.NaN;
    }

    // The constants, and the coefficients at the ionic strength of the answer, are compared a hundredth of a kelvin to either side.
    private double TemperatureCoefficient()
    {
        var temperatureK = _answer.Modelled.Equilibrium.Solvent.TemperatureK;
        var lowK = Math.Max(LowestK, temperatureK - StepK);
        var highK = Math.Min(HighestK, temperatureK + StepK);
        var low = At(lowK);
        var high = At(highK);
        var log10K = new double[low.SpeciesCount];
        for (var i = 0; i < low.Species.Count; i++)
        {
            log10K[i + Equilibrium.WaterIons] = (high.Species[i].Log10K - low.Species[i].Log10K) / (highK - lowK);
        }

        var log10Gammas = Log10Gammas(high).Zip(Log10Gammas(low), (above, below) => (above - below) / (highK - lowK)).ToArray();
        return _sensitivity.PHPer(new Change
        {
            Log10K = log10K,
            Log10Gammas = log10Gammas,
            PKw = (high.Solvent.PKw - low.Solvent.PKw) / (highK - lowK),
        });
    }

    private Equilibrium At(double temperatureK) =>
        new Doorway(_answer.Modelled.Mixture, _model, _answer.Modelled.PairSets) { TemperatureK = temperatureK }.Run().GetValueOrThrow().Equilibrium;

    private double[] Log10Gammas(Equilibrium equilibrium)
    {
        var log10Gammas = new double[equilibrium.SpeciesCount];
        _model.Log10Gammas(equilibrium, _answer.Speciation.IonicStrengthMolPerKg, _answer.Speciation.MolalitiesMolPerKg.ToArray(), log10Gammas);
        return log10Gammas;
    }
}
