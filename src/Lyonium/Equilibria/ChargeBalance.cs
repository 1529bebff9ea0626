using System;

namespace Lyonium.Equilibria;

/// <summary>The full charge balance of an equilibrium at a given hydrogen-ion activity.</summary>
/// <remarks>
/// <para>
/// Each ladder is counted from the rung that most of it stands on: its charge is that rung's charge times the total (summed exactly,
/// over all ladders and spectators) plus the small rest that stands on other rungs. So the balance keeps its relative precision in
/// strong excess, at both ends of the scale, and where large charges cancel. Components that couple are counted in the same way from the
/// species of which there is most.
/// </para>
/// <para>
/// The activity coefficients and the ionic strength are made consistent at every evaluation, so the balance is a function of the
/// hydrogen-ion activity alone.
/// </para>
/// </remarks>
internal ref struct ChargeBalance
{
    private const int MostRounds = 200;
    private const int UndampedRounds = 30;
    private const double FullPrecision = 1e-8; // a Newton step this short leaves an error of its square
    private const double HalfLastDigit = 1.1102230246251565e-16;

    private readonly Equilibrium _equilibrium;
    private readonly LadderSet _ladders;
    private readonly CoupledGroup[] _groups;
    private readonly Span<double> _groupWork;
    private double _groupNoise;
    private readonly IActivityModel _model;
    private readonly bool _dependsOnMolalities;
    private readonly double _ionProduct;
    private readonly Span<double> _ratios;
    private readonly Span<double> _log10Gammas;
    private readonly Span<double> _nextLog10Gammas;
    private readonly Span<double> _molalities;
    private double _inverseGammaH;
    private double _inverseGammaOH;
    private double _gammasAt;
    private double _largestLog10Gamma;
    private double _gammaNoise;

    /// <summary>Starts from activity coefficients of one.</summary>
    /// <param name="equilibrium">The equilibrium.</param>
    /// <param name="model">The model of activity coefficients.</param>
    /// <param name="buffer">Working space of at least <see cref="BufferLength"/>.</param>
    public ChargeBalance(Equilibrium equilibrium, IActivityModel model, Span<double> buffer)
    {
        _equilibrium = equilibrium;
        _ladders = equilibrium.Ladders;
        _groups = equilibrium.Groups;
        _model = model;
        _dependsOnMolalities = (model.Uses & IonData.Interactions) != IonData.None;
        _ionProduct = Math.Pow(10, -equilibrium.Solvent.PKw);
        var species = equilibrium.SpeciesCount;
        var rungs = _ladders.Species.Length;
        _log10Gammas = buffer.Slice(0, species);
        _nextLog10Gammas = buffer.Slice(species, species);
        _molalities = buffer.Slice(2 * species, species);
        _ratios = buffer.Slice(3 * species, rungs);
        _groupWork = buffer.Slice((3 * species) + rungs, LengthOfGroups(equilibrium));
        _molalities.Clear();
        Forget();
        for (var i = 0; i < _ladders.SpectatorSpecies.Length; i++)
        {
            _molalities[_ladders.SpectatorSpecies[i]] = _ladders.SpectatorTotal[i];
        }
    }

    /// <summary>The net charge, in mol/kg; it falls with pH.</summary>
    public double Charge { get; private set; }

    /// <summary>The part of the charge that grows in proportion to the hydrogen-ion activity, in mol/kg.</summary>
    public double Rising { get; private set; }

    /// <summary>The part of the charge that shrinks in inverse proportion to the hydrogen-ion activity, in mol/kg.</summary>
    public double Falling { get; private set; }

    /// <summary>Σ z²m of what the hydrogen-ion activity moves, in mol/kg, charges counted from each ladder's fullest rung.</summary>
    public double Moving { get; private set; }

    /// <summary>
    /// A bound on the relative rounding error of a share: at most sixteen roundings for each rung of distance, and what its activity
    /// coefficients may be off by.
    /// </summary>
    public readonly double RelativeNoise => (16 * HalfLastDigit) + (Math.Log(10) * _gammaNoise);

    /// <summary>A bound on the rounding error of the net charge, in mol/kg: beyond it the sign is certain.</summary>
    public readonly double Noise => (RelativeNoise * Moving) + _groupNoise;

    /// <summary>Σ|z|m of what the totals fix, in mol/kg: how large the numbers are that the charge is a difference of.</summary>
    public double FixedMagnitude { get; private set; }

    /// <summary>The ionic strength, in mol/kg.</summary>
    public double IonicStrength { get; private set; }

    /// <summary>Whether the model gave anything but activity coefficients of one.</summary>
    public bool GammasMove { get; private set; }

    public readonly ReadOnlySpan<double> Molalities => _molalities;

    public readonly ReadOnlySpan<double> Log10Gammas => _log10Gammas;

    public static int BufferLength(Equilibrium equilibrium) =>
        (3 * equilibrium.SpeciesCount) + equilibrium.Ladders.Species.Length + LengthOfGroups(equilibrium);

    /// <summary>
    /// Starts again from activity coefficients of one, as a balance just made. Far beyond its range a model may have several ionic strengths
    /// that agree with themselves; from the same start the same one is found.
    /// </summary>
    public void Forget()
    {
        _log10Gammas.Clear();
        _ladders.Ratio.AsSpan().CopyTo(_ratios);
        _inverseGammaH = 1;
        _inverseGammaOH = 1;
        _gammasAt = 0;
        _largestLog10Gamma = 0;
        var at = 0;
        foreach (var group in _groups)
        {
            CoupledSpeciation.Forget(group, _groupWork.Slice(at, group.WorkLength));
            at += group.WorkLength;
        }
    }

    /// <summary>Evaluates the balance.</summary>
    /// <param name="activity">The hydrogen-ion activity, above 0.</param>
    /// <returns>
    /// Whether the activity coefficients settled; if not, the model gave a number that is not finite or contradicts itself.
    /// </returns>
    public bool At(double activity)
    {
        double low = 0, high = double.PositiveInfinity, lastAt = double.NaN, lastMiss = double.NaN, change = double.PositiveInfinity;
        for (var round = 0; round < MostRounds; round++)
        {
            // While the coefficients still move, the mass balances of coupled components need not be exact to the last digit.
            if (!Speciate(activity, GammasMove && change > 1e-6 ? Math.Min(1e-3, 0.01 * change) : FullPrecision))
            {
                return false;
            }

            var miss = IonicStrength - _gammasAt;
            if (change <= 1e-15 * (1 + _largestLog10Gamma) && Math.Abs(miss) <= 1e-13 * IonicStrength)
            {
                return Settled(change);
            }

            if (miss > 0)
            {
                low = _gammasAt;
            }
            else
            {
                high = _gammasAt;
            }

            var next = Next(round, low, high, miss, lastAt, lastMiss);
            lastAt = _gammasAt;
            lastMiss = miss;
            change = UseGammasAt(next, isDamped: _dependsOnMolalities && round >= UndampedRounds);
            if (change == 0 && next == IonicStrength)
            {
                return Settled(0);
            }

            if (double.IsNaN(change) || double.IsInfinity(change))
            {
                return false;
            }

            if (!double.IsInfinity(high) && high - low <= 4e-16 * high)
            {
                return Speciate(activity, FullPrecision) && Math.Abs(IonicStrength - _gammasAt) <= 1e-13 * IonicStrength && Settled(change);
            }
        }

        return false;
    }

    // What the last round changed is a fair bound on what further rounds would.
    private bool Settled(double change)
    {
        _gammaNoise = (8 * HalfLastDigit * _largestLog10Gamma) + change;
        return true;
    }

    // A secant on (ionic strength out) − (ionic strength in), kept inside the bracket that the misses give.
    private readonly double Next(int round, double low, double high, double miss, double lastAt, double lastMiss)
    {
        var next = IonicStrength;
        if (round > 0 && miss != lastMiss)
        {
            var secant = _gammasAt - (miss * (_gammasAt - lastAt) / (miss - lastMiss));
            next = secant > 0.1 * next && secant < 10 * next ? secant : next;
        }

        if (round < 20 && next >= low && next <= high)
        {
            return next;
        }

        if (round < 2)
        {
            return next;
        }

        return double.IsInfinity(high) ? 2 * Math.Max(low, IonicStrength) : 0.5 * (low + high);
    }

    // Where the coefficients follow single molalities and go to and fro, half a step brings them to rest. Coefficients that follow the ionic
    // strength alone have its bracket, and must be those of it.
    private double UseGammasAt(double ionicStrength, bool isDamped)
    {
        _nextLog10Gammas.Fill(double.NaN); // so that a model that leaves one out is refused
        _model.Log10Gammas(_equilibrium, ionicStrength, _molalities, _nextLog10Gammas);
        _gammasAt = ionicStrength;
        for (var i = 0; isDamped && i < _log10Gammas.Length; i++)
        {
            _nextLog10Gammas[i] = 0.5 * (_nextLog10Gammas[i] + _log10Gammas[i]);
        }

        if (_nextLog10Gammas.SequenceEqual(_log10Gammas))
        {
            return 0;
        }

        double change = 0;
        _largestLog10Gamma = 0;
        for (var i = 0; i < _log10Gammas.Length; i++)
        {
            change = Math.Max(change, Math.Abs(_nextLog10Gammas[i] - _log10Gammas[i]));
            _largestLog10Gamma = Math.Max(_largestLog10Gamma, Math.Abs(_nextLog10Gammas[i]));
        }

        GammasMove = true;
        _nextLog10Gammas.CopyTo(_log10Gammas);
        _inverseGammaH = Math.Pow(10, -_log10Gammas[Equilibrium.HydrogenIon]);
        _inverseGammaOH = Math.Pow(10, -_log10Gammas[Equilibrium.HydroxideIon]);
        for (var i = 0; i < _ratios.Length; i++)
        {
            if (_ladders.Gap[i] > 0)
            {
                var shift = _log10Gammas[_ladders.Species[i - 1]] - _log10Gammas[_ladders.Species[i]];
                _ratios[i] = _ladders.Ratio[i] * Math.Pow(10, shift);
            }
        }

        return change;
    }

    private static int LengthOfGroups(Equilibrium equilibrium)
    {
        var length = 0;
        foreach (var group in equilibrium.Groups)
        {
            length += group.WorkLength;
        }

        return length;
    }

    private bool Speciate(double activity, double lengthOfLastStep)
    {
        var hydrogen = activity * _inverseGammaH;
        var hydroxide = _ionProduct / activity * _inverseGammaOH;
        _molalities[Equilibrium.HydrogenIon] = hydrogen;
        _molalities[Equilibrium.HydroxideIon] = hydroxide;
        Rising = hydrogen;
        Falling = hydroxide;
        Moving = hydrogen + hydroxide;
        FixedMagnitude = _ladders.SpectatorChargeMagnitude;
        IonicStrength = _ladders.SpectatorIonicStrength + (0.5 * Moving);
        var charge = _ladders.SpectatorCharge;
        charge.Add(hydrogen);
        charge.Add(-hydroxide);
        for (var ladder = 0; ladder < _ladders.Total.Length; ladder++)
        {
            Speciate(ladder, activity, ref charge);
        }

        var isSound = _groups.Length == 0 || SpeciateGroups(activity, lengthOfLastStep, ref charge);
        Charge = charge.Value;
        return isSound;
    }

    private bool SpeciateGroups(double activity, double lengthOfLastStep, ref ExactSum charge)
    {
        var at = 0;
        _groupNoise = 0;
        foreach (var group in _groups)
        {
            var speciation = new CoupledSpeciation(group, Math.Log(activity), _groupWork.Slice(at, group.WorkLength));
            if (!speciation.Run(_log10Gammas, lengthOfLastStep, _molalities, ref charge))
            {
                return false;
            }

            Rising += speciation.Rising;
            Falling += speciation.Falling;
            Moving += speciation.Moving;
            FixedMagnitude += speciation.FixedMagnitude;
            IonicStrength += speciation.IonicStrength;
            _groupNoise += speciation.Noise;
            at += group.WorkLength;
        }

        return true;
    }

    private void Speciate(int ladder, double activity, ref ExactSum charge)
    {
        var start = _ladders.Start[ladder];
        var end = _ladders.Start[ladder + 1];
        var most = Fullest(start, end, activity);
        var chargeOfMost = _ladders.Charge[most];

        // Sums over the rungs above and below the fullest one, in units of what stands on that one.
        double sum = 1, squares = chargeOfMost * chargeOfMost, above = 0, aboveSquares = 0, below = 0, belowSquares = 0;
        _molalities[_ladders.Species[most]] = 1;
        double share = 1;
        for (var i = most + 1; i < end; i++)
        {
            share *= RatioToRungBelow(i, activity);
            _molalities[_ladders.Species[i]] = share;
            var distance = _ladders.Charge[i] - chargeOfMost;
            sum += share;
            above += distance * share;
            aboveSquares += distance * distance * share;
            squares += _ladders.Charge[i] * _ladders.Charge[i] * share;
        }

        share = 1;
        for (var i = most - 1; i >= start; i--)
        {
            share /= RatioToRungBelow(i + 1, activity);
            _molalities[_ladders.Species[i]] = share;
            var distance = chargeOfMost - _ladders.Charge[i];
            sum += share;
            below += distance * share;
            belowSquares += distance * distance * share;
            squares += _ladders.Charge[i] * _ladders.Charge[i] * share;
        }

        var total = _ladders.Total[ladder];
        var scale = total / sum;
        for (var i = start; i < end; i++)
        {
            _molalities[_ladders.Species[i]] *= scale;
        }

        var excess = (above - below) / sum;
        charge.AddProduct(total, chargeOfMost);
        charge.Add(total * excess);
        Rising += scale * (aboveSquares - (above * excess));
        Falling += scale * (belowSquares + (below * excess));
        Moving += scale * (aboveSquares + belowSquares);
        FixedMagnitude += Math.Abs(chargeOfMost) * total;
        IonicStrength += 0.5 * scale * squares;
    }

    private readonly int Fullest(int start, int end, double activity)
    {
        var fullest = start;
        double share = 1;
        for (var i = start + 1; i < end; i++)
        {
            share *= RatioToRungBelow(i, activity);
            if (share > 1)
            {
                fullest = i;
                share = 1;
            }
        }

        return fullest;
    }

    private readonly double RatioToRungBelow(int rung, double activity)
    {
        var ratio = _ratios[rung] * activity;
        for (var gap = _ladders.Gap[rung]; gap > 1; gap--)
        {
            ratio *= activity;
        }

        return ratio;
    }
}
