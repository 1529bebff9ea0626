using System;
using System.Collections.Generic;
using Lyonium.Provenance;

namespace Lyonium.Substances;

/// <summary>The density of a substance's aqueous solutions at some mass fractions, read between them on straight lines.</summary>
/// <remarks>
/// A line is drawn over at most ten percentage points, and nowhere beyond the points. Immutable; safe to share between threads.
/// </remarks>
public sealed class SolutionDensities
{
    private const double WidestGap = 0.1000001;

    // A concentration is a product: on a point it may differ from it in the last digit.
    private const double LastDigits = 1e-12;

    private readonly IReadOnlyList<SolutionDensity> _points;

    internal SolutionDensities(IReadOnlyList<SolutionDensity> points) => _points = points;

    /// <summary>The published points, by rising mass fraction.</summary>
    public IReadOnlyList<SolutionDensity> Points => _points;

    /// <summary>The density at a mass fraction.</summary>
    /// <param name="massFraction">The mass fraction, 0 to 1.</param>
    /// <returns>The density in kg/L with the source of the point below; <see langword="null"/> where no points enclose it closely.</returns>
    public SourcedValue? AtMassFraction(double massFraction)
    {
        for (var i = 0; i < _points.Count; i++)
        {
            var point = _points[i];
            if (point.MassFraction == massFraction)
            {
                return point.DensityKgPerL;
            }

            if (i > 0 && massFraction < point.MassFraction && massFraction > _points[i - 1].MassFraction && IsClose(i))
            {
                var below = _points[i - 1];
                var part = (massFraction - below.MassFraction) / (point.MassFraction - below.MassFraction);
                return Between(below, part, point);
            }
        }

        return null;
    }

    /// <summary>The density of the solution that has a mass concentration.</summary>
    /// <param name="soluteKgPerL">The mass of solute per volume of solution, in kg/L.</param>
    /// <returns>The density in kg/L with the source of the point below; <see langword="null"/> where no points enclose it closely.</returns>
    public SourcedValue? AtMassConcentration(double soluteKgPerL)
    {
        for (var i = 0; i < _points.Count; i++)
        {
            var above = Concentration(i);
            if (Math.Abs(above - soluteKgPerL) <= LastDigits * above)
            {
                return _points[i].DensityKgPerL;
            }

            if (i > 0 && soluteKgPerL < above && soluteKgPerL > Concentration(i - 1) && IsClose(i))
            {
                return Between(_points[i - 1], PartAt(soluteKgPerL, _points[i - 1], _points[i]), _points[i]);
            }
        }

        return null;
    }

    private double Concentration(int i) => _points[i].MassFraction * _points[i].DensityKgPerL.Value;

    private bool IsClose(int i) => _points[i].MassFraction - _points[i - 1].MassFraction <= WidestGap;

    // (w + p Δw)(ρ + p Δρ) = c, solved for p between 0 and 1 by halving: the product rises over the line.
    private static double PartAt(double soluteKgPerL, SolutionDensity below, SolutionDensity above)
    {
        double low = 0, high = 1;
        for (var i = 0; i < 60; i++)
        {
            var middle = 0.5 * (low + high);
            var fraction = below.MassFraction + (middle * (above.MassFraction - below.MassFraction));
            var density = below.DensityKgPerL.Value + (middle * (above.DensityKgPerL.Value - below.DensityKgPerL.Value));
            if (fraction * density < soluteKgPerL)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return 0.5 * (low + high);
    }

    private static SourcedValue Between(SolutionDensity below, double part, SolutionDensity above)
    {
        var density = below.DensityKgPerL.Value + (part * (above.DensityKgPerL.Value - below.DensityKgPerL.Value));
        return new SourcedValue(density, below.DensityKgPerL.Source, below.DensityKgPerL.Known)
        {
            TemperatureK = below.DensityKgPerL.TemperatureK,
            Note = "read between two points on a straight line",
        };
    }
}
