using Lyonium.Provenance;

namespace Lyonium.Substances;

/// <summary>A specific interaction coefficient of two ions.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
/// <param name="Cation">The species id, <c>family:protons</c>, of the positive ion; <c>water:2</c> is the hydrogen ion.</param>
/// <param name="Anion">The species id of the negative ion; <c>water:0</c> is the hydroxide ion.</param>
/// <param name="KgPerMol">The coefficient ε at 25 °C, in kg/mol.</param>
/// <param name="Layer">The user's table that it comes from; <see langword="null"/> for the library's own.</param>
public sealed record InteractionCoefficient(string Cation, string Anion, SourcedValue KgPerMol, string? Layer);
