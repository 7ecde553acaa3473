using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>What was changed in a circuit: at most one change a place. Crystal and stage go together and are one change.</summary>
public sealed class SwapChanges
{
    private readonly ImmutableSortedDictionary<SwapPlace, SwapOption> _byPlace;

    private SwapChanges(ImmutableSortedDictionary<SwapPlace, SwapOption> byPlace) => _byPlace = byPlace;

    /// <summary>No change.</summary>
    public static SwapChanges None { get; } = new(ImmutableSortedDictionary<SwapPlace, SwapOption>.Empty);

    /// <summary>Whether nothing is changed.</summary>
    public bool IsEmpty => _byPlace.IsEmpty;

    /// <summary>With another change in a place.</summary>
    /// <param name="option">What stands there now.</param>
    public SwapChanges With(SwapOption option)
    {
        ArgumentNullException.ThrowIfNull(option);
        return new SwapChanges(_byPlace.SetItem(Key(option.Place), option));
    }

    /// <summary>With a place as it was.</summary>
    /// <param name="place">The place.</param>
    public SwapChanges Without(SwapPlace place) => new(_byPlace.Remove(Key(place)));

    /// <summary>Those changes that are any in a circuit.</summary>
    /// <param name="board">The circuit.</param>
    public SwapChanges In(BoardParts board) => new(_byPlace.RemoveRange(
        _byPlace.Where(pair => pair.Value.StandsIn(board)).Select(pair => pair.Key).ToArray()));

    /// <summary>The changed circuits: one for every combination of the parts that the changes leave open.</summary>
    /// <param name="board">The circuit before.</param>
    /// <param name="support">The support parts of a circuit with another crystal.</param>
    public ImmutableArray<BoardParts> Boards(BoardParts board, Func<CandidateParts, SupportParts> support)
    {
        ArgumentNullException.ThrowIfNull(board);
        ArgumentNullException.ThrowIfNull(support);
        ImmutableArray<BoardParts> boards = [board];

        // The crystal first: what else the circuit needs follows from it.
        foreach (SwapOption option in _byPlace.Values.OrderBy(option => Key(option.Place) == SwapPlace.Crystal ? 0 : 1))
        {
            boards = [.. boards.SelectMany(one => option.Parts.Select(part => option.In(one, part)))];
            if (Key(option.Place) == SwapPlace.Crystal && boards[0].Choice.Crystal.FrequencyHz != board.Choice.Crystal.FrequencyHz)
            {
                boards = [.. boards.Select(one => one with { Support = support(one.Choice) })];
            }
        }

        return boards;
    }

    private static SwapPlace Key(SwapPlace place) => place == SwapPlace.Stage ? SwapPlace.Crystal : place;
}
