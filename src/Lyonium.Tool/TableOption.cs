using System.CommandLine;
using System.IO;
using Lyonium.Faults;
using Lyonium.Substances;

namespace Lyonium.Tool;

/// <summary>The option that lays a user's own table over the library's.</summary>
internal static class TableOption
{
    public static Option<string?> Create() => new("--table") { Description = "a table of your own (lyonium-table/1.1), laid over the library's" };

    /// <summary>Standard input is one document: a command line that wants two of it is wrong.</summary>
    public static void RefuseBothOnStandardInput(Command command, Argument<string> recipe, Option<string?> table) => command.Validators.Add(result =>
    {
        if (result.GetResult(recipe) is { Tokens: [{ Value: "-" }] } && result.GetResult(table) is { Tokens: [{ Value: "-" }] })
        {
            result.AddError("Standard input is either the recipe or the table; give a file for the other.");
        }
    });

    public static Attempt<SubstanceTable> Open(string? file) => file is null
        ? new Attempt<SubstanceTable>(SubstanceTable.Default)
        : InputFile.Read(file, stream => SubstanceTable.Default.TryLayer(Path.GetFileName(file), stream));
}
