using System.Text;

namespace PartPick.Catalog.Import;

/// <summary>Makes the texts of cells plain.</summary>
internal static class CellText
{
    private static readonly HashSet<string> Missing = new(StringComparer.OrdinalIgnoreCase)
    {
        "", "-", "--", "---", "n/a", "na", "n.a.", "none", "null", "nil", "tbd", "tba", "?", "*", "\u2013", "\u2014",
        "not specified", "unspecified", "not applicable", "not available", "unknown", "k.a.", "k. a.", "keine angabe",
        "n/d", "nd", "#n/a", "nan", ".",
        "/", "//", "n.d.", "n. d.", "s/d", "n/v", "nvt", "n.v.t.", "b.d.", "brak", "brak danych", "néant", "neant", "aucun", "aucune",
        "ninguno", "ninguna", "sin datos", "nessuno", "nessuna", "nenhum", "nenhuma", "keine", "#n/d", "#nv", "#ref!", "#value!",
        "#div/0!", "#name?", "#wert!", "#bezug!",
    };

    private static readonly string[] Leading =
    [
        "<=", ">=", "≤", "<", "±", "+/-", "+-", "~", "max.", "max", "typ.", "typ", "approx.", "ca.",
    ];

    private static readonly string[] Trailing = ["max.", "max", "maximum", "typ.", "typ", "typical", "min.", "nom.", "nominal"];

    /// <summary>A cell without outer space and without the guard against formulas; empty where it says that there is nothing.</summary>
    public static string Plain(string cell)
    {
        string text = FormulaGuard.Unguard(cell.Trim());
        return Missing.Contains(text) ? "" : text;
    }

    /// <summary>
    /// A text on one line that does nothing on a terminal: line breaks and tabs become spaces, other control characters the signs
    /// that stand for them, and marks that turn the direction of writing are shown as unknown.
    /// </summary>
    public static string Harmless(string text)
    {
        if (!text.Any(IsHarmful))
        {
            return text;
        }

        var plain = new StringBuilder(text.Length);
        foreach (char letter in text)
        {
            plain.Append(letter switch
            {
                '\t' or '\n' or '\r' or '\u2028' or '\u2029' => ' ',
                < ' ' => (char)(0x2400 + letter),
                '\u007F' => '\u2421',
                _ when IsHarmful(letter) => '\uFFFD',
                _ => letter,
            });
        }

        return plain.ToString().Trim();
    }

    /// <summary>A number's text without marks around it that do not change it: ±, max, a condition behind @.</summary>
    public static string Bare(string text)
    {
        string bare = text.Replace('\u00A0', ' ').Replace('\u202F', ' ').Replace('\u2009', ' ').Replace('\u2212', '-').Trim();
        int at = bare.IndexOf('@', StringComparison.Ordinal);
        bare = at > 0 ? bare[..at].TrimEnd() : bare;
        foreach (string mark in Leading)
        {
            if (bare.StartsWith(mark, StringComparison.OrdinalIgnoreCase))
            {
                bare = bare[mark.Length..].TrimStart(' ', ':');
            }
        }

        foreach (string mark in Trailing)
        {
            if (bare.Length > mark.Length
                && bare.EndsWith(mark, StringComparison.OrdinalIgnoreCase)
                && !char.IsLetter(bare[^(mark.Length + 1)]))
            {
                bare = bare[..^mark.Length].TrimEnd(' ', ',', '(');
            }
        }

        return bare;
    }

    private static bool IsHarmful(char letter) => char.IsControl(letter)
        || letter is '\u2028' or '\u2029'
            or (>= '\u202A' and <= '\u202E')
            or (>= '\u2066' and <= '\u2069')
            or '\u200E' or '\u200F' or '\u061C';
}
