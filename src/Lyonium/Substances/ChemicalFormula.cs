using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using Lyonium.Faults;

namespace Lyonium.Substances;

/// <summary>A chemical formula: what it is made of, its charge, and its crystal water.</summary>
/// <remarks>
/// Written as elements with counts and parentheses; a charge after a caret (<c>SO4^2-</c>); crystal water after a point
/// (<c>Na2CO3.10H2O</c>). Immutable; safe to share between threads.
/// </remarks>
public sealed class ChemicalFormula
{
    private ChemicalFormula(string text, IReadOnlyDictionary<string, double> composition, int charge, double crystalWater)
    {
        Text = text;
        Composition = composition;
        Charge = charge;
        CrystalWater = crystalWater;
        Display = FormulaDisplay.Of(Normalize(text));
    }

    /// <summary>The formula as it is written in the table.</summary>
    public string Text { get; }

    /// <summary>How many atoms of each element there are, crystal water included, by symbol in alphabetical order.</summary>
    public IReadOnlyDictionary<string, double> Composition { get; }

    /// <summary>The charge number.</summary>
    public int Charge { get; }

    /// <summary>How many molecules of crystal water there are.</summary>
    public double CrystalWater { get; }

    /// <summary>The formula with subscripts and superscripts, such as <c>SO₄²⁻</c>.</summary>
    public string Display { get; }

    /// <summary>Reads a formula.</summary>
    /// <param name="text">The formula.</param>
    /// <returns>The formula.</returns>
    /// <exception cref="LyoniumException">The text is not a formula.</exception>
    public static ChemicalFormula Parse(string text)
    {
        _ = text ?? throw new ArgumentNullException(nameof(text));
        return TryParse(text, out var formula, out var detail)
            ? formula!
            : throw new LyoniumException(Fault.Of(FaultKinds.TableBadFormula, "$", text, ("detail", detail)));
    }

    /// <summary>The formula as text.</summary>
    /// <returns><see cref="Text"/>.</returns>
    public override string ToString() => Text;

    internal static bool TryParse(string text, out ChemicalFormula? formula, out string detail)
    {
        formula = null;
        var body = Normalize(text);
        var charge = 0;
        var caret = body.IndexOf('^');
        if (caret >= 0)
        {
            if (!TryCharge(body.Substring(caret + 1), out charge))
            {
                detail = "its charge is not a number and a sign";
                return false;
            }

            body = body.Substring(0, caret);
        }

        double water = 0;
        var point = body.IndexOf('.');
        if (point >= 0)
        {
            if (!TryCrystalWater(body.Substring(point + 1), out water))
            {
                detail = "what follows the point is not crystal water";
                return false;
            }

            body = body.Substring(0, point);
        }

        var composition = new SortedDictionary<string, double>(StringComparer.Ordinal);
        var at = 0;
        if (body.Length == 0 || body.Length > 200 || !TryGroup(body, ref at, 1, 0, composition) || at != body.Length)
        {
            detail = $"it cannot be read at position {at + 1}";
            return false;
        }

        if (water > 0)
        {
            Add(composition, "H", 2 * water);
            Add(composition, "O", water);
        }

        detail = "";
        formula = new ChemicalFormula(text, composition, charge, water);
        return true;
    }

    /// <summary>One way of writing the point before crystal water.</summary>
    internal static string Normalize(string text) =>
        text.Trim().Replace(" ", "").Replace('·', '.').Replace('•', '.').Replace('∙', '.').Replace('*', '.');

    private static bool TryCharge(string text, out int charge)
    {
        charge = 0;
        if (text.Length == 0 || text[text.Length - 1] is not ('+' or '-'))
        {
            return false;
        }

        var digits = text.Substring(0, text.Length - 1);
        var size = 1;
        if (digits.Length > 0 && !int.TryParse(digits, NumberStyles.None, CultureInfo.InvariantCulture, out size))
        {
            return false;
        }

        charge = text[text.Length - 1] == '+' ? size : -size;
        return size is > 0 and < 100;
    }

    private static bool TryCrystalWater(string text, out double count)
    {
        count = 1;
        if (!text.EndsWith("H2O", StringComparison.Ordinal))
        {
            return false;
        }

        var number = text.Substring(0, text.Length - 3);
        return number.Length == 0
            || (double.TryParse(number, NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out count) && count is > 0 and < 100);
    }

    // Elements and groups in parentheses, each with a count, until the end or a closing parenthesis.
    private static bool TryGroup(string text, ref int at, double times, int depth, SortedDictionary<string, double> composition)
    {
        while (at < text.Length && text[at] != ')')
        {
            if (text[at] == '(')
            {
                at++;
                var inner = new SortedDictionary<string, double>(StringComparer.Ordinal);
                if (depth > 8 || !TryGroup(text, ref at, 1, depth + 1, inner) || at >= text.Length)
                {
                    return false;
                }

                at++;
                var count = Count(text, ref at) * times;
                foreach (var element in inner)
                {
                    Add(composition, element.Key, element.Value * count);
                }
            }
            else if (text[at] is >= 'A' and <= 'Z')
            {
                var start = at++;
                while (at < text.Length && text[at] is >= 'a' and <= 'z')
                {
                    at++;
                }

                var symbol = text.Substring(start, at - start);
                Add(composition, symbol, Count(text, ref at) * times);
            }
            else
            {
                return false;
            }
        }

        return depth > 0 == at < text.Length && composition.Count > 0 && composition.Values.All(count => count is > 0 and < 1e6);
    }

    private static double Count(string text, ref int at)
    {
        var start = at;
        while (at < text.Length && text[at] is >= '0' and <= '9')
        {
            at++;
        }

        return at == start ? 1 : double.Parse(text.Substring(start, at - start), CultureInfo.InvariantCulture);
    }

    private static void Add(SortedDictionary<string, double> composition, string symbol, double count) =>
        composition[symbol] = composition.TryGetValue(symbol, out var there) ? there + count : count;
}
