namespace Lyonium.Faults;

/// <summary>One way in which input can be refused: a stable code, and what is said about it.</summary>
/// <remarks>
/// The texts hold placeholders in braces (<c>{found}</c>, <c>{expected}</c> …) that <see cref="Fault.Arguments"/> fills, so that a host
/// can say the same in its own language. Immutable; safe to share between threads.
/// </remarks>
/// <param name="Code">The code, <c>LYO</c> and four digits; never reused for something else.</param>
/// <param name="Title">A short name of the kind, as <c>docs/faults.md</c> lists it.</param>
/// <param name="Message">What is wrong, with placeholders.</param>
/// <param name="Remedy">What to do about it, with placeholders.</param>
public sealed record FaultKind(string Code, string Title, string Message, string Remedy);
