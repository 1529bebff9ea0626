using System;

namespace Lyonium.Equilibria;

/// <summary>Speciates a coupled group at a given hydrogen-ion activity.</summary>
/// <remarks>
/// <para>
/// The mass balances are the gradient of a convex function of the logarithms of the component activities (J. W. Smith and R. W. Missen,
/// Chemical Reaction Equilibrium Analysis, Wiley 1982). A sweep over the components, each in the logarithm of its own balance, comes near
/// from anywhere; a damped Newton method on the convex function comes nearer.
/// </para>
/// <para>
/// For the last digits the balances are written over the species of which there is most, one for each component: then each balance holds
/// the small difference that the large totals leave, and what is scarce keeps its relative precision. The net charge is counted from the
/// same species, as the ladders count theirs from their fullest rung.
/// </para>
/// </remarks>
internal ref partial struct CoupledSpeciation
{
    private const int MostSweeps = 200;
    private const int MostSteps = 100;

    private readonly CoupledGroup _group;
    private readonly int _species;
    private readonly int _components;
    private readonly double _lnActivity;
    private readonly Span<double> _lnX;        // ln of each component's activity, and then of the molality of the basis: where the next call starts
    private readonly Span<double> _lnK;        // conditional: activity coefficients and protons taken in
    private readonly Span<double> _lnM;
    private readonly Span<double> _m;
    private readonly Span<double> _counts;     // over the basis
    private readonly Span<double> _constants;  // ln K over the basis
    private readonly Span<double> _protons;    // protons over the basis
    private readonly Span<double> _charges;    // charge counted from the basis
    private readonly Span<double> _totals;     // over the basis
    private readonly Span<double> _matrix;
    private readonly Span<double> _inverse;    // of the basis species' counts, beside them while it is made
    private readonly Span<double> _scale;
    private readonly Span<double> _right;
    private readonly Span<double> _step;
    private readonly Span<double> _basis;      // the species of the basis, whole numbers
    private readonly Span<double> _slope;      // of ln m of the basis against ln of the hydrogen-ion activity
    private readonly Span<double> _last;       // 1 where the last call left a basis, and its ln of the hydrogen-ion activity

    public CoupledSpeciation(CoupledGroup group, double lnActivity, Span<double> work)
    {
        _group = group;
        _species = group.Species.Length;
        _components = group.Components.Length;
        _lnActivity = lnActivity;
        var at = 0;
        _lnX = Take(work, ref at, _components);
        _lnK = Take(work, ref at, _species);
        _lnM = Take(work, ref at, _species);
        _m = Take(work, ref at, _species);
        _counts = Take(work, ref at, _species * _components);
        _constants = Take(work, ref at, _species);
        _protons = Take(work, ref at, _species);
        _charges = Take(work, ref at, _species);
        _totals = Take(work, ref at, _components);
        _matrix = Take(work, ref at, _components * _components);
        _inverse = Take(work, ref at, 2 * _components * _components);
        _scale = Take(work, ref at, _components);
        _right = Take(work, ref at, _components);
        _step = Take(work, ref at, _components);
        _basis = Take(work, ref at, _components);
        _slope = Take(work, ref at, _components);
        _last = Take(work, ref at, 2);
    }

    /// <summary>The part of the charge that grows with the hydrogen-ion activity, and that shrinks, for each unit of its logarithm.</summary>
    public double Rising { get; private set; }

    /// <summary>See <see cref="Rising"/>.</summary>
    public double Falling { get; private set; }

    /// <summary>Σ|z|m of what moves, charges counted from the basis, each as often as its counts carry an error.</summary>
    public double Moving { get; private set; }

    /// <summary>A bound on the rounding error of the group's charge, in mol/kg, activity coefficients apart.</summary>
    public double Noise { get; private set; }

    /// <summary>Σ|z|m of what the totals fix, in mol/kg.</summary>
    public double FixedMagnitude { get; private set; }

    /// <summary>The ionic strength of the group's ions, in mol/kg.</summary>
    public double IonicStrength { get; private set; }

    public static int WorkLength(int species, int components) =>
        2 + (7 * components) + (6 * species) + (species * components) + (3 * components * components);

    /// <summary>Forgets where the last call ended.</summary>
    public static void Forget(CoupledGroup group, Span<double> work)
    {
        work[group.WorkLength - 2] = 0;
        for (var c = 0; c < group.Components.Length; c++)
        {
            work[c] = Math.Log(group.Totals[c]);
        }
    }

    /// <summary>Speciates, and adds the group's charge.</summary>
    /// <param name="log10Gammas">log10 γ of every species of the equilibrium.</param>
    /// <param name="lengthOfLastStep">How short a Newton step, in ln of a molality, is the last; its square is the error.</param>
    /// <param name="molalities">Takes the molality of the group's species.</param>
    /// <param name="charge">Takes the group's charge.</param>
    /// <returns>Whether the mass balances are fulfilled to the last digits.</returns>
    public bool Run(ReadOnlySpan<double> log10Gammas, double lengthOfLastStep, Span<double> molalities, ref ExactSum charge)
    {
        for (var i = 0; i < _species; i++)
        {
            _lnK[i] = _group.LnK[i] + (_group.Protons[i] * _lnActivity) - (Math.Log(10) * log10Gammas[_group.Species[i]]);
        }

        if (!FromLastCall(lengthOfLastStep) && !FromAnywhere(lengthOfLastStep))
        {
            return false;
        }

        _last[0] = 1;
        _last[1] = _lnActivity;

        for (var i = 0; i < _species; i++)
        {
            molalities[_group.Species[i]] = _m[i];
            IonicStrength += 0.5 * _group.Charges[i] * _group.Charges[i] * _m[i];
        }

        CountCharge(ref charge);
        return true;
    }

    // Near the last call its basis is still that of which there is most, and its answer a good start.
    private readonly bool FromLastCall(double lengthOfLastStep)
    {
        const double farthest = 12;
        var move = _lnActivity - _last[1];
        if (_last[0] == 0 || !(Math.Abs(move) <= farthest))
        {
            return false;
        }

        CountConstants();
        for (var r = 0; r < _components; r++)
        {
            _lnX[r] += move * _slope[r];
        }

        return Finish(longest: 2, lengthOfLastStep) && IsBasisAbundant();
    }

    private readonly bool FromAnywhere(double lengthOfLastStep)
    {
        const double anyLength = double.PositiveInfinity;
        Forget();
        return Sweep() && Approach() && ChooseBasis() && Finish(anyLength, lengthOfLastStep);
    }

    private readonly void Forget()
    {
        for (var c = 0; c < _components; c++)
        {
            _lnX[c] = Math.Log(_group.Totals[c]);
        }
    }

    private static Span<double> Take(Span<double> work, scoped ref int at, int length)
    {
        var taken = work.Slice(at, length);
        at += length;
        return taken;
    }

    private readonly double Count(int species, int component) => _group.Counts[(species * _components) + component];

    private readonly void FromComponents()
    {
        for (var i = 0; i < _species; i++)
        {
            var ln = _lnK[i];
            for (var c = 0; c < _components; c++)
            {
                ln += Count(i, c) * _lnX[c];
            }

            _lnM[i] = ln;
        }
    }

    // Each component in turn is moved by what the logarithm of its own balance asks for, over the mean number of components of its species.
    private readonly bool Sweep()
    {
        const double near = 0.5;
        for (var round = 0; round < MostSweeps; round++)
        {
            FromComponents();
            double worst = 0;
            for (var c = 0; c < _components; c++)
            {
                var (lnSum, weight) = LogarithmOfSum(c);
                var miss = lnSum - Math.Log(_group.Totals[c]);
                worst = Math.Max(worst, Math.Abs(miss));
                _step[c] = -miss / weight;
            }

            if (double.IsNaN(worst) || double.IsInfinity(worst))
            {
                return false;
            }

            if (worst < near)
            {
                return true;
            }

            for (var c = 0; c < _components; c++)
            {
                _lnX[c] += _step[c];
            }
        }

        return true;
    }

    private readonly (double LnSum, double Weight) LogarithmOfSum(int component)
    {
        var largest = double.NegativeInfinity;
        for (var i = 0; i < _species; i++)
        {
            largest = Count(i, component) > 0 ? Math.Max(largest, _lnM[i]) : largest;
        }

        double sum = 0, weighted = 0;
        for (var i = 0; i < _species; i++)
        {
            if (Count(i, component) > 0)
            {
                double all = 0;
                for (var c = 0; c < _components; c++)
                {
                    all += Count(i, c);
                }

                var share = Count(i, component) * Math.Exp(_lnM[i] - largest);
                sum += share;
                weighted += share * all;
            }
        }

        return (largest + Math.Log(sum), weighted / sum);
    }

    // Damped Newton on Σm − ΣT ln x, which is convex.
    private readonly bool Approach()
    {
        const double near = 0.05;
        const double longest = 2;
        for (var round = 0; round < MostSteps; round++)
        {
            FromComponents();
            Exponentiate();
            Balance(_group.Counts, _group.Totals);
            var newton = new ScaledCholesky(_matrix, _scale);
            if (!newton.Factor())
            {
                return false;
            }

            newton.Solve(_right, _step);

            var largest = LargestChange(_group.Counts);
            var factor = Math.Min(1, longest / largest);
            for (var c = 0; c < _components; c++)
            {
                _lnX[c] += factor * _step[c];
            }

            if (largest < near)
            {
                FromComponents();
                Exponentiate();
                return true;
            }

            if (double.IsNaN(largest))
            {
                return false;
            }
        }

        return false;
    }

    private readonly void Exponentiate()
    {
        for (var i = 0; i < _species; i++)
        {
            _m[i] = Math.Exp(_lnM[i]);
        }
    }

    // The misses of the balances, and their derivatives by the logarithms: Σ count² m and so on.
    private readonly void Balance(ReadOnlySpan<double> counts, ReadOnlySpan<double> totals)
    {
        _matrix.Clear();
        for (var c = 0; c < _components; c++)
        {
            var sum = default(ExactSum);
            sum.Add(totals[c]);
            for (var i = 0; i < _species; i++)
            {
                var count = counts[(i * _components) + c];
                if (count == 0)
                {
                    continue;
                }

                sum.Add(-count * _m[i]);
                for (var d = 0; d <= c; d++)
                {
                    _matrix[(c * _components) + d] += count * counts[(i * _components) + d] * _m[i];
                }
            }

            _right[c] = sum.Value;
        }
    }

    private readonly double LargestChange(ReadOnlySpan<double> counts)
    {
        double largest = 0;
        for (var i = 0; i < _species; i++)
        {
            double change = 0;
            for (var c = 0; c < _components; c++)
            {
                change += counts[(i * _components) + c] * _step[c];
            }

            largest = Math.Max(largest, Math.Abs(change));
        }

        return double.IsNaN(_step.Length > 0 ? _step[0] : 0) ? double.NaN : largest;
    }
}
