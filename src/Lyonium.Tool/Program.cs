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
        QualifyCommand.Create(),
    };
    var parsed = root.Parse(args);
    if (parsed.Errors.Count == 0)
    {
        // The parser's own handler would print a stack trace.
        return parsed.Invoke(new InvocationConfiguration { EnableDefaultExceptionHandler = false });
    }

    foreach (var error in parsed.Errors)
    {
        Console.Error.WriteLine("lyonium: " + error.Message);
    }

    Console.Error.WriteLine("Try 'lyonium --help'.");
    return ExitStatus.WrongCommandLine;
}
catch (Exception e) when (e is IOException or UnauthorizedAccessException)
{
    // A reader that went away is no error here and never comes to this; a full disk does.
    return Say("the output cannot be written: " + e.Message, ExitStatus.Refused);
}
catch (Exception e) when (e is not OutOfMemoryException)
{
    return Say($"an internal error, please report it: {e.GetType().Name}: {e.Message}", ExitStatus.NoAnswer);
}

static int Say(string text, int status)
{
    try
    {
        Console.Error.WriteLine("lyonium: " + PlainText.Of(text));
    }
    catch (Exception e) when (e is IOException or UnauthorizedAccessException)
    {
        // Nobody can be told.
    }

    return status;
}
