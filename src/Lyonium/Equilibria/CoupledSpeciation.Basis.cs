using System;

namespace Lyonium.Equilibria;

/// <content>The last digits: the balances over the species of which there is most.</content>
internal ref partial struct CoupledSpeciation
{
    private const double HalfLastDigit = 1.1102230246251565e-16;

    // The most abundant species whose compositions are independent of each other, and everything counted over them.
    private readonly bool ChooseBasis()
    {
        for (var r = 0; r < _components; r++)
        {
            var most = -1;
            for (var i = 0; i < _species; i++)
            {
                if ((most < 0 || _lnM[i] > _lnM[most]) && Reduce(i, r) >= 0)
                {
                    most = i;
                }
            }

            if (most < 0)
            {
                return false;
            }

            Accept(most, r);
        }

        if (!Invert())
        {
            return false;
        }

        CountOverBasis();
        return true;
    }

    // What is left of a species' counts beside the basis chosen so far, in _right; the column of its largest part, or -1 where nothing is left.
    private readonly int Reduce(int species, int chosen)
    {
        const double nothing = 1e-9;
        for (var c = 0; c < _components; c++)
        {
            _right[c] = Count(species, c);
        }

        for (var r = 0; r < chosen; r++)
        {
            var part = _right[(int)_step[r]];
            for (var c = 0; c < _components; c++)
            {
                _right[c] -= part * _matrix[(r * _components) + c];
            }
        }

        var largest = -1;
        for (var c = 0; c < _components; c++)
        {
            largest = Math.Abs(_right[c]) > (largest < 0 ? nothing : Math.Abs(_right[largest])) ? c : largest;
        }

        return largest;
    }

    private readonly void Accept(int species, int row)
    {
        var pivot = Reduce(species, row);
        var scale = _right[pivot];
        for (var c = 0; c < _components; c++)
        {
            _matrix[(row * _components) + c] = _right[c] / scale;
        }

        _step[row] = pivot;
        _basis[row] = species;
    }

    // Gauss and Jordan, with the largest pivot of each column; the inverse ends in the right half.
    private readonly bool Invert()
    {
        var n = _components;
        var width = 2 * n;
        for (var r = 0; r < n; r++)
        {
            for (var c = 0; c < n; c++)
            {
                _inverse[(r * width) + c] = Count((int)_basis[r], c);
                _inverse[(r * width) + n + c] = r == c ? 1 : 0;
            }
        }

        for (var c = 0; c < n; c++)
        {
            var pivot = c;
            for (var r = c + 1; r < n; r++)
            {
                pivot = Math.Abs(_inverse[(r * width) + c]) > Math.Abs(_inverse[(pivot * width) + c]) ? r : pivot;
            }

            var value = _inverse[(pivot * width) + c];
            if (value == 0)
            {
                return false;
            }

            for (var k = 0; k < width; k++)
            {
                (_inverse[(pivot * width) + k], _inverse[(c * width) + k]) = (_inverse[(c * width) + k], _inverse[(pivot * width) + k] / value);
            }

            for (var r = 0; r < n; r++)
            {
                var factor = _inverse[(r * width) + c];
                for (var k = 0; r != c && factor != 0 && k < width; k++)
                {
                    _inverse[(r * width) + k] -= factor * _inverse[(c * width) + k];
                }
            }
        }

        return true;
    }

    private readonly double Inverse(int component, int row) => _inverse[(component * 2 * _components) + _components + row];

    private readonly void CountOverBasis()
    {
        for (var r = 0; r < _components; r++)
        {
            var total = default(ExactSum);
            for (var c = 0; c < _components; c++)
            {
                total.Add(Inverse(c, r) * _group.Totals[c]);
            }

            _totals[r] = total.Value;
        }

        for (var i = 0; i < _species; i++)
        {
            _protons[i] = _group.Protons[i];
            _charges[i] = _group.Charges[i];
            for (var r = 0; r < _components; r++)
            {
                double count = 0;
                for (var c = 0; c < _components; c++)
                {
                    count += Count(i, c) * Inverse(c, r);
                }

                _counts[(i * _components) + r] = count;
                var basis = (int)_basis[r];
                _protons[i] -= count * _group.Protons[basis];
                _charges[i] -= count * _group.Charges[basis];
            }
        }

        // The species of the basis are themselves and nothing else, without rounding.
        for (var r = 0; r < _components; r++)
        {
            var basis = (int)_basis[r];
            _protons[basis] = 0;
            _charges[basis] = 0;
            for (var s = 0; s < _components; s++)
            {
                _counts[(basis * _components) + s] = r == s ? 1 : 0;
            }

            _lnX[r] = _lnM[basis];
        }

        CountConstants();
    }

    private readonly void CountConstants()
    {
        for (var i = 0; i < _species; i++)
        {
            var constant = _lnK[i];
            for (var r = 0; r < _components; r++)
            {
                constant -= _counts[(i * _components) + r] * _lnK[(int)_basis[r]];
            }

            _constants[i] = constant;
        }

        for (var r = 0; r < _components; r++)
        {
            _constants[(int)_basis[r]] = 0;
        }
    }

    // No species outranks a species of the basis that it could stand for.
    private readonly bool IsBasisAbundant()
    {
        const double tenfold = 2.3;
        for (var i = 0; i < _species; i++)
        {
            for (var r = 0; r < _components; r++)
            {
                if (_counts[(i * _components) + r] != 0 && _lnM[i] > _lnM[(int)_basis[r]] + tenfold)
                {
                    return false;
                }
            }
        }

        return true;
    }

    // Newton's method on the balances over the basis, until rounding stops it.
    private readonly bool Finish(double longest, double lengthOfLastStep)
    {
        for (var round = 0; round < MostSteps; round++)
        {
            FromBasis();
            Balance(_counts, _totals);
            var newton = new ScaledCholesky(_matrix, _scale);
            if (!newton.Factor())
            {
                return false;
            }

            newton.Solve(_right, _step);
            var largest = LargestChange(_counts);
            if (double.IsNaN(largest) || largest > longest)
            {
                return false;
            }

            var factor = Math.Min(1, 1 / largest);
            for (var r = 0; r < _components; r++)
            {
                _lnX[r] += factor * _step[r];
            }

            // The error of a step is about the square of its length.
            if (largest <= lengthOfLastStep)
            {
                FollowStep();
                return true;
            }
        }

        return false;
    }

    private readonly void FromBasis()
    {
        for (var i = 0; i < _species; i++)
        {
            var ln = _constants[i];
            for (var r = 0; r < _components; r++)
            {
                ln += _counts[(i * _components) + r] * _lnX[r];
            }

            _lnM[i] = ln;
            _m[i] = Math.Exp(ln);
        }
    }

    // A step this short changes each molality by its own logarithm, to all digits.
    private readonly void FollowStep()
    {
        for (var i = 0; i < _species; i++)
        {
            double change = 0;
            for (var r = 0; r < _components; r++)
            {
                change += _counts[(i * _components) + r] * _step[r];
            }

            _lnM[i] += change;
            _m[i] += _m[i] * change;
        }
    }

    // The basis carries the totals' charge, summed exactly; what is left is small, and its change with the hydrogen-ion activity is known.
    private void CountCharge(ref ExactSum charge)
    {
        for (var r = 0; r < _components; r++)
        {
            var basis = (int)_basis[r];
            charge.AddProduct(_totals[r], (int)_group.Charges[basis]);
            FixedMagnitude += Math.Abs(_group.Charges[basis] * _totals[r]);
            double sum = 0;
            for (var i = 0; i < _species; i++)
            {
                sum -= _counts[(i * _components) + r] * _m[i] * _protons[i];
            }

            _right[r] = sum;
        }

        // The matrix still holds the factor of the last round.
        new ScaledCholesky(_matrix, _scale).Solve(_right, _slope);
        for (var i = 0; i < _species; i++)
        {
            var growth = _protons[i];
            double carried = 1, size = Math.Abs(_constants[i]);
            for (var r = 0; r < _components; r++)
            {
                var count = _counts[(i * _components) + r];
                growth += count * _slope[r];
                carried += Math.Abs(count);
                size += Math.Abs(count * _lnM[(int)_basis[r]]);
            }

            var part = _charges[i] * _m[i];
            charge.Add(part);
            Rising += growth > 0 ? part * growth : 0;
            Falling += growth < 0 ? part * growth : 0;
            Moving += Math.Abs(part) * carried;
            Noise += 4 * HalfLastDigit * (8 + size) * carried * Math.Abs(part);
        }

        // Both are what a sum of parts of either sign leaves; their sum is what counts, and neither is below zero.
        var slope = Math.Max(0, Rising + Falling);
        Rising = Math.Min(Math.Max(0, Rising), slope);
        Falling = slope - Rising;
    }
}
