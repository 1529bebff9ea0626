using System;
using System.Collections.Generic;
using System.Linq;
using System.Text.Json.Nodes;
using Lyonium.Faults;
using Lyonium.Predictions;
using Lyonium.Quantities;
using Lyonium.Records;

namespace Lyonium.Qualification;

/// <summary>A published check with the way to obtain its figure.</summary>
internal sealed class RunnableCheck(PublishedCheck check, CheckedQuantity quantity, JsonObject? recipe)
{
    private static readonly string[] Amounts = ["volume", "mass", "amount"];

    private readonly Dictionary<string, string> _inputs = check.Inputs.ToDictionary(one => one.Key, one => one.Value, StringComparer.Ordinal);

    public PublishedCheck Check => check;

    public CheckOutcome Run(Predictor predictor)
    {
        try
        {
            var (value, ionicStrength) = quantity.Obtain(this, predictor);
            return new CheckOutcome { Check = check, Obtained = value, IonicStrengthMolPerKg = ionicStrength };
        }
        catch (LyoniumException e)
        {
            return new CheckOutcome { Check = check, Obtained = double.NaN, Failure = e.Message };
        }
    }

    /// <summary>An input as text.</summary>
    public string Text(string name) => _inputs[name];

    /// <summary>An input as a number, in the unit that its dimension is computed in.</summary>
    public double Number(string name, Dimension dimension) => Measure.Parse(_inputs[name], dimension).Computed;

    /// <summary>An input that is a plain number.</summary>
    public double Number(string name) => NumberText.Parse(_inputs[name]);

    public bool Has(string name) => _inputs.ContainsKey(name);

    /// <summary>Predicts the recipe of the set with the inputs of this check: the temperature, or the amount of the part of that id.</summary>
    public Prediction Predict(Predictor predictor)
    {
        var own = (JsonObject)JsonNode.Parse(recipe!.ToJsonString())!;
        foreach (var input in check.Inputs)
        {
            if (string.Equals(input.Key, "temperature", StringComparison.Ordinal))
            {
                own["temperature"] = input.Value;
            }
            else
            {
                var part = own["parts"]!.AsArray().Single(one => string.Equals((string?)one!["id"], input.Key, StringComparison.Ordinal))!;
                part[Amounts.Single(name => part[name] is not null)] = input.Value;
            }
        }

        return predictor.Predict(RecipeJson.TryRead(own.ToJsonString(), predictor.Table).GetValueOrThrow());
    }
}
