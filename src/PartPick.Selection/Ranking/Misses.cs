namespace PartPick.Selection.Search;

/// <summary>Counts what the limits remove from one group, and remembers what came nearest.</summary>
internal sealed class Misses(SearchRun run, CircuitFamily family, FamilyMember member)
{
    private readonly double _budget = run.Space.Requirement.BudgetRatio;
    private readonly decimal? _costLimit = run.Space.Requirement.CostLimit;

    /// <summary>Whether figures that no choice of parts of a combination of values betters break a limit; counted where they do.</summary>
    public bool Breaks(Spot spot, double errorRatio, decimal cost)
    {
        if (Broken(errorRatio, cost) is not { } limit)
        {
            return false;
        }

        Reject(spot, limit, errorRatio, cost);
        return true;
    }

    /// <summary>Whether the figures that one choice of parts could reach break a limit; counted where they do.</summary>
    public bool Breaks(Spot spot, CapacitorPair pair)
    {
        if (Broken(pair.ErrorRatio, pair.Cost) is not { } limit)
        {
            return false;
        }

        run.Tally.Reject(limit, pair.Stands);
        Offer(spot, pair.ErrorRatio, pair.Cost, pair);
        return true;
    }

    /// <summary>Counts all parts of a combination of values as removed.</summary>
    public void Reject(Spot spot, Limit limit, double errorRatio, decimal cost)
    {
        run.Tally.Reject(limit, (double)run.Space.Capacitors[spot.C1].Parts * run.Space.Capacitors[spot.C2].Parts);
        Offer(spot, errorRatio, cost, null);
    }

    /// <summary>Counts one choice of parts as removed after its full analysis.</summary>
    public void Reject(Spot spot, CapacitorPair pair, Limit limit)
    {
        run.Tally.Reject(limit, pair.Stands);
        run.NearMisses.Offer(member, 1.01, () => Choice(spot, pair));
    }

    /// <summary>The choice of parts.</summary>
    public CandidateParts Choice(Spot spot, CapacitorPair pair) =>
        SearchRun.Choice(family, member, spot.Option, pair.C1.Part, pair.C2.Part);

    private Limit? Broken(double errorRatio, decimal cost) =>
        errorRatio > _budget ? Limit.Error
        : cost > _costLimit ? Limit.Cost
        : null;

    private void Offer(Spot spot, double errorRatio, decimal cost, CapacitorPair? pair)
    {
        if (run.Leaders.Cheapest is not null)
        {
            return;
        }

        double penalty = Math.Max(1, errorRatio / _budget)
            * Math.Max(1, (double)(cost / _costLimit ?? 1));
        run.NearMisses.Offer(member, penalty, () => pair is null
            ? SearchRun.Choice(family, member, spot.Option, run.Prices.Tightest(spot.C1), run.Prices.Tightest(spot.C2))
            : Choice(spot, pair));
    }
}
