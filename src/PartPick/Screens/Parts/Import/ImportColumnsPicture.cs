using System.Collections.Immutable;
using PartPick.Catalog.Import;
using PartPick.Output;

namespace PartPick.Screens;

/// <summary>Draws what is said of a list: the file, and its columns each beside its first cells.</summary>
/// <param name="page">The page.</param>
/// <param name="glyphs">The signs.</param>
/// <param name="width">Width in cells.</param>
internal sealed class ImportColumnsPicture(ImportPage page, Glyphs glyphs, int width)
{
    private const int NameWidth = 18;
    private const int UnitWidth = 6;
    private const int SampleCells = 3;
    private const int MostWhy = 2;

    /// <summary>The lines above the foot.</summary>
    /// <param name="height">Number of rows.</param>
    public ImmutableArray<Line> Draw(int height)
    {
        var lines = new List<Line>();
        int chosen = 0;
        for (int i = 0; i < ImportChoices.FirstColumn + (page.Look?.Columns.Length ?? 0); i++)
        {
            if (i == ImportChoices.FirstColumn)
            {
                lines.Add(Rules.Draw(Found(), "", width, glyphs));
                lines.Add(Heading());
            }

            chosen = i == page.Choices.At ? lines.Count : chosen;
            lines.Add(i < ImportChoices.FirstColumn ? Setting(i) : Column(i - ImportChoices.FirstColumn));
        }

        ImmutableArray<Line> why = Why();
        int room = Math.Max(1, height - 1 - why.Length);
        int top = Math.Clamp(chosen - (room / 2), 0, Math.Max(0, lines.Count - room));
        Line[] shown = [.. lines.Skip(top).Take(room)];
        string more = top + room < lines.Count ? "more below" : "";
        return
        [
            Rules.Draw("Import a list of parts", page.IsLooking ? "looking" : more, width, glyphs), .. shown,
            .. Enumerable.Repeat(Line.Empty, room - shown.Length), .. why,
        ];
    }

    private string Found() => page.Look is { } look
        ? $"{look.Columns.Length} columns, {look.Columns.Count(column => column.Field is not null)} read; "
            + ImportPace.Layout(look.Encoding, look.Delimiter, look.HeaderLine)
        : "";

    private Line Heading() => new LineBuilder(glyphs).Add("  ")
        .Column("column", HeaderWidth, Tone.Quiet).Column("figure", NameWidth, Tone.Quiet).Column("unit", UnitWidth, Tone.Quiet).Add("first cells", Tone.Quiet).Build();

    private int HeaderWidth => Math.Clamp(width / 4, 12, 30);

    private Line Setting(int row)
    {
        bool here = row == page.Choices.At;
        LineBuilder line = new LineBuilder(glyphs).Column(here ? glyphs.Chosen : "", 2).Column(ImportChoices.Names[row], NameWidth);
        if (here && page is { Typed: { } typed, IsNaming: false })
        {
            return line.Typed(typed, Math.Max(8, width - 3 - NameWidth), glyphs).Build();
        }

        line.Column(ImportChoices.Show(page.Wishes, row), Math.Max(1, width - 3 - NameWidth), Tone.Strong);
        return here ? line.Build().Chosen() : line.Build();
    }

    private Line Column(int number)
    {
        ImportColumn column = page.Look!.Columns[number];
        bool here = number + ImportChoices.FirstColumn == page.Choices.At;
        LineBuilder line = new LineBuilder(glyphs).Column(here ? glyphs.Chosen : "", 2).Column(column.Header, HeaderWidth - 1).Add(" ");
        int rest = Math.Max(1, width - HeaderWidth - NameWidth - UnitWidth - 3);
        string cells = string.Join(" | ", page.Look.CellsOf(number, SampleCells));
        if (here && page is { Typed: { } typed, IsNaming: false })
        {
            return line.Typed(typed, NameWidth + UnitWidth - 1, glyphs).Add(" ").Column(cells, rest, Tone.Quiet).Build();
        }

        bool stated = page.Wishes.Columns.ContainsKey(column.Header);
        line.Column(column.Field ?? "-", NameWidth - 1, column.Field is null ? Tone.Quiet : stated ? Tone.Accent : Tone.Strong).Add(" ")
            .Column(column.Unit, UnitWidth - 1).Add(" ").Column(cells, rest, Tone.Quiet);
        return here ? line.Build().Chosen() : line.Build();
    }

    private ImmutableArray<Line> Why() => page.Choices.ColumnOf(page) is { } column
        ?
        [
            Rules.Draw("", "", width, glyphs),
            .. Paragraph.Of($"{column.Header}: {column.Field ?? "left out"}: {column.Why}", width - 2, glyphs, " ", 1).Take(MostWhy),
        ]
        : [];
}
