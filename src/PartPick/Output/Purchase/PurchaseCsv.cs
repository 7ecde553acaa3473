using CsvHelper;
using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>A purchase list as CSV by RFC 4180: one row an order, lines ending in CR LF.</summary>
internal static class PurchaseCsv
{
    private static readonly string[] Header =
    [
        "line", "references", "perBuild", "builds", "needed", "attrition (%)", "required", "order", "description", "part", "supplier",
        "supplierPart", "unitPrice", "currency", "lineTotal", "stock", "covers", "alternates", "remark",
    ];

    /// <summary>Writes it; a byte order mark is the file's matter.</summary>
    public static void Write(TextWriter output, PurchaseList list, CsvStyle style)
    {
        var cells = new PurchaseCells(list, style.DecimalSign);
        using CsvWriter writer = CsvWriter.Create(
            output,
            CsvWriterOptions.Default with { NewLine = "\r\n", Separator = style.Delimiter, WriteByteOrderMark = false },
            true);
        writer.WriteRecord(Header);
        foreach ((PurchaseLine line, PurchaseOrder order, bool first) in cells.Orders)
        {
            writer.WriteRecord([.. Row(cells, list, line, order, first).Select(SpreadsheetText.Harmless)]);
        }

        writer.Flush();
    }

    // What belongs to the whole line stands in its first row alone, so that columns can be added up.
    private static string[] Row(PurchaseCells cells, PurchaseList list, PurchaseLine line, PurchaseOrder order, bool first) =>
    [
        Figures.Whole(line.Number),
        cells.References(line),
        PurchaseCells.PerBuild(line),
        PurchaseCells.Builds(line),
        first ? Figures.Whole(line.Needed) : "",
        cells.Attrition(line),
        first ? Figures.Whole(line.Required) : "",
        Figures.Whole(order.Quantity),
        line.Description,
        order.Part.Id,
        order.Part.Supplier ?? "",
        order.Part.SupplierPart ?? "",
        cells.Price(order.UnitPrice),
        list.Currency,
        cells.Amount(order.Total),
        PurchaseCells.Stock(order),
        PurchaseCells.Covers(order),
        PurchaseCells.Alternates(line),
        cells.Remark(line, first),
    ];
}
