using System.Collections.Immutable;

namespace PartPick.Catalog;

/// <summary>A part of a catalogue with where its figures came from.</summary>
/// <param name="Part">The part, with what was set by hand.</param>
/// <param name="Origin">Where each figure came from, by key: built-in; file, line and date; or set by hand.</param>
public sealed record CatalogEntry(Part Part, ImmutableSortedDictionary<string, string> Origin);
