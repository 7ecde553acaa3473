using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Draws the figures of a candidate at the left, and how the chosen one comes about beside them, or below where it is narrow.</summary>
internal static class FigureDrawing
{
    private const int Names = 28;
    private const int Least = 74;
    private const int FewRows = 4;

    /// <summary>The lines.</summary>
    public static ImmutableArray<Line> Draw(FigurePage page, int width, int height, Glyphs glyphs)
    {
        string place = page.Figures.IsEmpty ? "" : FormattableString.Invariant($"{page.At + 1} of {page.Figures.Length}");
        Line title = Rules.Draw(
            page.IsLooking ? "How the figures come about: computing" : $"How it comes about: {CircuitPane.ShortTitle(page.Candidate!)}",
            place, width, glyphs, page.IsLooking ? Tone.Accent : Tone.Strong);
        if (page.Figures.IsEmpty)
        {
            return [title];
        }

        int room = height - 1;
        if (width < Least)
        {
            int few = Math.Min(FewRows, page.Figures.Length);
            return [title, .. List(page, few, width, glyphs), Rules.Draw("", "", width, glyphs), .. Explained(page.Figures[page.At], width, glyphs).Take(room - few - 1)];
        }

        int left = Math.Min(Names + page.Figures.Max(figure => glyphs.Show(Short(figure.Value)).Length) + 4, width / 2);
        ImmutableArray<Line> list = List(page, room, left, glyphs);
        ImmutableArray<Line> words = Explained(page.Figures[page.At], width - left - 2, glyphs);
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
            if (step.Numbers.Length > 0)
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
