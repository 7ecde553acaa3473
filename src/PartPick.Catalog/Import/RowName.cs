namespace PartPick.Catalog.Import;

/// <summary>Finds by what a row names its part.</summary>
internal sealed class RowName
{
    private readonly int _id;
    private readonly int _number;
    private readonly int _supplier;
    private readonly string? _stated;

    /// <summary>Begins with the columns of a file.</summary>
    /// <param name="uses">The columns.</param>
    /// <param name="supplier">The supplier of rows that name none; null for none.</param>
    public RowName(ColumnUse[] uses, string? supplier)
    {
        int Of(string field) => Array.Find(uses, use => use.Field == field)?.Index ?? -1;
        (_id, _number, _supplier, _stated) = (Of("id"), Of("supplierPart"), Of("supplier"), supplier);
    }

    /// <summary>Id, supplier's number and supplier of a row; null where it has none.</summary>
    public (string? Id, string? Number, string? Supplier) Of(IReadOnlyList<string> cells) =>
        (Cell(cells, _id), Cell(cells, _number), Cell(cells, _supplier) ?? _stated);

    private static string? Cell(IReadOnlyList<string> cells, int column)
    {
        string text = column >= 0 && column < cells.Count ? CellText.Harmless(CellText.Plain(cells[column])) : "";
        return text.Length > 0 ? text : null;
    }
}
