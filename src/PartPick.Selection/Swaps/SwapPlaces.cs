using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>What stands in the places of a circuit that can be changed.</summary>
public static class SwapPlaces
{
    /// <summary>The places of a circuit.</summary>
    /// <param name="choice">The circuit.</param>
    public static ImmutableArray<SwapPlace> Of(CandidateParts choice)
    {
        ArgumentNullException.ThrowIfNull(choice);
        SwapPlace[] resistors = choice.Circuit == CircuitKind.Follower
            ? [SwapPlace.BaseTop, SwapPlace.BaseBottom, SwapPlace.Emitter]
            : [SwapPlace.Series, SwapPlace.Feedback];
        SwapPlace[] stage = choice.Amplifier is CounterPart { Taps.Length: > 1 } ? [SwapPlace.Stage] : [];
        return [SwapPlace.C1, SwapPlace.C2, .. resistors, SwapPlace.Crystal, SwapPlace.Amplifier, .. stage];
    }

    /// <summary>The part in a place; null for a direct connection, where there is none, and for the stage.</summary>
    /// <param name="board">The circuit.</param>
    /// <param name="place">The place.</param>
    public static Part? At(this BoardParts board, SwapPlace place)
    {
        ArgumentNullException.ThrowIfNull(board);
        return place switch
        {
            SwapPlace.C1 => board.Choice.C1,
            SwapPlace.C2 => board.Choice.C2,
            SwapPlace.Series => board.Choice.Series,
            SwapPlace.Feedback => board.Support.Feedback,
            SwapPlace.BaseTop => board.Choice.BaseTop,
            SwapPlace.BaseBottom => board.Choice.BaseBottom,
            SwapPlace.Emitter => board.Choice.Emitter,
            SwapPlace.Crystal => board.Choice.Crystal,
            SwapPlace.Amplifier => board.Choice.Amplifier,
            _ => null,
        };
    }

    /// <summary>What stands in a place, in words: "27 pF", "direct", an id, "stage 12".</summary>
    /// <param name="board">The circuit.</param>
    /// <param name="place">The place.</param>
    public static string Words(this BoardParts board, SwapPlace place)
    {
        ArgumentNullException.ThrowIfNull(board);
        return place == SwapPlace.Stage ? Words(board.Choice.Tap) : Words(place, board.At(place));
    }

    /// <summary>A part in words, as it stands in a place.</summary>
    /// <param name="place">The place.</param>
    /// <param name="part">The part; null for none.</param>
    internal static string Words(SwapPlace place, Part? part) => part switch
    {
        CapacitorPart capacitor => ValueText.FormatExact(capacitor.ValueFarads, Dimension.Capacitance),
        ResistorPart resistor => ValueText.FormatExact(resistor.ValueOhms, Dimension.Resistance),
        null => place == SwapPlace.Series ? "direct" : "none",
        _ => part.Id,
    };

    /// <summary>A stage in words.</summary>
    /// <param name="tap">The stage.</param>
    internal static string Words(int tap) => FormattableString.Invariant($"stage {tap}");
}
