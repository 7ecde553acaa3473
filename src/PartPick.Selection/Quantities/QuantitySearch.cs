using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Selection.Search;

namespace PartPick.Selection;

/// <summary>
/// Finds the best candidate for every number of boards. The figures of a circuit do not depend on that number, so the catalogue is
/// ranked for a few numbers only; what is on the front at any of them is compared, with exact costs, at every number; and where
/// the best changes, the catalogue is ranked again to see whether something else is better there, until nothing is.
/// </summary>
public static class QuantitySearch
{
    private static readonly int[] Decades = [1, 10, 100, 1000, 10_000];

    /// <summary>The best candidate for every number of boards.</summary>
    /// <param name="requirement">What is needed; its number of boards is one of those ranked.</param>
    /// <param name="catalog">The parts.</param>
    /// <param name="also">A candidate that is compared with the others, such as the chosen one; null for none.</param>
    /// <param name="options">How far it goes; null for the defaults.</param>
    /// <param name="progress">Takes a best-so-far of the rankings now and then; may be null.</param>
    /// <param name="cancellation">Ends the search at once with <see cref="OperationCanceledException"/>.</param>
    public static QuantityChoice Find(
        Requirement requirement,
        PartsCatalog catalog,
        Candidate? also = null,
        QuantityOptions? options = null,
        IProgress<RankingResult>? progress = null,
        CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        ArgumentNullException.ThrowIfNull(catalog);
        options ??= new QuantityOptions();
        var pool = new QuantityPool(requirement, catalog);
        var ranked = new SortedDictionary<int, string?>();
        Requirement loose = requirement with { Builds = 1, CostLimit = null };
        bool every = new SearchSpace(loose, catalog, every: true).Combinations <= options.EveryUpTo;
        pool.Add(also is null ? [] : [also]);
        if (every)
        {
            var all = new RankingOptions { All = true, Top = null };
            pool.Add(Ranker.Rank(loose, catalog, all, progress, cancellation).Candidates);
        }
        else
        {
            foreach (int builds in Decades.Append(requirement.Builds).Where(builds => builds <= options.Most).Distinct())
            {
                RankAt(builds);
            }
        }

        PoolPoint?[] best = Compare();
        while (!every && NextToRank(best, ranked, options) is { } builds)
        {
            if (RankAt(builds))
            {
                best = Compare();
            }
        }

        return new QuantityChoice
        {
            Spans = Spans(requirement, catalog, best, ranked),
            RankedAt = [.. ranked.Keys],
            IsExact = every || ranked.Count == options.Most,
            Costs = [.. best.Skip(1).Select(point => point?.Cost)],
            Compared = pool.Count,
        };

        bool RankAt(int builds)
        {
            RankingResult result = Ranker.Rank(
                requirement with { Builds = builds }, catalog, new RankingOptions { Front = true, Top = null }, progress, cancellation);
            ranked.Add(builds, result.Candidates.IsEmpty ? null : result.Candidates[0].Id);
            return pool.Add(result.Candidates);
        }

        PoolPoint?[] Compare() =>
        [
            null,
            .. Enumerable.Range(1, options.Most).AsParallel().AsOrdered().WithCancellation(cancellation).Select(pool.Best),
        ];
    }

    // Of the places where the best changes and that are not ranked, the one that ends or begins the range of most decades.
    private static int? NextToRank(PoolPoint?[] best, SortedDictionary<int, string?> ranked, QuantityOptions options)
    {
        if (ranked.Count >= options.MostRankings)
        {
            return null;
        }

        (int Builds, double Decades)[] open =
        [
            .. Ranges(best).Where(range => range.From > 1)
                .SelectMany(range => new[] { (range.From, range.Decades), (range.From - 1, range.Decades) })
                .Where(place => !ranked.ContainsKey(place.Item1)),
        ];
        return open.Length == 0 ? null : open.MaxBy(place => place.Decades).Builds;
    }

    private static ImmutableArray<ChoiceSpan> Spans(
        Requirement requirement, PartsCatalog catalog, PoolPoint?[] best, SortedDictionary<int, string?> ranked) =>
    [
        .. Ranges(best).Select(range => new ChoiceSpan(
            range.From,
            range.To,
            best[range.From] is { } point ? Analyse(requirement with { Builds = range.From }, catalog, point.Choice) : null,
            best[range.To]?.Cost,
            ranked.Any(one => one.Key >= range.From && one.Key <= range.To && one.Value == best[range.From]?.Id))),
    ];

    private static Candidate Analyse(Requirement requirement, PartsCatalog catalog, CandidateParts choice) =>
        new CandidateBuilder(requirement, new Market(catalog, requirement.Builds)).Build(choice)!;

    private static IEnumerable<(int From, int To, double Decades)> Ranges(PoolPoint?[] best)
    {
        int from = 1;
        for (int builds = 2; builds <= best.Length; builds++)
        {
            if (builds == best.Length || best[builds]?.Id != best[from]?.Id)
            {
                yield return (from, builds - 1, Math.Log10((double)builds / from));
                from = builds;
            }
        }
    }
}
