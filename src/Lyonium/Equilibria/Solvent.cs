namespace Lyonium.Equilibria;

/// <summary>The water of an equilibrium, as plain numbers.</summary>
/// <param name="TemperatureK">The temperature in K.</param>
/// <param name="PKw">−log10 of the ion product of water, molality scale.</param>
/// <param name="DebyeHuckelA">The limiting slope for log10 γ, in (kg/mol)^½.</param>
/// <param name="DebyeHuckelB">The slope of the ion-size term, in (kg/mol)^½ per ångström.</param>
public sealed record Solvent(double TemperatureK, double PKw, double DebyeHuckelA, double DebyeHuckelB);
