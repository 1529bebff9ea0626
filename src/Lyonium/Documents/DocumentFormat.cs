using System;
using System.Globalization;
using System.Linq;
using Lyonium.Faults;

namespace Lyonium.Documents;

/// <summary>Checks the <c>format</c> property of a document.</summary>
internal static class DocumentFormat
{
    /// <summary>Whether the document is of the format and version; a later version is told apart from another format.</summary>
    /// <param name="root">The document.</param>
    /// <param name="name">The name of the format before the slash.</param>
    /// <param name="version">The version after the slash.</param>
    public static bool Check(JsonPlace root, string name, string version) => VersionOf(root, name, version) is not null;

    /// <summary>The version of the document, where it is one of those that are read; a later one is told apart from another format.</summary>
    /// <param name="root">The document.</param>
    /// <param name="name">The name of the format before the slash.</param>
    /// <param name="versions">The versions after the slash, the latest last.</param>
    public static string? VersionOf(JsonPlace root, string name, params string[] versions)
    {
        if (!root.IsObject)
        {
            root.Properties();
            return null;
        }

        // Only the format is looked at: a later version may have properties that are not known here.
        if (root.Find("format") is not { } place)
        {
            root.Faults.Add(FaultKinds.MissingProperty, root.Path, "", ("property", "format"));
            return null;
        }

        if (place.Text() is not { } found)
        {
            return null;
        }

        if (Array.Find(versions, version => string.Equals(found, name + "/" + version, StringComparison.Ordinal)) is { } known)
        {
            return known;
        }

        var kind = found.StartsWith(name + "/", StringComparison.Ordinal) && IsVersion(found.Substring(name.Length + 1))
            ? FaultKinds.FormatTooNew
            : FaultKinds.WrongFormat;
        root.Faults.Add(
            kind,
            place.Path,
            found,
            ("expected", string.Join(" or ", versions.Select(version => name + "/" + version))),
            ("latest", name + "/" + versions[versions.Length - 1]));
        return null;
    }

    private static bool IsVersion(string text) =>
        double.TryParse(text, NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var version) && version > 1;
}
