using System.Collections.Immutable;
using System.Globalization;
using PartPick.Output;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Draws what a candidate costs over the number of boards: picture, table, where it turns, and the best candidates.</summary>
internal static class QuantityDrawing
{
    private const int Widest = 64;
    private const int Height = 8;

    /// <summary>The lines.</summary>
    /// <param name="page">The page.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in rows.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(QuantityPage page, int width, int height, Glyphs glyphs)
    {
        ImmutableArray<Line> all = page switch
        {
            { Problem: { } problem } => Paragraph.Of(problem.ToString(), width - 1, glyphs, " ! ", 3, Tone.Warning),
            { View: { } view } => Page(view, width, glyphs),
            _ => [],
        };
        ImmutableArray<Line> shown = page.Scroll.Cut(all, height - 1);
        string state = !page.IsLooking ? "" : page.View is null ? ": reading" : ": computing the best";
        string more = page.Scroll.HasMore ? "more below" : "";
        return [Rules.Draw("Cost over boards" + state, more, width, glyphs, page.IsLooking ? Tone.Accent : Tone.Strong), .. shown];
    }

    private static ImmutableArray<Line> Page(QuantityView view, int width, Glyphs glyphs)
    {
        var lines = ImmutableArray.CreateBuilder<Line>();
        string currency = view.Chosen.Candidate.Currency;
        int across = Math.Clamp(width - 14, 20, Widest);
        Say(ReviewWords.Name(view.Review), Tone.Strong);
        Say($"One board ({currency}) over the number of boards, both logarithmic");
        foreach (string line in CostPicture.Draw(view.Curve.Most, view.Curve.UnitCost, across, Height, view.Ascii))
        {
            lines.Add(new LineBuilder(glyphs).Add(line, Tone.Normal).Build());
        }

        if (view.Choice is { } choice)
        {
            lines.Add(new LineBuilder(glyphs).Add("    best  ", Tone.Quiet).Add(QuantityTable.Letters(view, choice, across), Tone.Accent).Build());
        }

        lines.Add(Line.Empty);
        using var table = new StringWriter(CultureInfo.InvariantCulture);
        QuantityTable.WriteRows(table, view);
        foreach (string line in table.ToString().TrimEnd().Split(table.NewLine))
        {
            lines.Add(new LineBuilder(glyphs).Add(" " + line).Build());
        }

        lines.Add(Line.Empty);
        foreach (string line in QuantityTable.Turns(view))
        {
            Say(line);
        }

        if (view.Choice is { } found)
        {
            lines.Add(Line.Empty);
            Say("The best candidate by score:", Tone.Strong);
            foreach (ChoiceSpan span in found.Spans)
            {
                Say(Span(view, span));
            }

            Say(ChoiceTable.Exactness(found), Tone.Quiet);
        }

        return lines.ToImmutable();

        void Say(string text, Tone tone = Tone.Normal) => lines.AddRange(Paragraph.Of(text, width - 1, glyphs, " ", 3, tone));
    }

    private static string Span(QuantityView view, ChoiceSpan span)
    {
        string range = FormattableString.Invariant($"{view.Letter(span.Candidate)} from {span.From} to {span.To} boards: ");
        return span.Candidate is not { } candidate ? range + "nothing fits."
            : range + $"{candidate.Choice.Circuit.Word()} {candidate.Choice.Amplifier.Id} with {candidate.Choice.Crystal.Id}, "
                + $"{candidate.Choice.C1.Id}, {candidate.Choice.C2.Id}; "
                + $"error {(candidate.Budget is { } budget ? Figures.Ppm(budget.WorstRatio) : "-")} ppm, "
                + $"margin {Figures.Three(candidate.Margin.Value)}; {QuantityTable.Money(candidate.Cost)}"
                + (span.CostAtEnd is { } last ? $" at first, {QuantityTable.Money(last)} at last." : ".");
    }
}
