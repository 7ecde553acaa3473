using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Draws a picture of numbers in cells of text, with axes and their numbers round it and what its signs mean below.</summary>
internal static class ChartDrawing
{
    private const int LeastRows = 4;
    private const int RowsATick = 3;
    private const int Between = 2;

    /// <summary>The picture; exactly as high as asked for.</summary>
    /// <param name="chart">The numbers.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in rows.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(Chart chart, int width, int height, Glyphs glyphs)
    {
        ImmutableArray<Line> key = ChartKey.Draw(chart, width, glyphs);
        ImmutableArray<Line> notes = [.. chart.Notes.SelectMany(note => Paragraph.Of(note, width - 1, glyphs, " ", 1, Tone.Quiet))];

        // Heading of the axis upwards, axis, numbers, and heading of the axis across; what is said in words gives way.
        const int fixedRows = 4;
        notes = [.. notes.Take(Math.Max(0, Math.Min(notes.Length, height - fixedRows - key.Length - 2 * LeastRows)))];
        key = [.. key.Take(Math.Max(0, height - fixedRows - LeastRows))];
        int rows = Math.Max(1, height - fixedRows - key.Length - notes.Length);
        ImmutableArray<AxisTick> up = chart.Y.Ticks(Math.Max(2, rows / RowsATick));
        string[] numbers = Figures.LineUp([.. up.Select(tick => glyphs.Show(tick.Text))]);
        int left = numbers.Max(text => text.Length) + 1;
        int across = Math.Max(8, width - left - 3);
        PlotDots dots = ChartPlot.Of(chart, across, rows, glyphs);
        var lines = ImmutableArray.CreateBuilder<Line>();
        lines.Add(new LineBuilder(glyphs).Add(" ").Words(chart.Y.Heading, width - 1, Tone.Quiet).Build());
        for (int row = 0; row < rows; row++)
        {
            int tick = Enumerable.Range(0, up.Length).FirstOrDefault(k => dots.Row(chart.Y.Place(up[k].Value)) / dots.Down == row, -1);
            LineBuilder line = new LineBuilder(glyphs).Column(tick < 0 ? "" : numbers[tick], left, right: true).Add(" ")
                .Add((tick < 0 ? glyphs.Vertical : glyphs.TeeLeft).ToString(), Tone.Quiet);
            dots.AddTo(line, row);
            lines.Add(line.Build());
        }

        lines.AddRange(Below(chart.X, left + 2, dots, width, glyphs));
        lines.AddRange(key);
        lines.AddRange(notes);
        return [.. lines.Take(height).Concat(Enumerable.Repeat(Line.Empty, Math.Max(0, height - lines.Count)))];
    }

    // The axis across with its ticks, their numbers below them, and its heading at the right.
    private static IEnumerable<Line> Below(ChartAxis axis, int left, PlotDots dots, int width, Glyphs glyphs)
    {
        char[] rule = new string(glyphs.Horizontal, dots.Width).ToCharArray();
        char[] numbers = new string(' ', left + dots.Width + 1).ToCharArray();
        int end = -Between;
        foreach (AxisTick tick in Ticks(axis, dots.Width, glyphs))
        {
            string text = glyphs.Show(tick.Text);
            int column = Math.Clamp(dots.Column(axis.Place(tick.Value)) / dots.Across, 0, dots.Width - 1);
            int start = Math.Clamp(left + column - (text.Length - 1) / 2, 0, numbers.Length - text.Length);
            if (start >= end + Between)
            {
                rule[column] = glyphs.TeeDown;
                text.CopyTo(0, numbers, start, text.Length);
                end = start + text.Length;
            }
        }

        yield return new LineBuilder(glyphs).Column("", left - 1).Add(glyphs.UpRight.ToString(), Tone.Quiet)
            .Add(new string(rule), Tone.Quiet).Build();
        yield return new LineBuilder(glyphs).Add(new string(numbers).TrimEnd()).Build();
        yield return new LineBuilder(glyphs).Column(axis.Heading, Math.Min(width, left + dots.Width), Tone.Quiet, right: true).Build();
    }

    private static ImmutableArray<AxisTick> Ticks(ChartAxis axis, int cells, Glyphs glyphs)
    {
        for (int most = Math.Max(2, cells / 5); ; most--)
        {
            ImmutableArray<AxisTick> ticks = axis.Ticks(most);
            int longest = ticks.IsEmpty ? 0 : ticks.Max(tick => glyphs.Show(tick.Text).Length);
            if (most <= 2 || ticks.Length * (longest + 2 * Between) <= cells)
            {
                return ticks;
            }
        }
    }
}
