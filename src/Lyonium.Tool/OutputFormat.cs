using System;
using System.Collections.Generic;
using System.CommandLine;
using Lyonium.Faults;
using Lyonium.Records;

namespace Lyonium.Tool;

/// <summary>How a command prints: text for people, or one JSON object for machines.</summary>
internal static class OutputFormat
{
    private const string Json = "json";

    public static Option<string> Option()
    {
        var option = new Option<string>("--format") { Description = "text, for people, or json, one object", DefaultValueFactory = _ => "text" };
        option.AcceptOnlyFromAmong("text", Json);
        return option;
    }

    public static bool IsJson(string format) => string.Equals(format, Json, StringComparison.Ordinal);

    /// <summary>Prints faults: a line each on standard error, and as an object on standard output where JSON was asked for.</summary>
    public static int Print(IReadOnlyList<Fault> faults, bool asJson)
    {
        foreach (var fault in faults)
        {
            Console.Error.WriteLine(fault.ToString());
        }

        if (asJson)
        {
            Console.Out.WriteLine(FaultsJson.Write(faults));
        }

        return ExitStatus.Of(faults);
    }
}
