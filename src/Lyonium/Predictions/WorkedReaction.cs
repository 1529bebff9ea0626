namespace Lyonium.Predictions;

/// <summary>One dissociation and its mass action.</summary>
/// <param name="Id">The id of the step, such as <c>citrate:1</c>.</param>
/// <param name="Equation">The reaction.</param>
/// <param name="MassAction">The mass-action expression in molalities.</param>
/// <param name="PKa">The pKa at infinite dilution.</param>
/// <param name="K">The constant in mol/kg at the ionic strength of the answer: Ka with the activity coefficients in it.</param>
/// <param name="Quotient">The mass-action expression with the molalities of the answer put in, in mol/kg; equal to K.</param>
public sealed record WorkedReaction(string Id, string Equation, string MassAction, double PKa, double K, double Quotient);
