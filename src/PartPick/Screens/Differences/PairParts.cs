using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Says which parts of two circuits differ, in a row each, and which are the same.</summary>
internal static class PairParts
{
    private const int Name = 12;

    /// <summary>The parts that differ, a row each.</summary>
    /// <param name="pair">The circuits.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Different(CircuitPair pair, int width, Glyphs glyphs)
    {
        int half = (width - 1 - Name) / 2;
        (string Name, string A, string B)[] rows = [.. Of(pair).Where(one => one.A != one.B)];
        return rows.Length == 0
            ? []
            : [Row(("differs", "A", "B"), Tone.Strong), .. rows.Select(row => Row(row, Tone.Normal)), Line.Empty];

        Line Row((string Name, string A, string B) row, Tone tone) => new LineBuilder(glyphs).Add(" ")
            .Column(row.Name, Name, tone).Column(row.A, half - 1, tone).Add(" ").Column(row.B, half, tone).Build();
    }

    /// <summary>The parts that are the same, in a sentence.</summary>
    /// <param name="pair">The circuits.</param>
    public static string Same(CircuitPair pair)
    {
        string[] same = [.. Of(pair).Where(one => one.A == one.B).Select(one => one.Name + " " + one.A)];
        return same.Length == 0 ? "No part is the same in both." : "The same in both: " + string.Join(", ", same) + ".";
    }

    private static IEnumerable<(string Name, string A, string B)> Of(CircuitPair pair)
    {
        (BoardParts a, BoardParts b) = (BoardParts.Of(pair.A), BoardParts.Of(pair.B));
        return pair.Places.Select(place => (Called(place), Words(place, a), Words(place, b)))
            .Prepend(("circuit", pair.A.Choice.Circuit.Word(), pair.B.Choice.Circuit.Word()));
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
