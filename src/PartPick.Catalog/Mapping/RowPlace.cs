namespace PartPick.Catalog.Mapping;

/// <summary>A row of an imported file.</summary>
/// <param name="Import">The number of the import, 0 for none.</param>
/// <param name="Line">The line of the file, counted from 1.</param>
internal readonly record struct RowPlace(int Import, long Line);
