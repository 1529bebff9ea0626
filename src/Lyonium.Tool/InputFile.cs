using System;
using System.IO;
using Lyonium.Faults;
using Lyonium.Recipes;
using Lyonium.Records;
using Lyonium.Substances;

namespace Lyonium.Tool;

/// <summary>Opens what a command was given as a file; a hyphen is standard input.</summary>
internal static class InputFile
{
    public static Attempt<Recipe> ReadRecipe(string file, SubstanceTable table) => Read(file, stream => RecipeJson.TryRead(stream, table));

    public static Attempt<T> Read<T>(string file, Func<Stream, Attempt<T>> read)
        where T : class
    {
        try
        {
            if (file == "-")
            {
                using var input = Console.OpenStandardInput();
                return read(input);
            }

            if (file.Trim().Length == 0)
            {
                return Refuse<T>(FaultKinds.CannotRead, file, ("detail", "a file has a name."));
            }

            if (Directory.Exists(file))
            {
                return Refuse<T>(FaultKinds.IsAFolder, file);
            }

            using var stream = File.OpenRead(file);
            return read(stream);
        }
        catch (Exception e) when (e is FileNotFoundException or DirectoryNotFoundException)
        {
            return Refuse<T>(FaultKinds.FileNotFound, file);
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            return Refuse<T>(FaultKinds.CannotRead, file, ("detail", e.Message));
        }
    }

    private static Attempt<T> Refuse<T>(FaultKind kind, string file, params (string Name, string Value)[] arguments)
        where T : class => new([Fault.Of(kind, "$", file, arguments)]);
}
