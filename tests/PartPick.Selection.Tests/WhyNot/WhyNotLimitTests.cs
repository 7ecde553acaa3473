using PartPick.Catalog;

namespace PartPick.Selection.Tests.WhyNot;

public class WhyNotLimitTests
{
    [Theory]
    [InlineData("X")]
    [InlineData("U")]
    public void A_part_that_fits_is_in_the_list(string id)
    {
        WhyNotAnswer answer = WhyNotWorld.Ask(WhyNotWorld.Wanted, WhyNotWorld.Usual, id);

        Assert.True(answer.Fits);
        Assert.Equal((1, 1), (answer.Place!.Number, answer.Place.Listed));
        Assert.Empty(answer.Changes);
        Assert.DoesNotContain(answer.Limits, limit => limit.IsBroken);
    }

    [Fact]
    public void A_part_behind_a_better_one_says_which_and_where()
    {
        CrystalPart looser = WhyNotWorld.Crystal with { Id = "X2", ToleranceRatio = 50e-6, Offer = Sample.Price("1:0.9") };
        PartsCatalog catalog = WhyNotWorld.Of(WhyNotWorld.Crystal, looser, Sample.Inverter);

        WhyNotAnswer answer = WhyNotWorld.Ask(WhyNotWorld.Wanted, catalog, "X2");

        RankingResult ranked = Ranker.Rank(WhyNotWorld.Wanted, catalog, cancellation: TestContext.Current.CancellationToken);
        Assert.Equal(["X", "X2"], ranked.Candidates.Select(candidate => candidate.Choice.Crystal.Id));
        Assert.Equal((2, 2), (answer.Place!.Number, answer.Place.Listed));
        Assert.Equal(ranked.Candidates[0].Id, answer.Place.Above!.Id);
        Assert.Equal(ranked.Candidates[1].Id, answer.Candidate!.Id);
        Assert.Equal(ranked.Candidates[1].Score, answer.Candidate.Score, 9);
        Assert.Equal(ranked.Candidates[0].Score, answer.Place.First.Score, 9);
    }

    // Each row breaks one limit; the change is a key of the requirement.
    [Theory]
    [InlineData(Limit.Error, "budget")]
    [InlineData(Limit.Margin, "margin")]
    [InlineData(Limit.Cost, "costLimit")]
    [InlineData(Limit.StartUpTime, "startUpTime")]
    public void The_limit_that_removes_it_and_the_least_change_that_lets_it_in(Limit limit, string key)
    {
        Requirement strict = Strict(limit);
        foreach (string id in new[] { "X", "U" })
        {
            WhyNotAnswer answer = WhyNotWorld.Ask(strict, WhyNotWorld.Usual, id);

            Assert.False(answer.Fits);
            Assert.Empty(WhyNotWorld.Listed(strict, WhyNotWorld.Usual));
            Assert.Equal([limit], answer.Limits.Where(one => one.IsBroken).Select(one => one.Limit));
            NeededChange change = Assert.Single(answer.Changes[0].Changes);
            Assert.Equal(key, change.Key!.Name);
            Assert.Equal(["X", "U"], WhyNotWorld.Listed(strict.With(change), WhyNotWorld.Usual));
            Assert.Empty(WhyNotWorld.Listed(OneStepLess(strict.With(change), limit), WhyNotWorld.Usual));
            Assert.Equal((1, 1), (answer.PlaceThen!.Number, answer.PlaceThen.Listed));
        }
    }

    [Fact]
    public void A_drive_level_beyond_the_rating_is_no_matter_of_the_requirement_but_of_the_supply()
    {
        CrystalPart weak = WhyNotWorld.Crystal with { DriveLevelWatts = 20e-6 };
        PartsCatalog catalog = WhyNotWorld.Of(weak, Sample.Inverter);

        WhyNotAnswer answer = WhyNotWorld.Ask(WhyNotWorld.Wanted, catalog, "X");

        Assert.Equal([Limit.Drive], answer.Limits.Where(one => one.IsBroken).Select(one => one.Limit));
        ChangeSet rating = Assert.Single(answer.Changes, set => !set.IsOfRequirement);
        NeededChange change = Assert.Single(rating.Changes);
        double watts = Values.ValueText.Parse(change.Becomes, Values.Dimension.Power, "drive").Value;
        Assert.Equal(["X", "U"],
            WhyNotWorld.Listed(WhyNotWorld.Wanted, WhyNotWorld.Of(weak with { DriveLevelWatts = watts }, Sample.Inverter)));
        Assert.Empty(WhyNotWorld.Listed(WhyNotWorld.Wanted, WhyNotWorld.Of(weak with { DriveLevelWatts = watts / 1.02 }, Sample.Inverter)));
        Assert.All(answer.Changes.Where(set => set.IsOfRequirement), set =>
        {
            Assert.Equal("supply", Assert.Single(set.Changes).Key!.Name);
            Assert.NotEmpty(WhyNotWorld.Listed(WhyNotWorld.Wanted.With(set.Changes[0]), catalog));
        });
    }

