using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Ranks the parts of a catalogue on threads of their own.</summary>
/// <param name="parts">The parts.</param>
public sealed class CatalogRanking(PartsOnDemand parts) : IRankingService
{
    private Task<Result<bool>> _opening = Task.FromResult(Result.Ok(true));

    /// <summary>The parts that are ranked.</summary>
    public IPartsSource Parts => parts;

    /// <summary>The main currency; empty before the parts were read.</summary>
    public string Currency => parts.Currency;

    /// <summary>Reads the parts as they now are; rankings wait for it. An edit of the requirement does not begin it anew.</summary>
    /// <returns>True, or the problem.</returns>
    public Task<Result<bool>> Open() => _opening = Task.Run(() => parts.Open(CancellationToken.None));

    /// <inheritdoc/>
    public async Task<RankingResult> RankAsync(
        Requirement requirement, IProgress<RankingResult> progress, CancellationToken cancellation)
    {
        // What went wrong is tried again, and said by the ranking itself.
        await _opening.WaitAsync(cancellation).ConfigureAwait(false);
        return await Task.Run(() => Ranker.Rank(requirement, parts, null, progress, cancellation), cancellation).ConfigureAwait(false);
    }
}
