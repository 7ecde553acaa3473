using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>A row of the error budget as a bar.</summary>
/// <param name="Name">What it is.</param>
/// <param name="Ratio">Its size as a ratio; the centre with its sign.</param>
/// <param name="RestsOn">"typical" or "assumed" where the figure rests on such a value; null elsewhere.</param>
/// <param name="IsSpread">Whether it may go either way.</param>
public sealed record BudgetBar(string Name, double Ratio, string? RestsOn = null, bool IsSpread = false);

/// <summary>The error budget as bars: the centre, the terms from the largest on, and the two sums.</summary>
public static class BudgetBars
{
    /// <summary>The bars in their order.</summary>
    /// <param name="budget">The budget.</param>
    public static ImmutableArray<BudgetBar> Of(ErrorBudget budget)
    {
        ArgumentNullException.ThrowIfNull(budget);
        return
        [
            new BudgetBar("centre: nominal values at 25 °C", budget.CentreRatio),
            .. budget.Terms.OrderByDescending(term => term.Ratio)
                .Select(term => new BudgetBar(term.Term, term.Ratio, term.RestsOn, IsSpread: true)),
            new BudgetBar("worst case, all together: the ranked figure", budget.WorstRatio),
            new BudgetBar("root of the sum of squares", budget.RssRatio),
        ];
    }
}
