using System.Collections.Frozen;

namespace PartPick.Catalog;

/// <summary>Whether two parts are the same to a circuit and its board: every figure and the package, whoever sells them.</summary>
public static class EqualParts
{
    private static readonly FrozenSet<string> Trade = new[]
    {
        "id", "description", "basis", "supplier", "supplierPart", "currency", "prices", "minimumOrder", "multiple", "stock", "excluded", "note",
    }.ToFrozenSet();

    /// <summary>True where kind, figures and package agree; ids, texts, prices and stock do not count.</summary>
    public static bool AreEqual(Part one, Part other)
    {
        ArgumentNullException.ThrowIfNull(one);
        ArgumentNullException.ThrowIfNull(other);
        return one.Kind == other.Kind && Figures(one).SequenceEqual(Figures(other));
    }

    private static IEnumerable<(string Key, double? Number, string? Text)> Figures(Part part) =>
        PartFigures.Of(part).Where(figure => !Trade.Contains(figure.Key)).Select(figure => (figure.Key, figure.Number, figure.Text));
}
