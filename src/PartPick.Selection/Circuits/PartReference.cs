using PartPick.Catalog;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>A part named by its id in the place of plain values.</summary>
internal static class PartReference
{
    /// <summary>The key that names the id.</summary>
    public const string Key = "part";

    /// <summary>The part that an object names; null where it gives plain values, or is wrong.</summary>
    /// <param name="fields">The object.</param>
    /// <param name="catalog">The catalogue; null where there is none.</param>
    /// <param name="what">What should be named: "a crystal of the catalogue".</param>
    public static T? Find<T>(FieldReader fields, PartsCatalog? catalog, string what)
        where T : Part
    {
        if (!fields.Has(Key))
        {
            return null;
        }

        fields.Allow("a part named by its id", [Key]);
        if (fields.Text(Key, $"the id of {what}") is not { } id)
        {
            return null;
        }

        if (catalog?.Find(id) is T found)
        {
            return found;
        }

        string wrong = catalog is null ? "cannot be looked up without a catalogue"
            : catalog.Find(id) is { } other ? $"is not {what} but one of the kind {other.Kind.ToString().ToLowerInvariant()}"
            : "is not in the catalogue";
        string? near = catalog is null ? null : NearWord.Of(id, catalog.All.OfType<T>().Select(part => part.Id));
        fields.Reject(Key, $"{Problem.Quote(id)} {wrong}", near is null ? $"the id of {what}" : $"'{near}'");
        return null;
    }
}
