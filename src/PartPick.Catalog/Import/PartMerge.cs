using PartPick.Catalog.Fields;
using PartPick.Catalog.Mapping;

namespace PartPick.Catalog.Import;

/// <summary>Joins what a row states with what is stored of its part: what the row's file does not state stays as it was.</summary>
/// <param name="shape">The shape of the kind.</param>
/// <param name="keys">The keys that the columns of the file state.</param>
internal sealed class PartMerge(PartShape shape, IReadOnlyList<string> keys)
{
    private readonly HashSet<string> _keys = [.. keys];

    /// <summary>The joined figures, before they are completed.</summary>
    public PartDraft Join(StoredPart old, PartDraft row)
    {
        PartDraft merged = old.Supplied.Copy();
        foreach (string key in keys)
        {
            if (key is not ("id" or "basis") && (key != "description" || row.Has(key)))
            {
                merged.Take(key, row);
            }
        }

        if (row.Has("supplier"))
        {
            merged.Take("supplier", row);
        }

        merged.Remove("basis");
        merged.Set("basis", BasisMarks.Join(old.Supplied.Text("basis"), row.Text("basis"), keys));
        merged.IsSeries = row.IsSeries
            || (!_keys.Contains("load") && old.Supplied.Text("basis")?.Contains("load=assumed", StringComparison.Ordinal) != true);
        return merged;
    }

    /// <summary>Whether figures are those that are stored.</summary>
    public bool IsSame(StoredPart old, PartDraft supplied) =>
        shape.Fields.All(field => supplied.Agrees(field.Key, old.Supplied));

    /// <summary>The part as it is stored with new figures: what was set by hand stays, and so does the origin of the rest.</summary>
    public StoredPart Changed(StoredPart old, PartDraft supplied, RowPlace place, byte[] digest)
    {
        var changed = new StoredPart
        {
            Kind = old.Kind,
            Supplied = supplied,
            ByHand = old.ByHand,
            Cleared = old.Cleared,
            HandDate = old.HandDate,
            Place = place,
            Digest = digest,
        };
        foreach (string key in supplied.Keys.Where(key => !_keys.Contains(key) && key != "basis"))
        {
            changed.Elsewhere[key] = old.Elsewhere.TryGetValue(key, out RowPlace earlier) ? earlier : old.Place;
        }

        return changed;
    }
}
