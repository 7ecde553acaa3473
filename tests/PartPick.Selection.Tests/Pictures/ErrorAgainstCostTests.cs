using System.Collections.Immutable;

namespace PartPick.Selection.Tests.Pictures;

public class ErrorAgainstCostTests
{
    private static readonly Candidate Cheap = Made("cheap", 60e-6, 0.50m, true);
    private static readonly Candidate Exact = Made("exact", 30e-6, 0.90m, true);
    private static readonly Candidate Neither = Made("neither", 70e-6, 0.95m, false);

    [Fact]
    public void Each_candidate_stands_at_its_error_and_cost_with_the_front_and_the_chosen_one_told_apart()
    {
        Chart chart = ErrorAgainstCost.Of(Answer(Cheap, Exact, Neither), Exact).Value;

        Assert.Equal(
            [
                (SpotKind.Other, 70e-6, 0.95), (SpotKind.Front, 60e-6, 0.50), (SpotKind.Chosen, 30e-6, 0.90),
            ],
            chart.Spots.Select(spot => (spot.Kind, spot.Point.X, spot.Point.Y)));
        Assert.Contains("is on the front", chart.Notes[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void Limits_near_the_candidates_are_drawn_and_far_ones_named()
    {
        Chart near = ErrorAgainstCost.Of(Answer(Cheap, Exact) with { Requirement = Wanted with { CostLimit = 1 } }, Cheap).Value;
        Chart far = ErrorAgainstCost.Of(Answer(Cheap, Exact) with { Requirement = Wanted with { CostLimit = 40 } }, Cheap).Value;

        Assert.Equal([(80e-6, true), (1.0, false)], near.Limits.Select(limit => (limit.Value, limit.IsUpright)));
        Assert.Equal([(80e-6, true)], far.Limits.Select(limit => (limit.Value, limit.IsUpright)));
        Assert.Contains("limit 40.00 is beyond the picture", far.Notes[0], StringComparison.Ordinal);
    }

    [Fact]
    public void A_chosen_one_that_is_not_in_the_list_is_drawn_too()
    {
        Chart chart = ErrorAgainstCost.Of(Answer(Cheap), Neither).Value;

        Assert.Equal([SpotKind.Front, SpotKind.Chosen], chart.Spots.Select(spot => spot.Kind));
    }

    [Fact]
    public void Where_nothing_is_fit_the_nearest_misses_stand_there()
    {
        Chart chart = ErrorAgainstCost.Of(Answer() with { NearestMisses = [Neither] }, null).Value;

        Assert.Equal("Error against cost, nearest misses", chart.Title);
        Assert.Single(chart.Spots);
        Assert.False(ErrorAgainstCost.Of(Answer(), null).IsOk);
    }

    private static Requirement Wanted => new() { OutputHz = 4e6, BudgetRatio = 80e-6 };

    private static Candidate Made(string id, double error, decimal cost, bool front) => PicturedCandidates.Gate with
    {
        Id = id,
        Budget = new ErrorBudget(0, [new BudgetTerm("all", error)]),
        Cost = cost,
        OnFront = front,
        Misses = [],
    };

    private static RankingResult Answer(params Candidate[] candidates) => new()
    {
        Requirement = Wanted, Combinations = 9, Covered = 9, Fit = null, Candidates = [.. candidates],
        Front = [], NearestMisses = [], Rejections = ImmutableDictionary<Limit, double>.Empty, IsComplete = true, ElapsedSeconds = 0,
    };
}
