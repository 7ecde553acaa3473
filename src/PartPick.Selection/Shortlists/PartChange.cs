namespace PartPick.Selection;

/// <summary>What about a part changed.</summary>
public enum ChangeKind
{
    /// <summary>Prices, currency, minimum order or multiple.</summary>
    Price,

    /// <summary>The stock.</summary>
    Stock,

    /// <summary>Any other figure or text.</summary>
    Data,

    /// <summary>The part is not in the catalogue any more.</summary>
    Gone,
}

/// <summary>One thing that changed about a part of a candidate since it was put on the list.</summary>
/// <param name="Designators">Where the part stands: "C1, C2".</param>
/// <param name="Part">The id of the part.</param>
/// <param name="Kind">What changed.</param>
/// <param name="Key">The key of the figure; empty where the part is gone.</param>
/// <param name="Old">What it was, with unit; empty for nothing.</param>
/// <param name="New">What it is, with unit; empty for nothing.</param>
public sealed record PartChange(string Designators, string Part, ChangeKind Kind, string Key, string Old, string New)
{
    /// <summary>The change in words: "Y1 X-1: stock 400 → 0".</summary>
    public override string ToString() => Kind == ChangeKind.Gone
        ? $"{Designators} {Part}: not in the catalogue any more"
        : $"{Designators} {Part}: {Key} {Shown(Old)} → {Shown(New)}";

    private static string Shown(string text) => text.Length == 0 ? "none" : text;
}
