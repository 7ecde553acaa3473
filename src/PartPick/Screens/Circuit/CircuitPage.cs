using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>The whole circuit as a page that scrolls.</summary>
internal static class CircuitPage
{
    private const int Share = 20;

    /// <summary>The page.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="result">The ranking that it belongs to.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    /// <param name="swaps">What can be changed in it, and was; null for nothing.</param>
    public static ImmutableArray<Line> Draw(
        Candidate candidate, RankingResult result, int width, Glyphs glyphs, SwapModel? swaps = null)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        ArgumentNullException.ThrowIfNull(result);
        Requirement requirement = result.Requirement;
        var lines = ImmutableArray.CreateBuilder<Line>();
        Watch(Broken.Sentences(candidate, swaps?.Ranked));
        lines.AddRange(DrawingLimitsAndParts(candidate, requirement, width, glyphs, swaps));
        if (candidate.Misses.Length + candidate.Warnings.Length > 0)
        {
            lines.Add(Line.Empty);
            lines.Add(Heading("To be watched", glyphs));
            Watch(candidate.Misses.Select(miss => miss.Sentence).Concat(candidate.Warnings));
        }

        lines.Add(Line.Empty);
        lines.AddRange(PartsTable.Draw(candidate, glyphs));
        lines.AddRange(Budget(candidate, requirement, width, glyphs));
        lines.AddRange(Corners(candidate, width, glyphs));
        lines.AddRange(CircuitFigures.Draw(candidate, glyphs));
        lines.Add(Heading("Why this circuit", glyphs));
        foreach (string reason in Reasons.Of(candidate, result))
        {
            lines.AddRange(Paragraph.Of(reason, width, glyphs, " ", 1));
        }

        lines.Add(Line.Empty);
        lines.Add(Heading("Before it is built", glyphs));
        foreach (string caution in Cautions.Of(requirement))
        {
            lines.AddRange(Paragraph.Of(caution, width, glyphs, " ", 1));
        }

        return lines.ToImmutable();

        void Watch(IEnumerable<string> sentences) =>
            lines.AddRange(sentences.SelectMany(text => Paragraph.Of(text, width, glyphs, " ! ", 3, Tone.Warning)));
    }

    internal static Line Heading(string text, Glyphs glyphs) => new LineBuilder(glyphs).Add(" " + text, Tone.Strong).Build();

    // The limits stand above the drawing with the parts that can be changed beside it, or all follow each other.
    private static IEnumerable<Line> DrawingLimitsAndParts(
        Candidate candidate, Requirement requirement, int width, Glyphs glyphs, SwapModel? swaps)
    {
        ImmutableArray<LimitUse> uses = LimitUses.Of(candidate, requirement);
        if (swaps is { Ranked: { } ranked } && !ReferenceEquals(ranked, candidate))
        {
            uses = LimitChanges.Mark(uses, ranked, candidate, requirement);
        }

        ImmutableArray<Line> drawing = Schematic.Draw(candidate, glyphs);
        if (width < Schematic.Width + 36)
        {
            ImmutableArray<Line> narrow = swaps is null ? [] : [.. SwapTable.Draw(swaps, width, glyphs), Line.Empty];
            return [.. Bars.DrawTall(uses, width, glyphs), Line.Empty, .. narrow, .. drawing];
        }

        int left = width >= Schematic.Width + 64 ? Schematic.Width + 3 : Schematic.Width;
        ImmutableArray<Line> beside = swaps is null ? [] : SwapTable.Draw(swaps, width - left, glyphs);
        return [.. Bars.Draw(uses, width, glyphs), Line.Empty, .. SideBySide(drawing, left, beside)];
    }

    private static IEnumerable<Line> SideBySide(ImmutableArray<Line> left, int width, ImmutableArray<Line> right)
    {
        for (int i = 0; i < Math.Max(left.Length, right.Length); i++)
        {
            yield return (i < left.Length ? left[i] : Line.Empty).Beside(width, i < right.Length ? right[i] : Line.Empty);
        }
    }

    /// <summary>The error budget as bars: an empty line, a heading, and a line for each term and sum.</summary>
    internal static IEnumerable<Line> Budget(Candidate candidate, Requirement requirement, int width, Glyphs glyphs)
    {
        yield return Line.Empty;
        if (candidate.Budget is not { } budget)
        {
            yield return Heading("Frequency error: none, as it does not run", glyphs);
            yield break;
        }

        string limit = ValueText.Format(requirement.BudgetRatio, Dimension.Relative);
        yield return Heading($"Frequency error, ppm; the bars are shares of {limit}", glyphs);
        BudgetBar[] bars = [.. BudgetBars.Of(budget)];
        string[] texts = Figures.LineUp(
            [.. bars.Select((bar, i) => bar.IsSpread ? glyphs.Show("±" + Figures.Ppm(bar.Ratio)) : i == 0 ? Signed(bar.Ratio) : Figures.Ppm(bar.Ratio))]);
        for (int i = 0; i < bars.Length; i++)
        {
            yield return Row(texts[i], Math.Abs(bars[i].Ratio), bars[i].Name + (bars[i].RestsOn is { } rest ? $" ({rest})" : ""));
        }

        Line Row(string figure, double ratio, string words)
        {
            LineBuilder line = new LineBuilder(glyphs).Add(" ").Add(figure).Add(" ")
                .Add(Bars.Bar(ratio / requirement.BudgetRatio, Share, glyphs)).Add(" ");
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
