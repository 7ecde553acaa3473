namespace PartPick.Selection;

/// <summary>The score of a candidate and the order by it (lower is better).</summary>
public static class Score
{
    /// <summary>w_e·(error/budget) + w_m·(required margin/margin) + w_c·(cost/cheapest fit cost).</summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="errorRatio">Frequency error, worst case, as a ratio.</param>
    /// <param name="margin">Margin at the worst corner.</param>
    /// <param name="cost">Cost per unit.</param>
    /// <param name="cheapest">Cheapest fit cost; where it is zero, every cost counts as equal to it plus itself.</param>
    public static double Of(Requirement requirement, double errorRatio, double margin, decimal cost, decimal cheapest)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        double share = cheapest > 0 ? (double)(cost / cheapest) : 1 + (double)cost;
        return requirement.Weights.Error * errorRatio / requirement.BudgetRatio
            + requirement.Weights.Margin * requirement.Margin / margin
            + requirement.Weights.Cost * share;
    }
}
