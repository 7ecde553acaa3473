namespace PartPick.Catalog.Import;

/// <summary>A phrase of a header in the form in which headers are compared.</summary>
/// <param name="Text">Its words with one space between.</param>
/// <param name="Words">Its words without articles and prepositions.</param>
/// <param name="IsWhole">Whether it has to be the whole name of a header.</param>
internal sealed record TradePhrase(string Text, string[] Words, bool IsWhole)
{
    private static readonly HashSet<string> Small = new(StringComparer.Ordinal)
    {
        "of", "the", "de", "d", "l", "la", "le", "les", "des", "du", "der", "die", "das", "del", "di", "da", "do", "dos", "el", "los",
        "en", "em", "in", "im", "a", "al", "for", "pour", "for", "und", "and", "et", "y", "e", "i", "van", "av", "den", "per", "z", "w",
    };

    /// <summary>Whether a word only joins others.</summary>
    public static bool IsSmall(string word) => Small.Contains(word);

    /// <summary>A line of the lists of words, as it stands: behind "=" the phrase has to be the whole name.</summary>
    public static TradePhrase Of(string line)
    {
        string text = Folded(Trade.Words(line.TrimStart('=')));
        return new TradePhrase(text, Telling(text), line.StartsWith('='));
    }

    /// <summary>The words that tell something; all of them where none does.</summary>
    public static string[] Telling(string text)
    {
        string[] all = text.Split(' ', StringSplitOptions.RemoveEmptyEntries);
        string[] telling = [.. all.Where(word => !Small.Contains(word))];
        return telling.Length > 0 ? telling : all;
    }

    /// <summary>Vowels with two dots that are written with an e behind them, as those that lost their dots.</summary>
    public static string Folded(string words) => words
        .Replace("ae", "a", StringComparison.Ordinal).Replace("oe", "o", StringComparison.Ordinal)
        .Replace("ue", "u", StringComparison.Ordinal);
}
