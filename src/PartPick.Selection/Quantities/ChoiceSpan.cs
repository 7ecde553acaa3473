namespace PartPick.Selection;

/// <summary>A range of numbers of boards over which one candidate is the best.</summary>
/// <param name="From">First number of boards.</param>
/// <param name="To">Last number of boards.</param>
/// <param name="Candidate">The best candidate, analysed in full for the first number; null where none fits.</param>
/// <param name="CostAtEnd">Its cost per unit for the last number of boards.</param>
/// <param name="Ranked">Whether the whole catalogue was ranked somewhere in the range, with this answer.</param>
public sealed record ChoiceSpan(int From, int To, Candidate? Candidate, decimal? CostAtEnd, bool Ranked);
