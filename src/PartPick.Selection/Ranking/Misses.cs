namespace PartPick.Selection.Search;

/// <summary>Counts what the limits remove from one group, and remembers what came nearest.</summary>
internal sealed class Misses(SearchRun run, CircuitFamily family, FamilyMember member)
{
    /// <summary>Share of an estimated drive level by which it may be too high.</summary>
    private const double DriveSlack = 0.05;
    private readonly double _budget = run.Space.Requirement.BudgetRatio;
    private readonly decimal? _costLimit = run.Space.Requirement.CostLimit;

    /// <summary>Whether figures that no choice of parts of an estimate betters break a limit; counted where they do.</summary>
    public bool Breaks(Estimate estimate, double errorRatio, decimal cost)
    {
        if (Broken(estimate, errorRatio, cost) is not { } limit)
        {
            return false;
        }

        Reject(estimate, limit, errorRatio, cost);
        return true;
    }

    /// <summary>Whether the figures that one choice of parts could reach break a limit; counted where they do.</summary>
    public bool Breaks(Estimate estimate, CapacitorPair pair)
    {
        if (Broken(estimate, pair.ErrorRatio, pair.Cost) is not { } limit)
        {
            return false;
        }

        run.Tally.Reject(limit, pair.Stands);
        Offer(estimate, pair.ErrorRatio, pair.Cost, pair);
        return true;
    }

    /// <summary>Counts all parts of an estimate as removed.</summary>
    public void Reject(Estimate estimate, Limit limit, double errorRatio, decimal cost)
    {
        run.Tally.Reject(limit, (double)run.Space.Capacitors[estimate.C1].Parts * run.Space.Capacitors[estimate.C2].Parts);
        Offer(estimate, errorRatio, cost, null);
    }

    /// <summary>Counts one choice of parts as removed after its full analysis.</summary>
    public void Reject(Estimate estimate, CapacitorPair pair, Limit limit)
    {
        run.Tally.Reject(limit, pair.Stands);
        run.NearMisses.Offer(member, 1.01, () => Choice(estimate, pair));
    }

    /// <summary>The choice of parts.</summary>
    public CandidateParts Choice(Estimate estimate, CapacitorPair pair) =>
        SearchRun.Choice(family, member, estimate.Option, pair.C1.Part, pair.C2.Part);

    private Limit? Broken(Estimate estimate, double errorRatio, decimal cost) =>
        errorRatio > _budget ? Limit.Error
        : estimate.Steady.DriveWatts * (1 - DriveSlack) > member.Crystal.DriveLevelWatts ? Limit.Drive
        : cost > _costLimit ? Limit.Cost
        : null;

    private void Offer(Estimate estimate, double errorRatio, decimal cost, CapacitorPair? pair)
    {
        if (run.Leaders.Cheapest is not null)
        {
            return;
        }

        double penalty = Math.Max(1, errorRatio / _budget)
            * Math.Max(1, estimate.Steady.DriveWatts / member.Crystal.DriveLevelWatts ?? 1)
            * Math.Max(1, (double)(cost / _costLimit ?? 1));
        run.NearMisses.Offer(member, penalty, () => pair is null
            ? SearchRun.Choice(family, member, estimate.Option, run.Prices.Tightest(estimate.C1), run.Prices.Tightest(estimate.C2))
            : Choice(estimate, pair));
    }
}
