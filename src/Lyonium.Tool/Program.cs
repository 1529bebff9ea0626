using System;
using System.CommandLine;
using System.IO;
using System.Text;
using Lyonium.Tool;

Console.OutputEncoding = new UTF8Encoding(encoderShouldEmitUTF8Identifier: false);
try
{
    var root = new RootCommand("Predicts the pH of mixtures of acids, bases and salts, and shows what the answer rests on.")
    {
        PredictCommand.Create(),
        CompareCommand.Create(),
        ConstantsCommand.Create(),
    };
    var parsed = root.Parse(args);
    if (parsed.Errors.Count == 0)
    {
        return parsed.Invoke();
    }

    foreach (var error in parsed.Errors)
    {
        Console.Error.WriteLine("lyonium: " + error.Message);
    }

    Console.Error.WriteLine("Try 'lyonium --help'.");
    return ExitStatus.WrongCommandLine;
}
catch (IOException)
{
    // The reader of a pipe went away; there is nobody left to tell.
    return ExitStatus.Done;
}
