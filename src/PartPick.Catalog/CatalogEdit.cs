using System.Globalization;
using PartPick.Catalog.Fields;
using PartPick.Catalog.Import;
using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>Sets figures of a part by hand. They count before what was supplied, and no import changes them.</summary>
public static class CatalogEdit
{
    /// <summary>Sets figures, all of them or, where one is wrong, none.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="id">The id of the part.</param>
    /// <param name="changes">
    /// Keys with their values as they are typed; an empty value takes the figure away, null brings the supplied one back.
    /// </param>
    /// <param name="date">The day.</param>
    /// <returns>The part as it now is, or the problem.</returns>
    public static Result<Part> Set(string path, string id, IReadOnlyList<(string Key, string? Value)> changes, DateOnly date)
    {
        ArgumentNullException.ThrowIfNull(id);
        ArgumentNullException.ThrowIfNull(changes);
        return CatalogChange.Hold(
            path, () => CatalogStore.UseCurrent(path, file => Change(file, id, changes, date)).Then(result => result));
    }

    internal static bool CanBeSet(PartField field) => field.Key is not ("id" or "basis");

    private static Result<Part> Change(CatalogFile file, string id, IReadOnlyList<(string Key, string? Value)> changes, DateOnly date)
    {
        if (file.FindStored(id) is not { } stored)
        {
            return Result.Fail<Part>("ID", $"{Problem.Quote(id)} is no part of the catalogue", "an id from partpick catalog list");
        }

        PartShape shape = PartShape.Of(stored.Kind);
        foreach ((string key, string? value) in changes)
        {
            PartField? field = shape.Fields.FirstOrDefault(each => each.Key == key && CanBeSet(each));
            if (field is null)
            {
                return Result.Fail<Part>(
                    key, $"is no figure of {stored.Kind.Word()} that can be set",
                    "one of " + string.Join(", ", shape.Fields
                        .Where(CanBeSet)
                        .Select(each => each.Key)
                        .Where(each => !each.Contains(' ', StringComparison.Ordinal))));
            }

            stored.ByHand.Remove(key);
            stored.Cleared.Remove(key);
            string text = CellText.Harmless(value ?? "").Trim();
            if (value is not null && text.Length == 0)
            {
                stored.Cleared.Add(key);
            }
            else if (text.Length > 0 && (field with { Power = 0 }).Read(text, stored.ByHand, () => key) is { } wrong)
            {
                return Result.Fail<Part>(wrong);
            }
        }

        stored.HandDate = stored.ByHand.Keys.Any() || stored.Cleared.Count > 0
            ? date.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture)
            : null;
        var figures = new DraftReader(stored.Figures(), key => key);
        if (shape.Build(figures) is not { } part)
        {
            return Result.Fail<Part>(figures.Problems[0]);
        }

        file.Put(stored);
        return Result.Ok(part);
    }
}
