using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Selection.Search;

namespace PartPick.Selection;

/// <summary>
/// Says why a crystal or an amplifier is not in a ranked list: by the same search as the ranking, over the circuits with that part
/// alone. Every change that it names was ranked again.
/// </summary>
public static class WhyNotSearch
{
    /// <summary>Finds the answer.</summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="source">Where the parts come from.</param>
    /// <param name="part">The crystal or amplifier.</param>
    /// <param name="progress">Is told what is being looked for; may be null.</param>
    /// <param name="cancellation">Ends it at once with <see cref="OperationCanceledException"/>.</param>
    /// <exception cref="PartsUnreadableException">The parts cannot be read.</exception>
    public static WhyNotAnswer Find(
        Requirement requirement, IPartsSource source, Part part, IProgress<string>? progress = null,
            CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(part);
        string currency = source.PartsFor(requirement, cancellation).Currency;
        Lift lift = PartHurdles.Of(requirement, part, currency);
        var search = new PartSearch(source, lift.Part, cancellation);
        lift = lift.IsFinal ? lift : new Pairings(search).Over(lift);
        var answer = new WhyNotAnswer { Part = part, Requirement = requirement, Hurdles = lift.Hurdles };
        if (lift.IsFinal)
        {
            return answer;
        }

        progress?.Report("holding its circuits against the limits");
        Requirement lifted = lift.Requirement;
        SearchRun run = search.Run(lifted);
        FitPoint? best = PartSearch.BestOf(run);
        answer = answer with { Rejections = run.Tally.Rejections() };
        if (best is not null && lift.Hurdles.IsEmpty)
        {
            return Placed(answer, search, best, progress);
        }

        ImmutableArray<NeededChange> changes = lift.Changes(requirement, part);
        ImmutableArray<ChangeSet> sets = best is not null
            ? [new ChangeSet(changes, lifted, search.Build(lifted, best.Choice)!)]
            : new ChangeSearch(search, lifted, changes, progress).Find();
        return sets.IsEmpty ? Unlifted(answer, search, run, lifted) : Changed(answer, search, lifted, sets, progress);
    }

    /// <summary>The answer for a part that a ranking lists already; null where it does not, or is not complete.</summary>
    /// <param name="ranked">The ranking.</param>
    /// <param name="id">The id of the part.</param>
    public static WhyNotAnswer? InList(RankingResult ranked, string id)
    {
        ArgumentNullException.ThrowIfNull(ranked);
        for (int i = 0; i < ranked.Candidates.Length && ranked.IsComplete; i++)
        {
            Candidate candidate = ranked.Candidates[i];
            if (candidate.Choice.Crystal.Id == id || candidate.Choice.Amplifier.Id == id)
            {
                return new WhyNotAnswer
                {
                    Part = candidate.Choice.Crystal.Id == id ? candidate.Choice.Crystal : candidate.Choice.Amplifier,
                    Requirement = ranked.Requirement,
                    Candidate = candidate,
                    Limits = LimitReading.Of(candidate, ranked.Requirement),
                    Place = new ListPlace(
                        i + 1, ranked.Candidates.Length, ranked.Candidates[0], i == 0 ? null : ranked.Candidates[i - 1]),
                };
            }
        }

        return null;
    }

    private static WhyNotAnswer Placed(WhyNotAnswer answer, PartSearch search, FitPoint best, IProgress<string>? progress)
    {
        progress?.Report("it fits; ranking it among all others");
        (ListPlace place, double score) = search.PlaceOf(answer.Requirement, best);
        Candidate candidate = search.Build(answer.Requirement, best.Choice)! with { Score = score };
        return answer with { Candidate = candidate, Limits = LimitReading.Of(candidate, answer.Requirement), Place = place };
    }

    private static WhyNotAnswer Changed(
        WhyNotAnswer answer, PartSearch search, Requirement lifted, ImmutableArray<ChangeSet> sets, IProgress<string>? progress)
    {
        // The nearest miss is what the smallest change lets in, judged without that change.
        Candidate near = search.Build(lifted, sets[0].Candidate.Choice)!;
        ListPlace? then = null;
        if (sets[0].IsOfRequirement && search.Best(sets[0].Requirement) is { } point)
        {
            progress?.Report("ranking all others with the change");
            (then, _) = search.PlaceOf(sets[0].Requirement, point);
        }

        return answer with { Candidate = near, Limits = LimitReading.Of(near, lifted), Changes = sets, PlaceThen = then };
    }

    // Nothing lets it in: the one that came nearest all the same, where the search has kept one.
    private static WhyNotAnswer Unlifted(WhyNotAnswer answer, PartSearch search, SearchRun run, Requirement lifted)
    {
        CandidateParts? nearest = run.NearMisses.Nearest(1).Concat(RelaxedSearch.Find(run.Space, 1, run.Cancellation)).FirstOrDefault();
        return nearest is not null && search.Build(lifted, nearest) is { } candidate
            ? answer with { Candidate = candidate, Limits = LimitReading.Of(candidate, lifted) }
            : answer;
    }
}
