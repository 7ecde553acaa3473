using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Draws which parts of two circuits differ, in a row each, and names those that are the same.</summary>
internal static class PairParts
{
    private const int Name = 12;

    /// <summary>The lines.</summary>
    /// <param name="pair">The circuits.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(CircuitPair pair, int width, Glyphs glyphs)
    {
        (BoardParts a, BoardParts b) = (BoardParts.Of(pair.A), BoardParts.Of(pair.B));
        int half = (width - 1 - Name) / 2;
        var lines = ImmutableArray.CreateBuilder<Line>();
        var same = new List<string>();
        if (pair.A.Choice.Circuit != pair.B.Choice.Circuit)
        {
            Row("circuit", pair.A.Choice.Circuit.Word(), pair.B.Choice.Circuit.Word());
        }

        foreach (SwapPlace place in pair.Places)
        {
            (string one, string other) = (Words(place, a), Words(place, b));
            if (one == other)
            {
                same.Add(Called(place) + " " + one);
            }
            else
            {
                Row(Called(place), one, other);
            }
        }

        if (lines.Count > 0)
        {
            lines.Insert(0, new LineBuilder(glyphs).Add(" ").Column("differs", Name, Tone.Strong).Column("A", half, Tone.Strong)
                .Column("B", half, Tone.Strong).Build());
        }

        if (same.Count > 0)
        {
            lines.AddRange(Paragraph.Of("The same in both: " + string.Join(", ", same) + ".", width, glyphs, " ", 1, Tone.Quiet));
        }

        return lines.ToImmutable();

        void Row(string name, string one, string other) => lines.Add(new LineBuilder(glyphs).Add(" ")
            .Column(name, Name).Column(one, half - 1).Add(" ").Column(other, half).Build());
    }

    private static string Called(SwapPlace place) => place switch
    {
        SwapPlace.Series => "Rs",
        SwapPlace.Feedback => "Rf",
        SwapPlace.BaseTop => "RB top",
        SwapPlace.BaseBottom => "RB low",
        SwapPlace.Emitter => "RE",
        SwapPlace.C1 or SwapPlace.C2 => place.ToString(),
        _ => place.ToString().ToLowerInvariant(),
    };

    // Value and id: parts of one value may differ in tolerance.
    private static string Words(SwapPlace place, BoardParts board) => !SwapPlaces.Of(board.Choice).Contains(place) ? "-"
        : place == SwapPlace.Stage ? Trade.Stage(board.Choice.Tap).Replace("stage ", "", StringComparison.Ordinal)
        : board.At(place) is CapacitorPart or ResistorPart ? board.Words(place) + " " + board.At(place)!.Id
        : board.Words(place);
}
