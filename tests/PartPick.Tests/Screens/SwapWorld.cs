using PartPick.Catalog;
using PartPick.Screens;
using PartPick.Selection;

namespace PartPick.Tests.Screens;

/// <summary>A few parts for a counter of 1 kHz, really ranked, on a screen in which they can be changed.</summary>
internal static class SwapWorld
{
    private static readonly PartsCatalog BuiltIn = PartsCatalog.BuiltIn();

    public static Requirement Wanted { get; } = new()
    {
        OutputHz = 1000, Waveform = Waveform.Square, BudgetRatio = 100e-6, TemperatureMinCelsius = -10, StartUpTimeSeconds = 0.05,
        Builds = 200, CostLimit = 2.5m, Circuits = [CircuitKind.Counter],
    };

    /// <summary>Crystals for two stages, all counters, capacitors and resistors of the usual values, each with its tolerances.</summary>
    public static PartsCatalog Parts { get; } = new(
    [
        .. BuiltIn.Crystals.Where(part => part.FrequencyHz == 4.096e6).Take(4),
        .. BuiltIn.Crystals.Where(part => part.FrequencyHz == 8.192e6).Take(3),
        .. BuiltIn.Counters,
        .. BuiltIn.Capacitors.Where(part => part.ValueFarads is > 9e-12 and < 50e-12 or > 90e-9 and < 110e-9),
        .. BuiltIn.Resistors.Where(part => part.ValueOhms is > 300 and < 1300 or 100e3 or 1e6 or 2.2e6 or 4.7e6),
    ]);

    private static readonly Lazy<RankingResult> Best = new(() => Ranker.Rank(Wanted, Parts));

    private static readonly Lazy<RankingResult> Everything = new(
        () => Ranker.Rank(Wanted, Parts, new RankingOptions { All = true, Top = null }));

    /// <summary>The best of each group.</summary>
    public static RankingResult Ranking => Best.Value;

    /// <summary>Every fit circuit with its figures, as the ranking lists them.</summary>
    public static RankingResult All => Everything.Value;

    public static Bench Open(int width = 80, int height = 24, Glyphs? glyphs = null)
    {
        var bench = new Bench(width, height, new FakeRanking { Answer = _ => Ranking }, Wanted, glyphs);
        bench.ChangeParts(Parts);
        return bench;
    }

    public static object? Figures(Candidate? one) => one is null
        ? null
        : (one.Id, one.Budget?.WorstRatio, one.Budget?.RssRatio, one.Margin, one.Drive, one.StartUpTime, one.Cost, one.OutputHz);
}
