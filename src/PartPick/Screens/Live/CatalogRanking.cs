using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Ranks the parts of a catalogue on threads of their own.</summary>
/// <param name="catalog">The parts.</param>
public sealed class CatalogRanking(PartsCatalog catalog) : IRankingService
{
    /// <inheritdoc/>
    public Task<RankingResult> RankAsync(
        Requirement requirement, IProgress<RankingResult> progress, CancellationToken cancellation) =>
        Task.Run(() => Ranker.Rank(requirement, catalog, null, progress, cancellation), cancellation);
}
