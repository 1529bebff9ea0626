using Lyonium.Provenance;

namespace Lyonium.Substances;

/// <summary>The density of a solution at one mass fraction.</summary>
/// <param name="MassFraction">The mass fraction, 0 to 1.</param>
/// <param name="DensityKgPerL">The density in kg/L.</param>
public sealed record SolutionDensity(double MassFraction, SourcedValue DensityKgPerL);
