using System.Collections.Immutable;
using System.Globalization;
using PartPick.Output;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Draws the page of kept requirements: a row each, and below them all about the chosen one.</summary>
internal static class KeptDrawing
{
    private const int LeastRows = 3;
    private const int WithSentence = 64;
    private const int FigureCells = 27;

    /// <summary>The lines.</summary>
    /// <param name="page">The page.</param>
    /// <param name="currency">The currency; empty where it is not known.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in rows.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(KeptModel page, string currency, int width, int height, Glyphs glyphs)
    {
        if (page.Comparison is { IsOpen: true } comparison)
        {
            return ComparisonDrawing.Draw(comparison, currency, width, height, glyphs);
        }

        ImmutableArray<Line> below = [.. Wrong(page, width, glyphs), .. About(page, currency, width, glyphs)];
        int rows = Math.Clamp(page.Rows.Length, 1, Math.Max(LeastRows, height - 3 - below.Length));
        int first = Math.Clamp(page.At - rows + 1, 0, page.Rows.Length - rows);
        int kept = page.Rows.Length - 1;
        RankedFigure?[] found = [.. page.Rows.Select(row => page.Figures.Of(row.Requirement))];
        string[] error = Figures.LineUp([.. found.Select(each => each?.Best?.Budget is { } budget ? Figures.Ppm(budget.WorstRatio) : "")]);
        string[] margin = Figures.LineUp([.. found.Select(each => each?.Best is { } best ? Figures.Three(best.Margin.Value) : "")]);
        string count = kept == 0 ? "Wanted: nothing is kept yet" : FormattableString.Invariant($"Wanted: {kept} kept");
        return
        [
            Rules.Draw(count, page.IsAtWork ? "at work" : "", width, glyphs),
            Heading(currency, width, glyphs),
            .. page.Rows.Skip(first).Take(rows).Select((row, i) =>
                Row(page, row, found[first + i], error[first + i], margin[first + i], width, glyphs)),
            .. below,
        ];
    }

    private static Line Heading(string currency, int width, Glyphs glyphs)
    {
        LineBuilder line = Named("    ", "name", "wanted", width, glyphs, Tone.Quiet, Tone.Quiet);
        return line.Column("fit", 5, Tone.Quiet, true).Column("ppm", 8, Tone.Quiet, true).Column("margin", 8, Tone.Quiet, true)
            .Column(currency.Length is > 0 and <= 4 ? currency : "cost", 6, Tone.Quiet, true).Build();
    }

    private static Line Row(KeptModel page, KeptRow row, RankedFigure? found, string error, string margin, int width, Glyphs glyphs)
    {
        bool here = ReferenceEquals(row, page.Chosen);
        string mark = (here ? glyphs.Chosen : " ") + " " + (page.IsMarked(row) ? "* " : "  ");
        string name = row.Kept is null ? "as it stands" : row.Name;
        LineBuilder line = Named(
            mark, name, KeptWords.Short(row.Requirement), width, glyphs, row.Kept is null ? Tone.Normal : Tone.Strong, Tone.Normal);
        line.Column(found?.Fit.ToString(CultureInfo.InvariantCulture) ?? "", 5, right: true)
            .Column(error, 8, right: true).Column(margin, 8, right: true)
            .Column(found?.Best is { } best ? Figures.Money(best.Cost) : "", 6, right: true);
        return here ? line.Build().Chosen() : line.Build();
    }

    private static LineBuilder Named(string mark, string name, string wanted, int width, Glyphs glyphs, Tone tone, Tone words)
    {
        LineBuilder line = new LineBuilder(glyphs).Add(mark);
        int room = width - line.Width - FigureCells;
        if (width < WithSentence)
        {
            return line.Column(name, Math.Max(6, room - 1), tone).Add(" ");
        }

        int named = Math.Clamp(room * 2 / 5, 14, 30);
        line.Column(name, named, tone).Add("  ");
        int start = line.Width;
        return line.Words(wanted, room - named - 2, words).To(start + room - named - 2);
    }

    private static IEnumerable<Line> Wrong(KeptModel page, int width, Glyphs glyphs) => page.Problems.SelectMany(problem =>
        Paragraph.Of($"{problem}. It is left as it is.", width - 1, glyphs, " ! ", 3, Tone.Warning));

    private static IEnumerable<Line> About(KeptModel page, string currency, int width, Glyphs glyphs)
    {
        KeptRow row = page.Chosen;
        string title = row.Kept is null ? "The sentence as it stands" : row.Name;
        return
        [
            Rules.Draw(title, "", width, glyphs),
            .. row.Kept is null ? [] : Paragraph.Of(RequirementSentence.Of(row.Requirement), width - 1, glyphs, " ", 1),
            .. Paragraph.Of(State(page, row), width - 1, glyphs, " ", 1, Tone.Accent),
            .. Paragraph.Of(Best(page.Figures.Of(row.Requirement), row.Requirement, currency), width - 1, glyphs, " ", 1),
        ];
    }

    private static string State(KeptModel page, KeptRow row)
    {
        if (row.Kept is not null)
        {
            return RankedFigures.AreSame(row.Requirement, page.Rows[0].Requirement)
                ? "The sentence as it stands wants the same."
                : "Enter makes it the sentence; d puts it beside the sentence as it stands.";
        }

        return page.SameAsSentence is { } same ? $"It is kept as {same.Name}."
            : page.Rows.Skip(1).Any(each => each.Name == row.Requirement.Name)
                ? $"{row.Name} is kept with other values; n puts these in their place, or keeps them under another name."
                : "It is not kept; n keeps it under a name.";
    }

    private static string Best(RankedFigure? found, Requirement requirement, string currency) => found switch
    {
        null => "Not ranked since the program was started.",
        { Best: null } => "Nothing fits it.",
        { Best: { } best } => $"Best of {found.Fit}: {CircuitPane.Title(best)}; "
            + (best.Budget is { } budget
                ? $"error {Figures.Ppm(budget.WorstRatio)} of {ValueText.Format(requirement.BudgetRatio, Dimension.Relative)}, "
                : "")
            + $"margin {Figures.Three(best.Margin.Value)}, {Figures.Money(best.Cost)} {currency} each.",
    };
}
