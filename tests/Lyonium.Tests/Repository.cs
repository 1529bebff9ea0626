using System;
using System.IO;

namespace Lyonium.Tests;

/// <summary>Finds the files of the repository that tests look at.</summary>
internal static class Repository
{
    public static string Root { get; } = FindRoot();

    /// <summary>A file by its place in the repository, with forward slashes.</summary>
    public static string File(string relative) => Path.Combine(Root, relative.Replace('/', Path.DirectorySeparatorChar));

    public static string Schema(string name) => File("docs/schemas/" + name + ".schema.json");

    /// <summary>The example recipes; empty where there are none yet.</summary>
    public static string[] Examples()
    {
        var folder = Path.Combine(Root, "docs", "examples");
        return Directory.Exists(folder) ? Directory.GetFiles(folder, "*.json") : [];
    }

    private static string FindRoot()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (folder is not null && !System.IO.File.Exists(Path.Combine(folder.FullName, "Library.sln")))
        {
            folder = folder.Parent;
        }

        return folder?.FullName ?? throw new InvalidOperationException("The tests run outside the repository.");
    }
}
