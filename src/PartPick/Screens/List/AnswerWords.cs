using System.Globalization;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Says how far the ranking is and what it found.</summary>
public static class AnswerWords
{
    /// <summary>The words above the list.</summary>
    /// <param name="result">The answer that is shown; null before the first one.</param>
    /// <param name="running">Whether a better or newer answer is being computed.</param>
    /// <param name="stale">Whether the answer shown is one to an older requirement.</param>
    /// <param name="reading">Whether the parts are still being read.</param>
    public static string Of(RankingResult? result, bool running, bool stale, bool reading = false)
    {
        if (reading && running)
        {
            return "reading the parts" + (result is null ? "" : "; the list is still the one before");
        }

        if (result is null)
        {
            return running ? "computing" : "nothing ranked yet";
        }

        if (running)
        {
            double share = Math.Min(1, result.Covered / result.Combinations);
            string far = stale || !(result.Combinations > 0)
                ? ""
                : string.Create(CultureInfo.InvariantCulture, $" {Math.Floor(100 * share):F0} %");
            return "computing" + far + (stale ? "; the list is still the one before" : ", best so far");
        }

        string of = $", of {Figures.Count(result.Combinations)} combinations";
        if (!result.Candidates.IsEmpty)
        {
            int count = result.Candidates.Length;
            string circuits = string.Create(CultureInfo.InvariantCulture, $"{count} {(count == 1 ? "circuit fits" : "circuits fit")}");
            return circuits + of;
        }

        return MostRemoved(result);
    }

    private static string MostRemoved(RankingResult result)
    {
        if (!(result.Combinations > 0))
        {
            return "nothing fits; no crystal gives this frequency";
        }

        if (result.Rejections.IsEmpty)
        {
            return $"nothing fits, of {Figures.Count(result.Combinations)} combinations";
        }

        (Limit limit, double count) = result.Rejections.OrderByDescending(pair => pair.Value).ThenBy(pair => pair.Key).First();
        double share = 100 * count / result.Combinations;
        string percent = share < 1 ? "less than 1" : string.Create(CultureInfo.InvariantCulture, $"{Math.Floor(share):F0}");
        return $"nothing fits; {Trade.Words(limit)} removed {percent} %";
    }
}
