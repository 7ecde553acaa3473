using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>A candidate beside the chosen circuit, with what it changes.</summary>
/// <param name="Candidate">The candidate, analysed in full.</param>
/// <param name="Change">The change from the chosen circuit.</param>
public sealed record ChangedCandidate(Candidate Candidate, CandidateChange Change);

/// <summary>What else meets a requirement where a part cannot be had.</summary>
public sealed record Shortage
{
    /// <summary>The parts that cannot be had.</summary>
    public required ImmutableArray<Part> Gone { get; init; }

    /// <summary>The parts of the chosen circuit that had to stay.</summary>
    public required ImmutableArray<Part> Kept { get; init; }

    /// <summary>The ranking without the one and with the other.</summary>
    public required RankingResult Ranking { get; init; }

    /// <summary>
    /// The best of each group, in the order of the ranking, with the change from the chosen circuit; empty where none fits.
    /// </summary>
    public required ImmutableArray<ChangedCandidate> Candidates { get; init; }
}
