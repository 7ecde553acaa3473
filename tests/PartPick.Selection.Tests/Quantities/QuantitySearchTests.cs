using PartPick.Catalog;
using PartPick.Selection.Tests.Ranking;

namespace PartPick.Selection.Tests.Quantities;

/// <summary>The best candidate for every number of boards, against a ranking of the catalogue for each of them (arithmetic).</summary>
public class QuantitySearchTests
{
    private const int Most = 110;

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    public static TheoryData<int> Seeds => [.. Enumerable.Range(0, 12)];

    [Theory]
    [MemberData(nameof(Seeds))]
    public void The_choice_is_what_a_ranking_for_every_number_of_boards_gives(int seed)
    {
        SmallWorld world = Stepped(seed);

        QuantityChoice every = QuantitySearch.Find(
            world.Requirement, world.Catalog, null, new QuantityOptions { Most = Most, EveryUpTo = int.MaxValue }, null, Cancellation);
        QuantityChoice ranked = QuantitySearch.Find(
            world.Requirement, world.Catalog, null, new QuantityOptions { Most = Most, EveryUpTo = -1 }, null, Cancellation);

        Assert.True(every.IsExact);
        Assert.Empty(every.RankedAt);
        Assert.False(ranked.IsExact);
        Assert.InRange(ranked.RankedAt.Length, 3, 12);
        Assert.Equal((1, Most), (every.Spans[0].From, every.Spans[^1].To));
        for (int builds = 1; builds <= Most; builds++)
        {
            Candidate? best = Best(world, builds);
            Assert.Equal(best?.Id, every.At(builds).Candidate?.Id);
            Assert.Equal(best?.Id, ranked.At(builds).Candidate?.Id);
        }

        Assert.All(every.Spans, span => Assert.Equal(Best(world, span.From)?.Cost, span.Candidate?.Cost));
        Assert.All(every.Spans, span => Assert.Equal(Best(world, span.To)?.Cost, span.CostAtEnd));
        Assert.All(every.Spans.Zip(every.Spans.Skip(1)), pair => Assert.Equal(pair.First.To + 1, pair.Second.From));
    }

    [Fact]
    public void In_enough_of_the_worlds_the_choice_changes_with_the_number_of_boards() =>
        Assert.True(Enumerable.Range(0, 12).Select(Stepped).Count(world => QuantitySearch.Find(
            world.Requirement, world.Catalog, null, new QuantityOptions { Most = Most, EveryUpTo = int.MaxValue }, null, Cancellation)
            .Spans.Length > 1) >= 4);

    [Fact]
    public void A_search_that_is_stopped_ends_at_once()
    {
        SmallWorld world = Stepped(0);
        Assert.ThrowsAny<OperationCanceledException>(() => QuantitySearch.Find(
            world.Requirement, world.Catalog, null, null, null, new CancellationToken(canceled: true)));
    }

    private static Candidate? Best(SmallWorld world, int builds)
    {
        RankingResult result = Ranker.Rank(world.Requirement with { Builds = builds }, world.Catalog, cancellation: Cancellation);
        return result.Candidates.IsEmpty ? null : result.Candidates[0];
    }

    // Resistors of the same values, which are cheaper for some numbers of boards.
    private static IEnumerable<ResistorPart> Twins(PartsCatalog catalog) => catalog.Resistors.Select(part => part with { Id = part.Id + "-twin" });

    // Small worlds in which every part has its own price breaks, and some a small stock, a minimum order or a multiple.
    private static SmallWorld Stepped(int seed)
    {
        SmallWorld world = SmallWorld.Draw(seed);
        var random = new Random(seed);
        return world with
        {
            Catalog = new PartsCatalog(world.Catalog.All.Concat(Twins(world.Catalog)).Select(part => part with
            {
                Stock = random.Next(5) == 0 ? random.Next(20, 200) : 1000,
                Offer = part.Offer with
                {
                    Prices =
                    [
                        part.Offer.Prices[0],
                        new PriceBreak(random.Next(5, 40), part.Offer.Prices[0].UnitPrice * random.Next(50, 95) / 100),
                    ],
                    MinimumOrder = random.Next(4) == 0 ? random.Next(2, 50) : 1,
                    Multiple = random.Next(4) == 0 ? random.Next(2, 20) : 1,
                },
            })),
            Requirement = world.Requirement with { Weights = new Weights(1, 1, 2), CostLimit = random.Next(2) == 0 ? 2m : null },
        };
    }
}
