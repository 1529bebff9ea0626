namespace Lyonium.Equilibria;

/// <summary>One estimate of a method that repeats itself.</summary>
/// <param name="PH">The estimate.</param>
/// <param name="Correction">How far it moved from the one before.</param>
public sealed record Iterate(double PH, double Correction);
