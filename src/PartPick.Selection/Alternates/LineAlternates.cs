using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>The replacements of one part of a circuit.</summary>
public sealed record LineAlternates
{
    /// <summary>The part and its places.</summary>
    public required BoardLine Line { get; init; }

    /// <summary>The parts that keep the circuit fit, the one that changes least first.</summary>
    public required ImmutableArray<Replacement> Replacements { get; init; }

    /// <summary>Number of other parts of the kind in the catalogue.</summary>
    public required int Considered { get; init; }

    /// <summary>Number of parts with which the whole circuit was analysed.</summary>
    public required int Analysed { get; init; }

    /// <summary>How many were left out without a whole analysis, by reason.</summary>
    public required ImmutableSortedDictionary<LeftOut, int> LeftOut { get; init; }

    /// <summary>How many analysed ones broke a limit, each counted at the first that it breaks.</summary>
    public required ImmutableSortedDictionary<Limit, int> Unfit { get; init; }
}
