using System.Collections.Immutable;

namespace PartPick.Catalog;

/// <summary>A named list of candidates.</summary>
/// <param name="Name">Its name, compared by ordinal.</param>
/// <param name="Entries">The candidates by ascending number; at least one.</param>
public sealed record Shortlist(string Name, ImmutableArray<ShortlistEntry> Entries);
