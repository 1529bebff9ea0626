using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Water;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>
/// Debye–Hückel slopes against a file of published ones. Those of the library are on the molality basis; on the basis of volume, with the
/// ionic strength in mol/L, they are greater by 1/√ρ of water (ρ in kg/L), here with Kell's density.
/// </summary>
public static class SlopeComparison
{
    public static DeviationTable OfA(
        ITestOutputHelper output, string title, string reason, string file, bool isMolar, Func<double, double> tolerance) =>
        Of(output, title + ", A", reason, PublishedRow.ReadAll(file), "A_log10", slopes => slopes.A, isMolar, tolerance);

    public static DeviationTable OfB(
        ITestOutputHelper output, string title, string reason, string file, bool isMolar, Func<double, double> tolerance) =>
        Of(output, title + ", B per angstrom", reason, PublishedRow.ReadAll(file), "B_per_angstrom", slopes => slopes.B, isMolar, tolerance);

    private static DeviationTable Of(
        ITestOutputHelper output,
        string title,
        string reason,
        IReadOnlyList<PublishedRow> rows,
        string column,
        Func<DebyeHuckelSlopes, double> slope,
        bool isMolar,
        Func<double, double> tolerance)
    {
        var table = new DeviationTable(output, title, reason);
        foreach (var row in rows.Where(row => row.Has(column)))
        {
            var celsius = row.Number("t_C");
            var published = row.Number(column);
            var basis = isMolar ? 1 / Math.Sqrt(KellKgPerL(celsius)) : 1;
            var obtained = slope(DebyeHuckelSlopes.At(celsius + 273.15)) * basis;
            table.Check(row, row.Text("t_C") + (isMolar ? " degC, volume basis" : " degC, molality basis"), published, obtained, tolerance(published));
        }

        return table;
    }

    private static double KellKgPerL(double t)
    {
        var numerator = 999.83952 + (t * (16.945176 + (t * (-7.9870401e-3 + (t * (-46.170461e-6 + (t * (105.56302e-9 - (t * 280.54253e-12)))))))));
        return numerator / (1 + (16.879850e-3 * t)) / 1000;
    }
}
