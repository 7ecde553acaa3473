namespace PartPick.Selection.Search;

/// <summary>
/// The nodes round one place along an axis of a grid, and how what is known at them continues to the place: along a straight line
/// between the two beside it, and bent by what lies beyond them.
/// </summary>
internal readonly struct NodeBracket
{
    private readonly double _before;
    private readonly double _low;
    private readonly double _high;
    private readonly double _after;
    private readonly double _at;

    /// <param name="along">Where the places lie along the axis, rising.</param>
    /// <param name="nodes">The places that are nodes, rising; the first and the last place are among them.</param>
    /// <param name="place">The place.</param>
    public NodeBracket(ReadOnlySpan<double> along, ReadOnlySpan<int> nodes, int place)
    {
        int found = nodes.BinarySearch(place);
        int low = found >= 0 ? found : ~found - 1;
        int high = found >= 0 ? found : low + 1;
        Low = nodes[low];
        High = nodes[high];
        Before = low > 0 ? nodes[low - 1] : -1;
        After = high < nodes.Length - 1 ? nodes[high + 1] : -1;
        (_at, _low, _high) = (along[place], along[Low], along[High]);
        _before = Before < 0 ? double.NaN : along[Before];
        _after = After < 0 ? double.NaN : along[After];
        Weight = IsNode ? 0 : (_at - _low) / (_high - _low);
    }

    private NodeBracket(NodeBracket other, Func<int, int> renamed)
    {
        this = other;
        Low = renamed(other.Low);
        High = renamed(other.High);
        Before = other.Before < 0 ? -1 : renamed(other.Before);
        After = other.After < 0 ? -1 : renamed(other.After);
    }

    /// <summary>The node before <see cref="Low"/>; −1 for none.</summary>
    public int Before { get; }

    /// <summary>The node at or before the place.</summary>
    public int Low { get; }

    /// <summary>The node at or after the place.</summary>
    public int High { get; }

    /// <summary>The node after <see cref="High"/>; −1 for none.</summary>
    public int After { get; }

    /// <summary>How far the place stands on the way from one to the other.</summary>
    public double Weight { get; }

    /// <summary>Whether the place is a node itself.</summary>
    public bool IsNode => Low == High;

    /// <summary>The brackets of all places along an axis with a node at every so many-eth.</summary>
    public static NodeBracket[] Along(double[] along, int step)
    {
        int[] nodes = [.. Enumerable.Range(0, along.Length).Where(place => place % step == 0 || place == along.Length - 1)];
        return [.. Enumerable.Range(0, along.Length).Select(place => new NodeBracket(along, nodes, place))];
    }

    /// <summary>The same bracket where places have other numbers.</summary>
    public NodeBracket Renamed(Func<int, int> renamed) => new(this, renamed);

    /// <summary>
    /// By how much the parabola or cubic through the nodes differs from the straight line; zero at a node, and not a number where
    /// neither node beyond is known.
    /// </summary>
    /// <param name="before">Value at <see cref="Before"/>; not a number where not known.</param>
    /// <param name="low">Value at <see cref="Low"/>.</param>
    /// <param name="high">Value at <see cref="High"/>.</param>
    /// <param name="after">Value at <see cref="After"/>; not a number where not known.</param>
    public double Bend(double before, double low, double high, double after)
    {
        if (IsNode)
        {
            return 0;
        }

        // Newton's divided differences: the line, the parabola, the cubic.
        double slope = (high - low) / (_high - _low);
        double span = (_at - _low) * (_at - _high);
        double byBefore = (slope - (low - before) / (_low - _before)) / (_high - _before);
        double byAfter = ((after - high) / (_after - _high) - slope) / (_after - _low);
        if (double.IsNaN(byBefore))
        {
            return span * byAfter;
        }

        return double.IsNaN(byAfter)
            ? span * byBefore
            : span * (byBefore + (byAfter - byBefore) / (_after - _before) * (_at - _before));
    }
}
