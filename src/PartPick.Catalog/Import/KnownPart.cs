namespace PartPick.Catalog.Import;

/// <summary>
/// What an import needs to know of a part that is there, small enough for millions: id and supplier's number as digests only.
/// </summary>
internal struct KnownPart
{
    /// <summary>The digest of its id.</summary>
    public UInt128 Id;

    /// <summary>The digest of its supplier's number; zero for none.</summary>
    public UInt128 Number;

    /// <summary>The digest of its row; zero for none.</summary>
    public UInt128 Row;

    /// <summary>The line of this import that it was met on; zero while it was not.</summary>
    public uint MetOn;

    /// <summary>The place of its supplier in the list of suppliers; -1 for none.</summary>
    public int Supplier;

    /// <summary>The next part in the same slot of the ids; -1 for none.</summary>
    public int NextById;

    /// <summary>The next part in the same slot of the numbers; -1 for none.</summary>
    public int NextByNumber;

    /// <summary>Its kind.</summary>
    public PartKind Kind;
}
