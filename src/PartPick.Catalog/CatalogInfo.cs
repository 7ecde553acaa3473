using System.Collections.Immutable;

namespace PartPick.Catalog;

/// <summary>What a catalogue holds.</summary>
/// <param name="Path">The full path of its file.</param>
/// <param name="Bytes">The length of the file.</param>
/// <param name="Counts">How many parts of each kind there are.</param>
/// <param name="Own">How many of all parts are the user's own.</param>
/// <param name="SetByHand">How many parts have a figure set by hand.</param>
/// <param name="Imports">The imports, the latest first.</param>
/// <param name="Maps">The names of the column maps that are kept.</param>
public sealed record CatalogInfo(
    string Path,
    long Bytes,
    ImmutableArray<(PartKind Kind, int Count)> Counts,
    int Own,
    int SetByHand,
    ImmutableArray<ImportNote> Imports,
    ImmutableArray<string> Maps);
