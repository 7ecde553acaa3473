namespace PartPick.Catalog.Browsing;

/// <summary>The rows of a list that a filter lets through, in the order of a column.</summary>
public sealed class PartView
{
    private readonly int[] _found;
    private readonly int[] _fullOrder;
    private readonly int[] _shown;

    private PartView(
        PartRows rows, PartFilter filter, ListColumn column, bool descending, int[] found, int[] fullOrder, int[] shown)
    {
        (Rows, Filter, Column, IsDescending) = (rows, filter, column, descending);
        (_found, _fullOrder, _shown) = (found, fullOrder, shown);
    }

    /// <summary>All rows.</summary>
    public PartRows Rows { get; }

    /// <summary>The filter.</summary>
    public PartFilter Filter { get; }

    /// <summary>The column that gives the order.</summary>
    public ListColumn Column { get; }

    /// <summary>Whether the order is turned round.</summary>
    public bool IsDescending { get; }

    /// <summary>How many rows the filter lets through.</summary>
    public int Count => _shown.Length;

    /// <summary>A row that the filter lets through.</summary>
    /// <param name="place">Its place in the order, from zero.</param>
    public PartRow this[int place] => Rows[_shown[place]];

    /// <summary>No rows.</summary>
    /// <param name="kind">The kind.</param>
    public static PartView None(PartKind kind) =>
        new(PartRows.None(kind), PartFilter.All(kind), ListColumns.Of(kind)[0], false, [], [], []);

    /// <summary>Makes a view; what an earlier one found out already is not done again.</summary>
    /// <param name="rows">The rows.</param>
    /// <param name="filter">The filter.</param>
    /// <param name="column">The column that gives the order.</param>
    /// <param name="descending">Whether the order is turned round.</param>
    /// <param name="earlier">An earlier view; null for none.</param>
    /// <param name="cancellation">Ends it.</param>
    public static PartView Of(
        PartRows rows, PartFilter filter, ListColumn column, bool descending, PartView? earlier, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(rows);
        ArgumentNullException.ThrowIfNull(filter);
        earlier = ReferenceEquals(earlier?.Rows, rows) ? earlier : null;
        int[] found = earlier is not null && filter.Narrows(earlier.Filter)
            ? filter.Find(rows, earlier._found, cancellation)
            : filter.Find(rows, cancellation);
        int[] order = earlier is not null && earlier.Column == column && earlier.IsDescending == descending
            ? earlier._fullOrder
            : RowOrder.Of(rows, column, descending, cancellation);
        return new PartView(
            rows, filter, column, descending, found, order, found.Length == rows.Count ? order : Ordered(order, found, rows.Count));
    }

    /// <summary>Finds a part among the rows that the filter lets through.</summary>
    /// <param name="id">The id of the part.</param>
    /// <returns>Its place in the order; -1 where it is not among them.</returns>
    public int PlaceOf(string id)
    {
        int row = Rows.Find(id);
        return row < 0 ? -1 : Array.IndexOf(_shown, row);
    }

    private static int[] Ordered(int[] order, int[] found, int count)
    {
        bool[] holds = new bool[count];
        foreach (int row in found)
        {
            holds[row] = true;
        }

        int[] shown = new int[found.Length];
        int at = 0;
        foreach (int row in order)
        {
            if (holds[row])
            {
                shown[at++] = row;
            }
        }

        return shown;
    }
}
