using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Selection.Tests.Ranking;

namespace PartPick.Selection.Tests.Alternates;

/// <summary>Replacements of a part: which ones, in what order, with what changes (arithmetic: by the definitions alone).</summary>
public class AlternatesTests
{
    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    public static TheoryData<int> Seeds => [.. Enumerable.Range(0, 12)];

    [Theory]
    [MemberData(nameof(Seeds))]
    public void The_replacements_are_all_parts_that_keep_the_whole_circuit_fit(int seed)
    {
        SmallWorld world = SmallWorld.Draw(seed);
        PartsCatalog catalog = Widened(world, seed);
        if (Chosen(world.Requirement, world.Catalog, catalog) is not { } chosen)
        {
            Assert.Empty(Ranker.Rank(world.Requirement, world.Catalog, cancellation: Cancellation).Candidates);
            return;
        }

        var alternates = new Selection.Alternates(chosen, world.Requirement, catalog);
        foreach (BoardLine line in BoardLine.Of(chosen.Board))
        {
            LineAlternates found = alternates.Find(line, Cancellation);

            Assert.Equal(
                EveryPart.ThatFits(chosen.Board, line, world.Requirement, catalog),
                found.Replacements.Select(one => one.Part.Id).Order(StringComparer.Ordinal));
            Assert.Equal(found.Considered, found.Analysed + found.LeftOut.Values.Sum());
            Assert.Equal(found.Analysed, found.Replacements.Length + found.Unfit.Values.Sum());
            Assert.Equal(found.Replacements.OrderBy(one => one.Change.Size).Select(one => one.Change.Size),
                found.Replacements.Select(one => one.Change.Size));
        }
    }

    [Fact]
    public void Enough_of_the_worlds_have_replacements_and_parts_that_break_a_limit()
    {
        LineAlternates[] lines =
        [
            .. from seed in Enumerable.Range(0, 12)
               let world = SmallWorld.Draw(seed)
               let catalog = Widened(world, seed)
               let chosen = Chosen(world.Requirement, world.Catalog, catalog)
               where chosen is not null
               let alternates = new Selection.Alternates(chosen, world.Requirement, catalog)
               from line in BoardLine.Of(chosen.Board)
               select alternates.Find(line, Cancellation),
        ];

        Assert.True(lines.Sum(line => line.Replacements.Length) >= 20, $"{lines.Sum(line => line.Replacements.Length)} replacements");
        Assert.True(lines.Sum(line => line.Unfit.Values.Sum()) >= 5, $"{lines.Sum(line => line.Unfit.Values.Sum())} unfit");
        Assert.True(lines.Sum(line => line.LeftOut.Values.Sum()) >= 5, $"{lines.Sum(line => line.LeftOut.Values.Sum())} left out");
    }

    [Fact]
    public void The_number_of_threads_does_not_change_the_replacements()
    {
        (ChosenCircuit chosen, Requirement requirement) = Bench();
        BoardLine crystal = BoardLine.Of(chosen.Board).Single(line => line.Places.Contains(PartPlace.Crystal));

        var one = new Selection.Alternates(chosen, requirement, Parts, new AlternatesOptions { Threads = 1 });
        var four = new Selection.Alternates(chosen, requirement, Parts, new AlternatesOptions { Threads = 4 });

        Assert.Equal(
            one.Find(crystal, Cancellation).Replacements.Select(r => (r.Part.Id, r.Change.Size)),
            four.Find(crystal, Cancellation).Replacements.Select(r => (r.Part.Id, r.Change.Size)));
    }

    [Fact]
    public void A_part_in_two_places_is_replaced_in_both()
    {
        (ChosenCircuit chosen, Requirement requirement) = Bench();
        BoardLine load = BoardLine.Of(chosen.Board)[0];

        Assert.Equal(["C1", "C2"], load.Designators);
        Assert.Equal([PartPlace.C1, PartPlace.C2], load.Places);
        LineAlternates found = new Selection.Alternates(chosen, requirement, Parts).Find(load, Cancellation);
        Replacement equal = found.Replacements.Single(one => one.Part.Id == "C22-B");
        Assert.Same(equal.Part, equal.Candidate.Choice.C1);
        Assert.Same(equal.Part, equal.Candidate.Choice.C2);
        Assert.Equal((0, 0), (equal.Change.ErrorRatio, equal.Change.Margin));
        Assert.Equal(ChangedFigure.Cost, equal.Change.Most);
        // Both are bought together: twice 0.03 instead of twice 0.01, of a circuit of 0.73.
        Assert.Equal(0.04m, equal.Change.Cost);
        Assert.Equal(0.04 / 0.73, equal.Change.Size, 12);
    }

