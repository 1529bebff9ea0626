using System;
using System.Text.Json;
using Lyonium.Predictions;

namespace Lyonium.Records;

/// <summary>Compares a record with the record of the prediction that its recipe gives now.</summary>
internal sealed class ReplayComparison(RecordReader record, Prediction now)
{
    // Deeper than any record that is read.
    private const int Deepest = 256;

    public ReplayReport Report()
    {
        var software = now.Evidence.Software;
        var isSameBuild = string.Equals(
            record.Build, $"{software.Version} {software.Target} {software.ProcessArchitecture}", StringComparison.Ordinal);
        var pH = record.PH ?? double.NaN;
        using var written = JsonDocument.Parse(RecordJson.Write(now), new JsonDocumentOptions { MaxDepth = Deepest });
        var differences = new RecordDifferences(new ReplayBounds(isSameBuild, pH, now.PH));

        // The format was read already; what a later version has more, an earlier one lacks.
        differences.Compare(record.Root, written.RootElement, record.IsFirstVersion ? ["format", .. RecordReader.Later] : ["format"]);
        return new ReplayReport(now.PH.Equals(pH), isSameBuild, differences.All, now);
    }
}
