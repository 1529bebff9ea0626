namespace Lyonium.Equilibria;

/// <summary>How many of a component a species is made of.</summary>
/// <param name="Component">The index of the component.</param>
/// <param name="Count">How many of it, one or more.</param>
public readonly record struct Term(int Component, int Count);
