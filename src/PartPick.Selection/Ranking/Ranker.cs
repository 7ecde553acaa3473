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
        ArgumentNullException.ThrowIfNull(requirement);
        ArgumentNullException.ThrowIfNull(catalog);
        options ??= new RankingOptions();
        var space = new SearchSpace(requirement, catalog, options.All);
        return new SearchRun(space, options, progress, cancellation).Run();
    }
}
