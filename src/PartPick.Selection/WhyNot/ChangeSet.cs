using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>What has to be changed together for a part to be let in: ranking with it changed finds the candidate.</summary>
/// <param name="Changes">The changes; more than one only where no single one does.</param>
/// <param name="Requirement">The requirement with them.</param>
/// <param name="Candidate">The best candidate with the part then, analysed in full and judged by the changed requirement.</param>
public sealed record ChangeSet(ImmutableArray<NeededChange> Changes, Requirement Requirement, Candidate Candidate)
{
    /// <summary>How large they are together: a ratio above one.</summary>
    public double Size => Changes.Aggregate(1.0, (size, change) => size * change.Size);

    /// <summary>Whether a change of the requirement alone does it.</summary>
    public bool IsOfRequirement => Changes.All(change => change.Key is not null);

    /// <summary>The changes in words.</summary>
    public override string ToString() => Say.List([.. Changes.Select(change => change.ToString())]);
}
