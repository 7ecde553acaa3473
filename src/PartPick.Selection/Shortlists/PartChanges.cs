using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Compares the parts of a candidate with those of another day.</summary>
internal static class PartChanges
{
    private static readonly string[] PriceKeys = ["currency", "prices", "minimumOrder", "multiple"];

    /// <summary>What changed, in the order of the designators.</summary>
    /// <param name="then">The parts of that day, each in its place.</param>
    /// <param name="now">Today's catalogue.</param>
    public static ImmutableArray<PartChange> Of(ImmutableArray<PartUse> then, PartsCatalog now) =>
    [
        .. then.GroupBy(use => use.Part.Id, StringComparer.Ordinal).SelectMany(group =>
        {
            string places = string.Join(", ", group.Select(use => use.Designator));
            Part old = group.First().Part;
            return now.Find(old.Id) is { } part && part.Kind == old.Kind
                ? Compare(places, old, part)
                : [new PartChange(places, old.Id, ChangeKind.Gone, "", "", "")];
        }),
    ];

    private static IEnumerable<PartChange> Compare(string places, Part old, Part now)
    {
        var before = PartFigures.Of(old).ToDictionary(figure => figure.Key, figure => figure.ToString(), StringComparer.Ordinal);
        var after = PartFigures.Of(now).ToDictionary(figure => figure.Key, figure => figure.ToString(), StringComparer.Ordinal);
        foreach (string key in before.Keys.Union(after.Keys))
        {
            (string was, string @is) = (before.GetValueOrDefault(key, ""), after.GetValueOrDefault(key, ""));
            if (was != @is)
            {
                yield return new PartChange(places, old.Id, KindOf(key), key, was, @is);
            }
        }
    }

    private static ChangeKind KindOf(string key) =>
        key == "stock" ? ChangeKind.Stock : PriceKeys.Contains(key) ? ChangeKind.Price : ChangeKind.Data;
}
