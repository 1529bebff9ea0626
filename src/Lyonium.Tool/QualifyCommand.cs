using System;
using System.CommandLine;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Qualification;
using Lyonium.Recipes;
using Lyonium.Solvers;

namespace Lyonium.Tool;

/// <summary><c>lyonium qualify</c>: the published checks, run in this process.</summary>
internal static class QualifyCommand
{
    public static Command Create()
    {
        var method = Plugins.MethodOption();
        var activity = Plugins.ActivityOption();
        var pairs = PairsOption.Create();
        var table = TableOption.Create();
        var format = OutputFormat.Option();
        var command = new Command("qualify", "Runs the published checks in this process: evidence towards installation and operational qualification.")
        {
            method, activity, pairs, table, format,
        };
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
            predictor = PairsOption.Apply(predictor, parsed.GetValue(pairs));
            var water = predictor.TryPredict(Recipe.Named("water").PourWater("1 kg").Build());
            if (!water.Success)
            {
                // What not even water can be predicted with need not be told once for each check.
                return OutputFormat.Print(water.Faults, asJson);
            }

            var report = new Qualifier(predictor).Run();
            if (asJson)
            {
                Console.Out.WriteLine(report.ToJson());
            }
            else
            {
                Terminal.Print(new QualificationLines(report).Print);
            }

            return report.IsPassed ? ExitStatus.Done : ExitStatus.NoAnswer;
        });
        return command;
    }
}
