using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Equilibria;
using Lyonium.Faults;
using Lyonium.Modelling;
using Lyonium.Recipes;
using Lyonium.Solvers;

namespace Lyonium.Predictions;

/// <summary>A modelled mixture with what the method found for it.</summary>
internal sealed class SolvedMixture
{
    private SolvedMixture(ModelledMixture modelled, SolverOutcome outcome, Speciation speciation)
    {
        Modelled = modelled;
        Outcome = outcome;
        Speciation = speciation;
    }

    public ModelledMixture Modelled { get; }

    public SolverOutcome Outcome { get; }

    public Speciation Speciation { get; }

    /// <summary>Models a mixture and runs the method, and turns whatever it and the activity model do into an answer or a fault.</summary>
    public static Attempt<SolvedMixture> TrySolve(Mixture mixture, IReadOnlyList<string>? pairSets, ISolver method, IActivityModel model) =>
        TrySolve(new Doorway(mixture, model, pairSets), method, model);

    /// <summary>The same through a doorway that has been set otherwise.</summary>
    public static Attempt<SolvedMixture> TrySolve(Doorway doorway, ISolver method, IActivityModel model)
    {
        try
        {
            if (WhatIsNotNamed(method, model) is { } unnamed)
            {
                return Refuse(FaultKinds.MethodFailed, unnamed, method, model);
            }

            var attempt = doorway.Run();
            if (!attempt.Success)
            {
                return new Attempt<SolvedMixture>(attempt.Faults);
            }

            var modelled = attempt.Value;
            var outcome = Copied(method.Solve(modelled.Equilibrium, model));
            if (outcome.Status == SolverStatus.None)
            {
                return Refuse(FaultKinds.MethodFailed, "it gave no outcome", method, model);
            }

            if (outcome.Status != SolverStatus.Solved)
            {
                return Refuse(KindOf(outcome.Status), outcome.Reason ?? "no reason was given", method, model, outcome.Iterates);
            }

            if (WhatIsNoAssumption(outcome, modelled) is { } wrong)
            {
                return Refuse(FaultKinds.MethodFailed, wrong, method, model);
            }

            if (double.IsNaN(outcome.PH) || double.IsInfinity(outcome.PH))
            {
                return Refuse(FaultKinds.MethodFailed, "the answer is not a number", method, model);
            }

            if (outcome.PH < outcome.BracketLow || outcome.PH > outcome.BracketHigh)
            {
                return Refuse(FaultKinds.MethodFailed, "the answer lies outside its own bracket", method, model);
            }

            var speciation = Speciation.At(modelled.Equilibrium, model, outcome.PH);
            return IsRepresentable(speciation)
                ? new Attempt<SolvedMixture>(new SolvedMixture(modelled, outcome, speciation))
                : Refuse(FaultKinds.MethodFailed, "activity coefficients are beyond what a number holds", method, model);
        }
        catch (ArithmeticException e)
        {
            return Refuse(FaultKinds.DidNotSettle, e.Message.TrimEnd('.'), method, model);
        }
        catch (Exception e) when (e is not OutOfMemoryException)
        {
            // A plug-in is other people's code: whatever it throws is its fault, told by its name.
            return Failed(e, method, model);
        }
    }

    /// <summary>The fault of a plug-in that threw.</summary>
    public static Attempt<SolvedMixture> Failed(Exception e, ISolver method, IActivityModel model) =>
        Refuse(FaultKinds.MethodFailed, e.GetType().Name + ": " + e.Message, method, model);

    /// <summary>Every species of the answer.</summary>
    public IReadOnlyList<PredictedSpecies> Species()
    {
        var mixture = Modelled.Mixture;
        var species = new PredictedSpecies[Modelled.Species.Count];
        for (var i = 0; i < species.Length; i++)
        {
            var one = Modelled.Species[i];
            var molality = Speciation.MolalitiesMolPerKg[i];
            species[i] = new PredictedSpecies(
                one.Id,
                one.Family,
                one.Display,
                one.Charge,
                molality,
                molality * mixture.WaterKg / mixture.VolumeL,
                one.FamilyTotalMolPerKg is double total ? (total > 0 ? molality / total : 0) : null,
                Math.Pow(10, Speciation.Log10Gammas[i]));
        }

        return species;
    }

