using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection.Tests.Candidates;

/// <summary>Each hard limit by itself: just inside it holds, just outside it is broken and says by how much.</summary>
public class JudgeTests
{
    private static readonly Market Market = new(new PartsCatalog([Sample.Crystal]), 10);
    private static readonly Figures Fine = new();

    [Fact]
    public void Figures_at_their_limits_are_fit() => Assert.Empty(Judged(Fine));

    [Fact]
    public void Too_little_stock_is_a_miss() =>
        Only(Limit.Stock, Fine with { Shortage = Sample.Crystal with { Stock = 3 } }, "stock of X is 3, too few for 10 boards");

    [Fact]
    public void Cost_above_the_limit_is_a_miss() =>
        Only(Limit.Cost, Fine with { Cost = 2.51m }, "costs 2.51 EUR of 2.50 allowed", 2.51 / 2.5);

    [Fact]
    public void A_corner_that_does_not_start_is_a_miss() =>
        Only(Limit.Start, Fine with { Starts = false }, "does not build up from noise at corner");

    [Fact]
    public void Margin_below_the_required_one_is_a_miss() =>
        Only(Limit.Margin, Fine with { Margin = 4 }, "margin 4.0 of 5.0 wanted, at corner", 1.25);

    [Fact]
    public void No_margin_at_all_is_a_miss() =>
        Only(Limit.Margin, Fine with { Margin = double.NaN }, "margin NaN of 5.0 wanted, at corner", 100);

    [Fact]
    public void Error_above_the_budget_is_a_miss() =>
        Only(Limit.Error, Fine with { Error = 120e-6 }, "error 120 ppm of 100 ppm allowed", 1.2);

    [Fact]
    public void Error_that_is_not_known_is_a_miss() =>
        Assert.Equal([Limit.Error], Judged(Fine with { Error = double.NaN }).Select(miss => miss.Limit));

    [Fact]
    public void Drive_above_the_rating_is_a_miss() =>
        Only(Limit.Drive, Fine with { Drive = 600e-6 }, "drive level 600 µW of 500 µW rated, at corner", 1.2);

    [Fact]
    public void A_crystal_without_a_rating_has_no_limit_of_drive() => Assert.Empty(Judged(Fine with { Drive = 1, Rated = null }));

    [Fact]
    public void A_corner_without_a_steady_state_is_a_miss() =>
        Only(Limit.Drive, Fine with { Drive = null }, "has no steady state at a corner");

    [Fact]
    public void Starting_too_slowly_is_a_miss() =>
        Only(Limit.StartUpTime, Fine with { Time = 0.06 }, "starts in 60 ms of 50 ms allowed, at corner", 1.2);

    [Fact]
    public void A_start_that_never_comes_is_a_miss() =>
        Only(Limit.StartUpTime, Fine with { Time = null }, "start-up time is not defined where it does not build up", 100);

    [Fact]
    public void No_steady_state_is_one_miss_of_the_error_alone() =>
        Assert.Equal("has no steady state", Assert.Single(Judged(Fine with { Error = null, Drive = null })).Sentence);

    [Fact]
    public void Several_misses_come_in_the_order_of_the_limits()
    {
        Limit[] limits = [.. Judged(Fine with { Cost = 9, Margin = 1, Error = 1, Drive = 1, Time = 1 }).Select(miss => miss.Limit)];

        Assert.Equal([Limit.Cost, Limit.Margin, Limit.Error, Limit.Drive, Limit.StartUpTime], limits);
    }

    private static void Only(Limit limit, Figures figures, string sentence, double? ratio = null)
    {
        Miss miss = Assert.Single(Judged(figures));

        Assert.Equal((limit, sentence), (miss.Limit, miss.Sentence));
        Assert.True(miss.Ratio > 1);
        Assert.Equal(ratio ?? miss.Ratio, miss.Ratio, 1e-9);
    }

    private static ImmutableArray<Miss> Judged(Figures figures) => Judge.Misses(
        Sample.Requirement with { Margin = 5, CostLimit = 2.5m, StartUpTimeSeconds = 0.05 },
        Market,
        figures.Shortage,
        figures.Cost,
        figures.Starts,
        new AtCorner(figures.Margin, "corner"),
        figures.Error is { } error ? new ErrorBudget(error, []) : null,
        figures.Drive is { } drive ? new AtCorner(drive, "corner") : null,
        figures.Rated,
        figures.Time is { } time ? new AtCorner(time, "corner") : null);

    private sealed record Figures(
        Part? Shortage = null,
        decimal Cost = 2.5m,
        bool Starts = true,
        double Margin = 5,
        double? Error = 100e-6,
        double? Drive = 500e-6,
        double? Rated = 500e-6,
        double? Time = 0.05);
}
