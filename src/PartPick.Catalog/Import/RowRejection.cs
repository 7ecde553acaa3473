namespace PartPick.Catalog.Import;

/// <summary>A row that was not taken.</summary>
/// <param name="Line">The line on which it begins, counted from 1.</param>
/// <param name="Column">The header of the column at fault; null for the row as a whole.</param>
/// <param name="Value">What stands there.</param>
/// <param name="Reason">What is wrong, and what fits.</param>
public sealed record RowRejection(long Line, string? Column, string? Value, string Reason);
