using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Draws the circuit of a candidate with its designators and values.</summary>
public static class Schematic
{
    /// <summary>Width of every drawing in cells.</summary>
    public const int Width = 40;

    /// <summary>The drawing.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(Candidate candidate, Glyphs glyphs)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        return candidate.Choice.Circuit == CircuitKind.Follower
            ? FollowerDrawing.Draw(candidate, glyphs)
            : GateDrawing.Draw(candidate, glyphs);
    }
}
