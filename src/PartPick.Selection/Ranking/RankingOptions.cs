namespace PartPick.Selection;

/// <summary>How much of the answer is wanted.</summary>
public sealed record RankingOptions
{
    /// <summary>Most candidates to list; null for no limit.</summary>
    public int? Top { get; init; } = 50;

    /// <summary>List the front instead of the best of each group.</summary>
    public bool Front { get; init; }

    /// <summary>Every fit candidate, not only the best of each group.</summary>
    public bool All { get; init; }

    /// <summary>Number of threads; null for one a core.</summary>
    public int? Threads { get; init; }
}
