using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>One spread of the frequency, as a ratio, zero or more (±).</summary>
/// <param name="Term">What spreads, in words.</param>
/// <param name="Ratio">Its largest effect on the frequency, as a ratio.</param>
/// <param name="RestsOn">"typical" or "assumed" where the figure rests on such a value; null where it is guaranteed.</param>
public sealed record BudgetTerm(string Term, double Ratio, string? RestsOn = null)
{
    /// <summary>How the spread goes over temperature; null where it is the same at every temperature.</summary>
    public TemperatureLaw? Law { get; init; }
}

/// <summary>The frequency error of a candidate: its centre and every spread, named.</summary>
/// <param name="CentreRatio">e0 = f/(2^k f_target) − 1.</param>
/// <param name="Terms">The spreads.</param>
public sealed record ErrorBudget(double CentreRatio, ImmutableArray<BudgetTerm> Terms)
{
    /// <summary>|e0| + Σ|terms|, as a ratio: the ranked figure.</summary>
    public double WorstRatio
    {
        get
        {
            double sum = Math.Abs(CentreRatio);
            foreach (BudgetTerm term in Terms)
            {
                sum += term.Ratio;
            }

            return sum;
        }
    }

    /// <summary>|e0| + √Σ terms², as a ratio.</summary>
    public double RssRatio
    {
        get
        {
            double sum = 0;
            foreach (BudgetTerm term in Terms)
            {
                sum += term.Ratio * term.Ratio;
            }

            return Math.Abs(CentreRatio) + Math.Sqrt(sum);
        }
    }

    /// <summary>The largest spread.</summary>
    public BudgetTerm Largest => Terms.MaxBy(term => term.Ratio)!;
}
