using PartPick.Catalog;
using PartPick.Selection.Search;

namespace PartPick.Selection;

/// <summary>Ranks the combinations of a catalogue's parts for a requirement.</summary>
public static class Ranker
{
    /// <summary>
    /// Searches the whole space; the answer equals what trying every combination gives.
    /// </summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="catalog">The parts.</param>
    /// <param name="options">How much of the answer is wanted; null for the defaults.</param>
    /// <param name="progress">Called from any thread with a best-so-far, a few times a second; may be null.</param>
    /// <param name="cancellation">Ends the search at once with <see cref="OperationCanceledException"/>.</param>
    public static RankingResult Rank(
        Requirement requirement,
        PartsCatalog catalog,
        RankingOptions? options = null,
        IProgress<RankingResult>? progress = null,
        CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(catalog);
        return Rank(requirement, new WholeCatalog(catalog), options, progress, cancellation);
    }

    /// <summary>
    /// Searches the whole space of the parts that a source gives; the answer equals what trying every combination gives.
    /// </summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="source">Where the parts come from.</param>
    /// <param name="options">How much of the answer is wanted; null for the defaults.</param>
    /// <param name="progress">Called from any thread with a best-so-far, a few times a second; may be null.</param>
    /// <param name="cancellation">Ends the search at once with <see cref="OperationCanceledException"/>.</param>
    /// <exception cref="PartsUnreadableException">The parts cannot be read.</exception>
    public static RankingResult Rank(
        Requirement requirement,
        IPartsSource source,
        RankingOptions? options = null,
        IProgress<RankingResult>? progress = null,
        CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        ArgumentNullException.ThrowIfNull(source);
        options ??= new RankingOptions();
        var space = new SearchSpace(requirement, source, options.All, cancellation);
        return new SearchRun(space, options, progress, cancellation).Run();
    }
}
