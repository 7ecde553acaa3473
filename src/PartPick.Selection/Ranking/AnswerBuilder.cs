using System.Collections.Concurrent;
using System.Collections.Immutable;

namespace PartPick.Selection.Search;

/// <summary>
/// Makes the answers of what a run has found: the listed candidates are analysed in full, from nothing, each once for all answers
/// of the run.
/// </summary>
internal sealed class AnswerBuilder(SearchRun run, RankingOptions options)
{
    private const int BestSoFarListed = 12;
    private const int NearestListed = 10;
    private readonly CandidateBuilder _builder = new(run.Space.Requirement, run.Space.Market);
    private readonly ConcurrentDictionary<string, Candidate> _built = new(StringComparer.Ordinal);

    /// <summary>Builds the answer.</summary>
    public RankingResult Build(bool complete, double elapsedSeconds)
    {
        Requirement requirement = run.Space.Requirement;
        decimal cheapest = run.Leaders.Cheapest ?? 0;
        ImmutableArray<FitPoint> front = [.. run.Leaders.Order(run.Front.Points, cheapest)];
        var onFront = front.Select(point => point.Id).ToHashSet(StringComparer.Ordinal);
        IEnumerable<FitPoint> listed = options.Front ? front : options.All ? run.Leaders.Order(Snapshot(), cheapest) : run.Leaders.Best();
        int most = complete ? options.Top ?? int.MaxValue : Math.Min(options.Top ?? BestSoFarListed, BestSoFarListed);
        FitPoint[] points = [.. listed.Take(most)];
        Candidate[] candidates =
        [
            .. points.AsParallel().AsOrdered().WithDegreeOfParallelism(complete ? Environment.ProcessorCount : 1).Select(point =>
                Shown(_built.GetOrAdd(point.Id, _ => _builder.Build(point.Choice)!), cheapest) with
                {
                    OnFront = onFront.Contains(point.Id),
                }),
        ];
        candidates =
        [
            .. candidates
                .OrderBy(candidate => candidate.Score)
                .ThenBy(candidate => candidate.Budget?.WorstRatio)
                .ThenBy(candidate => candidate.Cost)
                .ThenBy(candidate => candidate.Id, StringComparer.Ordinal),
        ];
        ImmutableArray<Candidate> nearest = complete && points.Length == 0 ? Nearest() : [];
        return new RankingResult
        {
            Requirement = requirement,
            Combinations = run.Space.Combinations,
            Covered = complete ? run.Space.Combinations : run.Tally.Covered,
            Fit = complete && options.All ? run.Tally.Fit : null,
            Analysed = run.Tally.Analysed,
            Candidates = [.. candidates],
            Front = [.. front.Select(point => point.Id)],
            NearestMisses = nearest,
            CheapestCost = run.Leaders.Cheapest,
            Rejections = run.Tally.Rejections(),
            IsComplete = complete,
            ElapsedSeconds = elapsedSeconds,
        };
    }

    // Score and order go by the figures that are shown: they are solved from nothing, those of the search from neighbours.
    private Candidate Shown(Candidate candidate, decimal cheapest) => candidate.Budget is not { } budget ? candidate : candidate with
    {
        Score = Score.Of(run.Space.Requirement, budget.WorstRatio, candidate.Margin.Value, candidate.Cost, cheapest),
    };

    private ImmutableArray<Candidate> Nearest() =>
    [
        .. run.NearMisses.Nearest(NearestListed)
            .Concat(RelaxedSearch.Find(run.Space, NearestListed, run.Cancellation))
            .DistinctBy(CandidateId.Of)
            .Select(_builder.Build).OfType<Candidate>()
            .OrderBy(candidate => Miss.Distance(candidate.Misses)).ThenBy(candidate => candidate.Id, StringComparer.Ordinal)
            .Take(NearestListed),
    ];

    private FitPoint[] Snapshot()
    {
        lock (run.All)
        {
            return [.. run.All];
        }
    }
}
