using PartPick.Selection;

namespace PartPick.Output;

/// <summary>A ranking as comma-separated values; the nearest misses where nothing fits.</summary>
internal static class RankCsv
{
    private static readonly string[] Header =
    [
        "id", "circuit", "crystal", "amplifier", "tap", "c1 (F)", "c2 (F)", "rs (ohm)", "errorWorst (ppm)", "errorRss (ppm)",
        "startUpMargin", "startUpTime (s)", "driveLevel (W)", "outputFrequency (Hz)", "cost", "currency", "score", "onFront", "misses",
        "warnings",
    ];

    /// <summary>Prints it.</summary>
    public static void Write(TextWriter output, RankView view) =>
        CsvOutput.Write(output, Header, (view.NothingFits ? view.Result.NearestMisses : view.Result.Candidates).Select(Row));

    private static IEnumerable<string> Row(Candidate candidate) =>
    [
        candidate.Id,
        candidate.Choice.Circuit.Word(),
        candidate.Choice.Crystal.Id,
        candidate.Choice.Amplifier.Id,
        Figures.Whole(candidate.Choice.Tap),
        Figures.Exact(candidate.Choice.C1.ValueFarads),
        Figures.Exact(candidate.Choice.C2.ValueFarads),
        Figures.Exact(candidate.Choice.Series?.ValueOhms),
        Figures.Exact(candidate.Budget?.WorstRatio * 1e6),
        Figures.Exact(candidate.Budget?.RssRatio * 1e6),
        Figures.Exact(candidate.Margin.Value),
        Figures.Exact(candidate.StartUpTime?.Value),
        Figures.Exact(candidate.Drive?.Value),
        Figures.Exact(candidate.OutputHz),
        candidate.Cost.ToString(System.Globalization.CultureInfo.InvariantCulture),
        candidate.Currency,
        Figures.Exact(candidate.Score),
        candidate.OnFront ? "true" : "false",
        string.Join(" | ", candidate.Misses.Select(miss => miss.Sentence)),
        string.Join(" | ", candidate.Warnings),
    ];
}
