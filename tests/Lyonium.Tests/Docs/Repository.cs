using System;
using System.Diagnostics;
using System.IO;
using System.Text;

namespace Lyonium.Tests.Docs;

/// <summary>The files of the repository, and the tool as it was built beside the tests.</summary>
internal static class Repository
{
    public static string Root { get; } = FindRoot();

    public static string Path(string relative) => System.IO.Path.Combine(Root, relative.Replace('/', System.IO.Path.DirectorySeparatorChar));

    /// <summary>Runs the tool at the top of the repository.</summary>
    public static (int ExitStatus, string Output, string Errors) RunTool(string arguments, string? input = null)
    {
        var start = new ProcessStartInfo("dotnet")
        {
            UseShellExecute = false,
            WorkingDirectory = Root,
            RedirectStandardInput = true,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            StandardOutputEncoding = Encoding.UTF8,
            StandardErrorEncoding = Encoding.UTF8,
            Arguments = "\"" + System.IO.Path.Combine(AppContext.BaseDirectory, "Lyonium.Tool.dll") + "\" " + arguments,
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

    private static string FindRoot()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(System.IO.Path.Combine(folder.FullName, "Library.sln")))
        {
            folder = folder.Parent;
        }

        return folder?.FullName ?? throw new InvalidOperationException("The tests run inside the repository.");
    }
}
