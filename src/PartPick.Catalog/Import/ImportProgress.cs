namespace PartPick.Catalog.Import;

/// <summary>How far an import is.</summary>
/// <param name="Rows">The rows read.</param>
/// <param name="Share">The share of the file that was read, 0 to 1; null where its length is not known.</param>
/// <param name="Elapsed">The time since it began.</param>
public readonly record struct ImportProgress(long Rows, double? Share, TimeSpan Elapsed);
