using System;
using System.Collections.Generic;
using System.Linq;

namespace Lyonium.Substances;

/// <summary>Names, synonyms and ids as they are matched, each with the substance that owns it.</summary>
internal sealed class TakenNames
{
    private readonly Dictionary<string, string> _owners = new(StringComparer.Ordinal);

    public TakenNames(IEnumerable<Substance>? substances = null)
    {
        foreach (var substance in substances ?? [])
        {
            foreach (var name in substance.Synonyms.Concat([substance.Name, substance.Id]))
            {
                Take(name, substance.Id);
            }
        }
    }

    /// <summary>Takes a name for a substance; returns the id of the one that has it already, if it is another.</summary>
    public string? Take(string name, string id)
    {
        var folded = NameFolding.Fold(name);
        if (_owners.TryGetValue(folded, out var owner))
        {
            return owner;
        }

        _owners.Add(folded, id);
        return null;
    }
}
