using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Linq;
using System.Text;

namespace Lyonium.PublishedValues;

/// <summary>One row of a file of published values; a row without its source and how it is known cannot be read.</summary>
public sealed class PublishedRow
{
    private readonly Dictionary<string, string> _cells;

    private PublishedRow(Dictionary<string, string> cells) => _cells = cells;

    public string Source => Text("published_source");

    public string Known => Text("known");

    /// <summary>Why the row is no acceptance value; empty where it is one.</summary>
    public string Caution => _cells.GetValueOrDefault("caution", string.Empty);

    public static IReadOnlyList<PublishedRow> ReadAll(string file)
    {
        var lines = File.ReadAllLines(Path.Combine(AppContext.BaseDirectory, "Data", file));
        var columns = Split(lines[0]);
        return lines.Skip(1).Select(line => ReadOne(file, columns, line)).ToArray();
    }

    public string Text(string column) =>
        _cells[column] is { Length: > 0 } text ? text : throw new InvalidDataException($"An empty cell under '{column}'.");

    public bool Has(string column) => _cells[column].Length > 0;

    public double Number(string column) => double.Parse(Text(column), CultureInfo.InvariantCulture);

    /// <summary>A cell of several entries, such as <c>0.025 + 0.025</c>.</summary>
    public string[] Several(string column) => Text(column).Split(" + ");

    private static PublishedRow ReadOne(string file, List<string> columns, string line)
    {
        var cells = Split(line);
        if (cells.Count != columns.Count)
        {
            throw new InvalidDataException($"{file}: {cells.Count} cells under {columns.Count} columns in '{line}'.");
        }

        var row = new PublishedRow(columns.Zip(cells).ToDictionary(pair => pair.First, pair => pair.Second, StringComparer.Ordinal));
        return row.Source.Length > 0 && row.Known.Length > 0 ? row : throw new InvalidDataException($"{file}: no source in '{line}'.");
    }

    private static List<string> Split(string line)
    {
        var cells = new List<string>();
        var cell = new StringBuilder();
        var isQuoted = false;
        foreach (var character in line)
        {
            if (character == '"')
            {
                isQuoted = !isQuoted;
            }
            else if (character == ',' && !isQuoted)
            {
                cells.Add(cell.ToString());
                cell.Clear();
            }
            else
            {
                cell.Append(character);
            }
        }

        cells.Add(cell.ToString());
        return cells;
    }
}
