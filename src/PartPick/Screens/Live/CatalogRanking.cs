using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Ranks the parts of a catalogue on threads of their own.</summary>
/// <param name="catalog">The parts.</param>
public sealed class CatalogRanking(PartsCatalog catalog) : IRankingService
{
    /// <summary>The parts; the next ranking takes them as they are then.</summary>
    public PartsCatalog Catalog { get; set; } = catalog;

    /// <inheritdoc/>
    public Task<RankingResult> RankAsync(
        Requirement requirement, IProgress<RankingResult> progress, CancellationToken cancellation)
    {
        PartsCatalog parts = Catalog;
        return Task.Run(() => Ranker.Rank(requirement, parts, null, progress, cancellation), cancellation);
    }
}
