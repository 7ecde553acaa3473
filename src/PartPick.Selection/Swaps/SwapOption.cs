using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Something that may stand in a place of a circuit.</summary>
/// <param name="Place">The place.</param>
/// <param name="Words">What it is, in words; no two of one place and stage have the same.</param>
/// <param name="Parts">The parts, of which the best is taken; one null for a direct connection. Of a stage, its crystal.</param>
/// <param name="Tap">Divider stage, where it is a crystal or a stage; else zero.</param>
public sealed record SwapOption(SwapPlace Place, string Words, ImmutableArray<Part?> Parts, int Tap = 0)
{
    /// <summary>Whether that is what stands there in a circuit.</summary>
    /// <param name="board">The circuit.</param>
    public bool StandsIn(BoardParts board)
    {
        ArgumentNullException.ThrowIfNull(board);
        return board.Words(Place) == Words && (Place != SwapPlace.Crystal || board.Choice.Tap == Tap);
    }

    /// <summary>A circuit with one of the parts in the place.</summary>
    /// <param name="board">The circuit before.</param>
    /// <param name="part">The part.</param>
    internal BoardParts In(BoardParts board, Part? part)
    {
        CandidateParts choice = board.Choice;
        return Place switch
        {
            SwapPlace.C1 => board with { Choice = choice with { C1 = (CapacitorPart)part! } },
            SwapPlace.C2 => board with { Choice = choice with { C2 = (CapacitorPart)part! } },
            SwapPlace.Series => board with { Choice = choice with { Series = (ResistorPart?)part } },
            SwapPlace.Feedback => board with { Support = board.Support with { Feedback = (ResistorPart?)part } },
            SwapPlace.BaseTop => board with { Choice = choice with { BaseTop = (ResistorPart?)part } },
            SwapPlace.BaseBottom => board with { Choice = choice with { BaseBottom = (ResistorPart?)part } },
            SwapPlace.Emitter => board with { Choice = choice with { Emitter = (ResistorPart?)part } },
            SwapPlace.Amplifier => board with { Choice = choice with { Amplifier = part! } },
            _ => board with { Choice = choice with { Crystal = (CrystalPart)part!, Tap = Tap } },
        };
    }
}
