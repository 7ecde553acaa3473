namespace PartPick.Selection;

/// <summary>How far the choice over the number of boards is looked into.</summary>
public sealed record QuantityOptions
{
    /// <summary>Largest number of boards, one or more.</summary>
    public int Most { get; init; } = 10_000;

    /// <summary>Most numbers of boards for which the whole catalogue is ranked.</summary>
    public int MostRankings { get; init; } = 12;

    /// <summary>
    /// A catalogue with no more combinations than this is tried in full once, for all numbers of boards together.
    /// </summary>
    public int EveryUpTo { get; init; } = 150;
}
