namespace Lyonium.Substances;

/// <summary>How many of a family a substance brings into solution.</summary>
/// <param name="Family">The family.</param>
/// <param name="Count">How many, per formula unit.</param>
public sealed record BroughtFamily(Family Family, int Count);
