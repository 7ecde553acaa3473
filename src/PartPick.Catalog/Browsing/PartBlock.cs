using System.Collections.Immutable;

namespace PartPick.Catalog.Browsing;

/// <summary>
/// Some rows of a list, packed: their texts in one run of characters with signs between them that no text holds, and their numbers
/// column by column. Never changed once it is made.
/// </summary>
internal sealed class PartBlock
{
    /// <summary>The most rows of a block; all but the last one of a list are full.</summary>
    public const int Size = 8192;

    /// <summary>Stands behind each text.</summary>
    public const char Stop = '\n';

    private readonly char[] _text;
    private readonly int[] _starts;
    private readonly double[][] _numbers;
    private readonly RowMarks[] _marks;
    private readonly PartKind _kind;

    private PartBlock(PartKind kind, char[] text, int[] starts, double[][] numbers, RowMarks[] marks) =>
        (_kind, _text, _starts, _numbers, _marks) = (kind, text, starts, numbers, marks);

    public int Count => _marks.Length;

    /// <summary>The texts of all rows.</summary>
    public ReadOnlySpan<char> Text => _text;

    public static PartBlock Of(PartKind kind, IReadOnlyList<PartRow> rows)
    {
        int[] starts = new int[rows.Count + 1];
        for (int i = 0; i < rows.Count; i++)
        {
            starts[i + 1] = starts[i] + rows[i].Cells.Sum(cell => cell.Length + 1);
        }

        char[] text = new char[starts[^1]];
        int at = 0;
        foreach (string cell in rows.SelectMany(row => row.Cells))
        {
            cell.CopyTo(0, text, at, cell.Length);
            text.AsSpan(at, cell.Length).Replace(Stop, ' ');
            at += cell.Length + 1;
            text[at - 1] = Stop;
        }

        int columns = ListColumns.Of(kind).Count(column => column.IsNumber);
        double[][] numbers = [.. Enumerable.Range(0, columns).Select(column => rows.Select(row => row.Numbers[column]).ToArray())];
        return new PartBlock(kind, text, starts, numbers, [.. rows.Select(row => row.Marks)]);
    }

    /// <summary>The texts of a row.</summary>
    public ReadOnlySpan<char> TextOf(int row) => _text.AsSpan(_starts[row], _starts[row + 1] - _starts[row]);

    /// <summary>One text of a row.</summary>
    public ReadOnlySpan<char> CellOf(int row, int cell)
    {
        ReadOnlySpan<char> rest = TextOf(row);
        while (cell-- > 0)
        {
            rest = rest[(rest.IndexOf(Stop) + 1)..];
        }

        return rest[..rest.IndexOf(Stop)];
    }

    public double NumberOf(int row, int number) => _numbers[number][row];

    /// <summary>The row in whose texts a place of <see cref="Text"/> is.</summary>
    public int RowAt(int place)
    {
        int found = Array.BinarySearch(_starts, place);
        return found >= 0 ? found : ~found - 1;
    }

    /// <summary>Where the texts of a row begin in <see cref="Text"/>.</summary>
    public int StartOf(int row) => _starts[row];

    public PartRow Row(int row)
    {
        string[] cells = TextOf(row)[..^1].ToString().Split(Stop);
        return new PartRow(_kind, [.. cells], [.. _numbers.Select(column => column[row])], _marks[row]);
    }

    /// <summary>The same rows but for one.</summary>
    public PartBlock With(int row, PartRow changed)
    {
        PartRow[] rows = [.. Enumerable.Range(0, Count).Select(i => i == row ? changed : Row(i))];
        return Of(_kind, rows);
    }
}
