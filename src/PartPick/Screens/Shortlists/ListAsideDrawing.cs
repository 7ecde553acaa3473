using System.Collections.Immutable;
using System.Globalization;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Draws a list at a glance: a quiet column beside the circuit.</summary>
internal static class ListAsideDrawing
{
    /// <summary>Its least width in cells.</summary>
    public const int Width = 39;

    /// <summary>The lines.</summary>
    /// <param name="column">The list; null where there are none.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in rows.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(ListAside? column, int width, int height, Glyphs glyphs)
    {
        column?.Ask();
        if (column?.Problem is { } problem)
        {
            return
            [
                Rules.Draw("Lists", "", width, glyphs),
                .. Paragraph.Of(problem.ToString(), width - 1, glyphs, " ! ", 3, Tone.Warning),
            ];
        }

        return column?.Glance switch
        {
            null => [Rules.Draw("Lists", column is null ? "" : "reading", width, glyphs)],
            { Rows.IsEmpty: true } =>
            [
                Rules.Draw("Lists", "none yet", width, glyphs),
                .. Paragraph.Of("s puts the chosen circuit on a list, which then stands here.", width - 1, glyphs, " ", 1, Tone.Quiet),
            ],
            { } glance => Of(glance, width, height, glyphs),
        };
    }

    private static ImmutableArray<Line> Of(ListGlance glance, int width, int height, Glyphs glyphs)
    {
        string currency = glance.Rows[0].Then.Currency;
        string[] cost = Figures.LineUp([.. glance.Rows.Select(row => row.Then.Cost is { } each ? Figures.Money(each) : "-")]);
        string[] error = Figures.LineUp([.. glance.Rows.Select(row => row.Then.ErrorWorst is { } each ? Figures.Three(each) : "-")]);
        var lines = ImmutableArray.CreateBuilder<Line>();
        int more = glance.Lists - 1;
        lines.Add(Rules.Draw(
            $"List {glance.Name}", more > 0 ? FormattableString.Invariant($"and {more} more") : "", width, glyphs, Tone.Normal));
        lines.Add(new LineBuilder(glyphs).Column("#", 3, Tone.Quiet, true).Add(" ").Column("amplifier", 12, Tone.Quiet)
            .Column("ppm", 6, Tone.Quiet, true).Column(currency.Length is > 0 and <= 4 ? currency : "cost", 6, Tone.Quiet, true).Build());
        int room = Math.Max(0, height - 2);
        int shown = glance.Rows.Length <= room ? glance.Rows.Length : Math.Max(0, room - 1);
        for (int i = 0; i < shown; i++)
        {
            ShortlistGlance row = glance.Rows[i];
            LineBuilder line = new LineBuilder(glyphs)
                .Column(row.Entry.Number.ToString(CultureInfo.InvariantCulture), 3, Tone.Quiet, true).Add(" ")
                .Column(row.Amplifier, 11).Add(" ").Column(error[i], 6, right: true).Column(cost[i], 6, right: true).Add("  ");
            (string state, Tone tone) = State(row);
            lines.Add(line.Column(state, Math.Max(0, width - line.Width), tone).Build());
        }

        if (shown < glance.Rows.Length)
        {
            lines.Add(new LineBuilder(glyphs)
                .Add(FormattableString.Invariant($"    and {glance.Rows.Length - shown} more; l shows all"), Tone.Quiet).Build());
        }

        return lines.ToImmutable();
    }

    // The figures are those of the day; what has changed since is said, and l computes it again.
    private static (string, Tone) State(ShortlistGlance row) =>
        row.HasGoneParts ? ("part gone", Tone.Warning)
        : !row.Then.IsFit ? ("unfit", Tone.Warning)
        : !row.Changes.IsEmpty ? ("changed", Tone.Accent)
        : ("", Tone.Normal);
}
