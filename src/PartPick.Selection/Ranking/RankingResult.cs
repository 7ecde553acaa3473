using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>What a ranking answers.</summary>
public sealed record RankingResult
{
    /// <summary>The requirement that was ranked, defaults filled in.</summary>
    public required Requirement Requirement { get; init; }

    /// <summary>Number of combinations that the space holds.</summary>
    public required double Combinations { get; init; }

    /// <summary>Number of combinations covered so far: all of them where the answer is complete.</summary>
    public required double Covered { get; init; }

    /// <summary>Number of fit combinations where they were counted (every one analysed); null otherwise.</summary>
    public required long? Fit { get; init; }

    /// <summary>
    /// Number of combinations of values whose steady state was solved; the others were decided by bounds and quick estimates.
    /// </summary>
    public long Analysed { get; init; }

    /// <summary>
    /// Fit candidates in order, best first: the best of each circuit–crystal–amplifier group (with its tap), or every fit one
    /// where that was asked. Where nothing is fit, empty.
    /// </summary>
    public required ImmutableArray<Candidate> Candidates { get; init; }

    /// <summary>Ids of the candidates on the front, in order.</summary>
    public required ImmutableArray<string> Front { get; init; }

    /// <summary>The nearest misses where nothing is fit, nearest first.</summary>
    public required ImmutableArray<Candidate> NearestMisses { get; init; }

    /// <summary>Cheapest cost of a fit circuit, to which the scores are relative; null where nothing is fit.</summary>
    public decimal? CheapestCost { get; init; }

    /// <summary>How many combinations each limit removed (each counted at the first limit it breaks).</summary>
    public required ImmutableDictionary<Limit, double> Rejections { get; init; }

    /// <summary>True once the answer is exact; false for a best-so-far.</summary>
    public required bool IsComplete { get; init; }

    /// <summary>Time taken so far, in seconds.</summary>
    public required double ElapsedSeconds { get; init; }
}
