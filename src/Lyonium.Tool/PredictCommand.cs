using System;
using System.CommandLine;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Records;
using Lyonium.Solvers;
using Lyonium.Substances;

namespace Lyonium.Tool;

/// <summary><c>lyonium predict</c>: one pH.</summary>
internal static class PredictCommand
{
    public static Command Create()
    {
        var recipe = new Argument<string>("RECIPE") { Description = "a file of lyonium-recipe/1, or - for standard input" };
        var method = Plugins.MethodOption();
        var activity = Plugins.ActivityOption();
        var format = OutputFormat.Option();
        var command = new Command("predict", "Predicts the pH of a recipe.") { recipe, method, activity, format };
        command.SetAction(parsed => Run(
            parsed.GetValue(recipe)!,
            new Predictor(SubstanceTable.Default, Methods.Find(parsed.GetValue(method)!), ActivityModels.Find(parsed.GetValue(activity)!)),
            OutputFormat.IsJson(parsed.GetValue(format)!)));
        return command;
    }

    private static int Run(string file, Predictor predictor, bool asJson)
    {
        var recipe = RecipeFile.Read(file, predictor.Table);
        if (!recipe.Success)
        {
            return OutputFormat.Print(recipe.Faults, asJson);
        }

        var prediction = predictor.TryPredict(recipe.Value);
        if (!prediction.Success)
        {
            return OutputFormat.Print(prediction.Faults, asJson);
        }

        if (asJson)
        {
            Console.Out.WriteLine(RecordJson.Write(prediction.Value));
        }
        else
        {
            Terminal.Print(new PredictionText(prediction.Value).Print);
        }

        return ExitStatus.Done;
    }
}
