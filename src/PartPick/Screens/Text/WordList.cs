namespace PartPick.Screens;

/// <summary>Lists words in a sentence.</summary>
internal static class WordList
{
    /// <summary>The words with commas and an "and": "a, b and c".</summary>
    /// <param name="words">The words, one or more.</param>
    public static string Of(IReadOnlyList<string> words) =>
        words.Count == 1 ? words[0] : string.Join(", ", words.Take(words.Count - 1)) + " and " + words[^1];
}
