using System.Collections.Immutable;
using System.Globalization;
using PartPick.Catalog;
using PartPick.Catalog.Browsing;
using PartPick.Catalog.Import;

namespace PartPick.Screens;

/// <summary>Draws the first rows of a list as they are read, and below them the whole of the chosen one.</summary>
/// <param name="page">The page.</param>
/// <param name="glyphs">The signs.</param>
/// <param name="width">Width in cells.</param>
internal sealed class ImportRowsPicture(ImportPage page, Glyphs glyphs, int width)
{
    private const int LineWidth = 6;
    private const int MostBelow = 6;

    /// <summary>The lines above the foot.</summary>
    /// <param name="height">Number of rows.</param>
    public ImmutableArray<Line> Draw(int height)
    {
        ImmutableArray<LookedAtRow> rows = page.Look?.Rows ?? [];
        ImmutableArray<ListColumn> columns = ListColumns.Of(page.Wishes.Kind);
        PartListShape shape = PartListShape.Of(columns, 0, width - LineWidth);
        ImmutableArray<Line> below = Below(rows);
        int room = Math.Max(1, height - 3 - below.Length);
        int top = Math.Clamp(page.RowAt - (room / 2), 0, Math.Max(0, rows.Length - room));
        LookedAtRow[] shown = [.. rows.Skip(top).Take(room)];
        var parts = new Queue<Line>(PartListDrawing.Rows(
            [.. shown.Where(row => row.Part is not null).Select(row => PartRow.Of(row.Part!))], columns, shape, -1, glyphs));
        Line[] lines = [.. shown.Select((row, i) => RowLine(row, top + i == page.RowAt, parts))];
        string wrong = rows.Count(row => row.Rejection is not null) is > 0 and int count
            ? $"{count} would be rejected"
            : "none would be rejected";
        return
        [
            Rules.Draw($"The first {rows.Length} rows as they are read: {wrong}", "", width, glyphs),
            .. PartListDrawing.Headings(columns, shape, -1, -1, glyphs).Select((line, i) =>
                new LineBuilder(glyphs).Column(i == 0 ? "line" : "", LineWidth, Tone.Quiet).Build().Beside(LineWidth, line)),
            .. lines, .. Enumerable.Repeat(Line.Empty, room - lines.Length), .. below,
        ];
    }

    private Line RowLine(LookedAtRow row, bool here, Queue<Line> parts)
    {
        LineBuilder number = new LineBuilder(glyphs)
            .Column(row.Line.ToString(CultureInfo.InvariantCulture), LineWidth - 1, here ? Tone.Strong : Tone.Quiet, true).Add(" ");
        Line rest = row.Rejection is { } rejection
            ? new LineBuilder(glyphs).Add(" ! ").Column(Reason(rejection), Math.Max(1, width - LineWidth - 3), Tone.Warning).Build()
            : parts.Dequeue();
        Line whole = number.Build().Beside(LineWidth, rest);
        return here ? whole.Chosen() : whole;
    }

    private static string Reason(RowRejection rejection) =>
        (rejection.Column is null ? "" : rejection.Column + ": ") + rejection.Reason;

    private ImmutableArray<Line> Below(ImmutableArray<LookedAtRow> rows)
    {
        if (page.RowAt >= rows.Length)
        {
            return [];
        }

        LookedAtRow row = rows[page.RowAt];
        string read = row.Part is { } part
            ? "read: " + string.Join(", ", PartFigures.Of(part).Where(figure => figure.Key is not ("id" or "basis"))
                .Select(figure => $"{figure.Key} {figure}" + (figure.Basis == Basis.Assumed ? " (assumed)" : "")))
            : "rejected: " + Reason(row.Rejection!);
        return
        [
            Rules.Draw("", "", width, glyphs),
            .. Paragraph.Of("cells: " + string.Join(" | ", row.Cells), width - 2, glyphs, " ", 3, Tone.Quiet).Take(2),
            .. Paragraph.Of(read, width - 2, glyphs, " ", 3, row.Part is null ? Tone.Warning : Tone.Normal).Take(MostBelow - 2),
        ];
    }
}
