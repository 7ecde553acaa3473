using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Selection.Tests.Ranking;

namespace PartPick.Selection.Tests.Swaps;

/// <summary>A circuit changed part by part has the figures of the ranking (arithmetic: both by the same definitions).</summary>
public class SwapTests
{
    private static readonly RankingOptions Everything = new() { All = true, Top = null };

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory]
    [InlineData(1)]
    [InlineData(3)]
    [InlineData(11)]
    [InlineData(15)]
    [InlineData(16)]
    [InlineData(24)]
    [InlineData(37)]
    public void A_changed_circuit_is_the_one_that_the_ranking_puts_first_of_those_values_and_has_its_figures(int seed)
    {
        SmallWorld world = SmallWorld.Draw(seed);
        RankingResult all = Ranker.Rank(world.Requirement, world.Catalog, Everything, cancellation: Cancellation);
        var desk = new SwapDesk(world.Requirement, world.Catalog);
        BoardParts ranked = BoardOf(all.Candidates[0], desk);
        foreach (SwapOption option in SwapPlaces.Of(ranked.Choice).SelectMany(place => desk.Options(place, ranked)))
        {
            ImmutableArray<BoardParts> boards = SwapChanges.None.With(option).Boards(ranked, desk.Support);
            SwapTrial trial = SwapTrial.Of(boards, world.Requirement, desk.Market, all, Cancellation);
            Candidate? first = all.Candidates.FirstOrDefault(one => boards.Any(board => board.Choice == one.Choice));
            if (option.Place != SwapPlace.Feedback && IsTried(trial.Board.Choice))
            {
                Assert.Equal(first?.Id, trial.Candidate!.IsFit ? trial.Candidate.Id : null);
                Assert.Equal(Figures(first), trial.Candidate.IsFit ? Figures(trial.Candidate) : null);

                // The search scores with its own error figure, near that of the analysis.
                Assert.Equal(first?.Score ?? double.NaN, trial.Candidate.Score, 1e-3);
            }
        }
    }

    [Fact]
    public void Taking_the_changes_back_leaves_the_ranked_circuit_with_its_figures()
    {
        (RankingResult ranking, SwapDesk desk, BoardParts ranked) = River();
        SwapOption other = desk.Options(SwapPlace.C1, ranked)[0];
        SwapChanges back = SwapChanges.None.With(other).Without(SwapPlace.C1);
        Assert.True(back.IsEmpty);
        SwapTrial trial = SwapTrial.Of(back.Boards(ranked, desk.Support), desk.Requirement, desk.Market, ranking, Cancellation);
        Assert.Equal(Figures(ranking.Candidates[0]), Figures(trial.Candidate));
        SwapOption same = desk.Options(SwapPlace.C1, ranked).Single(option => option.StandsIn(ranked));
        Assert.True(SwapChanges.None.With(same).In(ranked).IsEmpty);
        Assert.False(SwapChanges.None.With(other).In(ranked).IsEmpty);
    }

    [Fact]
    public void Values_are_in_order_and_a_direct_connection_comes_before_the_smallest_resistor()
    {
        (_, SwapDesk desk, BoardParts ranked) = River();
        double[] farads = [.. desk.Options(SwapPlace.C2, ranked).Select(option => ((CapacitorPart)option.Parts[0]!).ValueFarads)];
        Assert.True(farads.Length > 10);
        Assert.Equal(farads.Order().Distinct(), farads);
        ImmutableArray<SwapOption> series = desk.Options(SwapPlace.Series, ranked);
        Assert.Equal(("direct", null), (series[0].Words, series[0].Parts.Single()));
        Assert.Single(series, option => option.StandsIn(ranked));
        Assert.Null(SwapChanges.None.With(series[0]).Boards(ranked, desk.Support).Single().Choice.Series);
    }

    [Fact]
    public void The_crystal_goes_with_the_stage_so_that_the_output_stays()
    {
        (RankingResult ranking, SwapDesk desk, BoardParts ranked) = River();
        ImmutableArray<SwapOption> stages = desk.Options(SwapPlace.Stage, ranked);
        Assert.True(stages.Length > 1);
        foreach (SwapOption stage in stages)
        {
            SwapTrial trial = SwapTrial.Of(
                SwapChanges.None.With(stage).Boards(ranked, desk.Support), desk.Requirement, desk.Market, ranking, Cancellation);
            Assert.Equal(stage.Tap, trial.Candidate!.Choice.Tap);
            Assert.Equal(1000 * Math.Pow(2, stage.Tap), trial.Candidate.Choice.Crystal.FrequencyHz, 1e-3);
            Assert.Equal(
                SupportParts.For(CircuitKind.Counter, trial.Candidate.Choice.Crystal.FrequencyHz, desk.Market), trial.Board.Support);
        }
    }

    [Fact]
    public void Every_crystal_and_amplifier_on_offer_is_specified_for_the_job()
    {
        (_, SwapDesk desk, BoardParts ranked) = River();
        ImmutableArray<SwapOption> crystals = desk.Options(SwapPlace.Crystal, ranked);
        Assert.True(crystals.Length > 1);
        Assert.All(crystals, option => Assert.Equal(4.096e6, ((CrystalPart)option.Parts[0]!).FrequencyHz, 1.0));
        double[] loads = [.. crystals.Select(option => ((CrystalPart)option.Parts[0]!).LoadFarads ?? 0)];
        Assert.Equal(loads.Order(), loads);
        ImmutableArray<SwapOption> amplifiers = desk.Options(SwapPlace.Amplifier, ranked);
        Assert.True(amplifiers.Length > 1);
        Assert.All(amplifiers, option => Assert.Contains(12, ((CounterPart)option.Parts[0]!).Taps));
    }

    [Fact]
    public void A_circuit_that_no_longer_starts_breaks_the_start_and_the_margin()
    {
        (RankingResult ranking, SwapDesk desk, BoardParts ranked) = River();
        SwapOption largest = desk.Options(SwapPlace.Series, ranked)[^1];
        SwapTrial trial = SwapTrial.Of(
            SwapChanges.None.With(largest).Boards(ranked, desk.Support), desk.Requirement, desk.Market, ranking, Cancellation);
        Assert.Contains(trial.Misses, miss => miss.Limit == Limit.Start);
        Assert.True(double.IsNaN(trial.Candidate!.Score));
    }

    private static (RankingResult Ranking, SwapDesk Desk, BoardParts Ranked) River()
    {
        PartsCatalog catalog = PartsCatalog.BuiltIn();
        var requirement = new Requirement
        {
            OutputHz = 1000, Waveform = Waveform.Square, BudgetRatio = 80e-6, TemperatureMinCelsius = -10, TemperatureMaxCelsius = 50,
            Builds = 200, Circuits = [CircuitKind.Counter],
        };
        RankingResult ranking = Ranker.Rank(requirement, catalog, new RankingOptions { Top = 1 }, cancellation: Cancellation);
        var desk = new SwapDesk(requirement, catalog);
        return (ranking, desk, BoardOf(ranking.Candidates[0], desk));
    }

    private static BoardParts BoardOf(Candidate candidate, SwapDesk desk) => new(candidate.Choice, desk.Support(candidate.Choice));

    // A ranking tries two equal base resistors only.
    private static bool IsTried(CandidateParts choice) => choice.BaseBottom is null || choice.BaseBottom == choice.BaseTop;

    private static object? Figures(Candidate? one) => one is null
        ? null
        : (one.Budget!.WorstRatio, one.Budget.RssRatio, one.Margin, one.Drive, one.StartUpTime, one.Cost, one.OutputHz);
}
