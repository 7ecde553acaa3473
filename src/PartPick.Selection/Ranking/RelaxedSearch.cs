namespace PartPick.Selection.Search;

/// <summary>
/// Looks for what comes nearest where nothing fits: the same search with a wider budget, a smaller margin and no limit on cost and
/// start-up time. What it finds is then judged by the requirement as it stands.
/// </summary>
internal static class RelaxedSearch
{
    private const double BudgetFactor = 3;
    private const double MarginFactor = 3;
    private const double LeastMargin = 1;

    /// <summary>The best choices under the relaxed requirement.</summary>
    /// <param name="space">The space in which nothing fits.</param>
    /// <param name="count">How many are wanted.</param>
    /// <param name="cancellation">Ends the search.</param>
    public static IReadOnlyList<CandidateParts> Find(SearchSpace space, int count, CancellationToken cancellation)
    {
        Requirement requirement = space.Requirement;
        double budget = BudgetFactor * Math.Max(requirement.BudgetRatio, space.LeastCrystalRatio ?? 0);
        Requirement relaxed = requirement with
        {
            BudgetRatio = budget,
            Margin = Math.Min(requirement.Margin, Math.Max(LeastMargin, requirement.Margin / MarginFactor)),
            CostLimit = null,
            StartUpTimeSeconds = null,
        };
        var options = new RankingOptions { Top = count };
        var wider = new SearchSpace(relaxed, space.Source, every: false, cancellation);
        var run = new SearchRun(wider, options, null, cancellation, leadersOnly: true);
        run.Search();
        return [.. run.Leaders.Best().Take(count).Select(point => point.Choice)];
    }
}
