namespace Lyonium.Tests.Equilibria;

/// <summary>One component as a textbook states it: its total, the charge of its most protonated form, and its pKa from the most acidic on.</summary>
/// <remarks>Without a pKa it is a spectator.</remarks>
internal sealed record LadderInput(double MolPerKg, int TopCharge, params double[] PKa);
