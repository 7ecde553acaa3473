using PartPick.Selection;

namespace PartPick.Output;

/// <summary>A ranking and how it is shown.</summary>
/// <param name="Result">The ranking.</param>
/// <param name="Colour">Whether colour may be used.</param>
internal sealed record RankView(RankingResult Result, bool Colour)
{
    /// <summary>Whether nothing fits the requirement.</summary>
    public bool NothingFits => Result.Candidates.IsEmpty;

    /// <summary>The limits by the number of combinations that they removed, most first.</summary>
    public IReadOnlyList<KeyValuePair<Limit, double>> Removed =>
        [.. Result.Rejections.Where(limit => limit.Value > 0).OrderByDescending(limit => limit.Value).ThenBy(limit => limit.Key)];
}
