using System;
using System.IO;

namespace Lyonium.Tests;

/// <summary>Finds the files of the repository that tests look at.</summary>
internal static class Repository
{
    public static string Root { get; } = FindRoot();

    public static string Schema(string name) => Path.Combine(Root, "docs", "schemas", name + ".schema.json");

    /// <summary>The example recipes; empty where there are none yet.</summary>
    public static string[] Examples()
    {
        var folder = Path.Combine(Root, "docs", "examples");
        return Directory.Exists(folder) ? Directory.GetFiles(folder, "*.json") : [];
    }

    private static string FindRoot()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "Library.sln")))
        {
            folder = folder.Parent;
        }

        return folder?.FullName ?? throw new InvalidOperationException("The tests run outside the repository.");
    }
}
