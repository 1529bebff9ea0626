namespace Lyonium.Equilibria;

/// <summary>The specific interaction of two species: what one mol/kg of either adds to log10 γ of the other.</summary>
/// <param name="First">The index of one species, the ions of water first.</param>
/// <param name="Second">The index of the other.</param>
/// <param name="KgPerMol">The interaction coefficient ε, in kg/mol.</param>
public readonly record struct IonInteraction(int First, int Second, double KgPerMol);
