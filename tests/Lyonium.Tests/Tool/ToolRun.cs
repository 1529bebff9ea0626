using System;
using System.Diagnostics;
using System.IO;
using System.Linq;
using System.Text;
using Xunit;

namespace Lyonium.Tests.Tool;

/// <summary>The tool run as a process, as a caller would run it, with what every run must keep to.</summary>
internal sealed record ToolRun(int ExitStatus, string Output, string Errors)
{
    private static readonly TimeSpan Longest = TimeSpan.FromSeconds(60);

    public string[] ErrorLines => Errors.Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(line => line.TrimEnd('\r')).ToArray();

    public static ToolRun Of(params string[] arguments) => Run(arguments, input: null, isOutputClosed: false);

    /// <summary>Through the shell, with something before the command, such as a redirection.</summary>
    public static ToolRun InShell(string before, params string[] arguments) => Run(arguments, input: null, isOutputClosed: false, before);

    public static ToolRun WithInput(string input, params string[] arguments) => Run(arguments, input, isOutputClosed: false);

    public static ToolRun WithClosedPipe(params string[] arguments) => Run(arguments, input: null, isOutputClosed: true);

    private static ToolRun Run(string[] arguments, string? input, bool isOutputClosed, string? shell = null)
    {
        var start = new ProcessStartInfo(shell is null ? "dotnet" : "/bin/sh")
        {
            UseShellExecute = false,
            RedirectStandardInput = true,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            StandardInputEncoding = new UTF8Encoding(encoderShouldEmitUTF8Identifier: false),
            StandardOutputEncoding = Encoding.UTF8,
            StandardErrorEncoding = Encoding.UTF8,
        };
        if (shell is not null)
        {
            start.ArgumentList.Add("-c");
            start.ArgumentList.Add(shell + " dotnet \"$@\"");
            start.ArgumentList.Add("sh");
        }

        start.ArgumentList.Add(Path.Combine(AppContext.BaseDirectory, "Lyonium.Tool.dll"));
        foreach (var argument in arguments)
        {
            start.ArgumentList.Add(argument);
        }

        using var process = Process.Start(start)!;
        if (isOutputClosed)
        {
            process.StandardOutput.Close();
        }

        var errors = process.StandardError.ReadToEndAsync();
        var output = isOutputClosed ? null : process.StandardOutput.ReadToEndAsync();
        try
        {
            process.StandardInput.Write(input ?? "");
            process.StandardInput.Close();
        }
        catch (IOException)
        {
            // It ended without reading all of it.
        }

        if (!process.WaitForExit(Longest))
        {
            process.Kill();
            Assert.Fail($"It hangs: {string.Join(' ', arguments)}");
        }

        var run = new ToolRun(process.ExitCode, output?.GetAwaiter().GetResult() ?? "", errors.GetAwaiter().GetResult());
        run.Check();
        return run;
    }

    // No stack trace and no escape ever reaches a user whose output is redirected.
    private void Check()
    {
        Assert.InRange(ExitStatus, 0, 3);
        Assert.DoesNotContain("   at ", Errors, StringComparison.Ordinal);
        Assert.DoesNotContain("Unhandled", Errors, StringComparison.OrdinalIgnoreCase);
        Assert.DoesNotContain("Exception", Errors, StringComparison.Ordinal);
        Assert.DoesNotContain('\u001b', Output + Errors);
        Assert.DoesNotContain('\u009b', Output + Errors);
    }
}
