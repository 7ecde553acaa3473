using System.Collections.Immutable;
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
        Passives(candidate, width, glyphs)[0],
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
        .. Bars.Draw(LimitUses.Of(candidate, requirement), width, glyphs),
        .. Watched(candidate, glyphs).SelectMany(text => Paragraph.Of(text, width, glyphs, " ! ", 3, Tone.Warning)),
    ];

    private static ImmutableArray<Line> Passives(Candidate candidate, int width, Glyphs glyphs) =>
        Paragraph.Of(
            string.Join("  ", candidate.Parts.Where(use => use.Value.Length > 0)
                .Select(use => CircuitParts.Label(use).Replace(' ', '\u00a0'))).Replace("  ", " \u00a0", StringComparison.Ordinal),
            width, glyphs, " ", 1)
            .Select(line => new Line([new Span(line.Text.Replace('\u00a0', ' '), Tone.Strong)])).ToImmutableArray();

    private static IEnumerable<string> Watched(Candidate candidate, Glyphs glyphs)
    {
        IEnumerable<string> all = candidate.Misses.Select(miss => miss.Sentence).Concat(candidate.Warnings);
        return all.Select(glyphs.Show);
    }
}
