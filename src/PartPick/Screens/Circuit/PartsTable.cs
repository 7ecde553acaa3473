using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>The parts of a circuit with their values, ids and places.</summary>
internal static class PartsTable
{
    /// <summary>The lines.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(Candidate candidate, Glyphs glyphs)
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
}
