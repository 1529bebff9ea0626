using System.Linq;

namespace Lyonium.Tool;

/// <summary>Text that came from a file, safe to print: a name must not steer a terminal or break a line.</summary>
internal static class PlainText
{
    public static string Of(string text) =>
        text.Any(IsUnsafe) ? string.Concat(text.Select(c => IsUnsafe(c) ? ' ' : c)) : text;

    private static bool IsUnsafe(char c) => char.IsControl(c) || c is '\u2028' or '\u2029';
}
