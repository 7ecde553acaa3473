using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Browsing;

namespace PartPick.Screens;

/// <summary>Lays the list of parts out: what is listed above, the rows, and the texts of the chosen part below them.</summary>
/// <param name="list">The list.</param>
/// <param name="glyphs">The signs.</param>
/// <param name="width">Width in cells.</param>
internal sealed class PartListPicture(PartList list, Glyphs glyphs, int width)
{
    private const int LeastForTexts = 17;

    /// <summary>The lines above the foot.</summary>
    /// <param name="height">Number of rows.</param>
    public ImmutableArray<Line> Draw(int height)
    {
        ImmutableArray<Line> texts = height >= LeastForTexts ? Texts() : [];
        int room = height - 4 - texts.Length;
        list.Fit(room);
        PartListShape shape = PartListShape.Of(list.Columns, list.Marked, width);
        bool isOther = list.View.Rows.Kind != list.Kind;
        PartRow[] rows = isOther
            ? []
            : [.. Enumerable.Range(list.Top, Math.Clamp(list.View.Count - list.Top, 0, room)).Select(i => list.View[i])];
        ImmutableArray<Line> drawn = PartListDrawing.Rows(rows, list.Columns, shape, list.At - list.Top, glyphs);
        return
        [
            Sentence(), Rules.Draw(Counted(), Place(), width, glyphs, list.IsReading || list.IsStale ? Tone.Accent : Tone.Strong),
            .. PartListDrawing.Headings(list.Columns, shape, list.Marked, list.Ordered, glyphs), .. drawn,
            .. Enumerable.Repeat(Line.Empty, Math.Max(0, room - drawn.Length)), .. texts,
        ];
    }

    private Line Sentence()
    {
        LineBuilder line = new LineBuilder(glyphs).Add(" Listed: ").Add(list.Kind.Word(), Tone.Strong);
        if (list.Typed is { } typed)
        {
            return line.Add(" with ").Typed(typed, Math.Max(8, width - line.Width - 1), glyphs).Build();
        }

        if (list.FilterText.Length > 0)
        {
            line.Add(" with ").Add(list.FilterText, Tone.Strong);
        }

        ListColumn column = list.Columns[list.Ordered];
        string order = (column.IsNumber, list.IsDescending) switch
        {
            (true, false) => ", lowest first.",
            (true, true) => ", highest first.",
            (false, false) => ", from A to Z.",
            _ => ", from Z to A.",
        };
        return line.Add(", by ").Add(column.Name, Tone.Strong).Add(order).Build();
    }

    private string Counted()
    {
        string all = PartListDrawing.Count(list.View.Rows.Count);
        string found = list.FilterText.Length > 0 || list.View.Count != list.View.Rows.Count
            ? $"{PartListDrawing.Count(list.View.Count)} of {all}"
            : all;
        string word = list.IsReading ? ", reading on" : list.IsStale ? ", looking" : "";
        return $"{found} {list.Kind.Word()}{word}";
    }

    private string Place() => list.View.Count == 0 ? "" : $"at {PartListDrawing.Count(list.At + 1)}";

    // What the columns have no room for.
    private ImmutableArray<Line> Texts()
    {
        if (list.Chosen is not { } row)
        {
            return [Rules.Draw("", "", width, glyphs), Line.Empty, Line.Empty];
        }

        string[] keys = [.. list.Columns.Where(column => !column.IsNumber).Select(column => column.Key)];
        string Cell(string key) => row.Cells[Array.IndexOf(keys, key)];
        string[] pieces =
        [
            row.Marks.HasFlag(RowMarks.Excluded) ? "excluded" : "", row.Marks.HasFlag(RowMarks.SetByHand) ? "set by hand" : "",
            Cell("note").Length > 0 ? "note: " + Cell("note") : "", Cell("supplier"), Cell("supplierPart"), Cell("package"),
        ];
        return
        [
            Rules.Draw(row.Id, "", width, glyphs),
            new LineBuilder(glyphs).Add(" ").Words(Cell("description"), width - 2).Build(),
            new LineBuilder(glyphs).Add(" ")
                .Words(string.Join(", ", pieces.Where(piece => piece.Length > 0)), width - 2, Tone.Quiet).Build(),
        ];
    }
}
