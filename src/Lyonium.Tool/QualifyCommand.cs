using System;
using System.CommandLine;
using Lyonium.Activity;
using Lyonium.Predictions;
using Lyonium.Qualification;

namespace Lyonium.Tool;

/// <summary><c>lyonium qualify</c>: the published checks, run in this process.</summary>
internal static class QualifyCommand
{
    public static Command Create()
    {
        var activity = Plugins.ActivityOption();
        var pairs = PairsOption.Create();
        var table = TableOption.Create();
        var format = OutputFormat.Option();
        var command = new Command("qualify", "Runs the published checks in this process: evidence towards installation and operational qualification.")
        {
            activity, pairs, table, format,
        };
        command.SetAction(parsed =>
        {
            var asJson = OutputFormat.IsJson(parsed.GetValue(format)!);
            var opened = TableOption.Open(parsed.GetValue(table));
            if (!opened.Success)
            {
                return OutputFormat.Print(opened.Faults, asJson);
            }

            var report = new Qualifier(PairsOption.Apply(new Predictor(opened.Value, null, ActivityModels.Find(parsed.GetValue(activity)!)), parsed.GetValue(pairs))).Run();
            Console.Out.Write(asJson ? report.ToJson() + "\n" : report.ToText());
            return report.IsPassed ? ExitStatus.Done : ExitStatus.NoAnswer;
        });
        return command;
    }
}
