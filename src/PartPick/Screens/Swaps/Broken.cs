using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Says which limits a circuit breaks, and what of it is new against the ranked one.</summary>
internal static class Broken
{
    /// <summary>A sentence for those that are newly broken, those that still are, and those that hold now.</summary>
    /// <param name="candidate">The circuit.</param>
    /// <param name="ranked">The circuit as it was ranked; null for none.</param>
    public static IEnumerable<string> Sentences(Candidate candidate, Candidate? ranked)
    {
        Limit[] now = LimitsOf(candidate);
        if (ranked is null || ReferenceEquals(ranked, candidate))
        {
            return Said("It does not start by itself.", "It breaks ", now);
        }

        Limit[] before = LimitsOf(ranked);
        return
        [
            .. Said("It does not start by itself any more.", "Newly broken: ", now.Except(before)),
            .. Said("It still does not start by itself.", "Still broken: ", now.Intersect(before)),
            .. Said("It starts by itself now.", "It holds now: ", before.Except(now)),
        ];
    }

    private static Limit[] LimitsOf(Candidate candidate) => [.. candidate.Misses.Select(miss => miss.Limit).Distinct().Order()];

    private static IEnumerable<string> Said(string start, string begin, IEnumerable<Limit> limits)
    {
        if (limits.Contains(Limit.Start))
        {
            yield return start;
        }

        string[] words = [.. limits.Where(limit => limit != Limit.Start).Select(Trade.Words)];
        if (words.Length > 0)
        {
            yield return begin + WordList.Of(words) + ".";
        }
    }
}
