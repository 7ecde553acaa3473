using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Says which limits a circuit breaks, and which of them and of its limits have changed against the ranked one.</summary>
internal static class Broken
{
    /// <summary>The sentences.</summary>
    /// <param name="candidate">The circuit.</param>
    /// <param name="ranked">The circuit as it was ranked; null for none.</param>
    public static IEnumerable<string> Sentences(Candidate candidate, Candidate? ranked)
    {
        if (ranked is null || ReferenceEquals(ranked, candidate))
        {
            return candidate.Misses.Select(miss => miss.Sentence);
        }

        IEnumerable<string> now = candidate.Misses.Select(miss => Breaks(ranked, miss.Limit) ? miss.Sentence : "Newly broken: " + miss.Sentence);
        Limit[] mended = [.. ranked.Misses.Select(miss => miss.Limit).Distinct().Where(limit => !Breaks(candidate, limit))];
        return mended.Length == 0 ? now : now.Append("It holds now: " + string.Join(", ", mended.Select(Trade.Words)));
    }

    private static bool Breaks(Candidate candidate, Limit limit) => candidate.Misses.Any(miss => miss.Limit == limit);
}
