using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>The figures of two circuits, those with a limit first.</summary>
internal static class PairFigures
{
    /// <summary>The figures.</summary>
    /// <param name="pair">The circuits.</param>
    public static ImmutableArray<FigurePair> Of(CircuitPair pair)
    {
        // What counts of the drive level is its share of what each crystal is rated for, where both are.
        bool rated = pair is { A.RatedDriveWatts: not null, B.RatedDriveWatts: not null };
        bool priced = pair.A.Currency == pair.B.Currency;
        return
        [
            Figure("error, worst case", "ppm", -1, one => one.Budget?.WorstRatio * 1e6),
            Figure("margin, worst corner", "", 1, one => one.Margin.Value),
            Figure("drive, worst corner", "µW", rated ? 0 : -1, one => one.Drive?.Value * 1e6),
            Figure("  of the rated", "%", -1, one => one.Drive?.Value / one.RatedDriveWatts * 100),
            Figure("start-up, longest", "ms", -1, one => one.StartUpTime?.Value * 1e3),
            Figure("cost of a board", priced ? pair.A.Currency : "", priced ? -1 : 0, one => (double)one.Cost, 3),
            Figure("score", "", -1, one => one.IsFit ? one.Score : null, 3),
            Figure("limits broken", "", -1, one => one.Misses.Length, 0),
            Figure("error, root of squares", "ppm", -1, one => one.Budget?.RssRatio * 1e6),
            Figure("centre of the error", "ppm", 0, one => one.Budget?.CentreRatio * 1e6),
            Figure("load on the crystal", "pF", 0, one => one.Result.Steady?.LoadFarads * 1e12),
            Figure("gain margin", "", 1, one => one.Result.StartUp.GainMargin),
            Figure("output swing, p-p", "V", 0, one => one.Result.Steady?.OutputSwingVolts),
        ];

        FigurePair Figure(string name, string unit, int sense, Func<Candidate, double?> of, int? decimals = null) =>
            new(name, unit, of(pair.A), of(pair.B), sense, decimals);
    }

    /// <summary>Which is better in what, as a sentence; of the figures that are judged.</summary>
    /// <param name="figures">The figures.</param>
    public static string Sentence(ImmutableArray<FigurePair> figures)
    {
        (string Word, FigurePair Figure)[] judged =
        [
            ("error", figures[0]), ("margin", figures[1]), ("drive", figures[2].Sense == 0 ? figures[3] : figures[2]),
            ("start-up", figures[4]), ("cost", figures[5]),
        ];
        string[] parts =
        [
            .. new[] { ("A", "A is better in "), ("B", "B is better in "), ("", "they are the same in ") }
                .Select(group => (
                    Begin: group.Item2,
                    Words: judged.Where(one => one.Figure.Better == group.Item1).Select(one => one.Word).ToArray()))
                .Where(group => group.Words.Length > 0)
                .Select(group => group.Begin + WordList.Of(group.Words)),
        ];
        string text = string.Join("; ", parts);
        return char.ToUpperInvariant(text[0]) + text[1..] + ".";
    }
}
