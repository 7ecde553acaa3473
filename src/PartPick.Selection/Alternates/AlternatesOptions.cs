namespace PartPick.Selection;

/// <summary>Which replacements are wanted.</summary>
public sealed record AlternatesOptions
{
    /// <summary>Only parts of the package that they replace, which need no change of the board.</summary>
    public bool SamePackage { get; init; }

    /// <summary>Number of threads; null for one a core.</summary>
    public int? Threads { get; init; }
}
