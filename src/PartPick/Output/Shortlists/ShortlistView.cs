using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Commands;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>A list as it is today.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Candidates">Its candidates, recomputed.</param>
internal sealed record ShortlistView(string Name, ImmutableArray<ShortlistReview> Candidates)
{
    /// <summary>Recomputes a list; one that cannot be read ends the command.</summary>
    public static ShortlistView Of(Shortlist list, ShortlistReviewer reviewer) =>
        new(list.Name, CommandFailure.Unless(reviewer.Review(list), ExitStatus.NoCatalog));

    /// <summary>How many have a part that changed.</summary>
    public int Changed => Candidates.Count(candidate => candidate.IsChanged);

    /// <summary>How many break a limit today.</summary>
    public int Unfit => Candidates.Count(candidate => !candidate.IsFit);
}
