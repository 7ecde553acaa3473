using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>A candidate of a list, with all from which its replacements and its cost are found.</summary>
/// <param name="Review">The candidate as it is today.</param>
/// <param name="Chosen">The same, analysed.</param>
/// <param name="Catalog">Today's parts.</param>
public sealed record ListCircuit(ShortlistReview Review, ChosenCircuit Chosen, PartsCatalog Catalog);
