using System;
using System.Buffers;
using Lyonium.Equilibria;

namespace Lyonium.Solvers;

/// <summary>The exact method: the zero of the full charge balance, certified by a bracket.</summary>
/// <remarks>
/// <para>
/// At a given hydrogen-ion activity every ladder speciates in closed form, coupled components by a damped Newton method on a convex problem,
/// and the charges are summed, activity coefficients and ionic
/// strength included; the sum falls with pH and the method finds its zero. Each step replaces every dissociation term by that one of its
/// two asymptotes (a constant plus a term in a, or a constant plus a term in 1/a) which matches its value and slope, and solves the
/// quadratic equation that is left; where that step leaves the bracket, the bracket's geometric mean is taken.
/// </para>
/// <para>
/// The bracket is returned as two pH values at which the balance has opposite signs, each larger than rounding could have turned, a few
/// last digits apart. The solve allocates nothing. Stateless and thread-safe.
/// </para>
/// </remarks>
public sealed class ExactSolver : ISolver
{
    private const double LowestPH = -50;
    private const double HighestPH = 70;
    private const double WidestBracket = 1e-9;
    private const int MostEvaluations = 400;
    private const double LastDigit = 2.220446049250313e-16;

    /// <inheritdoc/>
    public string Name => "exact";

    /// <inheritdoc/>
    public SolverOutcome Solve(Equilibrium equilibrium, IActivityModel model)
    {
        _ = equilibrium ?? throw new ArgumentNullException(nameof(equilibrium));
        _ = model ?? throw new ArgumentNullException(nameof(model));
        var buffer = ArrayPool<double>.Shared.Rent(ChargeBalance.BufferLength(equilibrium));
        try
        {
            var search = new Search(new ChargeBalance(equilibrium, model, buffer), model.HighestIonicStrengthMolPerKg);
            return search.Run();
        }
        finally
        {
            ArrayPool<double>.Shared.Return(buffer);
        }
    }

    private ref struct Search
    {
        private readonly double _highestIonicStrength;
        private ChargeBalance _balance;
        private int _evaluations;
        private bool _settled;

        public Search(ChargeBalance balance, double highestIonicStrength)
        {
            _highestIonicStrength = highestIonicStrength;
            _balance = balance;
            _settled = true;
        }

        // By how much the charge falls for each unit of pH, activity coefficients held.
        private readonly double Slope => Math.Log(10) * (_balance.Rising + _balance.Falling);

        public SolverOutcome Run()
        {
            var pH = -Math.Log10(FindZero());
            return _settled ? Certify(pH) : NotSettled("the activity coefficients do not settle");
        }

        private double FindZero()
        {
            var low = Math.Pow(10, -HighestPH);
            var high = Math.Pow(10, -LowestPH);
            var activity = 1e-7;
            double lastStep = 1, lastMove = double.NaN;
            while (_settled && _evaluations < MostEvaluations)
            {
                var charge = ChargeAt(activity);
                if (charge > 0)
                {
                    high = activity;
                }
                else
                {
                    low = activity;
                }

                // The slope is exact but for activity coefficients that move: each error is then about the square of the one before.
                var step = Math.Log(Factor(charge));
                var rate = Math.Min(1, Math.Abs(step / lastStep));
                var shrinks = Math.Max(Math.Abs(step), _balance.GammasMove ? rate : rate * rate);
                var move = _balance.GammasMove ? Secant(step, lastStep, lastMove) : step;
                var next = activity * Math.Exp(move);
                if (Math.Abs(step) * shrinks <= 2 * _balance.RelativeNoise)
                {
                    return next;
                }

                // Steps that go to and fro inside the bracket do not narrow it; halving does.
                var isSlow = _evaluations > 40 && _evaluations % 2 == 0;
                if (isSlow || !(next > low && next < high))
                {
                    next = Math.Sqrt(low) * Math.Sqrt(high);
                    move = Math.Log(next / activity);
                }

                lastStep = step;
                lastMove = move;
                activity = next;
            }

            return activity;
        }

        // Activity coefficients move with pH, so near the zero the step is a little too short or too long; two steps tell by how much.
        private static double Secant(double step, double lastStep, double lastMove)
        {
            var factor = lastMove / (lastStep - step);
            return Math.Abs(step) < 0.3 && factor is > 0.1 and < 10 ? step * factor : step;
        }

        // The factor t on the activity that makes Rising · t + constant − Falling / t zero.
        private readonly double Factor(double charge)
        {
            var constant = charge - _balance.Rising + _balance.Falling;
            var root = Math.Sqrt((constant * constant) + (4 * _balance.Rising * _balance.Falling));
            return constant > 0 ? 2 * _balance.Falling / (constant + root) : (root - constant) / (2 * _balance.Rising);
        }

        private double ChargeAt(double activity)
        {
            _evaluations++;
            _settled &= _balance.At(activity);
            return _balance.Charge;
        }

        private SolverOutcome Certify(double pH)
        {
            // The first guess is as narrow as rounding lets the signs be certain; it nearly always holds.
            var narrow = (1.5 * Math.Max(1, Math.Abs(pH)) * LastDigit) + (1.5 * _balance.Noise / Slope);
            double low = pH, high = pH, lowCharge = 0, highCharge = 0;
            for (var reach = narrow; lowCharge <= 0 && reach < 1; reach *= 4)
            {
                low -= reach;
                lowCharge = CertainChargeAtPH(low);
            }

            for (var reach = narrow; highCharge >= 0 && reach < 1; reach *= 4)
            {
                high += reach;
                highCharge = CertainChargeAtPH(high);
            }

            if (!_settled)
            {
                return NotSettled("the activity coefficients do not settle");
            }

            if (!(lowCharge > 0 && highCharge < 0))
            {
                return NotSettled("the charge balance has no zero that a bracket can hold");
            }

            while (high - low > 2 * narrow && _evaluations < MostEvaluations)
            {
                var middle = low + (0.5 * (high - low));
                var charge = CertainChargeAtPH(middle);
                if (charge > 0)
                {
                    low = middle;
                    lowCharge = charge;
                }
                else if (charge < 0)
                {
                    high = middle;
                    highCharge = charge;
                }
                else
                {
                    break;
                }
            }

            return Answer(low, high, lowCharge - highCharge);
        }

        // Zero where rounding could have turned the sign.
        private double CertainChargeAtPH(double pH)
        {
            // What certifies must not depend on where the search came from.
            if (_balance.IonicStrength > _highestIonicStrength)
            {
                _balance.Forget();
            }

            var charge = ChargeAt(Math.Pow(10, -pH));
            return Math.Abs(charge) > _balance.Noise ? charge : 0;
        }

        private readonly SolverOutcome Answer(double low, double high, double jump)
        {
            // Beyond its range an activity model can make the balance jump; a jump is not a zero.
            if (!_settled || high - low > WidestBracket || jump > 1e3 * Slope * (high - low))
            {
                return NotSettled("the charge balance jumps over zero, so that no pH fulfils it");
            }

            return new SolverOutcome
            {
                Status = SolverStatus.Solved,
                PH = low + (0.5 * (high - low)),
                BracketLow = low,
                BracketHigh = high,
                Evaluations = _evaluations,
                InputResolution = 0.5 * LastDigit * _balance.FixedMagnitude / Slope,
            };
        }

        private readonly SolverOutcome NotSettled(string reason) => SolverOutcome.Without(SolverStatus.NotSettled, reason, _evaluations);
    }
}
