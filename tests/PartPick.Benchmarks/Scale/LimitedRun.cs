using System.Diagnostics;
using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Benchmarks;

/// <summary>One ranking that is cancelled after a limit.</summary>
/// <param name="Space">Combinations of the space; zero where it ended before they were known.</param>
/// <param name="Covered">Combinations covered, as the search last said.</param>
/// <param name="FirstSeconds">Until the first answer with a candidate in it; null where there was none.</param>
/// <param name="Seconds">Until the exact answer, or until it was cancelled.</param>
/// <param name="EndedSeconds">From cancelling to the end of the search; null where it came to its end by itself.</param>
/// <param name="Answer">The exact answer; null where it was cancelled.</param>
internal sealed record LimitedRun(
    double Space, double Covered, double? FirstSeconds, double Seconds, double? EndedSeconds, RankingResult? Answer)
{
    /// <summary>Ranks until the end or the limit.</summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="catalog">The parts.</param>
    /// <param name="limit">The limit.</param>
    public static LimitedRun Of(Requirement requirement, PartsCatalog catalog, TimeSpan limit)
    {
        using var stop = new CancellationTokenSource(limit);
        var watch = new Watch();
        try
        {
            RankingResult answer = Ranker.Rank(requirement, catalog, null, watch, stop.Token);
            double seconds = watch.Seconds;
            double? first = answer.Candidates.IsEmpty ? null : watch.First ?? seconds;
            return new LimitedRun(answer.Combinations, answer.Covered, first, seconds, null, answer);
        }
        catch (OperationCanceledException)
        {
            double ended = watch.Seconds - limit.TotalSeconds;
            return new LimitedRun(watch.Last?.Combinations ?? 0, watch.Last?.Covered ?? 0, watch.First, limit.TotalSeconds, ended, null);
        }
    }

    private sealed class Watch : IProgress<RankingResult>
    {
        private readonly long _start = Stopwatch.GetTimestamp();

        public double Seconds => Stopwatch.GetElapsedTime(_start).TotalSeconds;

        public double? First { get; private set; }

        public RankingResult? Last { get; private set; }

        public void Report(RankingResult value)
        {
            First ??= value.Candidates.IsEmpty ? null : Seconds;
            Last = value;
        }
    }
}
