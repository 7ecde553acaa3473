using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>A circuit that was chosen, with every part, analysed for what is needed of it.</summary>
/// <param name="Board">Its parts.</param>
/// <param name="Candidate">The circuit, analysed in full; it may be unfit.</param>
public sealed record ChosenCircuit(BoardParts Board, Candidate Candidate)
{
    /// <summary>Analyses a circuit's parts.</summary>
    /// <param name="board">The parts.</param>
    /// <param name="requirement">What is needed.</param>
    /// <param name="catalog">What can be bought.</param>
    /// <returns>The circuit, or why its figures cannot be found.</returns>
    public static Result<ChosenCircuit> Of(BoardParts board, Requirement requirement, PartsCatalog catalog)
    {
        ArgumentNullException.ThrowIfNull(board);
        ArgumentNullException.ThrowIfNull(requirement);
        var builder = new CandidateBuilder(requirement, new Market(catalog, requirement.Builds));
        return builder.Build(board.Choice, board.Support) is { } candidate
            ? Result.Ok(new ChosenCircuit(board, candidate))
            : Result.Fail<ChosenCircuit>(
                "supply",
                FormattableString.Invariant(
                    $"{board.Choice.Amplifier.Id} is not specified over {requirement.SupplyMinVolts} to {requirement.SupplyMaxVolts} V"),
                "a supply range that the amplifier states");
    }

    /// <summary>Analyses a candidate of a list with today's parts; those that are gone count as they were when it was put there.</summary>
    /// <param name="review">The candidate.</param>
    /// <param name="catalog">Today's parts.</param>
    /// <returns>The circuit, or why its figures cannot be found.</returns>
    public static Result<ChosenCircuit> Of(ShortlistReview review, PartsCatalog catalog)
    {
        ArgumentNullException.ThrowIfNull(review);
        ArgumentNullException.ThrowIfNull(catalog);
        var parts = new PartsCatalog(review.Entry.Parts
            .Select(part => catalog.Find(part.Id) is { } today && today.Kind == part.Kind ? today : part));
        return review.Chosen.In(parts) is { } found
            ? Of(new BoardParts(found.Choice, found.Support), review.Requirement, catalog)
            : Result.Fail<ChosenCircuit>(
                FormattableString.Invariant($"candidate {review.Entry.Number}"),
                "cannot be read",
                "a candidate put there by partpick shortlist add");
    }
}
