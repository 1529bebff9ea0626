using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Xunit;
using Xunit.Abstractions;

namespace Lyonium.PublishedValues;

/// <summary>Obtained against published, row by row: printed as a table, and held to its tolerances.</summary>
public sealed class DeviationTable(ITestOutputHelper output, string title, string reasonForTolerance)
{
    private readonly List<Row> _rows = [];

    public void Check(PublishedRow source, string inputs, double expected, double obtained, double tolerance) =>
        _rows.Add(new Row(inputs, source.Source, source.Known, expected, obtained, tolerance));

    /// <summary>A row that is printed and not judged: there is no published ground for a tolerance, or the row carries a caution.</summary>
    public void Report(PublishedRow source, string inputs, double expected, double obtained) =>
        _rows.Add(new Row(inputs, source.Source, source.Known, expected, obtained, double.NaN));

    /// <summary>Prints the table, and fails unless this many rows are judged and every one of them holds.</summary>
    public void AssertHolds(int judgedRows)
    {
        Print();
        var judged = _rows.Where(row => row.IsJudged).ToArray();
        Assert.True(judged.Length == judgedRows, $"{title}: {judged.Length} rows were judged where {judgedRows} are published.");
        Assert.True(
            judged.All(row => row.Holds),
            title + ": " + string.Join("; ", judged.Where(row => !row.Holds).Select(row => row.ToString())));
    }

    private void Print()
    {
        output.WriteLine(title);
        output.WriteLine("tolerance: " + reasonForTolerance);
        var width = _rows.Max(row => row.Inputs.Length);
        foreach (var row in _rows)
        {
            output.WriteLine(row.ToString(width));
        }

        var worst = _rows.Where(row => row.IsJudged).OrderByDescending(row => Math.Abs(row.Deviation) / row.Tolerance).FirstOrDefault();
        if (worst is not null)
        {
            output.WriteLine("worst: " + worst.ToString());
        }
    }

    private sealed record Row(string Inputs, string Source, string Known, double Expected, double Obtained, double Tolerance)
    {
        public double Deviation => Obtained - Expected;

        public bool IsJudged => !double.IsNaN(Tolerance);

        public bool Holds => Math.Abs(Deviation) <= Tolerance;

        public string ToString(int width) =>
            string.Create(
                CultureInfo.InvariantCulture,
                $"{Inputs.PadRight(width)}  expected {Expected,-11:G9} obtained {Obtained,-11:G9} deviation {Deviation,-10:+0.00e+0;-0.00e+0;0} ")
            + (IsJudged
                ? string.Create(CultureInfo.InvariantCulture, $"tolerance {Tolerance:G3} {(Holds ? "holds" : "FAILS")}")
                : "reported")
            + $"  [{Known}] {Source}";

        public override string ToString() => ToString(0);
    }
}
