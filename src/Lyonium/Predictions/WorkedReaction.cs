namespace Lyonium.Predictions;

/// <summary>One dissociation, or the formation of an ion pair, and its mass action.</summary>
/// <param name="Id">The id of the step, such as <c>citrate:1</c>, or of the pair.</param>
/// <param name="Equation">The reaction.</param>
/// <param name="MassAction">The mass-action expression in molalities.</param>
/// <param name="PKa">The pKa at infinite dilution; of a formation −log10 of its constant.</param>
/// <param name="K">The constant in mol/kg (of a formation in powers of kg/mol) at the ionic strength of the answer: with the activity coefficients in it.</param>
/// <param name="Quotient">The mass-action expression with the molalities of the answer put in, in the same unit; equal to K.</param>
/// <param name="IsFormation">Whether it is the formation of an ion pair, dimer or polymer.</param>
public sealed record WorkedReaction(string Id, string Equation, string MassAction, double PKa, double K, double Quotient, bool IsFormation = false);
