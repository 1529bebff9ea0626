using System;
using System.Diagnostics;
using System.IO;
using System.Text;

namespace Lyonium.Tests.Docs;

/// <summary>The tool as it was built beside the tests.</summary>
internal static class BuiltTool
{
    /// <summary>Runs the tool at the top of the repository.</summary>
    public static (int ExitStatus, string Output, string Errors) Run(string arguments, string? input = null)
    {
        var start = new ProcessStartInfo("dotnet")
        {
            UseShellExecute = false,
            WorkingDirectory = Repository.Root,
            RedirectStandardInput = true,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            StandardOutputEncoding = Encoding.UTF8,
            StandardErrorEncoding = Encoding.UTF8,
            Arguments = "\"" + Path.Combine(AppContext.BaseDirectory, "Lyonium.Tool.dll") + "\" " + arguments,
        };
        using var process = Process.Start(start)!;
        var errors = process.StandardError.ReadToEndAsync();
        if (input is not null)
        {
            process.StandardInput.Write(input);
        }

        process.StandardInput.Close();
        var output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return (process.ExitCode, output.Replace("\r\n", "\n", StringComparison.Ordinal), errors.GetAwaiter().GetResult());
    }
}
