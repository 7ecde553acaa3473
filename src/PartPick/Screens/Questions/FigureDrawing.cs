using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>
/// Draws the figures of a candidate at the left, and how the chosen one comes about beside them, or below where it is
/// narrow.
/// </summary>
internal static class FigureDrawing
{
    private const int Names = 27;
    private const int Least = 74;
    private const int FewRows = 4;

    /// <summary>The lines.</summary>
    public static ImmutableArray<Line> Draw(FigurePage page, int width, int height, Glyphs glyphs)
    {
        if (page.Figures.IsEmpty)
        {
            return [Rules.Draw("How the figures come about: computing", "", width, glyphs, Tone.Accent)];
        }

        int room = height - 1;
        bool narrow = width < Least;
        int few = narrow ? Math.Min(FewRows, page.Figures.Length) : room;
        int left = narrow ? width : Math.Min(Names + page.Figures.Max(figure => glyphs.Show(Short(figure.Value)).Length) + 4, width / 2);
        ImmutableArray<Line> list = List(page, few, left, glyphs);
        ImmutableArray<Line> words = page.Scroll.Cut(
            Explained(page.Figures[page.At], narrow ? width : width - left - 2, glyphs), narrow ? room - few - 1 : room);
        string place = FormattableString.Invariant($"{page.At + 1} of {page.Figures.Length}")
            + (page.Scroll.HasMore ? ", more below: PgDn" : "");
        Line title = Rules.Draw($"How it comes about: {CircuitPane.ShortTitle(page.Candidate!)}", place, width, glyphs);
        if (narrow)
        {
            return [title, .. list, Rules.Draw("", page.Scroll.HasMore ? "more below: PgDn" : "", width, glyphs), .. words];
        }

        var bar = new Line([new Span(glyphs.Vertical.ToString(), Tone.Quiet)]);
        return
        [
            title,
            .. Enumerable.Range(0, room).Select(i => (i < list.Length ? list[i] : Line.Empty).Beside(left, bar)
                .Beside(left + 1, i < words.Length ? words[i] : Line.Empty)),
        ];
    }

    private static ImmutableArray<Line> List(FigurePage page, int rows, int width, Glyphs glyphs)
    {
        int first = Math.Clamp(page.At - rows / 2, 0, Math.Max(0, page.Figures.Length - rows));
        return
        [
            .. page.Figures.Skip(first).Take(rows).Select((figure, i) =>
            {
                bool here = first + i == page.At;
                Line line = new LineBuilder(glyphs).Add(here ? glyphs.Chosen + " " : "  ").Column(figure.Name, Names)
                    .Column(Short(figure.Value), Math.Max(4, width - Names - 3), Tone.Normal, right: true).Build();
                return here ? line.Chosen() : line;
            }),
        ];
    }

    // What a figure rests on is said in the text beside it.
    private static string Short(string value)
    {
        int bracket = value.IndexOf(" (", StringComparison.Ordinal);
        return bracket < 0 ? value : value[..bracket];
    }

    private static ImmutableArray<Line> Explained(FigureWorking figure, int width, Glyphs glyphs)
    {
        var lines = ImmutableArray.CreateBuilder<Line>();
        Add($"{figure.Name}: {figure.Value}", " ", 1, Tone.Strong);
        Add(figure.Definition, " ", 1, Tone.Normal);
        foreach (WorkingStep step in figure.Steps)
        {
            lines.Add(Line.Empty);
            Add($"{step.Quantity}: {step.Formula}", " ", 3, Tone.Normal);
            if (step.Numbers.Length > 0 && step.Numbers != step.Value)
            {
                Add("= " + step.Numbers, "   ", 5, Tone.Normal);
            }

            Add("= " + step.Value, "   ", 5, Tone.Accent);
            Add($"from: {step.Source}", "   ", 5, Tone.Quiet);
        }

        return lines.ToImmutable();

        void Add(string text, string first, int indent, Tone tone) =>
            lines.AddRange(Paragraph.Of(text, width - 1, glyphs, first, indent, tone));
    }
}
