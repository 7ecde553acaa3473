using System.Text;
using PartPick.Commands;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>A list with its circuits and what to order for them, as Markdown.</summary>
internal static class PurchaseMarkdown
{
    private static readonly string[] OrderColumns =
    [
        "#", "references", "per build", "builds", "attrition (%)", "order", "description", "part", "supplier", "supplier's number",
        "unit price", "total", "stock", "covers", "alternates", "remark",
    ];

    /// <summary>The document.</summary>
    public static string Of(ShortlistView view, PurchaseList list, DateOnly date)
    {
        var text = new StringBuilder();
        var cells = new PurchaseCells(list);
        Line(text, $"# {Escaped(view.Name)}");
        Line(text, "");
        Line(text, $"Purchase list of {date.ToString("yyyy-MM-dd", System.Globalization.CultureInfo.InvariantCulture)}. "
            + "Figures and prices are those of the catalogue on this day.");
        Line(text, "");
        Table(
            text, ["#", "circuit", "boards", "output", "error (ppm)", "margin", $"cost per board ({list.Currency})", "state", "note"],
            view.Candidates.Select(each => new[]
            {
                Figures.Whole(each.Entry.Number), ReviewWords.Name(each), Figures.Whole(each.Entry.Builds),
                Values.ValueText.Format(each.Requirement.OutputHz, Values.Dimension.Frequency, 9), Figures.Fixed(each.Now.ErrorWorst, 1, 1),
                Figures.Fixed(each.Now.Margin, 1, 2), ReviewWords.Money(each.Now.Cost), ReviewWords.State(each), each.Entry.Note ?? "",
            }));
        foreach (ShortlistReview review in view.Candidates)
        {
            foreach (string line in ReviewWords.Lines(review))
            {
                Line(text, $"- {Figures.Whole(review.Entry.Number)}: {Escaped(line)}");
            }
        }

        Line(text, "");
        Line(text, "## Orders");
        Line(text, "");
        Table(text, OrderColumns, cells.Orders.Select(row => new[]
        {
            Figures.Whole(row.Line.Number), cells.References(row.Line), PurchaseCells.PerBuild(row.Line), PurchaseCells.Builds(row.Line),
            cells.Attrition(row.Line), Figures.Whole(row.Order.Quantity), row.Line.Description, row.Order.Part.Id,
            row.Order.Part.Supplier ?? "", row.Order.Part.SupplierPart ?? "", cells.Price(row.Order.UnitPrice),
            cells.Amount(row.Order.Total), PurchaseCells.Stock(row.Order), PurchaseCells.Covers(row.Order),
            PurchaseCells.Alternates(row.Line), cells.Remark(row.Line, row.First),
        }));
        Line(text, "");
        Line(text, $"**Total: {cells.Amount(list.Total)} {Escaped(list.Currency)}**");
        Line(text, "");
        foreach (string note in cells.Notes())
        {
            Line(text, "- " + Escaped(note));
        }

        Line(text, cells.Notes().IsEmpty ? null : "");
        Line(text, HelpFooter.Cautions);
        return text.ToString();
    }

    private static void Table(StringBuilder text, string[] header, IEnumerable<string[]> rows)
    {
        Line(text, "| " + string.Join(" | ", header.Select(Escaped)) + " |");
        Line(text, "|" + string.Concat(header.Select(_ => "---|")));
        foreach (string[] row in rows)
        {
            Line(text, "| " + string.Join(" | ", row.Select(Escaped)) + " |");
        }

        Line(text, "");
    }

    // Every sign that Markdown or the HTML in it could take for its own stands for itself.
    private static string Escaped(string cell)
    {
        var shown = new StringBuilder();
        foreach (char sign in cell)
        {
            _ = sign switch
            {
                '\\' or '|' or '*' or '_' or '`' or '[' or ']' or '#' or '<' or '>' or '~' or '!' => shown.Append('\\').Append(sign),
                '&' => shown.Append("&amp;"),
                _ => shown.Append(char.IsControl(sign) ? ' ' : sign),
            };
        }

        return shown.ToString();
    }

    private static void Line(StringBuilder text, string? line) => text.Append(line).Append(line is null ? "" : "\n");
}
