namespace PartPick.Catalog.Import;

/// <summary>What became of one column.</summary>
/// <param name="Header">The cell of the header.</param>
/// <param name="Field">The key of the figure; null where the column was not used.</param>
/// <param name="Unit">The unit of numbers without one; empty for none.</param>
/// <param name="Why">Why.</param>
public sealed record ImportColumn(string Header, string? Field, string Unit, string Why);
