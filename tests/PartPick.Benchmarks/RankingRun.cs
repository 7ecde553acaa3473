using System.Diagnostics;
using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Benchmarks;

/// <summary>One ranking over the built-in catalogue, timed.</summary>
/// <param name="FirstMilliseconds">Until the first answer with a candidate in it: a best-so-far, or the exact one.</param>
/// <param name="ExactMilliseconds">Until the exact answer.</param>
/// <param name="Answer">The exact answer.</param>
internal sealed record RankingRun(double FirstMilliseconds, double ExactMilliseconds, RankingResult Answer)
{
    /// <summary>Ranks to the end.</summary>
    public static RankingRun ToTheEnd(Requirement requirement)
    {
        var first = new FirstAnswer(null);
        RankingResult answer = Ranker.Rank(requirement, PartsCatalog.BuiltIn(), null, first);
        double exact = first.Milliseconds;
        return new RankingRun(first.At ?? exact, exact, answer);
    }

    /// <summary>Ranks until there is a candidate to show, and stops there.</summary>
    public static void ToTheFirst(Requirement requirement)
    {
        using var stop = new CancellationTokenSource();
        try
        {
            Ranker.Rank(requirement, PartsCatalog.BuiltIn(), null, new FirstAnswer(stop), stop.Token);
        }
        catch (OperationCanceledException)
        {
            // The first answer is there.
        }
    }

    private sealed class FirstAnswer(CancellationTokenSource? stop) : IProgress<RankingResult>
    {
        private readonly long _start = Stopwatch.GetTimestamp();

        public double Milliseconds => Stopwatch.GetElapsedTime(_start).TotalMilliseconds;

        public double? At { get; private set; }

        public void Report(RankingResult value)
        {
            if (At is null && !value.Candidates.IsEmpty)
            {
                At = Milliseconds;
                stop?.Cancel();
            }
        }
    }
}