    /// <summary>The ions of the mixture whose ion-size parameter is not listed, by display.</summary>
    public IReadOnlyList<string> UnlistedIonSizes() => Modelled.Species
        .Where((one, i) => one.Charge != 0 && double.IsNaN(Modelled.Equilibrium.IonSizesAngstrom[i]) && Speciation.MolalitiesMolPerKg[i] > 0)
        .Select(one => one.Display)
        .ToArray();

    /// <summary>The pairs of ions, each at least a hundredth of the ionic strength, whose interaction coefficient is not listed.</summary>
    public IReadOnlyList<string> UnlistedInteractions()
    {
        const double smallestPart = 0.01;
        var charges = Modelled.Equilibrium.Charges.ToArray();
        var listed = new HashSet<(int, int)>();
        foreach (var one in Modelled.Equilibrium.Interactions)
        {
            listed.Add((one.First, one.Second));
        }

        var ions = Enumerable.Range(0, charges.Length)
            .Where(i => charges[i] != 0 && Speciation.MolalitiesMolPerKg[i] >= smallestPart * Speciation.IonicStrengthMolPerKg).ToArray();
        return ions.Where(i => charges[i] > 0)
            .SelectMany(cation => ions.Where(i => charges[i] < 0).Select(anion => (cation, anion)))
            .Where(pair => !listed.Contains(pair))
            .Select(pair => Modelled.Species[pair.cation].Display + " " + Modelled.Species[pair.anion].Display)
            .ToArray();
    }

    // A record pins the method and the model by their names, and gives the model's source.
    private static string? WhatIsNotNamed(ISolver method, IActivityModel model) =>
        string.IsNullOrWhiteSpace(method.Name) ? "the method has no name"
        : string.IsNullOrWhiteSpace(model.Name) ? "the activity model has no name"
        : string.IsNullOrWhiteSpace(model.Source) ? "the activity model names no source"
        : null;

    // A list of other people's may change, or throw when it is read.
    private static SolverOutcome Copied(SolverOutcome outcome) => outcome with
    {
        Assumptions = outcome.Assumptions.ToArray(),
        Iterates = outcome.Iterates.Select(one => one ?? throw new InvalidOperationException("an estimate is null")).ToArray(),
    };

    private static string? WhatIsNoAssumption(SolverOutcome outcome, ModelledMixture modelled) => outcome.Assumptions
        .Select(one =>
            one is null ? "an assumption is null"
            : string.IsNullOrWhiteSpace(one.Code) || string.IsNullOrWhiteSpace(one.Basis) ? "an assumption has no code or no basis"
            : one.Component >= modelled.Families.Count ? FormattableString.Invariant($"an assumption is about component {one.Component}, and there are {modelled.Families.Count}")
            : null)
        .FirstOrDefault(one => one is not null);

    // An answer whose coefficients or hydrogen ion overflow cannot be written down, whatever its pH.
    private static bool IsRepresentable(Speciation speciation)
    {
        const double largestLog10 = 300;
        return speciation.MolalitiesMolPerKg[Equilibrium.HydrogenIon] > 0
            && !double.IsInfinity(speciation.IonicStrengthMolPerKg)
            && speciation.Log10Gammas.All(one => Math.Abs(one) < largestLog10)
            && speciation.MolalitiesMolPerKg.All(one => !double.IsNaN(one) && !double.IsInfinity(one));
    }

    private static FaultKind KindOf(SolverStatus status) => status switch
    {
        SolverStatus.CoupledSpecies => FaultKinds.CoupledSpecies,
        SolverStatus.FixedActivity => FaultKinds.FixedActivity,
        SolverStatus.DoesNotApply => FaultKinds.MethodDoesNotApply,
        _ => FaultKinds.DidNotSettle,
    };

    private static string SuggestionTo(ISolver method) =>
        method is ExactSolver ? "dilute, or use another activity model" : "use the method 'exact' within the range of the activity model";

    private static Attempt<SolvedMixture> Refuse(
        FaultKind kind, string found, ISolver method, IActivityModel model, IReadOnlyList<Iterate>? iterates = null)
    {
        var fault = Fault.Of(
            kind, "$", found, ("method", PluginName.Of(method)), ("model", PluginName.Of(model)), ("suggestion", SuggestionTo(method)));
        return new Attempt<SolvedMixture>([fault.WithIterates((iterates ?? []).Select(one => (one.PH, one.Correction)).ToArray())]);
    }
}
