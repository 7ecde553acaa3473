using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>Draws limits as quiet bars.</summary>
public static class Bars
{
    private const int Cells = 14;

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

        // Something used is never drawn as nothing.
        int full = (int)Math.Clamp(Math.Round(part * cells), part > 0 ? 1 : 0, cells);
        return new string(glyphs.Full, full) + new string(glyphs.Free, cells - full);
    }

    /// <summary>All limits, each with its bar, its figure against the limit, and its reason.</summary>
    /// <param name="uses">The limits.</param>
    /// <param name="width">Width in cells; below 70 the reasons stand on lines of their own.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(ImmutableArray<LimitUse> uses, int width, Glyphs glyphs)
    {
        ArgumentNullException.ThrowIfNull(glyphs);
        bool narrow = width < 70;
        LimitUse? nearest = LimitUses.Nearest(uses);
        string[] figures = Figures.LineUp([.. uses.Select(use => use.Figure)]);
        int figureWidth = figures[0].Length;
        int againstWidth = uses.Max(use => glyphs.Show(use.Against).Length);
        int cells = narrow ? Math.Clamp(width - 15 - figureWidth - againstWidth, 4, Cells) : width < 100 ? Cells : 2 * Cells;
        var lines = ImmutableArray.CreateBuilder<Line>();
        for (int i = 0; i < uses.Length; i++)
        {
            LimitUse use = uses[i];
            Tone tone = use.IsBroken ? Tone.Warning : ReferenceEquals(use, nearest) ? Tone.Accent : Tone.Normal;
            LineBuilder line = new LineBuilder(glyphs).Add(" ").Column(use.Word, 9, tone)
                .Add(use.Used is null ? " " : "[", Tone.Quiet).Add(Bar(use.Used, cells, glyphs), tone)
                .Add(use.Used is null ? "  " : "] ", Tone.Quiet)
                .Add(figures[i]).Add(" ").Column(use.Against, againstWidth);
            if (narrow)
            {
                lines.Add(line.Build());
                lines.Add(new LineBuilder(glyphs).To(4).Words(use.Because, width - 4, Tone.Quiet).Build());
                continue;
            }

            line.Add("  ");
            lines.Add(line.Words(use.Because, width - line.Width, Tone.Quiet).Build());
        }

        return lines.ToImmutable();
    }
}
