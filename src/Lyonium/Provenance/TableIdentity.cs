using System.Collections.Generic;

namespace Lyonium.Provenance;

/// <summary>Which table a number came from, so that a record can be replayed against the same one.</summary>
/// <param name="Edition">The dated edition, such as <c>2026.12</c>.</param>
/// <param name="Sha256">The SHA-256 of the table's bytes, 64 hexadecimal digits in lower case.</param>
/// <param name="Layers">The user's own tables laid over it, the lowest first; empty where there are none.</param>
public sealed record TableIdentity(string Edition, string Sha256, IReadOnlyList<TableLayer> Layers);
