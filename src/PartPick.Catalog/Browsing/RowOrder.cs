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

    // Many parts share a package or a supplier: the different texts are put in order, and the rows dealt out to them.
    private static void SortTexts(PartRows rows, int cell, int[] order, bool descending, CancellationToken cancellation)
    {
        var numbers = new Dictionary<string, int>(StringComparer.OrdinalIgnoreCase);
        Dictionary<string, int>.AlternateLookup<ReadOnlySpan<char>> lookup = numbers.GetAlternateLookup<ReadOnlySpan<char>>();
        int[] textOf = new int[order.Length];
        for (int i = 0; i < order.Length; i++)
        {
            if (i % PartBlock.Size == 0)
            {
                cancellation.ThrowIfCancellationRequested();
            }

            ReadOnlySpan<char> text = rows.BlockOf(i).CellOf(i % PartBlock.Size, cell);
            if (!lookup.TryGetValue(text, out textOf[i]))
            {
                textOf[i] = numbers.Count;
                lookup[text] = textOf[i];
            }
        }

        string[] texts = [.. numbers.Keys];
        Array.Sort(texts, StringComparer.OrdinalIgnoreCase);
        cancellation.ThrowIfCancellationRequested();
        IEnumerable<string> wanted = descending ? texts.Reverse() : texts;
        int[] placeOf = new int[texts.Length];
        int place = 0;
        foreach (string text in wanted.Where(text => text.Length > 0))
        {
            placeOf[numbers[text]] = place++;
        }

        if (numbers.TryGetValue("", out int nothing))
        {
            placeOf[nothing] = place;
        }

        Deal(textOf, placeOf, order);
    }

    private static void Deal(int[] textOf, int[] placeOf, int[] order)
    {
        int[] starts = new int[placeOf.Length + 1];
        foreach (int text in textOf)
        {
            starts[placeOf[text] + 1]++;
        }

        for (int i = 1; i < starts.Length; i++)
        {
            starts[i] += starts[i - 1];
        }

        for (int row = 0; row < textOf.Length; row++)
        {
            order[starts[placeOf[textOf[row]]]++] = row;
        }
    }
}