    [Fact]
    public void Limits_that_no_single_change_lifts_are_named_together()
    {
        Requirement strict = WhyNotWorld.Wanted with { BudgetRatio = 60e-6, CostLimit = 0.5m };

        WhyNotAnswer answer = WhyNotWorld.Ask(strict, WhyNotWorld.Usual, "X");

        ChangeSet set = Assert.Single(answer.Changes);
        Assert.Equal(["budget", "costLimit"], set.Changes.Select(change => change.Key!.Name));
        Assert.Equal(["X", "U"], WhyNotWorld.Listed(set.Changes.Aggregate(strict, WhyNotWorld.With), WhyNotWorld.Usual));
        Assert.All(set.Changes, one => Assert.Empty(WhyNotWorld.Listed(strict.With(one), WhyNotWorld.Usual)));
        Assert.Equal(2, answer.Limits.Count(limit => limit.IsBroken));
    }

    [Fact]
    public void Limits_that_trade_against_each_other_each_lift_it_alone()
    {
        // The largest margin within a narrow budget, and within a wide one: between them either limit may give way.
        double narrow = Most(WhyNotWorld.Wanted with { BudgetRatio = 95e-6 });
        double wide = Most(WhyNotWorld.Wanted with { BudgetRatio = 400e-6 });
        Assert.True(wide > 1.02 * narrow, $"{wide} against {narrow}");
        Requirement strict = WhyNotWorld.Wanted with { BudgetRatio = 95e-6, Margin = Math.Sqrt(narrow * wide) };

        WhyNotAnswer answer = WhyNotWorld.Ask(strict, WhyNotWorld.Usual, "X");

        Assert.Equal(["budget", "margin"], answer.Changes.Select(set => Assert.Single(set.Changes).Key!.Name).Order());
        Assert.All(answer.Changes, set => Assert.NotEmpty(WhyNotWorld.Listed(strict.With(set.Changes[0]), WhyNotWorld.Usual)));
        Assert.Equal(answer.Changes.Select(set => set.Size).Order(), answer.Changes.Select(set => set.Size));

        static double Most(Requirement requirement) => Values.ValueText.Parse(
            WhyNotWorld.Ask(requirement with { Margin = 500 }, WhyNotWorld.Usual, "X").Changes
                .SelectMany(set => set.Changes).First(change => change.Key?.Name == "margin").Becomes,
            Values.Dimension.Number, "margin").Value;
    }

    [Fact]
    public void It_can_be_cancelled()
    {
        using var stop = new CancellationTokenSource();
        stop.Cancel();

        Assert.ThrowsAny<OperationCanceledException>(() => WhyNotSearch.Find(
            WhyNotWorld.Wanted, new WholeCatalog(WhyNotWorld.Usual), WhyNotWorld.Crystal, null, stop.Token));
    }

    // A limit beyond anything that this catalogue reaches.
    private static Requirement Strict(Limit limit) => limit switch
    {
        Limit.Error => WhyNotWorld.Wanted with { BudgetRatio = 70e-6 },
        Limit.Margin => WhyNotWorld.Wanted with { Margin = 500 },
        Limit.Cost => WhyNotWorld.Wanted with { CostLimit = 0.5m },
        _ => WhyNotWorld.Wanted with { StartUpTimeSeconds = 1e-4 },
    };

    // The change without its last step: three figures of a number, a hundredth of the currency; a time was halved in to 1 %.
    private static Requirement OneStepLess(Requirement one, Limit limit) => limit switch
    {
        Limit.Error => one with { BudgetRatio = one.BudgetRatio * (1 - 1.01e-2) },
        Limit.Margin => one with { Margin = one.Margin * (1 + 1.01e-2) },
        Limit.Cost => one with { CostLimit = one.CostLimit - 0.01m },
        _ => one with { StartUpTimeSeconds = one.StartUpTimeSeconds * (1 - 2e-2) },
    };
}
