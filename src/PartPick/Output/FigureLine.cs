using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Output;

/// <summary>One figure of a part in words.</summary>
/// <param name="Key">Its key.</param>
/// <param name="Value">The figure with its unit, or a dash.</param>
/// <param name="Basis">What it rests on; empty where that goes without saying.</param>
/// <param name="Origin">Where it came from.</param>
internal sealed record FigureLine(string Key, string Value, string Basis, string Origin)
{
    /// <summary>The figures of a part, those that are assumed because they are not stated behind the others.</summary>
    public static IReadOnlyList<FigureLine> Of(CatalogEntry entry)
    {
        var lines = PartFigures.Of(entry.Part).Where(figure => figure.Key != "basis").Select(figure => new FigureLine(
            figure.Key,
            figure.ToString(),
            figure is { Dimension: null or Dimension.Count, Basis: Catalog.Basis.Stated } ? "" : BasisWord(figure.Basis),
            entry.Origin.GetValueOrDefault(figure.Key, ""))).ToList();
        lines.AddRange(PartFigures.AssumedOf(entry.Part).Where(key => !lines.Exists(line => line.Key.Split(' ')[0] == key))
            .Select(key => new FigureLine(key, Figures.None, "assumed", "not stated: usual of its class")));
        return lines;
    }

    private static string BasisWord(Basis basis) => basis switch
    {
        Catalog.Basis.Minimum => "minimum",
        Catalog.Basis.Typical => "typical",
        Catalog.Basis.Maximum => "maximum",
        Catalog.Basis.Assumed => "assumed",
        _ => "stated",
    };
}
