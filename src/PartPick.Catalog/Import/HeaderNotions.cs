namespace PartPick.Catalog.Import;

/// <summary>The words of a header, each with the ways in which it can be understood.</summary>
/// <param name="Words">The words, those that only join others left out.</param>
internal sealed record HeaderNotions(IReadOnlyList<(string Word, IReadOnlyList<Notion> Notions)> Words)
{
    // Words that may only join others, "in" beside "input".
    private static readonly Notion Nothing = new(0, 0.02);

    private static readonly HashSet<string> Joining = new(StringComparer.Ordinal)
    {
        "on", "to", "at", "with", "by", "is", "med", "mit", "con", "met",
    };

    // A single letter beside words, which may stand for anything.
    private static readonly Notion Anything = new(0, 0.3);

    /// <summary>Whether a word can only mean a certain thing, such as the least figure.</summary>
    public bool Says(UInt128 mark) => Words.Any(word => word.Notions.Count > 0 && word.Notions.All(notion => (notion.Marks & mark) != 0));

    /// <summary>Takes a name apart.</summary>
    /// <param name="name">A name in the form of <see cref="TradePhrase.Folded"/>.</param>
    public static HeaderNotions Of(string name)
    {
        var words = new List<(string, IReadOnlyList<Notion>)>();
        foreach (string word in name.Split(' ', StringSplitOptions.RemoveEmptyEntries).Where(word => word.Length < 40).Take(12))
        {
            IReadOnlyList<Notion> notions = name.Length > 1 ? Notions.Of(word) : [];
            if (word.Length == 1 && name.Length > 1 && notions.Count > 0)
            {
                words.Add((word, [.. notions, Anything]));
            }
            else if (!TradePhrase.IsSmall(word) && !Joining.Contains(word))
            {
                words.Add((word, notions));
            }
            else if (notions.Count > 0)
            {
                words.Add((word, [.. notions, Nothing]));
            }
        }

        return new HeaderNotions(words);
    }
}
