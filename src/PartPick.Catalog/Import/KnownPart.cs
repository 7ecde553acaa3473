namespace PartPick.Catalog.Import;

/// <summary>What an import needs to know of a part that is already there.</summary>
internal sealed class KnownPart(string id, PartKind kind, string? supplier, string? supplierPart, UInt128 digest)
{
    public string Id { get; } = id;

    public PartKind Kind { get; } = kind;

    public string? Supplier { get; } = supplier;

    public string? SupplierPart { get; } = supplierPart;

    /// <summary>The digest of its row; zero for none.</summary>
    public UInt128 Digest { get; set; } = digest;

    /// <summary>The line of this import that it was met on; zero while it was not.</summary>
    public long MetOn { get; set; }

    /// <summary>Another part with the same supplier's number.</summary>
    public KnownPart? Next { get; set; }
}
