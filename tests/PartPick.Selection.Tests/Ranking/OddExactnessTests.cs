using PartPick.Selection.Search;

namespace PartPick.Selection.Tests.Ranking;

/// <summary>
/// In hundreds of small worlds, with equal costs, equal errors, empty kinds and single parts among them, the front and the first 50
/// equal what trying every combination gives (arithmetic: both by the same definitions).
/// </summary>
public class OddExactnessTests
{
    private const int Worlds = 304;

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    public static TheoryData<int, string> Numbers
    {
        get
        {
            var data = new TheoryData<int, string>();
            foreach (int number in Enumerable.Range(0, Worlds))
            {
                data.Add(number, OddWorld.Oddity(number));
            }

            return data;
        }
    }

    [Theory]
    [MemberData(nameof(Numbers))]
    public void Front_and_first_fifty_are_those_of_every_combination(int number, string oddity)
    {
        SmallWorld world = OddWorld.Draw(number);
        var every = new EveryCombination(world.Requirement, world.Catalog);

        RankingResult best = Ranker.Rank(world.Requirement, world.Catalog, cancellation: Cancellation);
        RankingResult all = Ranker.Rank(world.Requirement, world.Catalog, new RankingOptions { All = true }, cancellation: Cancellation);

        Assert.NotEmpty(oddity);
        Assert.Equal(every.Front(), best.Front);
        Assert.Equal(every.BestOfGroups().Take(50), best.Candidates.Select(candidate => candidate.Id));
        Assert.Equal(every.All().Take(50), all.Candidates.Select(candidate => candidate.Id));
        Assert.Equal(every.Fit, all.Fit);
    }

    [Fact]
    public void Worlds_of_every_circuit_and_oddity_hold_something_fit()
    {
        (CircuitKind, string)[] fit =
        [
            .. Enumerable.Range(0, Worlds).Select(number => (Number: number, World: OddWorld.Draw(number)))
                .Where(one => !Ranker.Rank(one.World.Requirement, one.World.Catalog, cancellation: Cancellation).Candidates.IsEmpty)
                .Select(one => ((CircuitKind)(one.Number % 4), OddWorld.Oddity(one.Number))),
        ];
        Assert.True(fit.Length >= Worlds / 4, $"{fit.Length} of {Worlds}");
        Assert.Equal(4, fit.Select(one => one.Item1).Distinct().Count());
        Assert.All(
            ["equal costs", "equal errors", "equal errors and costs", "single parts"],
            oddity => Assert.Contains(fit, one => one.Item2 == oddity));
    }

    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    [InlineData(4)]
    [InlineData(6)]
    [InlineData(11)]
    [InlineData(23)]
    public void Sharing_what_depends_on_values_alone_changes_no_figure(int number)
    {
        SmallWorld world = OddWorld.Draw(number);
        var space = new SearchSpace(world.Requirement, world.Catalog, every: true);
        var builder = new CandidateBuilder(world.Requirement, space.Market);
        CandidateParts[] choices =
        [
            .. from family in space.Families
               from member in family.Members
               from option in Enumerable.Range(0, family.Options.Length)
               from c1 in space.Capacitors.SelectMany(value => value.Contenders)
               from c2 in space.Capacitors.SelectMany(value => value.Contenders)
               select SearchRun.Choice(family, member, option, c1.Part, c2.Part),
        ];
        var built = choices.AsParallel().Select(builder.Build).OfType<Candidate>().Where(candidate => candidate.IsFit)
            .Select(one => (one.Id, one.Budget!.WorstRatio, one.Margin.Value, one.Cost)).OrderBy(one => one.Id, StringComparer.Ordinal);
        var every = new EveryCombination(world.Requirement, world.Catalog);

        Assert.Equal(choices.Length, every.Tried);
        Assert.Equal(built, every.FitOnes.Select(one => (one.Id, one.ErrorRatio, one.Margin, one.Cost))
            .OrderBy(one => one.Id, StringComparer.Ordinal));
    }
}
