using System.Collections.Immutable;

namespace PartPick.Catalog.Browsing;

/// <summary>Puts all rows of a list in the order of a column.</summary>
public static class RowOrder
{
    /// <summary>
    /// The numbers of the rows in ascending order of a column; rows with nothing in it come last, equal ones in the order of their
    /// ids.
    /// </summary>
    /// <param name="rows">The rows.</param>
    /// <param name="column">The column.</param>
    /// <param name="descending">Whether the order is turned round.</param>
    /// <param name="cancellation">Ends it.</param>
    public static int[] Of(PartRows rows, ListColumn column, bool descending, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(rows);
        ArgumentNullException.ThrowIfNull(column);
        ImmutableArray<ListColumn> alike = [.. ListColumns.Of(rows.Kind).Where(each => each.IsNumber == column.IsNumber)];
        int place = alike.IndexOf(column);
        int[] order = [.. Enumerable.Range(0, rows.Count)];
        if (column.IsNumber)
        {
            SortNumbers(rows, place, order, descending, cancellation);
        }
        else if (column.Key != "id")
        {
            SortTexts(rows, place, order, descending, cancellation);
        }
        else if (descending)
        {
            Array.Reverse(order);
        }

        return order;
    }

    private static void SortNumbers(PartRows rows, int number, int[] order, bool descending, CancellationToken cancellation)
    {
        double[] keys = new double[order.Length];
        for (int i = 0; i < order.Length; i++)
        {
            double value = rows.BlockOf(i).NumberOf(i % PartBlock.Size, number);
            keys[i] = double.IsNaN(value) ? double.PositiveInfinity : descending ? -value : value;
        }

        cancellation.ThrowIfCancellationRequested();
        Array.Sort(keys, order);
        for (int start = 0, end; start < order.Length; start = end)
        {
            for (end = start + 1; end < order.Length && keys[end] == keys[start]; end++)
            {
            }

            Array.Sort(order, start, end - start);
        }
    }

    private static void SortTexts(PartRows rows, int cell, int[] order, bool descending, CancellationToken cancellation)
    {
        int compared = 0;
        var texts = new (PartBlock Block, int Row)[order.Length];
        for (int i = 0; i < order.Length; i++)
        {
            texts[i] = (rows.BlockOf(i), i % PartBlock.Size);
        }

        try
        {
            order.AsSpan().Sort(Compare);
        }
        catch (InvalidOperationException) when (cancellation.IsCancellationRequested)
        {
            cancellation.ThrowIfCancellationRequested();
        }

        int Compare(int one, int other)
        {
            if (++compared % 65536 == 0)
            {
                cancellation.ThrowIfCancellationRequested();
            }

            ReadOnlySpan<char> left = texts[one].Block.CellOf(texts[one].Row, cell);
            ReadOnlySpan<char> right = texts[other].Block.CellOf(texts[other].Row, cell);
            if (left.IsEmpty || right.IsEmpty)
            {
                return left.IsEmpty && right.IsEmpty ? one - other : left.IsEmpty ? 1 : -1;
            }

            int compare = left.CompareTo(right, StringComparison.OrdinalIgnoreCase);
            return compare == 0 ? one - other : descending ? -compare : compare;
        }
    }
}
