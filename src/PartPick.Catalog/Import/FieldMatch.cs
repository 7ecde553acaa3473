using PartPick.Catalog.Fields;

namespace PartPick.Catalog.Import;

/// <summary>How surely a header names a field.</summary>
/// <param name="Column">The place of the column.</param>
/// <param name="Field">The field.</param>
/// <param name="Score">Greater is surer: 90 and more for the whole name, 50 and more for a part of it.</param>
internal readonly record struct FieldMatch(int Column, string Field, double Score)
{
    /// <summary>All fields that a header may name.</summary>
    public static IEnumerable<FieldMatch> Of(PartKind kind, int column, HeaderCell header)
    {
        foreach (PartField field in PartShape.Of(kind).Fields)
        {
            if (Trade.Words(field.Key) == header.Name)
            {
                string named = (kind, field.Key) is (PartKind.Capacitor, "tolerance") ? "toleranceAny" : field.Key;
                yield return new FieldMatch(column, named, 110);
            }
        }

        foreach ((string field, string[] phrases) in Trade.Of(kind))
        {
            double best = 0;
            for (int i = 0; i < phrases.Length; i++)
            {
                best = Math.Max(best, Rate(header, phrases[i]) - (i * 0.1));
            }

            if (best > 40)
            {
                yield return new FieldMatch(column, field, best);
            }
        }
    }

    private static double Rate(HeaderCell header, string phrase)
    {
        if (header.Name == phrase)
        {
            return 100;
        }

        if (header.BareName == phrase)
        {
            return 90;
        }

        bool inside = phrase.Length >= 4 && $" {header.Name} ".Contains($" {phrase} ", StringComparison.Ordinal);
        return inside ? 50 + (phrase.Length * 0.5) : 0;
    }
}
