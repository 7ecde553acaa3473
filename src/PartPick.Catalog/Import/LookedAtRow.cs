using System.Collections.Immutable;

namespace PartPick.Catalog.Import;

/// <summary>A row of a file that is only looked at.</summary>
/// <param name="Line">The line on which it begins, counted from 1.</param>
/// <param name="Cells">Its cells, safe to show.</param>
/// <param name="Part">The part that it would be by itself; null where it would be rejected.</param>
/// <param name="Rejection">Why it would be rejected; null where it would not.</param>
public sealed record LookedAtRow(long Line, ImmutableArray<string> Cells, Part? Part, RowRejection? Rejection);
