using Lyonium.Provenance;

namespace Lyonium.Modelling;

/// <summary>A constant at the value at which it was used, with its source.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
/// <param name="Id">What it belongs to: a step (<c>citrate:1</c>), a substance, or <c>water</c>.</param>
/// <param name="Quantity">What it is, such as <c>pKa</c>, with its unit where it has one.</param>
/// <param name="Value">The value, its conditions and its source.</param>
/// <param name="Layer">The user's table that it comes from; <see langword="null"/> for the library's own.</param>
public sealed record UsedConstant(string Id, string Quantity, SourcedValue Value, string? Layer);
