namespace PartPick.Catalog.Import;

/// <summary>What the separators of one written number say about the decimal sign of its file.</summary>
internal enum NumberEvidence
{
    /// <summary>Nothing: no separator.</summary>
    None,

    /// <summary>The decimal sign is a point.</summary>
    Point,

    /// <summary>The decimal sign is a comma.</summary>
    Comma,

    /// <summary>One point with three digits behind it: decimal, or thousands.</summary>
    PointOrThousands,

    /// <summary>One comma with three digits behind it: decimal, or thousands.</summary>
    CommaOrThousands,

    /// <summary>No number in any notation.</summary>
    Wrong,
}
