namespace Lyonium.Predictions;

/// <summary>The molality of a species before and after the protons settle.</summary>
/// <param name="Species">The formula.</param>
/// <param name="StartMolPerKg">
/// After strong and weak have neutralised each other and before anything dissociates, in mol/kg; <see langword="null"/> where the steps
/// have no order.
/// </param>
/// <param name="EquilibriumMolPerKg">At the answer, in mol/kg.</param>
public sealed record WorkedAmount(string Species, double? StartMolPerKg, double EquilibriumMolPerKg)
{
    /// <summary>The change from start to equilibrium, in mol/kg.</summary>
    public double? ChangeMolPerKg => EquilibriumMolPerKg - StartMolPerKg;
}
