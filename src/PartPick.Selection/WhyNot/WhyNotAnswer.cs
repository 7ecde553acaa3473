using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Why a crystal or an amplifier is not in a ranked list, or where in it it is.</summary>
public sealed record WhyNotAnswer
{
    /// <summary>The part.</summary>
    public required Part Part { get; init; }

    /// <summary>The requirement that was asked about.</summary>
    public required Requirement Requirement { get; init; }

    /// <summary>What keeps it out before any circuit with it is looked at.</summary>
    public ImmutableArray<Hurdle> Hurdles { get; init; } = [];

    /// <summary>
    /// The candidate with the part that was held against the limits: the best one where one fits, else the nearest miss; null
    /// where there is no circuit to look at.
    /// </summary>
    public Candidate? Candidate { get; init; }

    /// <summary>How that candidate stands to the limits of the requirement.</summary>
    public ImmutableArray<LimitReading> Limits { get; init; } = [];

    /// <summary>How many combinations with the part each limit removed, each counted at the first limit that it breaks.</summary>
    public ImmutableDictionary<Limit, double> Rejections { get; init; } = ImmutableDictionary<Limit, double>.Empty;

    /// <summary>
    /// What lets it in, the smallest change first: single changes, or where no single one does, one set of several; empty where
    /// the part fits, or nothing that the requirement states would do.
    /// </summary>
    public ImmutableArray<ChangeSet> Changes { get; init; } = [];

    /// <summary>Its place in the list; null where it is not in it.</summary>
    public ListPlace? Place { get; init; }

    /// <summary>Its place in the list once the smallest change is made; null where there is none.</summary>
    public ListPlace? PlaceThen { get; init; }

    /// <summary>Whether a circuit with the part fits the requirement as it is.</summary>
    public bool Fits => Candidate is not null && Hurdles.IsEmpty && Candidate.IsFit;
}

/// <summary>Where the best candidate with a part stands among the best of each circuit, crystal and amplifier.</summary>
/// <param name="Number">Its number from one; null where it stands behind all that are listed.</param>
/// <param name="Listed">How many are listed.</param>
/// <param name="First">The first of the list.</param>
/// <param name="Above">The one just before it, or the last of the list; null where it is the first.</param>
public sealed record ListPlace(int? Number, int Listed, Candidate First, Candidate? Above);
