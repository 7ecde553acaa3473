using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>The first rows of a file, column by column.</summary>
/// <param name="rows">The rows.</param>
internal sealed class ColumnSample(IReadOnlyList<string[]> rows)
{
    private readonly Dictionary<int, string[]> _cells = [];

    /// <summary>The cells of a column that say something.</summary>
    public string[] Cells(int column) => _cells.TryGetValue(column, out string[]? known)
        ? known
        : _cells[column] =
        [
            .. rows.Where(row => row.Length > column).Select(row => CellText.Plain(row[column]))
                .Where(cell => cell.Length is > 0 and < 200),
        ];

    /// <summary>The numbers of a column, those inside lists of prices one by one.</summary>
    public IEnumerable<string> Numbers(ColumnUse use) => use.Field switch
    {
        "prices" => Cells(use.Index).SelectMany(PriceCells.In),
        _ => Cells(use.Index),
    };

    /// <summary>Whether a code stands in every row of a column, each time another one.</summary>
    public bool IsCode(int column)
    {
        string[] cells = Cells(column);
        return cells.Length == rows.Count(row => row.Any(cell => !string.IsNullOrWhiteSpace(cell)))
            && cells.Length > 1
            && cells.Distinct(StringComparer.Ordinal).Count() == cells.Length
            && cells.All(cell => cell.Length is >= 3 and <= 40 && cell.Any(char.IsAsciiDigit) && cell.Count(letter => letter == ' ') <= 1)
            && (cells.Any(cell => cell.Any(char.IsLetter)) || cells.All(cell => cell.Count(char.IsAsciiDigit) >= 5
                && cell.All(letter => char.IsAsciiDigit(letter) || letter is '-' or '/') && char.IsAsciiDigit(cell[0])));
    }

    /// <summary>Whether whole numbers stand in some columns, in each row in ascending order as far as they are there.</summary>
    public bool Ascend(int[] columns)
    {
        bool any = false;
        foreach (string[] row in rows)
        {
            double last = 0;
            IEnumerable<string> cells = columns.Select(column => column < row.Length ? CellText.Plain(row[column]) : "");
            foreach (string cell in cells.Where(cell => cell.Length > 0))
            {
                Result<double> read = CellNumber.Read(cell, Dimension.Count, 0, NumberNotation.Unknown, false);
                if (!read.IsOk || read.Value <= last)
                {
                    return false;
                }

                (last, any) = (read.Value, true);
            }
        }

        return any;
    }

    /// <summary>The share of cells with which something is so; 1 of none.</summary>
    public static double Share(string[] cells, Func<string, bool> fits) =>
        cells.Length == 0 ? 1 : (double)cells.Count(fits) / cells.Length;
}
