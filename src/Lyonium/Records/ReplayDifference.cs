namespace Lyonium.Records;

/// <summary>One thing that differs between a record and its replay.</summary>
/// <param name="Path">Where it stands in the record, as a JSON path.</param>
/// <param name="Recorded">What the record says; empty where it says nothing.</param>
/// <param name="Replayed">What the replay gives; empty where it gives nothing.</param>
public sealed record ReplayDifference(string Path, string Recorded, string Replayed);
