using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>The chosen circuit in short: its parts, its limits, what is to be watched.</summary>
public static class CircuitPane
{
    /// <summary>The title: what it is made of.</summary>
    /// <param name="candidate">The candidate.</param>
    public static string Title(Candidate candidate)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        string stage = Trade.Stage(candidate.Choice.Tap);
        return $"{candidate.Choice.Circuit.Word()} {candidate.Choice.Amplifier.Id}, {candidate.Choice.Crystal.Id}"
            + (stage.Length == 0 ? "" : ", " + stage);
    }

    /// <summary>The title in short: circuit, amplifier and divider.</summary>
    /// <param name="candidate">The candidate.</param>
    public static string ShortTitle(Candidate candidate)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        string stage = Trade.Stage(candidate.Choice.Tap);
        return $"{candidate.Choice.Circuit.Word()} {candidate.Choice.Amplifier.Id}" + (stage.Length == 0 ? "" : ", " + stage);
    }

    /// <summary>The pane below the list.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="requirement">The requirement that it was ranked for.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Below(Candidate candidate, Requirement requirement, int width, Glyphs glyphs) =>
    [
        Values(candidate, width, glyphs),
        .. Bars.Draw(LimitUses.Of(candidate, requirement), width, glyphs),
        .. Watched(candidate, glyphs).Take(1).Select(text =>
            new LineBuilder(glyphs).Add(" ! ", Tone.Warning).Words(text, width - 3, Tone.Warning).Build()),
    ];

    /// <summary>The pane beside the list, with the drawing.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="requirement">The requirement that it was ranked for.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Beside(Candidate candidate, Requirement requirement, int width, Glyphs glyphs) =>
    [
        .. Schematic.Draw(candidate, glyphs),
        new LineBuilder(glyphs).Add(" Y1 is ", Tone.Quiet).Column(candidate.Choice.Crystal.Id, width - 7, Tone.Quiet).Build(),
        .. Bars.DrawTall(LimitUses.Of(candidate, requirement), width, glyphs),
        .. Watched(candidate, glyphs).SelectMany(text => Paragraph.Of(text, width, glyphs, " ! ", 3, Tone.Warning)),
    ];

    // Capacitors and resistors on one line: a label stays whole, and what does not fit is marked.
    private static Line Values(Candidate candidate, int width, Glyphs glyphs)
    {
        string[] labels =
        [
            .. candidate.Parts.Where(use => use.Part is CapacitorPart or ResistorPart)
                .Select(use => glyphs.Show(CircuitParts.Label(use))),
        ];
        LineBuilder line = new(glyphs);
        for (int i = 0; i < labels.Length; i++)
        {
            string text = (i == 0 ? " " : "  ") + labels[i];
            int mark = i == labels.Length - 1 ? 0 : glyphs.Show(" …").Length;
            if (line.Width + text.Length + mark > width)
            {
                return line.Add(" …", Tone.Quiet).Build().Fit(Math.Max(0, width));
            }

            line.Add(text, Tone.Strong);
        }

        return line.Build();
    }

    private static IEnumerable<string> Watched(Candidate candidate, Glyphs glyphs)
    {
        IEnumerable<string> all = candidate.Misses.Select(miss => miss.Sentence).Concat(candidate.Warnings);
        return all.Select(glyphs.Show);
    }
}
