using System.Text;

namespace Lyonium.Substances;

/// <summary>Formulas with subscripts and superscripts.</summary>
internal static class FormulaDisplay
{
    public static string Of(string text)
    {
        var shown = new StringBuilder();
        var isCharge = false;
        for (var i = 0; i < text.Length; i++)
        {
            var c = text[i];
            if (c == '^')
            {
                isCharge = true;
            }
            else if (isCharge)
            {
                shown.Append(c switch
                {
                    '+' => '⁺',
                    '-' => '⁻',
                    '1' => '¹',
                    '2' => '²',
                    '3' => '³',
                    >= '4' and <= '9' => (char)('⁴' + (c - '4')),
                    '0' => '⁰',
                    _ => c,
                });
            }
            else if (c is >= '0' and <= '9' && i > 0 && (char.IsLetter(text[i - 1]) || text[i - 1] == ')' || IsSubscript(shown)))
            {
                shown.Append((char)('₀' + (c - '0')));
            }
            else if (c == '.' && !(i > 0 && char.IsDigit(text[i - 1]) && shown.ToString().IndexOf('·') >= 0))
            {
                shown.Append('·');
            }
            else
            {
                shown.Append(c);
            }
        }

        return shown.ToString();
    }

    private static bool IsSubscript(StringBuilder shown) => shown[shown.Length - 1] is >= '₀' and <= '₉';
}
