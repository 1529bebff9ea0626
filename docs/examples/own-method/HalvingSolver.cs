using System;
using Lyonium.Equilibria;

namespace OwnMethod;

/// <summary>Halves an interval of pH until the charge balance changes sign within a thousandth.</summary>
public sealed class HalvingSolver : ISolver
{
    public string Name => "halving";

    public SolverOutcome Solve(Equilibrium equilibrium, IActivityModel model)
    {
        if (!equilibrium.IsLadders)
        {
            return SolverOutcome.Without(SolverStatus.DoesNotApply, "only mixtures without ion pairs are halved");
        }

        try
        {
            return Halve(equilibrium, model);
        }
        catch (ArithmeticException noCoefficients)
        {
            // Far beyond its range a model may have no coefficients that agree with their own ionic strength.
            return SolverOutcome.Without(SolverStatus.NotSettled, noCoefficients.Message);
        }
    }

    private static SolverOutcome Halve(Equilibrium equilibrium, IActivityModel model)
    {
        double low = -3, high = 17;
        if (Charge(low) < 0 || Charge(high) > 0)
        {
            return SolverOutcome.Without(SolverStatus.DoesNotApply, "the pH lies outside -3 to 17");
        }

        while (high - low > 0.001)
        {
            var middle = 0.5 * (low + high);
            if (Charge(middle) > 0)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return SolverOutcome.Answer(0.5 * (low + high)) with { BracketLow = low, BracketHigh = high };

        double Charge(double pH) => Speciation.At(equilibrium, model, pH).ChargeMolPerKg;
    }
}
