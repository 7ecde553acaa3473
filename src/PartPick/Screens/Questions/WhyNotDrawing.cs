using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Browsing;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Draws the choice of the part, and the answer why it is not in the list.</summary>
internal static class WhyNotDrawing
{
    private const int Ids = 26;
    private const int KindWidth = 11;

    /// <summary>The lines.</summary>
    public static ImmutableArray<Line> Draw(WhyNotPage page, int width, int height, Glyphs glyphs) =>
        page.Id is null ? Picker(page.Picker, width, height, glyphs) : Answer(page, width, height, glyphs);

    private static ImmutableArray<Line> Picker(PartPicker picker, int width, int height, Glyphs glyphs)
    {
        string count = picker.Count == 0 && picker.IsLooking ? ""
            : picker.Count == 1 ? "1 part"
            : FormattableString.Invariant($"{picker.Count} crystals and amplifiers");
        LineBuilder typed = new LineBuilder(glyphs).Add(" Part with ");
        var lines = ImmutableArray.CreateBuilder<Line>();
        lines.Add(Rules.Draw(
            picker.IsLooking ? "Why not: reading" : "Why not which part?", count, width, glyphs, picker.IsLooking ? Tone.Accent
                : Tone.Strong));
        lines.Add(typed.Typed(picker.Typed, Math.Max(8, width - typed.Width - 1), glyphs).Build());
        if (picker.Problem is { } problem)
        {
            lines.AddRange(Paragraph.Of(problem.ToString(), width - 1, glyphs, " ! ", 3, Tone.Warning));
            return lines.ToImmutable();
        }

        int rows = Math.Max(1, height - lines.Count);
        int first = Math.Clamp(picker.At - rows + 1, 0, Math.Max(0, picker.Matches.Length - rows));
        lines.AddRange(picker.Matches.Skip(first).Take(rows).Select((row, i) => Row(row, first + i == picker.At, width, glyphs)));
        if (picker.Matches.IsEmpty && !picker.IsLooking)
        {
            lines.Add(new LineBuilder(glyphs).Add("   ").Words("No crystal or amplifier has these words.", width - 4, Tone.Quiet).Build());
        }

        return lines.ToImmutable();
    }

    private static Line Row(PartRow row, bool here, int width, Glyphs glyphs)
    {
        LineBuilder line = new LineBuilder(glyphs).Add(here ? glyphs.Chosen + " " : "  ").Column(row.Id, Ids).Add(" ");
        if (width - line.Width > KindWidth + 10)
        {
            line.Column(row.Kind.Word()[..^1], KindWidth, Tone.Quiet).Words(Description(row), width - line.Width - KindWidth - 1,
                Tone.Quiet);
        }

        return here ? line.Build().Chosen() : line.Build();
    }

    private static string Description(PartRow row)
    {
        int at = ListColumns.Of(row.Kind).Where(column => !column.IsNumber).TakeWhile(column => column.Key != "description").Count();
        return at < row.Cells.Length ? row.Cells[at] : "";
    }

    private static ImmutableArray<Line> Answer(WhyNotPage page, int width, int height, Glyphs glyphs)
    {
        string title = page.IsLooking ? $"Why not {page.Id}: computing" : $"Why not {page.Id}";
        if (page.Answer is not { } answer)
        {
            string words = page.Problem?.ToString() ?? (page.Doing.Length == 0 ? "" : char.ToUpperInvariant(page.Doing[0])
                + page.Doing[1..] + " …");
            return
            [
                Rules.Draw(title, "", width, glyphs, page.IsLooking ? Tone.Accent : Tone.Strong),
                .. Paragraph.Of(words, width - 1, glyphs, page.Problem is null ? " " : " ! ", 3, page.Problem is null ? Tone.Quiet
                    : Tone.Warning),
            ];
        }

        ImmutableArray<Line> shown = page.Scroll.Cut(WhyNotLines.Of(answer, width, glyphs), height - 1);
        return [Rules.Draw(title, page.Scroll.HasMore ? "more below" : "", width, glyphs), .. shown];
    }
}
