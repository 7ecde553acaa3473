using System.Collections.Immutable;
using System.Globalization;
using PartPick.Catalog;
using PartPick.Catalog.Browsing;

namespace PartPick.Output;

/// <summary>Parts as tables for people.</summary>
internal static class PartTable
{
    /// <summary>Prints parts of one kind, a line each, with the figures by which one chooses among them.</summary>
    public static void WriteList(TextWriter output, PartKind kind, IReadOnlyList<CatalogEntry> entries)
    {
        ImmutableArray<ListColumn> figures = ListColumns.ChoosingFigures(kind);
        TextColumn[] columns =
        [
            new("id"), .. figures.Select(figure => new TextColumn(figure.Heading, true)), new("stock", true), new("price at 1", true),
            new("currency"), new("description"),
        ];
        TextTable.Write(output, columns, [.. entries.Select(entry => Row(entry.Part, figures))]);
    }

    /// <summary>Prints one part, a line for each figure, with what it rests on and where it came from.</summary>
    public static void WriteOne(TextWriter output, CatalogEntry entry)
    {
        TextTable.Write(
            output, [new("figure"), new("value"), new("basis"), new("origin")],
            [.. FigureLine.Of(entry).Select(line => new[] { line.Key, line.Value, line.Basis, line.Origin })]);
    }

    private static string[] Row(Part part, ImmutableArray<ListColumn> figures)
    {
        var known = PartFigures.Of(part).ToDictionary(figure => figure.Key);
        return
        [
            part.Id,
            .. figures.Select(figure => known.TryGetValue(figure.Key, out PartFigure? found)
                ? found.Text ?? Figures.Short(found.Number, figure.Unit)
                : Figures.None),
            part.Stock?.ToString(CultureInfo.InvariantCulture) ?? Figures.None,
            part.Offer.HasPrices ? part.Offer.Prices[0].UnitPrice.ToString(CultureInfo.InvariantCulture) : Figures.None,
            part.Offer.Currency,
            part.Description,
        ];
    }
}
