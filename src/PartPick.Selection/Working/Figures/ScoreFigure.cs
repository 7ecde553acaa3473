using System.Globalization;

namespace PartPick.Selection;

/// <summary>The score by which the list is ordered.</summary>
internal static class ScoreFigure
{
    public static IEnumerable<FigureWorking> Of(Candidate candidate, Requirement requirement, decimal? cheapest)
    {
        if (candidate.Budget is not { } budget || cheapest is not { } least || !double.IsFinite(candidate.Score)
            || !double.IsFinite(budget.WorstRatio))
        {
            yield break;
        }

        Weights weights = requirement.Weights;
        string cost = least > 0
            ? $"{Numbers.Of(weights.Cost)} ({Exact(candidate.Cost)} / {Exact(least)})"
            : $"{Numbers.Of(weights.Cost)} (1 + {Exact(candidate.Cost)})";
        yield return new FigureWorking(
            "score", candidate.Score.ToString("0.000", CultureInfo.InvariantCulture),
            "What the list is ordered by, lowest first: the shares of error, margin and cost, each with its weight.",
            [
                new WorkingStep(
                    "Order of the list", "score", "we error/budget + wm wanted margin/margin + wc cost/cheapest cost that fits",
                    $"{Numbers.Of(weights.Error)} ({Numbers.Ppm(budget.WorstRatio)} / {Numbers.Ppm(requirement.BudgetRatio)}) + "
                        + $"{Numbers.Of(weights.Margin)} "
                        + $"({Numbers.Of(requirement.Margin)} / {Numbers.Of(candidate.Margin.Value)}) + {cost}",
                    Numbers.Of(candidate.Score), "definition; the weights are the requirement's"),
            ]);
    }

    private static string Exact(decimal amount) => amount.ToString("0.########", CultureInfo.InvariantCulture);
}
