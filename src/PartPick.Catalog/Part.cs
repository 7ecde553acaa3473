using System.Collections.ObjectModel;

namespace PartPick.Catalog;

/// <summary>A part of the catalogue: what all kinds have in common. Figures that are not known are null.</summary>
public abstract record Part
{
    /// <summary>The kind of the part.</summary>
    public abstract PartKind Kind { get; }

    /// <summary>The catalogue's own id, unique over all kinds; compared by ordinal.</summary>
    public required string Id { get; init; }

    /// <summary>One line that says what the part is.</summary>
    public required string Description { get; init; }

    /// <summary>Prices and quantities.</summary>
    public required Offer Offer { get; init; }

    /// <summary>The supplier's number of the part.</summary>
    public string? SupplierPart { get; init; }

    /// <summary>Who supplies it.</summary>
    public string? Supplier { get; init; }

    /// <summary>The package.</summary>
    public string? Package { get; init; }

    /// <summary>How many are in stock; null when that is unknown.</summary>
    public int? Stock { get; init; }

    /// <summary>Whether the part is kept out of every search.</summary>
    public bool Excluded { get; init; }

    /// <summary>Free text.</summary>
    public string? Note { get; init; }

    /// <summary>What the figures rest on, by the key of the figure; a figure without an entry is simply stated.</summary>
    public IReadOnlyDictionary<string, Basis> Basis { get; init; } = ReadOnlyDictionary<string, Basis>.Empty;

    /// <summary>What one figure rests on.</summary>
    /// <param name="key">The key of the figure, such as <c>motional</c>.</param>
    /// <returns>Its basis; stated when nothing else is known.</returns>
    public Basis BasisOf(string key) => Basis.TryGetValue(key, out Basis basis) ? basis : Catalog.Basis.Stated;
}
