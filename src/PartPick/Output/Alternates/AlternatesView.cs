using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>The replacements of the parts of one candidate of a list, and how many of each are shown.</summary>
/// <param name="List">Name of the list.</param>
/// <param name="Review">The candidate as it is today.</param>
/// <param name="Chosen">The same, analysed.</param>
/// <param name="Lines">The replacements of its parts.</param>
/// <param name="Top">Most replacements shown of a part.</param>
internal sealed record AlternatesView(
    string List, ShortlistReview Review, ChosenCircuit Chosen, ImmutableArray<LineAlternates> Lines, int Top);
