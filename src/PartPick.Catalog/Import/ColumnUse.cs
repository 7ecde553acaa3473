namespace PartPick.Catalog.Import;

/// <summary>What becomes of one column of a file.</summary>
internal sealed record ColumnUse
{
    /// <summary>The power that says: a number without a unit is refused.</summary>
    public const int NoPlainNumbers = int.MinValue;

    /// <summary>The place of the column, counted from 0.</summary>
    public required int Index { get; init; }

    /// <summary>The cell of the header.</summary>
    public required string Header { get; init; }

    /// <summary>The unit that the header states; empty for none.</summary>
    public string HeaderUnit { get; init; } = "";

    /// <summary>The key of the figure, or temperature, toleranceAny, price or prices; null where the column is not used.</summary>
    public string? Field { get; init; }

    /// <summary>The unit of numbers that have none; empty for the SI unit.</summary>
    public string Unit { get; init; } = "";

    /// <summary>The power of ten of <see cref="Unit"/>.</summary>
    public int Power { get; init; }

    /// <summary>How numbers are written.</summary>
    public NumberNotation Notation { get; init; }

    /// <summary>What the figures rest on.</summary>
    public Basis Basis { get; init; }

    /// <summary>The quantity from which on a price holds.</summary>
    public int Quantity { get; init; } = 1;

    /// <summary>The column with the quantity from which on the price of a row holds; null where <see cref="Quantity"/> is it.</summary>
    public int? QuantityColumn { get; init; }

    /// <summary>Whether header or user say the quantity.</summary>
    public bool IsQuantityStated { get; init; }

    /// <summary>For how many pieces together the price is.</summary>
    public int Per { get; init; } = 1;

    /// <summary>The column that says for how many; null where <see cref="Per"/> does.</summary>
    public int? PerColumn { get; init; }

    /// <summary>Whether the price may be that of one piece or of <see cref="Quantity"/> together.</summary>
    public bool IsPerOpen { get; init; }

    /// <summary>Whether neither header nor user have said what the column is, so that its cells may.</summary>
    public bool IsUnnamed { get; init; }

    /// <summary>The currency of prices that name none.</summary>
    public string? Currency { get; init; }

    /// <summary>Whether the header is the program's own, so that cells are read exactly as they were written.</summary>
    public bool Exact { get; init; }

    /// <summary>Why the column is used so, or why it is not.</summary>
    public string Why { get; init; } = "";
}
