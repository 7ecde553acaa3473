namespace PartPick.Catalog.Import;

/// <summary>Which sign is the decimal one.</summary>
internal enum NumberNotation
{
    /// <summary>Not known: a number that can be read in two ways is refused.</summary>
    Unknown,

    /// <summary>A point; commas separate thousands.</summary>
    Point,

    /// <summary>A comma; points separate thousands.</summary>
    Comma,
}
