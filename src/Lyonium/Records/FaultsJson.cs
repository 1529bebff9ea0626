using System;
using System.Collections.Generic;
using System.Linq;
using System.Text.Json;
using Lyonium.Faults;

namespace Lyonium.Records;

/// <summary>Faults as JSON (<c>lyonium-faults/1</c>).</summary>
/// <remarks>Thread-safe.</remarks>
public static class FaultsJson
{
    /// <summary>Writes faults.</summary>
    /// <param name="faults">The faults.</param>
    /// <returns>The text, indented.</returns>
    /// <exception cref="ArgumentNullException"><paramref name="faults"/> is <see langword="null"/>.</exception>
    public static string Write(IReadOnlyList<Fault> faults)
    {
        _ = faults ?? throw new ArgumentNullException(nameof(faults));
        var document = new FaultsDocument(
            "lyonium-faults/1",
            faults.Select(one => new FaultEntry(one.Code, one.Path, one.Found, one.Message, one.Remedy)).ToArray(),
            faults.FirstOrDefault(one => one.Iterates.Count > 0)?.Iterates.Select(one => new IterateEntry(EntryOf.Finite(one.PH), EntryOf.Finite(one.Correction))).ToArray());
        return JsonSerializer.Serialize(document, ContractJson.Context.FaultsDocument);
    }
}
