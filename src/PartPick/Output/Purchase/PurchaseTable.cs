using PartPick.Selection;

namespace PartPick.Output;

/// <summary>A purchase list for the terminal.</summary>
internal static class PurchaseTable
{
    /// <summary>Prints it.</summary>
    public static void Write(TextWriter output, PurchaseList list)
    {
        var cells = new PurchaseCells(list);
        foreach (PurchaseCircuit circuit in list.Circuits)
        {
            output.WriteLine($"{circuit.Label}: {circuit.Name}; {Figures.Whole(circuit.Builds)} boards");
        }

        output.WriteLine();
        TextTable.Write(
            output,
            [
                new("#", true), new("references"), new("required", true), new("order", true), new("part"), new("supplier's number"),
                new("unit price", true), new($"total ({list.Currency})", true), new("stock", true), new("covers"), new("remark"),
            ],
            [
                .. cells.Orders.Select(row => new[]
                {
                    row.First ? Figures.Whole(row.Line.Number) : "", row.First ? cells.References(row.Line) : "",
                    row.First ? Figures.Whole(row.Line.Required) : "", Figures.Whole(row.Order.Quantity), row.Order.Part.Id,
                    row.Order.Part.SupplierPart ?? "", cells.Price(row.Order.UnitPrice), cells.Amount(row.Order.Total),
                    PurchaseCells.Stock(row.Order), PurchaseCells.Covers(row.Order), row.First ? cells.Remark(row.Line, true) : "",
                }),
            ]);
        output.WriteLine();
        output.WriteLine($"Total: {cells.Amount(list.Total)} {list.Currency}".TrimEnd());
        foreach (string note in cells.Notes())
        {
            output.WriteLine(note);
        }
    }
}
