using System.Text.Encodings.Web;
using System.Text.Json;

namespace Lyonium.Records;

/// <summary>How JSON is written here: indented, formulas and signs as they are.</summary>
internal static class JsonText
{
    public static JsonWriterOptions WriterOptions { get; } = new()
    {
        Indented = true,
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };
}