    [Fact]
    public void What_changes_nothing_but_the_price_comes_first()
    {
        (ChosenCircuit chosen, Requirement requirement) = Bench();
        LineAlternates found = new Selection.Alternates(chosen, requirement, Parts).Find(BoardLine.Of(chosen.Board)[0], Cancellation);

        Assert.Equal(["C22-B", "C27"], found.Replacements.Select(one => one.Part.Id));
        Assert.Equal(1, found.LeftOut[LeftOut.Stock]);
        Assert.Equal(1, found.LeftOut[LeftOut.Dielectric]);
        Assert.Equal(1, found.LeftOut[LeftOut.Voltage]);
    }

    [Fact]
    public void Too_small_a_stock_of_another_part_does_not_count_against_a_replacement()
    {
        (ChosenCircuit chosen, Requirement requirement) = Bench();
        BoardParts scarce = chosen.Board.With(PartPlace.Crystal, Sample.Crystal with { Stock = 0 });
        ChosenCircuit again = ChosenCircuit.Of(scarce, requirement, Parts).Value;

        Assert.False(again.Candidate.IsFit);
        Assert.Equal(
            ["C22-B", "C27"],
            new Selection.Alternates(again, requirement, Parts).Find(BoardLine.Of(scarce)[0], Cancellation).Replacements
                .Select(one => one.Part.Id));
    }

    [Fact]
    public void Only_equal_packages_are_taken_where_that_is_asked()
    {
        (ChosenCircuit chosen, Requirement requirement) = Bench();
        var options = new AlternatesOptions { SamePackage = true };
        LineAlternates found = new Selection.Alternates(chosen, requirement, Parts, options)
            .Find(BoardLine.Of(chosen.Board)[0], Cancellation);

        Assert.Equal(["C22-B"], found.Replacements.Select(one => one.Part.Id));
        Assert.Equal(1, found.LeftOut[LeftOut.Package]);
    }

    [Fact]
    public void A_search_that_is_stopped_ends_at_once()
    {
        (ChosenCircuit chosen, Requirement requirement) = Bench();
        Assert.ThrowsAny<OperationCanceledException>(() => new Selection.Alternates(chosen, requirement, Parts)
            .Find(BoardLine.Of(chosen.Board)[0], new CancellationToken(canceled: true)));
    }

    private static PartsCatalog Parts => AlternatesBench.Parts;

    private static (ChosenCircuit Chosen, Requirement Requirement) Bench() => (AlternatesBench.Chosen(), AlternatesBench.Requirement);

    private static ChosenCircuit? Chosen(Requirement requirement, PartsCatalog small, PartsCatalog catalog)
    {
        ImmutableArray<Candidate> candidates = Ranker.Rank(requirement, small, cancellation: Cancellation).Candidates;
        return candidates.IsEmpty
            ? null
            : ChosenCircuit.Of(BoardParts.Of(candidates[0].Choice, new Market(small, requirement.Builds)), requirement, catalog).Value;
    }

    // With some of all built-in parts, so that many have to be left out or fail.
    private static PartsCatalog Widened(SmallWorld world, int seed) => new(PartsCatalog.BuiltIn().All
        .Where(part => part switch
        {
            CapacitorPart or ResistorPart => Kept(part.Id, seed, 12),
            CrystalPart => Kept(part.Id, seed, 10),
            _ => true,
        })
        .Concat(world.Catalog.All)
        .DistinctBy(part => part.Id));

    // One part of so many, by a hash of the id that is the same in every run.
    private static bool Kept(string id, int seed, int oneOf) =>
        (int)(id.Aggregate(17u + (uint)seed, (hash, letter) => hash * 31 + letter) % (uint)oneOf) == 0;
}
