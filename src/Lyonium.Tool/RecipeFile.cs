using System;
using System.IO;
using Lyonium.Faults;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;

namespace Lyonium.Tool;

/// <summary>Opens what a command was given as a file; a hyphen is standard input.</summary>
internal static class RecipeFile
{
    public static Attempt<Recipe> Read(string file, SubstanceTable table)
    {
        try
        {
            if (file == "-")
            {
                using var input = Console.OpenStandardInput();
                return RecipeJson.TryRead(input, table);
            }

            if (Directory.Exists(file))
            {
                return Refuse(FaultKinds.IsAFolder, file);
            }

            using var stream = File.OpenRead(file);
            return RecipeJson.TryRead(stream, table);
        }
        catch (Exception e) when (e is FileNotFoundException or DirectoryNotFoundException)
        {
            return Refuse(FaultKinds.FileNotFound, file);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            return Refuse(FaultKinds.CannotRead, file, ("detail", e.Message));
        }
    }

    private static Attempt<Recipe> Refuse(FaultKind kind, string file, params (string Name, string Value)[] arguments) =>
        new([Fault.Of(kind, "$", file, arguments)]);
}
