namespace PartPick.Shortlists;

/// <summary>The file that an export is written to.</summary>
/// <param name="Path">Its path.</param>
/// <param name="Replaces">Whether a file that is there may be replaced.</param>
/// <param name="Where">The option or field that names it, for the problem.</param>
/// <param name="Catalog">The path of the catalogue, which it may not be.</param>
internal sealed record ExportTarget(string Path, bool Replaces, string Where, string Catalog);
