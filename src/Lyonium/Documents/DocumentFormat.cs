using System;
using System.Globalization;
using Lyonium.Faults;

namespace Lyonium.Documents;

/// <summary>Checks the <c>format</c> property of a document.</summary>
internal static class DocumentFormat
{
    /// <summary>Whether the document is of the format and version; a later version is told apart from another format.</summary>
    /// <param name="root">The document.</param>
    /// <param name="name">The name of the format before the slash.</param>
    /// <param name="version">The version after the slash.</param>
    public static bool Check(JsonPlace root, string name, string version)
    {
        var expected = name + "/" + version;
        if (!root.IsObject)
        {
            root.Properties();
            return false;
        }

        // Only the format is looked at: a later version may have properties that are not known here.
        if (root.Find("format") is not { } place)
        {
            root.Faults.Add(FaultKinds.MissingProperty, root.Path, "", ("property", "format"));
            return false;
        }

        if (place.Text() is not { } found)
        {
            return false;
        }

        if (string.Equals(found, expected, StringComparison.Ordinal))
        {
            return true;
        }

        var kind = found.StartsWith(name + "/", StringComparison.Ordinal) && IsVersion(found.Substring(name.Length + 1))
            ? FaultKinds.FormatTooNew
            : FaultKinds.WrongFormat;
        root.Faults.Add(kind, place.Path, found, ("expected", expected));
        return false;
    }

    private static bool IsVersion(string text) =>
        double.TryParse(text, NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out var version) && version > 1;
}
