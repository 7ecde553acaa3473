namespace PartPick.Catalog.Browsing;

/// <summary>What a listed part is marked with.</summary>
[Flags]
public enum RowMarks
{
    /// <summary>Nothing.</summary>
    None = 0,

    /// <summary>It is kept out of every search.</summary>
    Excluded = 1,

    /// <summary>A figure of it was set by hand.</summary>
    SetByHand = 2,
}
