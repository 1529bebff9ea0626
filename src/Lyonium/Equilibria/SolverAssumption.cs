namespace Lyonium.Equilibria;

/// <summary>One thing a method took for granted, in numbers.</summary>
/// <param name="Code">A stable word for it.</param>
/// <param name="Component">The index of the component it is about; −1 for the whole solution.</param>
/// <param name="Figure">How large it is here.</param>
/// <param name="Limit">Up to where it is taken to hold.</param>
/// <param name="Held">Whether it held.</param>
/// <param name="Basis">Where the limit comes from.</param>
public sealed record SolverAssumption(string Code, int Component, double Figure, double Limit, bool Held, string Basis);
