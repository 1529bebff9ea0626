namespace Lyonium.Provenance;

/// <summary>A user's own table, laid over the one of the library.</summary>
/// <param name="Name">The name that the user gave it.</param>
/// <param name="Edition">Its edition.</param>
/// <param name="Sha256">The SHA-256 of its bytes, 64 hexadecimal digits in lower case.</param>
public sealed record TableLayer(string Name, string Edition, string Sha256);
