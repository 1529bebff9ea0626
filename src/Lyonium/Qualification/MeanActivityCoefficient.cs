using System;
using System.Linq;
using Lyonium.Predictions;
using Lyonium.Quantities;
using Lyonium.Recipes;

namespace Lyonium.Qualification;

/// <summary>The mean activity coefficient of a salt alone in water at 25 °C: the geometric mean over its ions.</summary>
internal static class MeanActivityCoefficient
{
    public static (double Value, double? IonicStrength) Obtain(RunnableCheck check, Predictor predictor)
    {
        var molality = check.Number("molality", Dimension.Molality);
        var recipe = Recipe.Named(check.Check.Title).At("25 Cel")
            .Add(NumberText.Shortest(molality) + " mol", check.Text("substance")).PourWater("1 kg").Build(predictor.Table);
        var prediction = predictor.Predict(recipe);
        var ions = DissolvedForms.Of(prediction.Mixture.Amounts.Single().Substance);
        var log = ions.Sum(ion => ion.Value * Math.Log(prediction.Species.Single(one => string.Equals(one.Id, ion.Key, StringComparison.Ordinal)).ActivityCoefficient));
        return (Math.Exp(log / ions.Sum(ion => ion.Value)), prediction.IonicStrengthMolPerKg);
    }
}
