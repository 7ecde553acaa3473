using System.Collections.Immutable;

namespace PartPick.Catalog.Import;

/// <summary>What a file looks like before it is imported: its columns, and its first rows as they are read.</summary>
public sealed record ImportLook
{
    /// <summary>The columns as they are to be used.</summary>
    public required ImmutableArray<ImportColumn> Columns { get; init; }

    /// <summary>The first rows.</summary>
    public required ImmutableArray<LookedAtRow> Rows { get; init; }

    /// <summary>The encoding of the file, as far as it was read.</summary>
    public required string Encoding { get; init; }

    /// <summary>The delimiter.</summary>
    public required char Delimiter { get; init; }

    /// <summary>The line of the header.</summary>
    public required long HeaderLine { get; init; }

    /// <summary>Whether some column tells the parts apart; without one nothing can be imported.</summary>
    public required bool HasNumbers { get; init; }

    /// <summary>The first cells of a column that say something.</summary>
    /// <param name="column">The place of the column, from zero.</param>
    /// <param name="most">The most cells.</param>
    public ImmutableArray<string> CellsOf(int column, int most) =>
    [
        .. Rows.Where(row => row.Cells.Length > column).Select(row => row.Cells[column]).Where(cell => cell.Length > 0).Take(most),
    ];
}
