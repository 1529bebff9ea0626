using System;

namespace Lyonium.Equilibria;

/// <summary>Solves a small symmetric positive definite system, scaled by its diagonal, in the caller's memory.</summary>
/// <remarks>
/// The entries are sums of molalities that differ by many powers of ten; scaled, the system is well conditioned. Written here because a
/// solve allocates nothing.
/// </remarks>
internal readonly ref struct ScaledCholesky
{
    private readonly Span<double> _matrix;
    private readonly Span<double> _scale;

    /// <summary>Takes a matrix and room for its scale.</summary>
    /// <param name="matrix">The lower triangle, row by row; the factor takes its place.</param>
    /// <param name="scale">Room for one number a row.</param>
    public ScaledCholesky(Span<double> matrix, Span<double> scale)
    {
        _matrix = matrix;
        _scale = scale;
    }

    /// <summary>Factors the matrix.</summary>
    /// <returns>Whether it is positive definite.</returns>
    public bool Factor()
    {
        var n = _scale.Length;
        for (var c = 0; c < n; c++)
        {
            _scale[c] = 1 / Math.Sqrt(_matrix[(c * n) + c]);
            if (double.IsNaN(_scale[c]) || double.IsInfinity(_scale[c]))
            {
                return false;
            }
        }

        for (var c = 0; c < n; c++)
        {
            for (var d = 0; d <= c; d++)
            {
                var sum = _matrix[(c * n) + d] * _scale[c] * _scale[d];
                for (var e = 0; e < d; e++)
                {
                    sum -= _matrix[(c * n) + e] * _matrix[(d * n) + e];
                }

                if (c == d && !(sum > 0))
                {
                    return false;
                }

                _matrix[(c * n) + d] = c == d ? Math.Sqrt(sum) : sum / _matrix[(d * n) + d];
            }
        }

        return true;
    }

    /// <summary>Solves for a right-hand side, once factored.</summary>
    /// <param name="right">The right-hand side.</param>
    /// <param name="solution">Takes the solution.</param>
    public void Solve(ReadOnlySpan<double> right, Span<double> solution)
    {
        var n = _scale.Length;
        for (var c = 0; c < n; c++)
        {
            var sum = right[c] * _scale[c];
            for (var e = 0; e < c; e++)
            {
                sum -= _matrix[(c * n) + e] * solution[e];
            }

            solution[c] = sum / _matrix[(c * n) + c];
        }

        for (var c = n - 1; c >= 0; c--)
        {
            var sum = solution[c];
            for (var e = c + 1; e < n; e++)
            {
                sum -= _matrix[(e * n) + c] * solution[e];
            }

            solution[c] = sum / _matrix[(c * n) + c];
        }

        for (var c = 0; c < n; c++)
        {
            solution[c] *= _scale[c];
        }
    }
}
