using System;
using System.CommandLine;
using System.Linq;
using Lyonium.Substances;

namespace Lyonium.Tool;

/// <summary><c>lyonium constants</c>: looks up the table with its sources.</summary>
internal static class ConstantsCommand
{
    public static Command Create()
    {
        var name = new Argument<string?>("NAME")
        {
            Description = "a substance (name, id or formula) or a family; all of them where it is left out",
            Arity = ArgumentArity.ZeroOrOne,
        };
        var table = TableOption.Create();
        var command = new Command("constants", "Looks up substances and their constants, with the sources.") { name, table };
        command.SetAction(parsed =>
        {
            var opened = TableOption.Open(parsed.GetValue(table));
            return opened.Success ? Run(parsed.GetValue(name), opened.Value) : OutputFormat.Print(opened.Faults, asJson: false);
        });
        return command;
    }

    private static int Run(string? name, SubstanceTable table)
    {
        if (name is null)
        {
            Terminal.Print(console => new ConstantsText(table, console).PrintAll());
            return ExitStatus.Done;
        }

        var substance = table.Find(name);
        if (substance.Success)
        {
            Terminal.Print(console => new ConstantsText(table, console).Print(substance.Value));
            return ExitStatus.Done;
        }

        if (table.Families.FirstOrDefault(one => string.Equals(one.Id, name.Trim(), StringComparison.OrdinalIgnoreCase)) is { } family)
        {
            Terminal.Print(console => new ConstantsText(table, console).Print(family));
            return ExitStatus.Done;
        }

        return OutputFormat.Print(substance.Faults, asJson: false);
    }
}
