using System;
using System.Security.Cryptography;

namespace Lyonium.Provenance;

/// <summary>The SHA-256 by which data is recognised again.</summary>
internal static class Fingerprint
{
    public static string Of(byte[] bytes)
    {
        using var sha = SHA256.Create();
        return BitConverter.ToString(sha.ComputeHash(bytes)).Replace("-", "").ToLowerInvariant();
    }
}
