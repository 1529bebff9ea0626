namespace Lyonium.Conformance;

/// <summary>One property of a method on one mixture.</summary>
/// <param name="Property">What must hold.</param>
/// <param name="Mixture">Of which mixture.</param>
/// <param name="Passed">Whether it held.</param>
/// <param name="Detail">What was found where it did not; empty where it did.</param>
public sealed record ConformanceCheck(string Property, string Mixture, bool Passed, string Detail);
