using Lyonium.Provenance;

namespace Lyonium.Substances;

/// <summary>The standard atomic weight of an element.</summary>
/// <param name="Symbol">The symbol of the element.</param>
/// <param name="Weight">The relative atomic mass, with its published uncertainty; a molar mass is the sum in g/mol.</param>
public sealed record AtomicWeight(string Symbol, SourcedValue Weight);
