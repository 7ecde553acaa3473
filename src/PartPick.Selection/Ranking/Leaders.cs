namespace PartPick.Selection.Search;

/// <summary>
/// The best scores of the groups found so far, to leave out what can no longer be listed. The cheapest fit cost, by which
/// scores are scaled, is known only between two bounds; a score is linear in its inverse, so what loses at both bounds loses.
/// </summary>
internal sealed class Leaders
{
    private const double Tie = 1e-9;
    private readonly Requirement _requirement;
    private readonly int? _listed;
    private readonly decimal _floor;
    private readonly Lock _gate = new();
    private readonly Dictionary<FamilyMember, List<FitPoint>> _points = [];
    private readonly double _perFloor;
    private decimal? _cheapest;
    private double _perCheapest;
    private (double AtCheapest, double AtFloor)? _threshold;

    /// <param name="requirement">What is needed.</param>
    /// <param name="listed">Number of groups listed; null for all.</param>
    /// <param name="floor">A cost that no combination undercuts.</param>
    public Leaders(Requirement requirement, int? listed, decimal floor)
    {
        _requirement = requirement;
        _listed = listed;
        _floor = floor;
        _perFloor = PerCost(floor);
    }

    /// <summary>Cheapest fit cost so far; null before the first fit combination.</summary>
    public decimal? Cheapest
    {
        get
        {
            lock (_gate)
            {
                return _cheapest;
            }
        }
    }

    /// <summary>Adds a fit combination to its group.</summary>
    public void Add(FamilyMember member, FitPoint point)
    {
        lock (_gate)
        {
            if (!_points.TryGetValue(member, out List<FitPoint>? points))
            {
                _points.Add(member, points = []);
            }

            if (points.Any(other => other.Dominates(point.ErrorRatio, point.Margin, point.Cost)))
            {
                return;
            }

            points.RemoveAll(other => point.Dominates(other.ErrorRatio, other.Margin, other.Cost));
            points.Add(point);
            _cheapest = _cheapest is { } cheapest ? Math.Min(cheapest, point.Cost) : point.Cost;
            _perCheapest = PerCost(_cheapest.Value);
            _threshold = null;
        }
    }

    /// <summary>Whether figures no better than these could still make the best of a listed group.</summary>
    public bool MayLead(FamilyMember member, double errorRatio, double margin, decimal cost)
    {
        lock (_gate)
        {
            if (_cheapest is not { } cheapest)
            {
                return true;
            }

            (double AtCheapest, double AtFloor) least = Both(errorRatio, margin, (double)cost);
            least = (least.AtCheapest - Tie, least.AtFloor - Tie);
            if (_points.TryGetValue(member, out List<FitPoint>? points))
            {
                foreach (FitPoint point in points)
                {
                    (double atCheapest, double atFloor) = Both(point.ErrorRatio, point.Margin, point.CostNumber);
                    if (atCheapest < least.AtCheapest && atFloor < least.AtFloor)
                    {
                        return false;
                    }
                }
            }

            if (_listed is not { } listed || _points.Count < listed || points is not null && _points.Count == listed)
            {
                return true;
            }

            _threshold ??= Threshold(listed, cheapest);
            return least.AtCheapest <= _threshold.Value.AtCheapest || least.AtFloor <= _threshold.Value.AtFloor;
        }
    }

    /// <summary>The best of each group, in order, for the cheapest fit cost found.</summary>
    public IReadOnlyList<FitPoint> Best()
    {
        lock (_gate)
        {
            decimal cheapest = _cheapest ?? 0;
            return [.. Order(_points.Values.Select(points => Order(points, cheapest).First()), cheapest)];
        }
    }

    /// <summary>The order of a list: by score, then error, cost and id.</summary>
    public IOrderedEnumerable<FitPoint> Order(IEnumerable<FitPoint> points, decimal cheapest) => points
        .OrderBy(point => Of(point, cheapest))
        .ThenBy(point => point.ErrorRatio)
        .ThenBy(point => point.Cost)
        .ThenBy(point => point.Id, StringComparer.Ordinal);

    // A set of as many groups as are listed, best at the cheapest cost; what is worse than all of them at both bounds is not listed.
    private (double AtCheapest, double AtFloor) Threshold(int listed, decimal cheapest)
    {
        var chosen = _points.Values.Select(points => points.MinBy(point => Of(point, cheapest))!)
            .OrderBy(point => Of(point, cheapest)).Take(listed).ToList();
        return (chosen.Max(point => Of(point, cheapest)), chosen.Max(point => Of(point, _floor)));
    }

    // The scores at both bounds of the cheapest cost; in binary numbers, which are many times quicker and exact to far less than a tie.
    private (double AtCheapest, double AtFloor) Both(double errorRatio, double margin, double cost)
    {
        double common = _requirement.Weights.Error * errorRatio / _requirement.BudgetRatio
            + _requirement.Weights.Margin * _requirement.Margin / margin;
        double free = _cheapest > 0 ? 0 : _requirement.Weights.Cost;
        return (common + free + _perCheapest * cost, common + _perFloor * cost);
    }

    // Where the cheapest costs nothing, a score counts each cost as one more than itself.
    private double PerCost(decimal scale) => scale > 0 ? _requirement.Weights.Cost / (double)scale : _requirement.Weights.Cost;

    private double Of(FitPoint point, decimal cheapest) =>
        Score.Of(_requirement, point.ErrorRatio, point.Margin, point.Cost, cheapest);
}
