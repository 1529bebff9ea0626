namespace Lyonium.Provenance;

/// <summary>A published source.</summary>
/// <param name="Key">The short key by which values name it.</param>
/// <param name="Citation">Who published it, where and when.</param>
public sealed record Source(string Key, string Citation);
