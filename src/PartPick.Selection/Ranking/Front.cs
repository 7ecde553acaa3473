namespace PartPick.Selection.Search;

/// <summary>
/// The fit combinations that no other one beats or equals on error, margin and cost with one strictly better. Safe to use from
/// several threads; what it holds in the end does not depend on the order in which points came.
/// </summary>
internal sealed class Front
{
    private readonly Lock _gate = new();

    // In order of the error: only those before a point can dominate it.
    private FitPoint[] _points = [];

    /// <summary>The points so far.</summary>
    public IReadOnlyList<FitPoint> Points => Volatile.Read(ref _points);

    /// <summary>Adds a point unless another dominates it, and drops what it dominates.</summary>
    public void Add(FitPoint point)
    {
        lock (_gate)
        {
            if (Beats(point.ErrorRatio, point.Margin, point.Cost))
            {
                return;
            }

            Volatile.Write(ref _points,
            [
                .. _points.TakeWhile(other => other.ErrorRatio < point.ErrorRatio),
                point,
                .. _points.SkipWhile(other => other.ErrorRatio < point.ErrorRatio)
                    .Where(other => !point.Dominates(other.ErrorRatio, other.Margin, other.Cost)),
            ]);
        }
    }

    /// <summary>Whether a point here dominates these figures.</summary>
    public bool Beats(double errorRatio, double margin, decimal cost)
    {
        foreach (FitPoint point in Volatile.Read(ref _points))
        {
            if (point.ErrorRatio > errorRatio)
            {
                return false;
            }

            if (point.Dominates(errorRatio, margin, cost))
            {
                return true;
            }
        }

        return false;
    }
}
