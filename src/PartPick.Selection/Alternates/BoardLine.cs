using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>One part that is bought for a circuit, with every place that it stands in.</summary>
/// <param name="Part">The part.</param>
/// <param name="Places">The places, in the order of the parts list.</param>
/// <param name="Designators">The reference designators: C1, C2.</param>
/// <param name="Roles">What it does there, each role once.</param>
public sealed record BoardLine(
    Part Part, ImmutableArray<PartPlace> Places, ImmutableArray<string> Designators, ImmutableArray<string> Roles)
{
    /// <summary>The lines of a circuit, by their first place; equal parts share one.</summary>
    public static ImmutableArray<BoardLine> Of(BoardParts board)
    {
        ArgumentNullException.ThrowIfNull(board);
        ImmutableArray<PartUse> uses = BillOfParts.List(board.Choice, board.Support);
        return
        [
            .. board.Places.Zip(uses)
                .GroupBy(pair => pair.Second.Part.Id, StringComparer.Ordinal)
                .Select(group => new BoardLine(
                    group.First().Second.Part,
                    [.. group.Select(pair => pair.First)],
                    [.. group.Select(pair => pair.Second.Designator)],
                    [.. group.Select(pair => pair.Second.Role).Distinct()])),
        ];
    }

    /// <summary>The circuit with another part in all places of this line.</summary>
    public BoardParts Replace(BoardParts board, Part part) =>
        Places.Aggregate(board, (changed, place) => changed.With(place, part));
}
