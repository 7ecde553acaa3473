using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>The whole circuit as a page that scrolls.</summary>
public static class CircuitPage
{
    private const int Share = 20;

    /// <summary>The page.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="result">The ranking that it belongs to.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(Candidate candidate, RankingResult result, int width, Glyphs glyphs)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        ArgumentNullException.ThrowIfNull(result);
        Requirement requirement = result.Requirement;
        var lines = ImmutableArray.CreateBuilder<Line>();
        foreach (string text in candidate.Misses.Select(miss => miss.Sentence).Concat(candidate.Warnings))
        {
            lines.AddRange(Paragraph.Of(text, width, glyphs, " ! ", 3, Tone.Warning));
        }

        lines.AddRange(Bars.Draw(LimitUses.Of(candidate, requirement), width, glyphs));
        lines.AddRange(DrawingAndParts(candidate, width, glyphs));
        lines.AddRange(Budget(candidate, requirement, width, glyphs));
        lines.AddRange(Corners(candidate, width, glyphs));
        lines.AddRange(CircuitFigures.Draw(candidate, glyphs));
        lines.Add(Heading("Why this circuit", glyphs));
        foreach (string reason in Reasons.Of(candidate, result))
        {
            lines.AddRange(Paragraph.Of(reason, width, glyphs, " ", 1));
        }

        return lines.ToImmutable();
    }

    internal static Line Heading(string text, Glyphs glyphs) => new LineBuilder(glyphs).Add(" " + text, Tone.Strong).Build();

    private static IEnumerable<Line> DrawingAndParts(Candidate candidate, int width, Glyphs glyphs)
    {
        ImmutableArray<Line> drawing = Schematic.Draw(candidate, glyphs);
        ImmutableArray<Line> parts = Parts(candidate, glyphs);
        yield return Line.Empty;
        if (width < Schematic.Width + 64)
        {
            foreach (Line line in drawing)
            {
                yield return new LineBuilder(glyphs).Add("  ").Build().Beside(2, line);
            }

            yield return Line.Empty;
            foreach (Line line in parts)
            {
                yield return line;
            }

            yield break;
        }

        for (int i = 0; i < Math.Max(drawing.Length, parts.Length); i++)
        {
            Line left = i < drawing.Length ? drawing[i] : Line.Empty;
            yield return left.Beside(Schematic.Width + 3, i < parts.Length ? parts[i] : Line.Empty);
        }
    }

    private static ImmutableArray<Line> Parts(Candidate candidate, Glyphs glyphs)
    {
        var lines = ImmutableArray.CreateBuilder<Line>();
        int value = Math.Max(5, candidate.Parts.Max(use => glyphs.Show(use.Value).Length));
        int id = candidate.Parts.Max(use => use.Part.Id.Length);
        lines.Add(new LineBuilder(glyphs).Add(" ").Column("part", 6, Tone.Quiet).Column("value", value + 2, Tone.Quiet)
            .Column("id", id + 2, Tone.Quiet).Add("place", Tone.Quiet).Build());
        foreach (PartUse use in candidate.Parts)
        {
            lines.Add(new LineBuilder(glyphs).Add(" ").Column(use.Designator, 6, Tone.Strong).Column(use.Value, value + 2)
                .Column(use.Part.Id, id + 2).Add(use.Role, Tone.Quiet).Build());
        }

        return lines.ToImmutable();
    }

    private static IEnumerable<Line> Budget(Candidate candidate, Requirement requirement, int width, Glyphs glyphs)
    {
        yield return Line.Empty;
        if (candidate.Budget is not { } budget)
        {
            yield return Heading("Frequency error: none, as it does not run", glyphs);
            yield break;
        }

        string limit = ValueText.Format(requirement.BudgetRatio, Dimension.Relative);
        yield return Heading($"Frequency error, ppm; the bars are shares of {limit}", glyphs);
        BudgetTerm[] terms = [.. budget.Terms.OrderByDescending(term => term.Ratio)];
        string[] texts = Figures.LineUp(
        [
            Signed(budget.CentreRatio), .. terms.Select(term => glyphs.Show("±" + Figures.Ppm(term.Ratio))),
            Figures.Ppm(budget.WorstRatio), Figures.Ppm(budget.RssRatio),
        ]);
        yield return Row(texts[0], Math.Abs(budget.CentreRatio), "centre: nominal values at 25 °C");
        for (int i = 0; i < terms.Length; i++)
        {
            yield return Row(texts[i + 1], terms[i].Ratio, terms[i].Term + (terms[i].RestsOn is { } rest ? $" ({rest})" : ""));
        }

        yield return Row(texts[^2], budget.WorstRatio, "worst case, all together: the ranked figure");
        yield return Row(texts[^1], budget.RssRatio, "root of the sum of squares");

        Line Row(string figure, double ratio, string words)
        {
            LineBuilder line = new LineBuilder(glyphs).Add(" ").Add(figure).Add(" [", Tone.Quiet)
                .Add(Bars.Bar(ratio / requirement.BudgetRatio, Share, glyphs)).Add("] ", Tone.Quiet);
            return line.Words(words, width - line.Width).Build();
        }
    }

    private static string Signed(double ratio) => (ratio < 0 ? "-" : "+") + Figures.Ppm(Math.Abs(ratio));

    private static IEnumerable<Line> Corners(Candidate candidate, int width, Glyphs glyphs)
    {
        yield return Line.Empty;
        yield return Heading("Worst corners", glyphs);
        yield return Row("least start-up margin", Figures.Three(candidate.Margin.Value), candidate.Margin.Corner);
        if (candidate.Drive is { } drive)
        {
            yield return Row("highest drive level", ValueText.Format(drive.Value, Dimension.Power), drive.Corner);
        }

        if (candidate.StartUpTime is { } time)
        {
            yield return Row("longest start-up", ValueText.Format(time.Value, Dimension.Time), time.Corner);
        }

        yield return Line.Empty;

        Line Row(string what, string figure, string corner)
        {
            LineBuilder line = new LineBuilder(glyphs).Add(" ").Column(what, 23).Column(figure, 10).Add("  ");
            return line.Words("at " + corner, width - line.Width, Tone.Quiet).Build();
        }
    }
}
