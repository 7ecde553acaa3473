using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Draws two circuits side by side: which parts differ, the figures lined up, and which is better in each.</summary>
internal static class DifferencesDrawing
{
    private const int Names = 23;
    private const int Units = 5;
    private const int Least = 9;
    private const int Better = 8;

    /// <summary>The lines, with a rule above them.</summary>
    /// <param name="model">The circuits.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in rows.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(DifferencesModel model, int width, int height, Glyphs glyphs)
    {
        ImmutableArray<Line> shown = model.Scroll.Cut(Page(model.Pair!, width, glyphs), height - 1);
        return [Rules.Draw("Side by side", model.Scroll.HasMore ? "more below" : "", width, glyphs), .. shown];
    }

    private static ImmutableArray<Line> Page(CircuitPair pair, int width, Glyphs glyphs)
    {
        ImmutableArray<FigurePair> figures = PairFigures.Of(pair);
        var lines = ImmutableArray.CreateBuilder<Line>();
        lines.Add(Title("A", pair.AIs, pair.A));
        lines.Add(Title("B", pair.BIs, pair.B));
        lines.AddRange(Paragraph.Of(PairFigures.Sentence(figures), width, glyphs, " ", 1, Tone.Strong));
        Broken("A", pair.A);
        Broken("B", pair.B);
        lines.AddRange(PairParts.Different(pair, width, glyphs));
        lines.AddRange(FigureLines(figures, width, glyphs));
        lines.Add(Line.Empty);
        lines.AddRange(Paragraph.Of(PairParts.Same(pair), width, glyphs, " ", 1, Tone.Quiet));
        if (width >= 2 * Schematic.Width)
        {
            lines.Add(Line.Empty);
            lines.AddRange(Drawings(pair, width / 2, glyphs));
        }

        return lines.ToImmutable();

        Line Title(string letter, string what, Candidate candidate) => new LineBuilder(glyphs).Add(" ")
            .Add(letter, Tone.Strong).Add($" {what}: ", Tone.Quiet).Words(CircuitPane.Title(candidate), width - 13).Build();

        void Broken(string letter, Candidate candidate)
        {
            foreach (Miss miss in candidate.Misses)
            {
                lines.AddRange(Paragraph.Of($"{letter}: {miss.Sentence}", width, glyphs, " ! ", 3, Tone.Warning));
            }
        }
    }

    private static IEnumerable<Line> FigureLines(ImmutableArray<FigurePair> figures, int width, Glyphs glyphs)
    {
        string[] lined = Figures.LineUp([.. figures.Select(one => one.TextA), .. figures.Select(one => one.TextB)]);
        string[] differences = Figures.LineUp([.. figures.Select(one => one.Difference)]);
        int cells = Math.Max(Least, Math.Max(lined[0].Length, differences[0].Length) + 2);
        int names = Math.Clamp(width - 1 - Units - 3 * cells - Better, 10, Names);
        yield return Row("", "", "A", "B", "B less A", "better", "");
        for (int i = 0; i < figures.Length; i++)
        {
            FigurePair one = figures[i];
            yield return Row(one.Name, one.Unit, lined[i], lined[figures.Length + i], differences[i], one.Better, one.Better);
        }

        Line Row(string name, string unit, string a, string b, string difference, string better, string which) =>
            new LineBuilder(glyphs).Add(" ").Column(name, names, Tone.Quiet).Column(unit, Units, Tone.Quiet)
                .Column(a, cells, which == "A" ? Tone.Accent : Tone.Normal, right: true)
                .Column(b, cells, which == "B" ? Tone.Accent : Tone.Normal, right: true)
                .Column(difference, cells, Tone.Quiet, right: true)
                .Add("  ").Column(better, Better - 2, which.Length > 0 ? Tone.Accent : Tone.Quiet).Build();
    }

    private static IEnumerable<Line> Drawings(CircuitPair pair, int left, Glyphs glyphs)
    {
        ImmutableArray<Line> a = Schematic.Draw(pair.A, glyphs);
        ImmutableArray<Line> b = Schematic.Draw(pair.B, glyphs);
        yield return new LineBuilder(glyphs).Add(" A", Tone.Strong).To(left).Add(" B", Tone.Strong).Build();
        for (int i = 0; i < Math.Max(a.Length, b.Length); i++)
        {
            yield return (i < a.Length ? a[i] : Line.Empty).Beside(left, i < b.Length ? b[i] : Line.Empty);
        }
    }
}
