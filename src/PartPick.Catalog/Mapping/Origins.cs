using System.Collections.Immutable;
using System.Globalization;
using PartPick.Catalog.Fields;

namespace PartPick.Catalog.Mapping;

/// <summary>Says where each figure of a stored part came from.</summary>
/// <param name="imports">The imports by their numbers.</param>
internal sealed class Origins(IReadOnlyDictionary<int, ImportNote> imports)
{
    /// <summary>The origin of each figure that is there, by key.</summary>
    public ImmutableSortedDictionary<string, string> Of(StoredPart stored)
    {
        var origins = ImmutableSortedDictionary.CreateBuilder<string, string>(StringComparer.Ordinal);
        PartDraft figures = stored.Figures();
        foreach (string key in figures.Keys)
        {
            origins[key] = stored.HasHandwork && stored.ByHand.Has(key)
                ? "set by hand, " + stored.HandDate
                : PlaceOf(stored, key);
        }

        IEnumerable<string> assumed = (stored.Supplied.Text("basis") ?? "")
            .Split(';')
            .Where(mark => mark.EndsWith("=assumed", StringComparison.Ordinal));
        foreach (string mark in assumed)
        {
            string key = mark.Split('=')[0];
            if (stored.Place.Import > 0 && origins.TryGetValue(key, out string? place) && !stored.ByHand.Has(key))
            {
                origins[key] = $"assumed, not stated in {place}";
            }
        }

        foreach (string key in stored.Cleared)
        {
            origins.TryAdd(key, "cleared by hand, " + stored.HandDate);
        }

        return origins.ToImmutable();
    }

    private string PlaceOf(StoredPart stored, string key)
    {
        RowPlace place = stored.Elsewhere.TryGetValue(key, out RowPlace other) ? other : stored.Place;
        if (place.Import == 0)
        {
            return stored.BuiltIn || stored.Place.Import > 0 ? "built-in" : "own";
        }

        return imports.TryGetValue(place.Import, out ImportNote? note)
            ? string.Create(CultureInfo.InvariantCulture, $"{note.File} line {place.Line}, {note.Date}")
            : string.Create(CultureInfo.InvariantCulture, $"import {place.Import} line {place.Line}");
    }
}
