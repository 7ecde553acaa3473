using PartPick.Catalog;
using PartPick.Selection.Tests.Ranking;

namespace PartPick.Selection.Tests.Alternates;

/// <summary>What else meets a requirement without a part, against trying every combination of what is left (arithmetic).</summary>
public class ShortageTests
{
    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    public static TheoryData<int> Seeds => [.. Enumerable.Range(0, 12)];

    [Theory]
    [MemberData(nameof(Seeds))]
    public void Without_the_crystal_every_combination_round_the_same_amplifier_is_ranked(int seed)
    {
        SmallWorld world = SmallWorld.Draw(seed);
        if (Best(world) is not { } chosen)
        {
            return;
        }

        Shortage shortage = ShortageSearch.Find(
            chosen, LineOf(chosen, PartPlace.Crystal), world.Requirement, world.Catalog, cancellation: Cancellation);

        CandidateParts choice = chosen.Board.Choice;
        var left = new PartsCatalog(world.Catalog.All.Where(part =>
            part.Id != choice.Crystal.Id && (part is CrystalPart or CapacitorPart or ResistorPart || part.Id == choice.Amplifier.Id)));
        var every = new EveryCombination(world.Requirement with { Circuits = [choice.Circuit] }, left);
        Assert.Equal(every.BestOfGroups(), shortage.Candidates.Select(one => one.Candidate.Id));
        Assert.All(shortage.Candidates, one => Assert.Equal(choice.Amplifier.Id, one.Candidate.Choice.Amplifier.Id));
        Assert.All(shortage.Candidates, one =>
            Assert.Equal(one.Candidate.Cost - chosen.Candidate.Cost, one.Change.Cost));
    }

    [Theory]
    [MemberData(nameof(Seeds))]
    public void Without_the_amplifier_every_combination_round_the_same_crystal_is_ranked(int seed)
    {
        SmallWorld world = SmallWorld.Draw(seed);
        if (Best(world) is not { } chosen)
        {
            return;
        }

        Shortage shortage = ShortageSearch.Find(
            chosen, LineOf(chosen, PartPlace.Amplifier), world.Requirement, world.Catalog, cancellation: Cancellation);

        CandidateParts choice = chosen.Board.Choice;
        var left = new PartsCatalog(world.Catalog.All.Where(part =>
            part.Id != choice.Amplifier.Id && (part is not CrystalPart || part.Id == choice.Crystal.Id)));
        Assert.Equal(
            new EveryCombination(world.Requirement, left).BestOfGroups(),
            shortage.Candidates.Select(one => one.Candidate.Id));
    }

    [Fact]
    public void Enough_of_the_worlds_hold_something_without_the_crystal() =>
        Assert.True(Enumerable.Range(0, 12).Select(SmallWorld.Draw).Count(world => Best(world) is { } chosen && ShortageSearch.Find(
            chosen, LineOf(chosen, PartPlace.Crystal), world.Requirement, world.Catalog, cancellation: Cancellation)
            .Candidates.Length > 0) >= 2);

    [Fact]
    public void Equal_parts_of_other_suppliers_go_with_it_where_that_is_asked()
    {
        CrystalPart twin = Sample.Crystal with { Id = "X-twin", Supplier = "another", Stock = 5, Offer = Sample.Price("1:0.4") };
        CrystalPart other = Sample.Crystal with { Id = "X-other", ResistanceOhms = 50 };
        CapacitorPart load = Sample.Capacitor(22e-12, "C22") with { TemperatureCoefficientPerKelvin = 30e-6 };
        var catalog = new PartsCatalog([Sample.Crystal, twin, other, Sample.Inverter, load, Sample.Resistor(1e6, "R1M")]);
        Requirement requirement = Sample.Requirement with { BudgetRatio = 600e-6, Margin = 2, Builds = 1 };
        var choice = new CandidateParts
        {
            Circuit = CircuitKind.Gate, Crystal = Sample.Crystal, Amplifier = Sample.Inverter, C1 = load, C2 = load,
        };
        ChosenCircuit chosen = ChosenCircuit.Of(BoardParts.Of(choice, new Market(catalog, 1)), requirement, catalog).Value;
        BoardLine line = LineOf(chosen, PartPlace.Crystal);

        Shortage alone = ShortageSearch.Find(chosen, line, requirement, catalog, cancellation: Cancellation);
        Shortage both = ShortageSearch.Find(chosen, line, requirement, catalog, equalToo: true, cancellation: Cancellation);

        Assert.Equal(["X"], alone.Gone.Select(part => part.Id));
        Assert.Equal(["X-other", "X-twin"], alone.Candidates.Select(one => one.Candidate.Choice.Crystal.Id).Order(StringComparer.Ordinal));
        Assert.Equal(["X", "X-twin"], both.Gone.Select(part => part.Id));
        Assert.Equal(["X-other"], both.Candidates.Select(one => one.Candidate.Choice.Crystal.Id));
    }

    private static BoardLine LineOf(ChosenCircuit chosen, PartPlace place) =>
        BoardLine.Of(chosen.Board).Single(line => line.Places.Contains(place));

    private static ChosenCircuit? Best(SmallWorld world) =>
        Ranker.Rank(world.Requirement, world.Catalog, cancellation: Cancellation).Candidates is [var best, ..]
            ? ChosenCircuit.Of(
                BoardParts.Of(best.Choice, new Market(world.Catalog, world.Requirement.Builds)), world.Requirement, world.Catalog).Value
            : null;
}
