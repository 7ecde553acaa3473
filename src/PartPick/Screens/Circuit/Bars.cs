using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>Draws limits as quiet bars.</summary>
public static class Bars
{
    private const int Names = 9;
    private const int LeastCells = 8;
    private const int MostCells = 14;
    private const int LeastReason = 16;

    /// <summary>A bar: used cells, free cells, and an exclamation mark in the last cell where the limit is broken.</summary>
    /// <param name="used">The used part; null draws an empty stretch.</param>
    /// <param name="cells">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public static string Bar(double? used, int cells, Glyphs glyphs)
    {
        ArgumentNullException.ThrowIfNull(glyphs);
        if (used is not { } part)
        {
            return new string(' ', cells);
        }

        if (part > 1)
        {
            return new string(glyphs.Full, cells - 1) + "!";
        }

        // Something used is never drawn as nothing, and less than half a cell never as a whole one.
        int full = (int)Math.Clamp(Math.Round(part * cells), 0, cells);
        return full == 0 && part > 0
            ? glyphs.Trace + new string(glyphs.Free, cells - 1)
            : new string(glyphs.Full, full) + new string(glyphs.Free, cells - full);
    }

    /// <summary>One line a limit: its bar, its figure against the limit, and its reason where there is room for it.</summary>
    /// <param name="uses">The limits.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(ImmutableArray<LimitUse> uses, int width, Glyphs glyphs)
    {
        ArgumentNullException.ThrowIfNull(glyphs);
        int room = width - Width(uses, 0, glyphs);
        bool whole = room >= MostCells + 2 + uses.Max(use => glyphs.Show(use.Because).Length);
        string[] reasons = [.. uses.Select(use => glyphs.Show(whole ? use.Because : CornerWords.Shorten(use.Because)))];
        bool reasoned = room >= LeastCells + 2 + LeastReason;
        int cells = !reasoned ? Math.Clamp(room, 5, MostCells)
            : whole ? Math.Clamp(room - 2 - reasons.Max(text => text.Length), MostCells, 2 * MostCells)
            : Math.Clamp(room - 2 - reasons.Max(text => text.Length), LeastCells, MostCells);
        var lines = ImmutableArray.CreateBuilder<Line>();
        foreach ((LineBuilder line, int i) in Pictures(uses, cells, glyphs).Select((line, i) => (line, i)))
        {
            lines.Add(reasoned ? line.Add("  ").Words(reasons[i], width - line.Width, Tone.Quiet).Build() : line.Build());
        }

        return lines.ToImmutable();
    }

    /// <summary>The same with the whole reasons on lines of their own below.</summary>
    /// <param name="uses">The limits.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> DrawTall(ImmutableArray<LimitUse> uses, int width, Glyphs glyphs)
    {
        ArgumentNullException.ThrowIfNull(glyphs);
        if (Width(uses, 4, glyphs) > width)
        {
            uses = [.. uses.Select(use => use.Change.Length == 0
                ? use
                : use with { Change = "", Because = $"{use.Change}; {use.Because}" })];
        }

        int cells = Math.Clamp(width - Width(uses, 0, glyphs), 4, MostCells);
        var lines = ImmutableArray.CreateBuilder<Line>();
        foreach ((LineBuilder line, int i) in Pictures(uses, cells, glyphs).Select((line, i) => (line, i)))
        {
            lines.Add(line.Build());
            lines.AddRange(Paragraph.Of(uses[i].Because, width, glyphs, "   ", 3, Tone.Quiet));
        }

        return lines.ToImmutable();
    }

    private static int Width(ImmutableArray<LimitUse> uses, int cells, Glyphs glyphs) =>
        1 + Names + cells + 1 + Figures.LineUp([.. uses.Select(use => use.Figure)])[0].Length + 1
        + uses.Max(use => glyphs.Show(use.Against).Length) + Changes(uses);

    private static int Changes(ImmutableArray<LimitUse> uses) => uses.Max(use => use.Change.Length) is > 0 and int widest ? widest + 2 : 0;

    private static IEnumerable<LineBuilder> Pictures(ImmutableArray<LimitUse> uses, int cells, Glyphs glyphs)
    {
        LimitUse? nearest = LimitUses.Nearest(uses);
        string[] figures = Figures.LineUp([.. uses.Select(use => use.Figure)]);
        int against = uses.Max(use => glyphs.Show(use.Against).Length);
        int changes = Changes(uses);
        for (int i = 0; i < uses.Length; i++)
        {
            LimitUse use = uses[i];
            Tone tone = use.IsBroken ? Tone.Warning : ReferenceEquals(use, nearest) ? Tone.Accent : Tone.Normal;
            LineBuilder line = new LineBuilder(glyphs).Add(" ").Column(use.Word, Names, tone);
            line = use.Used is null
                ? line.Column(use.Unlimited, cells + 1, Tone.Quiet)
                : line.Add(Bar(use.Used, cells, glyphs), tone).Add(" ");
            line.Add(figures[i], tone).Add(" ").Column(use.Against, against);
            yield return changes == 0 ? line : line.Add("  ").Column(use.Change, changes - 2, Tone.Strong);
        }
    }
}
