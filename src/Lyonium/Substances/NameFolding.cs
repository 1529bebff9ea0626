using System.Text;

namespace Lyonium.Substances;

/// <summary>Names as they are matched: any case, hyphens and runs of blanks as one blank, "sulph" as "sulf".</summary>
internal static class NameFolding
{
    public static string Fold(string name)
    {
        var folded = new StringBuilder(name.Length);
        foreach (var c in name.Trim())
        {
            if (char.IsWhiteSpace(c) || c is '-' or '‐' or '‑' or '–' or '_')
            {
                if (folded.Length > 0 && folded[folded.Length - 1] != ' ')
                {
                    folded.Append(' ');
                }
            }
            else
            {
                folded.Append(char.ToLowerInvariant(c));
            }
        }

        return folded.ToString().TrimEnd().Replace("sulph", "sulf");
    }
}
