using PartPick.Catalog.Fields;

namespace PartPick.Catalog.Mapping;

/// <summary>A part as it is stored: what a supplier or the program states of it, and apart from that what the user set by hand.</summary>
internal sealed class StoredPart
{
    public required PartKind Kind { get; init; }

    /// <summary>Whether the part travels in the program.</summary>
    public bool BuiltIn { get; set; }

    /// <summary>The figures as they were supplied.</summary>
    public required PartDraft Supplied { get; set; }

    /// <summary>What the user set by hand; it counts before what was supplied, and no import changes it.</summary>
    public PartDraft ByHand { get; init; } = new();

    /// <summary>The keys of supplied figures that the user took away.</summary>
    public HashSet<string> Cleared { get; init; } = new(StringComparer.Ordinal);

    /// <summary>The day on which something was last set by hand.</summary>
    public string? HandDate { get; set; }

    /// <summary>The import and the line that the figures came from; import 0 for none.</summary>
    public RowPlace Place { get; set; }

    /// <summary>The figures that came from another import than the rest.</summary>
    public Dictionary<string, RowPlace> Elsewhere { get; init; } = new(StringComparer.Ordinal);

    /// <summary>A digest of the row and of how it was read; null for none.</summary>
    public byte[]? Digest { get; set; }

    public string Id => Supplied.Text("id") ?? "";

    public bool HasHandwork => HandDate is not null;

    /// <summary>The figures that count.</summary>
    public PartDraft Figures()
    {
        if (!HasHandwork)
        {
            return Supplied;
        }

        PartDraft figures = Supplied.Copy();
        foreach (string key in Cleared)
        {
            figures.Remove(key);
        }

        foreach (string key in ByHand.Keys)
        {
            figures.Take(key, ByHand);
        }

        return figures;
    }

    /// <summary>The part; null where the figures make none.</summary>
    public Part? Build() => PartShape.Of(Kind).Build(new DraftReader(Figures(), key => key));
}
