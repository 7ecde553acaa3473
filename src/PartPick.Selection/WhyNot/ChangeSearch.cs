using System.Collections.Immutable;
using PartPick.Values;

namespace PartPick.Selection.Search;

/// <summary>Finds what lets a part in where its circuits break limits that a number states: one change, or the fewest together.</summary>
/// <param name="search">The search of the circuits with the part.</param>
/// <param name="wanted">The requirement, with whatever else had to be lifted.</param>
/// <param name="lifted">What had to be lifted.</param>
/// <param name="progress">Is told what is being looked for; may be null.</param>
internal sealed class ChangeSearch(
    PartSearch search, Requirement wanted, ImmutableArray<NeededChange> lifted, IProgress<string>? progress)
{
    private readonly SmallestChange _smallest = new(search);
    private readonly LetOut _start = new(wanted);

    /// <summary>The sets, the smallest first; empty where nothing lets it in.</summary>
    public ImmutableArray<ChangeSet> Find()
    {
        ImmutableArray<Limit> limits = [.. LetOut.Limits.Where(limit => LetOut.IsSet(wanted, limit))];
        progress?.Report("looking whether any circuit with it runs");
        LetOut open = _start.Without(limits).Weighing(wanted, limits);
        FitPoint? nearest = search.Best(open.Requirement, open.RatingFactor);
        if (nearest is null)
        {
            return Disturbed() is { } only ? [only] : [];
        }

        var singles = new List<ChangeSet>();
        foreach (Limit limit in limits)
        {
            progress?.Report($"looking for the least change of the {Word(limit)}");
            if (Set([limit]) is { } set)
            {
                singles.Add(set);
                if (limit == Limit.Drive && _smallest.OfSupply(_start) is { } cooler)
                {
                    singles.Add(Made(cooler.At, cooler.Point));
                }
            }
        }

        if (singles.Count == 0 && Disturbed() is { } kicked)
        {
            singles.Add(kicked);
        }

        return singles.Count > 0 ? [.. singles.OrderBy(set => set.Size)] : Several(limits);
    }

    // The fewest limits that have to be changed together; of equally many, those that change least.
    private ImmutableArray<ChangeSet> Several(ImmutableArray<Limit> limits)
    {
        for (int count = 2; count <= limits.Length; count++)
        {
            progress?.Report($"looking for {count} limits that have to change together");
            ChangeSet? best = Choices(limits, count).Select(Set).OfType<ChangeSet>().MinBy(set => set.Size);
            if (best is not null)
            {
                return [best];
            }
        }

        return [];
    }

    private ChangeSet? Set(ImmutableArray<Limit> limits)
    {
        LetOut at = _start;
        if (limits.Length > 1)
        {
            // The figures that the score weighs are found together; each is then tightened with the others as they came out.
            LetOut open = _start.Without(limits).Weighing(wanted, limits);
            if (search.Best(open.Requirement, open.RatingFactor) is not { } together)
            {
                return null;
            }

            at = Reached(_start.Without(limits.Where(limit => limit is Limit.StartUpTime or Limit.Drive)), together, limits);
        }

        FitPoint? point = null;
        foreach (Limit limit in limits.Reverse())
        {
            if (_smallest.Of(Restored(at, limit), limit) is not { } found)
            {
                return null;
            }

            (at, point) = found;
        }

        return point is null ? null : Made(at, point);
    }

    // What a choice reaches of the limits that the score weighs, as limits.
    private static LetOut Reached(LetOut at, FitPoint point, ImmutableArray<Limit> limits)
    {
        Requirement one = at.Requirement;
        return at with
        {
            Requirement = one with
            {
                BudgetRatio = limits.Contains(Limit.Error)
                    ? Math.Max(one.BudgetRatio, Rounding.Up(point.ErrorRatio, 1))
                    : one.BudgetRatio,
                Margin = limits.Contains(Limit.Margin) ? Math.Min(one.Margin, Rounding.Down(point.Margin, 1)) : one.Margin,
                CostLimit = limits.Contains(Limit.Cost) && one.CostLimit is { } most
                    ? Math.Max(most, Rounding.Up(point.Cost))
                    : one.CostLimit,
            },
        };
    }

    private LetOut Restored(LetOut at, Limit limit) => limit switch
    {
        Limit.Error => at with { Requirement = at.Requirement with { BudgetRatio = wanted.BudgetRatio } },
        Limit.Margin => at with { Requirement = at.Requirement with { Margin = wanted.Margin } },
        Limit.Cost => at with { Requirement = at.Requirement with { CostLimit = wanted.CostLimit } },
        Limit.StartUpTime => at with { Requirement = at.Requirement with { StartUpTimeSeconds = wanted.StartUpTimeSeconds } },
        _ => at with { RatingFactor = 1 },
    };

    private ChangeSet? Disturbed()
    {
        if (wanted.AllowDisturbance)
        {
            return null;
        }

        progress?.Report("looking whether a disturbance starts it");
        LetOut kicked = _start with { Requirement = wanted with { AllowDisturbance = true } };
        return search.Best(kicked.Requirement) is { } point ? Made(kicked, point) : null;
    }

    private ChangeSet Made(LetOut at, FitPoint point)
    {
        Candidate candidate = search.Build(at.Requirement, point.Choice)!;
        ImmutableArray<NeededChange> changes = [.. lifted, .. RequirementChanges.Between(wanted, at.Requirement)];
        if (at.RatingFactor > 1 && candidate.RatedDriveWatts is { } rated)
        {
            changes = changes.Add(new NeededChange(
                $"rated drive level of {candidate.Choice.Crystal.Id}", null, Say.Watts(rated),
                ValueText.Format(rated * at.RatingFactor, Dimension.Power, 4), at.RatingFactor));
        }

        return new ChangeSet(changes, at.Requirement, candidate);
    }

    private static string Word(Limit limit) => limit switch
    {
        Limit.Error => "budget",
        Limit.Margin => "margin",
        Limit.Cost => "cost limit",
        Limit.StartUpTime => "start-up time",
        _ => "drive level",
    };

    private static IEnumerable<ImmutableArray<Limit>> Choices(ImmutableArray<Limit> limits, int count)
    {
        if (count == 0)
        {
            return [[]];
        }

        return limits.SelectMany((limit, place) =>
            Choices(limits[(place + 1)..], count - 1).Select(rest => (ImmutableArray<Limit>)[limit, .. rest]));
    }
}
