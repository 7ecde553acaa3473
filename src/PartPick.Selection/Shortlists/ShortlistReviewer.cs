using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Recomputes the candidates of lists from today's parts, with the same builder as the ranking.</summary>
/// <param name="catalog">Today's parts.</param>
public sealed class ShortlistReviewer(PartsCatalog catalog)
{
    private readonly Dictionary<int, Market> _markets = [];

    /// <summary>Today's parts.</summary>
    public PartsCatalog Catalog => catalog;

    /// <summary>The market for a number of boards.</summary>
    /// <param name="builds">Number of boards, one or more.</param>
    public Market MarketFor(int builds)
    {
        if (!_markets.TryGetValue(builds, out Market? market))
        {
            market = new Market(catalog, builds);
            _markets.Add(builds, market);
        }

        return market;
    }

    /// <summary>Recomputes a whole list.</summary>
    /// <param name="list">The list.</param>
    /// <returns>Its candidates in order, or the first that cannot be read.</returns>
    public Result<ImmutableArray<ShortlistReview>> Review(Shortlist list)
    {
        ArgumentNullException.ThrowIfNull(list);
        var reviews = ImmutableArray.CreateBuilder<ShortlistReview>();
        foreach (ShortlistEntry entry in list.Entries)
        {
            Result<ShortlistReview> review = Review(list.Name, entry);
            if (!review.IsOk)
            {
                return Result.Fail<ImmutableArray<ShortlistReview>>(review.Problem);
            }

            reviews.Add(review.Value);
        }

        return Result.Ok(reviews.ToImmutable());
    }

    /// <summary>Recomputes one candidate.</summary>
    /// <param name="list">The name of its list, for the problem.</param>
    /// <param name="entry">The candidate.</param>
    public Result<ShortlistReview> Review(string list, ShortlistEntry entry)
    {
        ArgumentNullException.ThrowIfNull(entry);
        string where = FormattableString.Invariant($"list {Problem.Quote(list)}, candidate {entry.Number}");
        Result<Requirement> wanted = RequirementFile.Read(entry.Requirement, where);
        if (!wanted.IsOk)
        {
            return Result.Fail<ShortlistReview>(wanted.Problem);
        }

        if (ChosenParts.Read(entry.Choice) is not { } chosen || ShortlistFigures.Read(entry.Figures) is not { } then
            || chosen.In(new PartsCatalog(entry.Parts)) is not { } old)
        {
            return Result.Fail<ShortlistReview>(where, "cannot be read", "a candidate put there by partpick shortlist add");
        }

        Requirement requirement = wanted.Value with { Builds = entry.Builds };
        ImmutableArray<PartUse> before = BillOfParts.List(old.Choice, old.Support);
        ImmutableArray<PartChange> changes = PartChanges.Of(before, catalog);
        (Candidate? candidate, ImmutableArray<Miss> misses, bool priced) = chosen.In(catalog) is { } now
            ? Judge(requirement, now.Choice, now.Support)
            : (null, [], false);
        return Result.Ok(new ShortlistReview
        {
            Entry = entry,
            Requirement = requirement,
            Chosen = chosen,
            Parts = candidate?.Parts ?? [.. before.Select(use => catalog.Find(use.Part.Id) is { } part && part.Kind == use.Part.Kind
                ? use with { Part = part }
                : use)],
            Changes = changes,
            Then = then,
            Now = ShortlistFigures.Of(candidate, misses, priced),
            Candidate = candidate,
            Misses = misses,
        });
    }

    /// <summary>Makes the entry of a choice, with its parts and figures of today.</summary>
    /// <param name="choice">The parts.</param>
    /// <param name="support">The support parts; null for the usual ones.</param>
    /// <param name="requirement">What is wanted, with the number of boards.</param>
    /// <param name="note">Free text; null for none.</param>
    /// <param name="date">The day.</param>
    /// <returns>The entry, or the problem: an amplifier that is not specified at the supply makes no circuit.</returns>
    public Result<ShortlistEntry> Make(
        CandidateParts choice, SupportParts? support, Requirement requirement, string? note, DateOnly date)
    {
        ArgumentNullException.ThrowIfNull(choice);
        ArgumentNullException.ThrowIfNull(requirement);
        SupportParts parts = support ?? SupportParts.For(choice.Circuit, choice.Crystal.FrequencyHz, MarketFor(requirement.Builds));
        (Candidate? candidate, ImmutableArray<Miss> misses, bool priced) = Judge(requirement, choice, parts);
        if (candidate is null)
        {
            return Result.Fail<ShortlistEntry>("supply", misses[0].Sentence, "an amplifier that is specified over the supply range");
        }

        return Result.Ok(new ShortlistEntry
        {
            Added = date.ToString("yyyy-MM-dd", System.Globalization.CultureInfo.InvariantCulture),
            Builds = requirement.Builds,
            Note = note,
            Choice = ChosenParts.Of(choice, parts).ToJson().ToJsonString(),
            Circuit = CircuitFile.Write(candidate.Describe(requirement.OutputHz)).ToJsonString(),
            Requirement = RequirementFile.Write(requirement).ToJsonString(),
            Figures = ShortlistFigures.Of(candidate, misses, priced).ToJson().ToJsonString(),
            Parts = [.. candidate.Parts.Select(use => use.Part).DistinctBy(part => part.Id)],
        });
    }

    private (Candidate? Candidate, ImmutableArray<Miss> Misses, bool Priced) Judge(
        Requirement requirement, CandidateParts choice, SupportParts support)
    {
        var judge = new ChoiceJudge(requirement, MarketFor(requirement.Builds));
        (Candidate? candidate, ImmutableArray<Miss> misses) = judge.Judge(choice, support);
        return (candidate, misses, candidate is not null && judge.IsPriced(candidate));
    }
}
