namespace Lyonium.Predictions;

/// <summary>One thing that was taken for granted, its figure, its limit, and whether it held.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
/// <param name="Code">A stable word for it; <c>docs/assumptions.md</c> lists them.</param>
/// <param name="Of">What it is about: a substance, or the mixture.</param>
/// <param name="Figure">How large it is here, in the unit that the list gives; <see langword="null"/> where it has no figure.</param>
/// <param name="Limit">Up to where it is taken to hold, in the same unit; <see langword="null"/> where it has none.</param>
/// <param name="Held">Whether it held.</param>
/// <param name="Basis">Where it or its limit comes from.</param>
public sealed record Assumption(string Code, string Of, double? Figure, double? Limit, bool Held, string Basis);
