using System;
using Spectre.Console;

namespace Lyonium.Tool;

/// <summary>Where text for people goes: coloured on a terminal only, and of a fixed width everywhere else.</summary>
internal static class Terminal
{
    private const int PageWidth = 96;

    public static IAnsiConsole Create()
    {
        var isPlain = Console.IsOutputRedirected || !string.IsNullOrEmpty(Environment.GetEnvironmentVariable("NO_COLOR"));
        var console = AnsiConsole.Create(new AnsiConsoleSettings
        {
            Ansi = isPlain ? AnsiSupport.No : AnsiSupport.Detect,
            ColorSystem = isPlain ? ColorSystemSupport.NoColors : ColorSystemSupport.Detect,
            Interactive = InteractionSupport.No,
            Out = new AnsiConsoleOutput(Console.Out),
        });
        console.Profile.Width = Console.IsOutputRedirected ? PageWidth : Math.Clamp(console.Profile.Width, 60, PageWidth);
        console.Profile.Capabilities.Unicode = true;
        return console;
    }
}
