using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Runtime.InteropServices;
using Lyonium.Predictions;
using Lyonium.Provenance;

namespace Lyonium.Qualification;

/// <summary>Where checks ran: which build, on what, with which table, method and activity model.</summary>
/// <remarks>Immutable; safe to share between threads.</remarks>
public sealed record QualificationEnvironment
{
    /// <summary>The software.</summary>
    public required SoftwareIdentity Software { get; init; }

    /// <summary>
    /// The SHA-256 of the library's assembly file, 64 hexadecimal digits in lower case; empty where the library is part of a single file.
    /// </summary>
    public required string AssemblySha256 { get; init; }

    /// <summary>The module version id of the library's assembly, which a deterministic build makes from its content.</summary>
    public required string ModuleVersionId { get; init; }

    /// <summary>The runtime, such as <c>.NET 10.0.1</c>.</summary>
    public required string Runtime { get; init; }

    /// <summary>The operating system.</summary>
    public required string OperatingSystem { get; init; }

    /// <summary>The processor: its architecture and how many doubles it takes at once.</summary>
    public required string Processor { get; init; }

    /// <summary>The name of the current culture; <c>invariant</c> for the invariant one.</summary>
    public required string Culture { get; init; }

    /// <summary>The table.</summary>
    public required TableIdentity Table { get; init; }

    /// <summary>The name of the method.</summary>
    public required string Method { get; init; }

    /// <summary>The name of the activity model.</summary>
    public required string ActivityModel { get; init; }

    /// <summary>The ids of the sets of ion pairs that were asked for; <see langword="null"/> for the defaults of the activity model.</summary>
    public IReadOnlyList<string>? PairSets { get; init; }

    internal static QualificationEnvironment Of(Predictor predictor) => new()
    {
        Software = SoftwareIdentity.Running,
        AssemblySha256 = HashOfAssembly(),
        ModuleVersionId = typeof(QualificationEnvironment).Assembly.ManifestModule.ModuleVersionId.ToString(),
        Runtime = RuntimeInformation.FrameworkDescription,
        OperatingSystem = RuntimeInformation.OSDescription.Trim(),
        Processor = FormattableString.Invariant(
            $"{RuntimeInformation.ProcessArchitecture}, {System.Numerics.Vector<double>.Count} doubles at once, {Environment.ProcessorCount} logical processors"),
        Culture = CultureInfo.CurrentCulture.Name.Length == 0 ? "invariant" : CultureInfo.CurrentCulture.Name,
        Table = predictor.Table.Identity,
        Method = predictor.Method.Name,
        ActivityModel = predictor.ActivityModel.Name,
        PairSets = predictor.PairSets,
    };

    private static string HashOfAssembly()
    {
#pragma warning disable IL3000 // The location is empty in a single file, and then there is no file to hash.
        var location = typeof(QualificationEnvironment).Assembly.Location;
#pragma warning restore IL3000
        try
        {
            return location.Length > 0 && File.Exists(location) ? Fingerprint.Of(File.ReadAllBytes(location)) : "";
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            return "";
        }
    }
}
