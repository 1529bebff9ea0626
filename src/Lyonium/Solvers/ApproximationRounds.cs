using System;
using System.Collections.Generic;
using System.Linq;

namespace Lyonium.Solvers;

/// <summary>The rounds of successive approximation over filled proton levels.</summary>
internal sealed class ApproximationRounds
{
    private readonly ProtonLevels _levels;
    private readonly List<Protolyte> _protolytes = [];
    private readonly Protolyte? _pair;
    private double _h = double.NaN;
    private bool _isExhausted;

    public ApproximationRounds(ProtonLevels levels)
    {
        _levels = levels;
        foreach (var group in levels.Levels.Select((level, index) => (level, isFilled: index < levels.Filled)).GroupBy(one => one.level.Component))
        {
            _protolytes.Add(new Protolyte(
                group.Key,
                group.First().level.Total,
                group.Where(one => one.isFilled).Select(one => one.level.K).Reverse().ToArray(),
                group.Where(one => !one.isFilled).Select(one => one.level.K).ToArray()));
        }

        // A pair counts as one only where its smaller member is more than the solution exchanges by itself.
        var offered = levels.IonProduct + _protolytes.Sum(one => one.FirstOffer);
        var wanted = 1 + _protolytes.Sum(one => one.FirstWant);
        if (levels.SharedLevel is { } shared && Math.Abs(levels.Rest) > Math.Sqrt(offered * wanted))
        {
            _pair = _protolytes.Find(one => one.Component == shared.Component);
            _pair!.Share(shared.K, levels.Rest);
        }
    }

    /// <summary>
    /// By how much the protons given and taken changed in the last round, relative to all that are exchanged: an answer can stand still
    /// while the amounts behind it still move.
    /// </summary>
    public double Change { get; private set; } = double.PositiveInfinity;

    /// <summary>
    /// The next estimate of the hydrogen-ion molality; NaN or not above zero where more would dissociate at the last one than there is.
    /// </summary>
    public double Next()
    {
        if (_isExhausted)
        {
            return double.NaN;
        }

        _h = double.IsNaN(_h) ? First() : Corrected();
        var (given, taken) = (_protolytes.ConvertAll(one => one.Given), _protolytes.ConvertAll(one => one.Taken));
        _isExhausted = _h > 0 && _protolytes.Exists(one => !one.Correct(_h));
        if (_isExhausted)
        {
            Change = double.PositiveInfinity;
            return _h;
        }

        var moved = _protolytes.Select((one, i) => Math.Abs(one.Given - given[i]) + Math.Abs(one.Taken - taken[i])).Sum();
        Change = moved / (_h + (_levels.IonProduct / _h) + Math.Abs(_levels.Rest) + _protolytes.Sum(one => one.Given + one.Taken));
        return _h;
    }

    private double First() => _pair is null
        ? Balance(_levels.IonProduct + _protolytes.Sum(one => one.FirstOffer), 1 + _protolytes.Sum(one => one.FirstWant))
        : _pair.PairRatio;

    private double Corrected()
    {
        if (_pair is null)
        {
            return Balance(
                _levels.IonProduct + (_h * _protolytes.Sum(one => one.Given)), 1 + (_protolytes.Sum(one => one.Taken) / _h));
        }

        var others = _protolytes.Where(one => one != _pair).ToArray();
        var gone = _h - (_levels.IonProduct / _h) + others.Sum(one => one.Taken) - others.Sum(one => one.Given);
        return _pair.CorrectPair(gone) ? _pair.PairRatio : double.NaN;
    }

    // The h for which h · wanted − offered / h is the rest.
    private double Balance(double offered, double wanted)
    {
        var rest = _levels.Rest;
        var root = Math.Sqrt((rest * rest) + (4 * offered * wanted));
        return rest >= 0 ? (rest + root) / (2 * wanted) : 2 * offered / (root - rest);
    }

    /// <summary>One protolyte around the form that most of it is counted as: steps below that give protons, steps above that take them.</summary>
    private sealed class Protolyte
    {
        private readonly double _total;
        private double[] _giving;
        private double[] _taking;
        private double _undissociated;
        private double _pairK;
        private double _filledAtStart;
        private double _filled;
        private double _empty;
        private bool _isPair;

        public Protolyte(int component, double total, double[] giving, double[] taking)
        {
            Component = component;
            _total = total;
            _undissociated = total;
            _giving = giving;
            _taking = taking;
        }

        public int Component { get; }

        /// <summary>The protons given, in mol/kg, counted per step; 0 before the first round.</summary>
        public double Given { get; private set; }

        /// <summary>The protons taken, in mol/kg, counted per step; 0 before the first round.</summary>
        public double Taken { get; private set; }

        public double FirstOffer => _giving.Length == 0 ? 0 : _giving[0] * _total;

        public double FirstWant => _taking.Length == 0 ? 0 : _total / _taking[0];

        public double PairRatio => _pairK * _filled / _empty;

        // The pair's own step is neither given nor taken from; its members are corrected instead.
        public void Share(double k, double rest)
        {
            _isPair = true;
            _pairK = k;
            _filledAtStart = rest > 0 ? rest : _total + rest;
            _filled = _filledAtStart;
            _empty = rest > 0 ? _total - rest : -rest;
            _giving = rest > 0 ? _giving : [.. _giving.Skip(1)];
            _taking = rest > 0 ? [.. _taking.Skip(1)] : _taking;
        }

        /// <summary>Corrects the undissociated amount with an estimate; false where nothing would be left of it.</summary>
        public bool Correct(double h)
        {
            if (_isPair)
            {
                return true;
            }

            var (given, lost) = Spread(_giving, _undissociated, h, (k, x) => x * k / h);
            var (taken, gained) = Spread(_taking, _undissociated, h, (k, x) => x * h / k);
            Given = given;
            Taken = taken;
            _undissociated = _total - lost - gained;
            if (!(_undissociated > 0) && _total > 0)
            {
                return false;
            }

            // The protons are counted with the corrected amount, as the next round uses them.
            (Given, _) = Spread(_giving, _undissociated, h, (k, x) => x * k / h);
            (Taken, _) = Spread(_taking, _undissociated, h, (k, x) => x * h / k);
            return true;
        }

        /// <summary>Corrects both members of the pair for the protons that went elsewhere; false where one would vanish.</summary>
        public bool CorrectPair(double gone)
        {
            var h = PairRatio;
            var (given, lost) = Spread(_giving, _empty, h, (k, x) => x * k / h);
            var (taken, gained) = Spread(_taking, _filled, h, (k, x) => x * h / k);
            var filled = _filledAtStart - gone + given - taken - gained;
            var empty = _total - filled - lost - gained;
            _filled = filled;
            _empty = empty;
            return filled > 0 && empty > 0;
        }

        private static (double Protons, double Amount) Spread(double[] steps, double from, double h, Func<double, double, double> next)
        {
            double protons = 0, amount = 0;
            var here = from;
            for (var i = 0; i < steps.Length; i++)
            {
                here = next(steps[i], here);
                protons += (i + 1) * here;
                amount += here;
            }

            return (protons, amount);
        }
    }
}
