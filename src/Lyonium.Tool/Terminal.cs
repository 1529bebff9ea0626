using System;
using System.IO;
using Spectre.Console;

namespace Lyonium.Tool;

/// <summary>Where text for people goes: coloured on a terminal only; everywhere else of a fixed width, with no blanks at line ends.</summary>
internal static class Terminal
{
    private const int PageWidth = 96;

    public static void Print(Action<IAnsiConsole> print)
    {
        if (!Console.IsOutputRedirected)
        {
            var isPlain = !string.IsNullOrEmpty(Environment.GetEnvironmentVariable("NO_COLOR"));
            var console = Create(Console.Out, isPlain);
            console.Profile.Width = Math.Clamp(console.Profile.Width, 60, PageWidth);
            print(console);
            return;
        }

        var page = new StringWriter();
        var plain = Create(page, isPlain: true);
        plain.Profile.Width = PageWidth;
        print(plain);
        using var lines = new StringReader(page.ToString());
        while (lines.ReadLine() is { } line)
        {
            Console.Out.WriteLine(PlainText.Of(line).TrimEnd());
        }
    }

    private static IAnsiConsole Create(TextWriter writer, bool isPlain)
    {
        var console = AnsiConsole.Create(new AnsiConsoleSettings
        {
            Ansi = isPlain ? AnsiSupport.No : AnsiSupport.Detect,
            ColorSystem = isPlain ? ColorSystemSupport.NoColors : ColorSystemSupport.Detect,
            Interactive = InteractionSupport.No,
            Out = new AnsiConsoleOutput(writer),
        });
        console.Profile.Capabilities.Unicode = true;
        return console;
    }
}
