using System;
using System.CommandLine;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Records;
using Lyonium.Solvers;

namespace Lyonium.Tool;

/// <summary><c>lyonium predict</c>: one pH.</summary>
internal static class PredictCommand
{
    public static Command Create()
    {
        var recipe = new Argument<string>("RECIPE") { Description = "a file of lyonium-recipe/1, or - for standard input" };
        var method = Plugins.MethodOption();
        var activity = Plugins.ActivityOption();
        var pairs = PairsOption.Create();
        var table = TableOption.Create();
        var steps = new Option<bool>("--steps") { Description = "show the worked steps after the answer (text only)" };
        var format = OutputFormat.Option();
        var command = new Command("predict", "Predicts the pH of a recipe.") { recipe, method, activity, pairs, table, steps, format };
        TableOption.RefuseBothOnStandardInput(command, recipe, table);
        command.SetAction(parsed =>
        {
            var asJson = OutputFormat.IsJson(parsed.GetValue(format)!);
            var opened = TableOption.Open(parsed.GetValue(table));
            if (!opened.Success)
            {
                return OutputFormat.Print(opened.Faults, asJson);
            }

            var predictor = new Predictor(
                opened.Value, Methods.Find(parsed.GetValue(method)!), ActivityModels.Find(parsed.GetValue(activity)!));
            return Run(parsed.GetValue(recipe)!, PairsOption.Apply(predictor, parsed.GetValue(pairs)), parsed.GetValue(steps), asJson);
        });
        return command;
    }

    private static int Run(string file, Predictor predictor, bool withSteps, bool asJson)
    {
        var recipe = InputFile.ReadRecipe(file, predictor.Table);
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
            return ExitStatus.Done;
        }

        Terminal.Print(new PredictionText(prediction.Value).Print);
        if (withSteps)
        {
            Console.Out.WriteLine();
            Console.Out.Write(prediction.Value.Work().ToText());
        }

        return ExitStatus.Done;
    }
}
