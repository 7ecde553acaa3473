using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Draws the limits of a picture with their words, where everything else has left room.</summary>
internal static class ChartLimits
{
    /// <summary>Draws a limit.</summary>
    /// <param name="dots">The field, with all else in it.</param>
    /// <param name="chart">The picture.</param>
    /// <param name="limit">The limit.</param>
    /// <param name="glyphs">The signs.</param>
    public static void Draw(PlotDots dots, Chart chart, ChartLimit limit, Glyphs glyphs)
    {
        Line(dots, chart, limit, glyphs);
        Words(dots, chart, limit, glyphs);
    }

    // A broken line, only where nothing else is.
    private static void Line(PlotDots dots, Chart chart, ChartLimit limit, Glyphs glyphs)
    {
        if (limit.IsUpright)
        {
            int column = dots.Column(chart.X.Place(limit.Value)) / dots.Across;
            foreach (int at in Enumerable.Range(0, dots.Height).Where(at => at % 2 == 0 && dots.IsEmpty(column, at, 1)))
            {
                dots.Words(column, at, glyphs.Vertical.ToString());
            }

            return;
        }

        int row = dots.Row(chart.Y.Place(limit.Value)) / dots.Down;
        foreach (int at in Enumerable.Range(0, dots.Width).Where(at => at % 3 != 2 && dots.IsEmpty(at, row, 1)))
        {
            dots.Words(at, row, glyphs.Horizontal.ToString());
        }
    }

    // In the row of the limit at its right end; else beside it. Nothing is written over letters.
    private static void Words(PlotDots dots, Chart chart, ChartLimit limit, Glyphs glyphs)
    {
        string text = " " + glyphs.Show(limit.Words) + " ";
        if (limit.IsUpright)
        {
            int column = dots.Column(chart.X.Place(limit.Value)) / dots.Across;
            int start = column + 1 + text.Length <= dots.Width ? column + 1 : column - text.Length;
            int free = Enumerable.Range(0, dots.Height).FirstOrDefault(at => dots.IsEmpty(start, at, text.Length), -1);
            if (free >= 0)
            {
                dots.Words(start, free, text);
            }

            return;
        }

        int row = dots.Row(chart.Y.Place(limit.Value)) / dots.Down;
        int last = dots.Width - text.Length;
        int[] starts = [.. Enumerable.Range(0, Math.Max(0, last + 1)).Select(k => last - k)];
        foreach (int beside in new[] { row, row - 1, row + 1 })
        {
            // Only the limit's own line may be written over.
            int at = starts.FirstOrDefault(start => beside == row ? dots.Holds(start, row, text.Length, glyphs.Horizontal)
                : dots.IsEmpty(start, beside, text.Length), -1);
            if (at >= 0)
            {
                dots.Words(at, beside, text);
                return;
            }
        }
    }
}
