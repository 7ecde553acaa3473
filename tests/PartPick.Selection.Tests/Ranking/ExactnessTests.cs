namespace PartPick.Selection.Tests.Ranking;

/// <summary>The front and the order equal what trying every combination gives (arithmetic: both by the same definitions).</summary>
public class ExactnessTests
{
    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    public static TheoryData<int> Seeds => [.. Enumerable.Range(0, 24)];

    [Theory]
    [MemberData(nameof(Seeds))]
    public void The_search_answers_what_trying_every_combination_gives(int seed)
    {
        SmallWorld world = SmallWorld.Draw(seed);
        var every = new EveryCombination(world.Requirement, world.Catalog);

        RankingResult best = Ranker.Rank(world.Requirement, world.Catalog, cancellation: Cancellation);
        var everything = new RankingOptions { All = true, Top = null };
        RankingResult all = Ranker.Rank(world.Requirement, world.Catalog, everything, cancellation: Cancellation);

        Assert.Equal(every.Front(), best.Front);
        Assert.Equal(every.BestOfGroups(), best.Candidates.Select(candidate => candidate.Id));
        Assert.Equal(every.All(), all.Candidates.Select(candidate => candidate.Id));
        Assert.Equal(every.Fit, all.Fit);
    }

    [Fact]
    public void Enough_of_the_worlds_hold_something_fit() =>
        Assert.True(Enumerable.Range(0, 24).Count(seed => new EveryCombinationCount(seed).HasFit) >= 8);

    private sealed record EveryCombinationCount(int Seed)
    {
        public bool HasFit
        {
            get
            {
                SmallWorld world = SmallWorld.Draw(Seed);
                return Ranker.Rank(world.Requirement, world.Catalog, cancellation: Cancellation).Candidates.Length > 0;
            }
        }
    }

    [Fact]
    public void The_number_of_threads_does_not_change_the_answer()
    {
        SmallWorld world = SmallWorld.Draw(3);
        RankingResult one = Ranker.Rank(world.Requirement, world.Catalog, new RankingOptions { Threads = 1 }, cancellation: Cancellation);
        RankingResult four = Ranker.Rank(world.Requirement, world.Catalog, new RankingOptions { Threads = 4 }, cancellation: Cancellation);
        Assert.Equal(one.Front, four.Front);
        Assert.Equal(one.Candidates.Select(c => (c.Id, c.Score)), four.Candidates.Select(c => (c.Id, c.Score)));
    }
}
