using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>A candidate of a list as it is today, beside what it was when it was put there.</summary>
public sealed record ShortlistReview
{
    /// <summary>What the list keeps.</summary>
    public required ShortlistEntry Entry { get; init; }

    /// <summary>What was wanted, for the entry's number of boards.</summary>
    public required Requirement Requirement { get; init; }

    /// <summary>Which part stands where.</summary>
    public required ChosenParts Chosen { get; init; }

    /// <summary>Every part in its place: today's, or that of the day it was added where it is gone.</summary>
    public required ImmutableArray<PartUse> Parts { get; init; }

    /// <summary>What changed about the parts.</summary>
    public required ImmutableArray<PartChange> Changes { get; init; }

    /// <summary>The figures of the day it was added.</summary>
    public required ShortlistFigures Then { get; init; }

    /// <summary>Today's figures; without any where a part is gone.</summary>
    public required ShortlistFigures Now { get; init; }

    /// <summary>Today's candidate; null where a part is gone, or the amplifier is not specified over the supply.</summary>
    public required Candidate? Candidate { get; init; }

    /// <summary>The limits that it breaks today.</summary>
    public required ImmutableArray<Miss> Misses { get; init; }

    /// <summary>Whether price, stock or data of a part changed.</summary>
    public bool IsChanged => !Changes.IsEmpty;

    /// <summary>Whether a part is not in the catalogue any more.</summary>
    public bool HasGoneParts => Changes.Any(change => change.Kind == ChangeKind.Gone);

    /// <summary>Whether every limit holds today.</summary>
    public bool IsFit => !HasGoneParts && Misses.IsEmpty;
}
