using System.Collections.Immutable;
using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Browsing;

/// <summary>A figure or text that can be set by hand.</summary>
/// <param name="Key">Its key.</param>
/// <param name="Dimension">What a number measures; null for a text.</param>
public sealed record FigureKey(string Key, Dimension? Dimension)
{
    /// <summary>What can be set by hand on parts of a kind, in the order of the columns of its file.</summary>
    /// <param name="kind">The kind.</param>
    public static ImmutableArray<FigureKey> Of(PartKind kind) =>
        [.. PartShape.Of(kind).Fields.Where(CatalogEdit.CanBeSet).Select(field => new FigureKey(field.Key, field.Dimension))];
}
