using System.Collections.Immutable;
using System.Globalization;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Says why nothing fits: which limit removed how many combinations.</summary>
internal static class NothingFits
{
    private const int Cells = 20;
    private const int Words = 28;

    /// <summary>The lines.</summary>
    /// <param name="result">The ranking.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(RankingResult result, int width, Glyphs glyphs)
    {
        if (!(result.Combinations > 0))
        {
            string output = ValueText.FormatExact(result.Requirement.OutputHz, Dimension.Frequency);
            return Paragraph.Of(
                $"No crystal of the catalogue gives {output} with the wanted circuits and waveform, whole or divided by a counter.",
                width - 1, glyphs, "  ", 2);
        }

        (Limit Limit, double Count)[] removed =
            [.. result.Rejections.Where(pair => pair.Value > 0).OrderByDescending(pair => pair.Value).ThenBy(pair => pair.Key)
                .Select(pair => (pair.Key, pair.Value))];
        if (removed.Length == 0)
        {
            return [];
        }

        var lines = ImmutableArray.CreateBuilder<Line>();
        lines.Add(new LineBuilder(glyphs).Add("  ")
            .Words("What removed the combinations, each at the first limit it breaks:", width - 2, Tone.Quiet).Build());
        string[] counts = [.. removed.Select(one => Grouped(one.Count))];
        int widest = counts.Max(count => count.Length);
        for (int i = 0; i < removed.Length; i++)
        {
            lines.Add(new LineBuilder(glyphs).Add("  ")
                .Column(Trade.Words(removed[i].Limit), Words, i == 0 ? Tone.Strong : Tone.Normal)
                .Add(Bars.Bar(Math.Min(1, removed[i].Count / result.Combinations), Cells, glyphs)).Add(" ")
                .Add(counts[i].PadLeft(widest)).Build());
        }

        return lines.ToImmutable();
    }

    private static string Grouped(double count) =>
        count.ToString("N0", CultureInfo.InvariantCulture).Replace(',', ' ');
}
