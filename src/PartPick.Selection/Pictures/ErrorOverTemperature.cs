using PartPick.Values;

namespace PartPick.Selection;

/// <summary>
/// The frequency error of a candidate over the required temperatures: nominal parts, and the band of the worst case round the
/// centre, made of the terms of its error budget at each temperature.
/// </summary>
public static class ErrorOverTemperature
{
    private const int Steps = 60;
    private const double Air = 1.12;

    /// <summary>The picture; a problem where the candidate has no steady state.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="requirement">What is needed.</param>
    public static Result<Chart> Of(Candidate candidate, Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        ArgumentNullException.ThrowIfNull(requirement);
        if (candidate.Budget is not { } budget || !double.IsFinite(budget.WorstRatio))
        {
            return Result.Fail<Chart>("frequency error", "has no figure, for the circuit does not run everywhere", "a circuit that runs");
        }

        double[] celsius = [.. Temperatures(requirement.TemperatureMinCelsius, requirement.TemperatureMaxCelsius)];
        double air = celsius.Length == 1 ? 0.5 : 0;
        double centre = budget.CentreRatio;
        double worstAt = celsius.MaxBy(at => HalfWidth(budget, at));
        double worst = Math.Abs(centre) + HalfWidth(budget, worstAt);
        double reach = Air * Math.Max(requirement.BudgetRatio, worst);
        string limit = Ppm(requirement.BudgetRatio);
        return Result.Ok(new Chart(
            "Frequency error over temperature",
            new ChartAxis("ambient", "°C", celsius[0] - air, celsius[^1] + air),
            new ChartAxis("error", "ppm", -reach, reach) { UnitSize = 1e-6 })
        {
            Bands =
            [
                new ChartBand(
                    "worst case", [.. celsius.Select(at => new BandPoint(at, centre - HalfWidth(budget, at), centre + HalfWidth(budget, at)))]),
            ],
            Curves = [new ChartCurve('n', "nominal parts", [.. celsius.Select(at => new ChartPoint(at, Nominal(budget, at)))])],
            Limits = [new ChartLimit("budget +" + limit, requirement.BudgetRatio), new ChartLimit("budget -" + limit, -requirement.BudgetRatio)],
            Marks =
            [
                new ChartMark('A', "worst case " + Ppm(worst), new ChartPoint(worstAt, centre < 0 ? -worst : worst)),
            ],
            Notes = [.. Notes(budget, worst)],
        });
    }

    /// <summary>Half the width of the band as a ratio: what the terms of the budget come to at a temperature.</summary>
    /// <param name="budget">The budget.</param>
    /// <param name="celsius">The temperature in °C.</param>
    public static double HalfWidth(ErrorBudget budget, double celsius)
    {
        ArgumentNullException.ThrowIfNull(budget);
        return budget.Terms.Sum(term => term.Ratio * (term.Law?.ShareAt(celsius) ?? 1));
    }

    /// <summary>The error of nominal parts as a ratio: the centre, and what is known to go one way over temperature.</summary>
    private static double Nominal(ErrorBudget budget, double celsius) => budget.CentreRatio
        + budget.Terms.Where(term => term.Law is not null).Sum(term => term.Law!.Sign * term.Ratio * term.Law.ShareAt(celsius));

    private static IEnumerable<string> Notes(ErrorBudget budget, double worst)
    {
        if (!budget.Terms.Any(term => term.Law is { Sign: not 0 }))
        {
            yield return "The crystal states a band for all temperatures and no law, so nominal parts are drawn level.";
        }

        if (budget.WorstRatio > worst * (1 + 1e-9))
        {
            yield return $"The ranked worst case, {Ppm(budget.WorstRatio)}, takes each term at its own worst temperature.";
        }
    }

    private static IEnumerable<double> Temperatures(double low, double high) => low == high
        ? [low]
        : Enumerable.Range(0, Steps + 1).Select(k => k == Steps ? high : low + (high - low) * k / Steps);

    private static string Ppm(double ratio) => ValueText.Format(ratio, Dimension.Relative);
}
