using System;
using System.Collections.Generic;
using Lyonium.Faults;
using Lyonium.Substances;

namespace Lyonium.Recipes;

/// <summary>Turns the names of a draft into the ids of a table; a name is looked up once.</summary>
internal sealed class SubstanceResolver(SubstanceTable table, FaultList faults)
{
    private readonly Dictionary<string, Substance?> _known = new(StringComparer.Ordinal);
    private readonly Dictionary<Stock, Stock> _stocks = [];

    public Stock Resolve(Stock stock, string path)
    {
        if (_stocks.TryGetValue(stock, out var resolved))
        {
            return resolved;
        }

        resolved = Find(stock.Substance, path + ".substance") is { } substance ? stock.Resolved(substance) : stock;
        _stocks.Add(stock, resolved);
        return resolved;
    }

    public Part Resolve(Part part, string path) => part switch
    {
        SolutionPart solution => new SolutionPart(Resolve(solution.Stock, path), solution.Taken, solution.Id),
        SubstancePart pure when Find(pure.Substance, path + ".substance") is { } substance =>
            new SubstancePart(substance.Id, pure.Taken, pure.Purity, pure.Id),
        _ => part,
    };

    // Told once for each name, at the first place where it stands.
    private Substance? Find(string name, string path)
    {
        if (!_known.TryGetValue(name, out var substance))
        {
            substance = table.Find(name, path, faults);
            _known.Add(name, substance);
        }

        return substance;
    }
}
