namespace PartPick.Catalog.Import;

/// <summary>By what a row names its part.</summary>
/// <param name="Id">The id; null where it has none.</param>
/// <param name="Number">The supplier's number; null where it has none.</param>
/// <param name="Supplier">The supplier; null where it has none.</param>
internal readonly record struct RowPart(string? Id, string? Number, string? Supplier);
