using System.Globalization;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>
/// The design record of a list: one page to print, complete in itself, with each circuit's drawing, pictures, budget, parts and
/// assumptions, what to order, and the cautions.
/// </summary>
internal static class DesignRecord
{
    private const string Style =
        """
        body { font: 10.5pt/1.4 sans-serif; color: #111; background: #fff; max-width: 62em; margin: 2em auto; padding: 0 1em; }
        h1 { font-size: 1.6em; margin-bottom: 0; } h2 { font-size: 1.25em; border-bottom: 1px solid #888; margin-top: 2em; }
        h3 { font-size: 1em; margin: 1.2em 0 .3em; }
        table { border-collapse: collapse; margin: .5em 0; font-size: .85em; }
        th, td { padding: .15em .5em; text-align: left; vertical-align: top; }
        th { border-bottom: 1px solid #888; } td { border-bottom: 1px solid #ddd; } .n { text-align: right; white-space: nowrap; }
        svg { display: block; margin: .5em 0; max-width: 100%; height: auto; }
        svg text { font: 13px monospace; fill: currentColor; stroke: none; }
        .caution { border: 2px solid #111; padding: .2em 1em; margin: 1em 0; }
        .changed { border-left: 4px solid #111; padding-left: .8em; }
        section.circuit { break-before: page; } h2, h3 { break-after: avoid; } tr, svg { break-inside: avoid; }
        @media print { body { margin: 0; max-width: none; } }
        @page { margin: 15mm; }
        """;

    /// <summary>The page.</summary>
    public static string Of(ShortlistView view, PurchaseList list, DateOnly date)
    {
        var page = new Html();
        page.Raw("<!DOCTYPE html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">")
            .Raw("<meta name=\"viewport\" content=\"width=device-width\">")
            .Element("title", "Design record: " + view.Name)
            .Raw("<style>\n" + Style + "\n</style>\n</head>\n<body>")
            .Element("h1", "Design record: " + view.Name)
            .Element("p", date.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture)
                + ". All figures are computed from the parts of the catalogue on this day.");
        WriteSummary(page, view, list);
        RecordCautions.Write(page);
        foreach (ShortlistReview review in view.Candidates)
        {
            CircuitSection.Write(page, review);
        }

        WriteOrders(page, list);
        page.Raw("</body>\n</html>");
        return page.ToString();
    }

    private static void WriteSummary(Html page, ShortlistView view, PurchaseList list) => page.Table(
        [
            new("#", true), new("circuit"), new("boards", true), new("output"), new("error (ppm)", true), new("margin", true),
            new($"cost per board ({list.Currency})", true), new("state"), new("note"),
        ],
        view.Candidates.Select(each => new[]
        {
            Figures.Whole(each.Entry.Number), ReviewWords.Name(each), Figures.Whole(each.Entry.Builds),
            Values.ValueText.Format(each.Requirement.OutputHz, Values.Dimension.Frequency, 9), Figures.Fixed(each.Now.ErrorWorst, 1, 1),
            Figures.Fixed(each.Now.Margin, 1, 2), ReviewWords.Money(each.Now.Cost), ReviewWords.State(each), each.Entry.Note ?? "",
        }));

    private static void WriteOrders(Html page, PurchaseList list)
    {
        var cells = new PurchaseCells(list);
        page.Raw("<section class=\"circuit\">")
            .Element("h2", "What to order")
            .Table(
                [
                    new("#", true), new("references"), new("per build"), new("builds"), new("attrition (%)", true), new("order", true),
                    new("description"), new("part"), new("supplier"), new("supplier's number"), new("unit price", true),
                    new($"total ({list.Currency})", true), new("stock", true), new("covers"), new("alternates"), new("remark"),
                ],
                cells.Orders.Select(row => new[]
                {
                    Figures.Whole(row.Line.Number), cells.References(row.Line), PurchaseCells.PerBuild(row.Line),
                    PurchaseCells.Builds(row.Line), cells.Attrition(row.Line), Figures.Whole(row.Order.Quantity), row.Line.Description,
                    row.Order.Part.Id, row.Order.Part.Supplier ?? "", row.Order.Part.SupplierPart ?? "", cells.Price(row.Order.UnitPrice),
                    cells.Amount(row.Order.Total), PurchaseCells.Stock(row.Order), PurchaseCells.Covers(row.Order),
                    PurchaseCells.Alternates(row.Line), cells.Remark(row.Line, row.First),
                }))
            .Element("p", $"Total: {cells.Amount(list.Total)} {list.Currency}")
            .List(cells.Notes())
            .Raw("</section>");
    }
}
