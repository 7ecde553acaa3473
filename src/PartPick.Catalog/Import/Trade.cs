using System.Globalization;
using System.Text;

namespace PartPick.Catalog.Import;

/// <summary>Brings the words of headers and cells into one form.</summary>
internal static class Trade
{
    private const string Accented =
        "àáâãäåāăąçćčďđèéêëēėęěğìíîïīįıłļľñńňņòóôõöøőōŕřśşšșťţțùúûüűůūųýÿźżžαβµμ₀₁₂";

    private const string Bare =
        "aaaaaaaaacccddeeeeeeeegiiiiiiilllnnnnoooooooorrsssstttuuuuuuuuyyzzzabuu012";

    /// <summary>A text as lower-case words of letters and digits without accents, one space between: "Freq. Stab" is "freq stab".</summary>
    public static string Words(string text)
    {
        var words = new StringBuilder();
        char last = ' ';
        for (int i = 0; i < text.Length; i++)
        {
            char letter = text[i];
            if (CharUnicodeInfo.GetUnicodeCategory(letter) == UnicodeCategory.NonSpacingMark)
            {
                continue;
            }

            if (!char.IsLetterOrDigit(letter) && letter is not ('₀' or '₁' or '₂'))
            {
                AddSpace(words);
            }
            else
            {
                if (char.IsUpper(letter) && char.IsLower(last) && i + 1 < text.Length && char.IsLower(text[i + 1]))
                {
                    AddSpace(words);
                }

                words.Append(Plain(letter));
            }

            last = letter;
        }

        return words.ToString().Trim();
    }

    // The accented letters of Europe; the platform's own decomposition needs culture data that the program runs without.
    private static string Plain(char letter)
    {
        char lower = char.ToLowerInvariant(letter);
        int at = Accented.IndexOf(lower, StringComparison.Ordinal);
        return at >= 0 ? Bare[at].ToString() : lower switch
        {
            'ß' => "ss",
            'æ' => "ae",
            'œ' => "oe",
            'İ' => "i",
            'ё' => "е",
            _ => lower.ToString(),
        };
    }

    private static void AddSpace(StringBuilder words)
    {
        if (words.Length > 0 && words[^1] != ' ')
        {
            words.Append(' ');
        }
    }
}
