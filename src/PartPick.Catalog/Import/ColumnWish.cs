namespace PartPick.Catalog.Import;

/// <summary>What the user, or a map that is kept, says of a column.</summary>
/// <param name="Header">The cell of the header.</param>
/// <param name="Field">The field; null to leave the column out.</param>
/// <param name="Unit">The unit of numbers without one; empty to find it from header and cells.</param>
public sealed record ColumnWish(string Header, string? Field, string Unit)
{
    /// <summary>Whether it is of the column with a header.</summary>
    internal bool IsOf(string header) => string.Equals(Header.Trim(), header.Trim(), StringComparison.OrdinalIgnoreCase);
}
