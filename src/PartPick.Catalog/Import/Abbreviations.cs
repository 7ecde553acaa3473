using System.Collections.Frozen;

namespace PartPick.Catalog.Import;

/// <summary>The words that the columns of stock systems shorten, "pkg_cd" for a package code.</summary>
internal static class Abbreviations
{
    private static readonly FrozenDictionary<string, string> Full = TradeWords.Lines()
        .Where(line => line.Section == "abbreviations")
        .SelectMany(line => line.Phrases.Select(brief => (brief, line.Field)))
        .ToFrozenDictionary(each => each.brief, each => each.Field, StringComparer.Ordinal);

    /// <summary>A name with its shortened words in full.</summary>
    /// <param name="name">Words in lower case with one space between.</param>
    public static string InFull(string name) =>
        string.Join(' ', name.Split(' ').Select(word => Full.GetValueOrDefault(word, word)));
}
