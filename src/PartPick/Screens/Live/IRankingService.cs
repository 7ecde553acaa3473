using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Ranks in the background.</summary>
public interface IRankingService
{
    /// <summary>Ranks the parts for a requirement.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <param name="progress">Is told the best so far, from any thread.</param>
    /// <param name="cancellation">Ends the ranking.</param>
    /// <returns>The exact answer.</returns>
    Task<RankingResult> RankAsync(
        Requirement requirement, IProgress<RankingResult> progress, CancellationToken cancellation);
}
