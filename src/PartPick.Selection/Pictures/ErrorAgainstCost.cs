using System.Collections.Immutable;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The candidates of a ranking by frequency error and cost, with the front and the chosen one marked.</summary>
public static class ErrorAgainstCost
{
    private const double Air = 0.08;

    // A limit farther off than this, in lengths of what the candidates take up, would press them into a corner.
    private const double Far = 2;

    /// <summary>The picture; a problem where no candidate has a frequency error.</summary>
    /// <param name="result">The ranking.</param>
    /// <param name="chosen">The chosen candidate, in the ranking or not; null for none.</param>
    public static Result<Chart> Of(RankingResult result, Candidate? chosen)
    {
        ArgumentNullException.ThrowIfNull(result);
        ImmutableArray<Candidate> listed = result.Candidates.IsEmpty ? result.NearestMisses : result.Candidates;
        ImmutableArray<ChartSpot> spots =
        [
            .. listed.Where(candidate => candidate.Id != chosen?.Id).Append(chosen).OfType<Candidate>()
                .Where(candidate => candidate.Budget is { } budget && double.IsFinite(budget.WorstRatio))
                .Select(candidate => new ChartSpot(KindOf(candidate, chosen), PointOf(candidate)))
                .OrderBy(spot => spot.Kind),
        ];
        if (spots.IsEmpty)
        {
            return Result.Fail<Chart>("candidates", "have no frequency error to compare", "a requirement that some circuit fits");
        }

        Requirement requirement = result.Requirement;
        double limitCost = requirement.CostLimit is { } cost ? (double)cost : double.NaN;
        (double left, double right, bool hasBudget) = Range(spots.Select(spot => spot.Point.X), requirement.BudgetRatio);
        (double low, double high, bool hasCost) = Range(spots.Select(spot => spot.Point.Y), limitCost);
        string budget = "budget " + ValueText.Format(requirement.BudgetRatio, Dimension.Relative);
        string most = FormattableString.Invariant($"limit {requirement.CostLimit:0.00}");
        ImmutableArray<string> beyond = [.. Beyond(hasBudget, budget), .. Beyond(hasCost || requirement.CostLimit is null, most)];
        return Result.Ok(new Chart(
            result.Candidates.IsEmpty ? "Error against cost, nearest misses" : "Error against cost",
            new ChartAxis("error, worst case", "ppm", left, right) { UnitSize = 1e-6 },
            new ChartAxis("cost", listed.Concat(chosen is null ? [] : [chosen]).First().Currency, low, high))
        {
            Spots = spots,
            Limits =
            [
                .. hasBudget ? [new ChartLimit(budget, requirement.BudgetRatio, IsUpright: true)] : ImmutableArray<ChartLimit>.Empty,
                .. hasCost ? [new ChartLimit(most, limitCost)] : ImmutableArray<ChartLimit>.Empty,
            ],
            Notes =
            [
                .. beyond,
                .. chosen is null ? ImmutableArray<string>.Empty : [Chosen(chosen)],
                .. result.IsComplete ? ImmutableArray<string>.Empty : ["The ranking goes on: best so far."],
            ],
        });
    }

    private static string Chosen(Candidate chosen) => chosen switch
    {
        { IsFit: false } => "The chosen one breaks a limit.",
        { OnFront: true } => "The chosen one is on the front: none is as good in error, margin and cost together and better in one of them.",
        _ => "The chosen one is not on the front: another is as good in error, margin and cost together and better in one of them.",
    };

    private static IEnumerable<string> Beyond(bool isIn, string words) => isIn ? [] : [$"The {words} is beyond the picture."];

    private static SpotKind KindOf(Candidate candidate, Candidate? chosen) =>
        candidate.Id == chosen?.Id ? SpotKind.Chosen : candidate.OnFront ? SpotKind.Front : SpotKind.Other;

    private static ChartPoint PointOf(Candidate candidate) => new(candidate.Budget!.WorstRatio, (double)candidate.Cost);

    private static (double From, double To, bool HasLimit) Range(IEnumerable<double> values, double limit)
    {
        double low = values.Min();
        double high = values.Max();
        double length = Math.Max(high - low, 0.2 * Math.Max(Math.Abs(high), 1e-9));
        bool takesLimit = limit >= low - Far * length && limit <= high + Far * length;
        if (takesLimit)
        {
            (low, high) = (Math.Min(low, limit), Math.Max(high, limit));
        }

        length = Math.Max(high - low, length);
        return (Math.Max(0, low - Air * length), high + Air * length, takesLimit);
    }
}
