using System;
using System.CommandLine;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Records;

namespace Lyonium.Tool;

/// <summary><c>lyonium compare</c>: every method side by side.</summary>
internal static class CompareCommand
{
    public static Command Create()
    {
        var recipe = new Argument<string>("RECIPE") { Description = "a file of lyonium-recipe/1, or - for standard input" };
        var activity = Plugins.ActivityOption();
        var pairs = PairsOption.Create();
        var tolerance = new Option<double>("--tolerance")
        {
            Description = "how far from the exact answer still counts as right, in pH",
            DefaultValueFactory = _ => Comparison.DefaultTolerance,
        };
        tolerance.Validators.Add(result =>
        {
            if (!(result.GetValueOrDefault<double>() is > 0 and < double.PositiveInfinity))
            {
                result.AddError("The tolerance is a number above 0.");
            }
        });
        var table = TableOption.Create();
        var format = OutputFormat.Option();
        var command = new Command("compare", "Predicts a recipe with every method, beside the exact answer.") { recipe, activity, pairs, tolerance, table, format };
        TableOption.RefuseBothOnStandardInput(command, recipe, table);
        command.SetAction(parsed =>
        {
            var asJson = OutputFormat.IsJson(parsed.GetValue(format)!);
            var opened = TableOption.Open(parsed.GetValue(table));
            if (!opened.Success)
            {
                return OutputFormat.Print(opened.Faults, asJson);
            }

            var predictor = new Predictor(opened.Value, activityModel: ActivityModels.Find(parsed.GetValue(activity)!));
            return Run(parsed.GetValue(recipe)!, PairsOption.Apply(predictor, parsed.GetValue(pairs)), parsed.GetValue(tolerance), asJson);
        });
        return command;
    }

    private static int Run(string file, Predictor predictor, double tolerance, bool asJson)
    {
        var recipe = InputFile.ReadRecipe(file, predictor.Table);
        if (!recipe.Success)
        {
            return OutputFormat.Print(recipe.Faults, asJson);
        }

        var comparison = predictor.TryCompare(recipe.Value, tolerance);
        if (!comparison.Success)
        {
            return OutputFormat.Print(comparison.Faults, asJson);
        }

        if (asJson)
        {
            Console.Out.WriteLine(ComparisonJson.Write(comparison.Value));
        }
        else
        {
            Terminal.Print(new ComparisonText(comparison.Value).Print);
        }

        return ExitStatus.Done;
    }
}
