using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>
/// Parts that are the same part from another supplier: of one kind and package, with every stated figure equal. Only the
/// offer, the texts and the supplier's number differ.
/// </summary>
public static class EqualParts
{
    private static readonly string[] NotOfThePart =
    [
        "id", "description", "basis", "supplier", "supplierPart", "currency", "prices", "minimumOrder", "multiple", "stock", "excluded",
        "note",
    ];

    /// <summary>The other parts of a catalogue that are equal to a part and not excluded, by id.</summary>
    /// <param name="part">The part.</param>
    /// <param name="catalog">The catalogue.</param>
    public static ImmutableArray<Part> Of(Part part, PartsCatalog catalog)
    {
        ArgumentNullException.ThrowIfNull(part);
        ArgumentNullException.ThrowIfNull(catalog);
        string key = KeyOf(part);
        return
        [
            .. Near(part, catalog).Where(other => other.Id != part.Id && !other.Excluded && KeyOf(other) == key),
        ];
    }

    /// <summary>A text that two parts share exactly where they are equal.</summary>
    /// <param name="part">The part.</param>
    public static string KeyOf(Part part)
    {
        ArgumentNullException.ThrowIfNull(part);
        return part.Kind + "|" + string.Join('|', PartFigures.Of(part)
            .Where(figure => !NotOfThePart.Contains(figure.Key))
            .Select(figure => $"{figure.Key}={figure}"));
    }

    // The value alone leaves few parts to compare in full.
    private static IEnumerable<Part> Near(Part part, PartsCatalog catalog) => part switch
    {
        CapacitorPart capacitor => catalog.Capacitors.Where(other => other.ValueFarads == capacitor.ValueFarads),
        ResistorPart resistor => catalog.Resistors.Where(other => other.ValueOhms == resistor.ValueOhms),
        CrystalPart crystal => catalog.Crystals.Where(other => other.FrequencyHz == crystal.FrequencyHz),
        _ => catalog.OfKind(part.Kind),
    };
}
