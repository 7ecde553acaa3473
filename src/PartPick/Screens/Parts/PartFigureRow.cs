using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Browsing;
using PartPick.Output;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>A figure of the open part, there or not.</summary>
/// <param name="Key">Its key.</param>
/// <param name="Dimension">What a number measures; null for a text.</param>
/// <param name="Value">The figure with its unit; null where there is none.</param>
/// <param name="Basis">What it rests on; empty where that goes without saying.</param>
/// <param name="Origin">Where it came from; empty where there is none.</param>
/// <param name="CanBeSet">Whether it can be set by hand.</param>
public sealed record PartFigureRow(string Key, Dimension? Dimension, string? Value, string Basis, string Origin, bool CanBeSet)
{
    /// <summary>The figures of a part in the order of its file's columns; of the supply points, those of points that are there.</summary>
    /// <param name="entry">The part.</param>
    public static ImmutableArray<PartFigureRow> Of(CatalogEntry entry)
    {
        ArgumentNullException.ThrowIfNull(entry);
        var lines = FigureLine.Of(entry).ToDictionary(line => line.Key);
        string[] points = [.. lines.Keys.Select(PointOf).Where(point => point.Length > 0).Distinct()];
        var rows = ImmutableArray.CreateBuilder<PartFigureRow>();
        rows.Add(new PartFigureRow("id", null, entry.Part.Id, "", lines["id"].Origin, false));
        foreach (FigureKey figure in FigureKey.Of(entry.Part.Kind))
        {
            if (lines.TryGetValue(figure.Key, out FigureLine? line))
            {
                string? value = line.Value == Output.Figures.None ? null : line.Value;
                rows.Add(new PartFigureRow(figure.Key, figure.Dimension, value, line.Basis, line.Origin, true));
            }
            else if (PointOf(figure.Key) is "" || points.Contains(PointOf(figure.Key)))
            {
                string origin = entry.Origin.GetValueOrDefault(figure.Key, "");
                rows.Add(new PartFigureRow(figure.Key, figure.Dimension, null, "", origin, true));
            }
        }

        return rows.ToImmutable();
    }

    private static string PointOf(string key) => key.Contains(' ', StringComparison.Ordinal) ? key.Split(' ')[1] : "";
}
