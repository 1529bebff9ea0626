using System;
using System.Collections.Generic;
using System.Linq;
using Lyonium.Predictions;
using Lyonium.Quantities;

namespace Lyonium.Records;

/// <summary>Compares a record with the prediction that its recipe gives now.</summary>
internal sealed class ReplayComparison(RecordReader record, Prediction now)
{
    private const double BoundInPH = 1e-9;

    // A molality moves by 2.3 times what the pH moves by, for each proton.
    private const double RelativeBound = 1e-7;

    private readonly List<ReplayDifference> _differences = [];

    public ReplayReport Report()
    {
        var software = now.Evidence.Software;
        var isSameBuild = string.Equals(
            record.Build, $"{software.Version} {software.Target} {software.ProcessArchitecture}", StringComparison.Ordinal);
        var isIdentical = now.PH.Equals(record.PH);
        if (!isIdentical && (isSameBuild || !(Math.Abs(now.PH - (record.PH ?? double.NaN)) <= BoundInPH)))
        {
            Add("$.pH", record.PH, now.PH);
        }

        if (!(Math.Abs(now.PHydrogenConcentration - (record.PHydrogenConcentration ?? double.NaN)) <= BoundInPH))
        {
            Add("$.pHydrogenConcentration", record.PHydrogenConcentration, now.PHydrogenConcentration);
        }

        Check("$.ionicStrength.value", record.IonicStrength, now.IonicStrengthMolPerKg);
        Check("$.water.value", record.Water, now.Mixture.WaterKg);
        CheckBuffer();
        foreach (var species in now.Species)
        {
            Check($"$.species[{species.Id}]", Recorded(record.Species, species.Id), species.MolalityMolPerKg);
        }

        CheckText("$.evidence.table.edition", record.Edition, now.Evidence.Table.Edition);
        CheckText("$.evidence.table.sha256", record.Sha256, now.Evidence.Table.Sha256);
        CheckText("$.evidence.table.layers", record.Layers, string.Join(", ", now.Evidence.Table.Layers.Select(one => one.Name + " " + one.Sha256)));
        foreach (var constant in now.Evidence.Constants)
        {
            var key = RecordReader.KeyOf(constant.Id, constant.Quantity);
            Check($"$.evidence.constants[{key}]", Recorded(record.Constants, key), constant.Value.Value);
        }

        return new ReplayReport(isIdentical, isSameBuild, _differences.ToArray(), now);
    }

    // Where a record has buffer figures; a /1 record has none. They are differences of pH, so as sure as the pH is.
    private void CheckBuffer()
    {
        if (record.BufferCapacity is not double capacity)
        {
            return;
        }

        Check("$.buffer.capacity.value", capacity, now.Buffer?.CapacityMolPerL ?? double.NaN);
        CheckDifference("$.buffer.dilutionValue", record.DilutionValue, now.Buffer?.DilutionValue ?? double.NaN);
        CheckDifference("$.buffer.temperatureCoefficient.value", record.TemperatureCoefficient, now.Buffer?.TemperatureCoefficientPerK ?? double.NaN);
    }

    private void CheckDifference(string path, double? recorded, double replayed)
    {
        if (!(Math.Abs(replayed - (recorded ?? double.NaN)) <= 2 * BoundInPH) && !(recorded is null && double.IsNaN(replayed)))
        {
            Add(path, recorded, replayed);
        }
    }

    private static double? Recorded(Dictionary<string, double> values, string key) => values.TryGetValue(key, out var value) ? value : null;

    private void Check(string path, double? recorded, double replayed)
    {
        if (!(Math.Abs(replayed - (recorded ?? double.NaN)) <= RelativeBound * Math.Abs(replayed)))
        {
            Add(path, recorded, replayed);
        }
    }

    private void CheckText(string path, string recorded, string replayed)
    {
        if (!string.Equals(recorded, replayed, StringComparison.Ordinal))
        {
            _differences.Add(new ReplayDifference(path, recorded, replayed));
        }
    }

    private void Add(string path, double? recorded, double replayed) => _differences.Add(
        new ReplayDifference(path, recorded is double value ? NumberText.Shortest(value) : "", NumberText.Shortest(replayed)));
}
