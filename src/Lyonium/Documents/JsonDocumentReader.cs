using System;
using System.IO;
using System.Text;
using System.Text.Json;
using Lyonium.Faults;

namespace Lyonium.Documents;

/// <summary>Opens JSON text strictly: of bounded size and depth, without comments and trailing commas.</summary>
internal static class JsonDocumentReader
{
    /// <summary>How deep a document may nest.</summary>
    public const int DeepestNesting = 64;

    private static readonly UTF8Encoding StrictUtf8 = new(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true);

    /// <summary>Opens a document from text.</summary>
    /// <returns>The root, or <see langword="null"/> with the fault told.</returns>
    public static JsonPlace? Open(string text, int mostBytes, FaultList faults, int deepest = DeepestNesting)
    {
        if (text.Length > mostBytes || Encoding.UTF8.GetByteCount(text) > mostBytes)
        {
            return TooLarge(mostBytes, text.Length, faults);
        }

        return Open(Encoding.UTF8.GetBytes(text), faults, deepest);
    }

    /// <summary>Opens a document from a stream, of which no more than the limit is read.</summary>
    /// <param name="stream">The stream.</param>
    /// <param name="mostBytes">The limit.</param>
    /// <param name="faults">Where faults are told.</param>
    /// <param name="bytes">Takes the bytes that were read.</param>
    /// <returns>The root, or <see langword="null"/> with the fault told.</returns>
    public static JsonPlace? Open(Stream stream, int mostBytes, FaultList faults, MemoryStream bytes)
    {
        var chunk = new byte[64 * 1024];
        int read;
        while ((read = stream.Read(chunk, 0, chunk.Length)) > 0)
        {
            bytes.Write(chunk, 0, read);
            if (bytes.Length > mostBytes)
            {
                return TooLarge(mostBytes, bytes.Length, faults);
            }
        }

        return Open(bytes.ToArray(), faults, DeepestNesting);
    }

    private static JsonPlace? Open(byte[] bytes, FaultList faults, int deepest)
    {
        if (!IsUtf8(bytes))
        {
            faults.Add(FaultKinds.NotJson, "$", "", ("detail", "it is not UTF-8."), ("line", "1"), ("position", "1"));
            return null;
        }

        var start = bytes.Length >= 3 && bytes[0] == 0xEF && bytes[1] == 0xBB && bytes[2] == 0xBF ? 3 : 0;
        try
        {
            using var document = JsonDocument.Parse(
                bytes.AsMemory(start), new JsonDocumentOptions { MaxDepth = deepest, CommentHandling = JsonCommentHandling.Disallow });
            return new JsonPlace(document.RootElement.Clone(), "$", faults);
        }
        catch (JsonException e)
        {
            var line = (e.LineNumber ?? 0) + 1;
            var position = (e.BytePositionInLine ?? 0) + 1;
            faults.Add(
                FaultKinds.NotJson,
                "$",
                "",
                ("detail", FirstSentence(e.Message)),
                ("line", line.ToString(System.Globalization.CultureInfo.InvariantCulture)),
                ("position", position.ToString(System.Globalization.CultureInfo.InvariantCulture)));
            return null;
        }
    }

    // The parser does not look into texts that nobody reads, and notes are echoed as they stand.
    private static bool IsUtf8(byte[] bytes)
    {
        try
        {
            _ = StrictUtf8.GetCharCount(bytes);
            return true;
        }
        catch (DecoderFallbackException)
        {
            return false;
        }
    }

    private static JsonPlace? TooLarge(int mostBytes, long found, FaultList faults)
    {
        var limit = $"{mostBytes / (1024 * 1024)} MiB";
        faults.Add(FaultKinds.TooLarge, "$", $"{found / (1024 * 1024)} MiB or more", ("limit", limit));
        return null;
    }

    private static string FirstSentence(string message)
    {
        var end = message.IndexOf(" LineNumber:", StringComparison.Ordinal);
        return end < 0 ? message : message.Substring(0, end);
    }
}
