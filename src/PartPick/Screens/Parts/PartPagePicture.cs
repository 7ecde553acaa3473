using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>Draws the open part: a line for each figure, and below them the whole of the chosen one.</summary>
/// <param name="page">The page.</param>
/// <param name="glyphs">The signs.</param>
/// <param name="width">Width in cells.</param>
internal sealed class PartPagePicture(PartPage page, Glyphs glyphs, int width)
{
    private const int MostBelow = 4;

    /// <summary>The lines above the foot.</summary>
    /// <param name="height">Number of rows.</param>
    public ImmutableArray<Line> Draw(int height)
    {
        (int key, int value, int basis) = Widths();
        ImmutableArray<Line> below = Below();
        int room = Math.Max(1, height - 2 - below.Length);
        page.Fit(room);
        Line heading = new LineBuilder(glyphs).Add("  ").Column("figure", key, Tone.Quiet).Column("value", value, Tone.Quiet)
            .Column(basis > 0 ? "basis" : "", basis, Tone.Quiet).Column("origin", Rest(key, value, basis), Tone.Quiet).Build();
        Line[] rows =
        [
            .. Enumerable.Range(page.Top, Math.Clamp(page.Figures.Length - page.Top, 0, room)).Select(i => Row(i, key, value, basis)),
        ];
        string more = page.Top + room < page.Figures.Length ? "more below" : "";
        return
        [
            Rules.Draw(page.Id ?? "", page.IsBusy ? "one moment" : more, width, glyphs), heading, .. rows,
            .. Enumerable.Repeat(Line.Empty, room - rows.Length), .. below,
        ];
    }

    private (int Key, int Value, int Basis) Widths()
    {
        int key = Math.Clamp(page.Figures.Select(figure => figure.Key.Length).DefaultIfEmpty(6).Max() + 2, 10, 20);
        int basis = width >= 70 ? 9 : 0;
        return (key, Math.Clamp((width - key - basis) / 2 - 6, 10, 40), basis);
    }

    private int Rest(int key, int value, int basis) => Math.Max(1, width - 3 - key - value - basis);

    private Line Row(int number, int key, int value, int basis)
    {
        PartFigureRow figure = page.Figures[number];
        bool here = number == page.At;
        LineBuilder line = new LineBuilder(glyphs).Column(here ? glyphs.Chosen : "", 2).Column(figure.Key, key);
        if (here && page.Typed is { } typed)
        {
            return line.Typed(typed, Math.Max(8, width - 3 - key), glyphs).Build();
        }

        line.Column(figure.Value ?? "-", value - 1, figure.Value is null ? Tone.Quiet : Tone.Strong).Add(" ");
        Tone tone = figure.Origin.Contains("by hand", StringComparison.Ordinal) || figure.Basis == "assumed" ? Tone.Accent : Tone.Quiet;
        line.Column(basis > 0 ? figure.Basis : "", basis, tone).Column(figure.Origin, Rest(key, value, basis), tone);
        return here ? line.Build().Chosen() : line.Build();
    }

    private ImmutableArray<Line> Below()
    {
        if (page.Chosen is not { } figure)
        {
            return [];
        }

        string[] pieces =
        [
            figure.Value is null ? "not stated" : figure.Value, figure.Basis == "" || figure.Value is null ? "" : figure.Basis,
            figure.Origin,
        ];
        return
        [
            Rules.Draw("", "", width, glyphs),
            .. Paragraph.Of(
                $"{figure.Key}: {string.Join("; ", pieces.Where(piece => piece.Length > 0))}", width - 2, glyphs, " ", 1).Take(MostBelow),
        ];
    }
}
