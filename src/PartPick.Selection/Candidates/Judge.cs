using System.Collections.Immutable;
using System.Globalization;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Holds a candidate's figures against the hard limits of a requirement.</summary>
internal static class Judge
{
    /// <summary>The limits that the figures break, in the order of <see cref="Limit"/>.</summary>
    public static ImmutableArray<Miss> Misses(
        Requirement requirement,
        Market market,
        Part? shortage,
        decimal cost,
        bool starts,
        AtCorner margin,
        ErrorBudget? budget,
        AtCorner? drive,
        double? ratedWatts,
        AtCorner? startUpTime)
    {
        var misses = ImmutableArray.CreateBuilder<Miss>();
        if (shortage is not null)
        {
            string text = Text($"stock of {shortage.Id} is {shortage.Stock}, too few for {requirement.Builds} boards");
            misses.Add(new Miss(Limit.Stock, text, 2));
        }

        if (cost > requirement.CostLimit)
        {
            double ratio = (double)(cost / requirement.CostLimit.Value);
            string text = Text($"costs {cost:0.00##} {market.Currency} of {requirement.CostLimit:0.00##} allowed");
            misses.Add(new Miss(Limit.Cost, text, ratio));
        }

        if (!starts)
        {
            string text = Text($"does not build up from noise at {margin.Corner}");
            misses.Add(new Miss(Limit.Start, text, Shortfall(requirement.Margin, margin.Value)));
        }

        if (!(margin.Value >= requirement.Margin))
        {
            string sentence = Text($"margin {margin.Value:0.0#} of {requirement.Margin:0.0#} wanted, at {margin.Corner}");
            misses.Add(new Miss(Limit.Margin, sentence, Shortfall(requirement.Margin, margin.Value)));
        }

        if (budget is null)
        {
            misses.Add(new Miss(Limit.Error, "has no steady state", 100));
        }
        else if (!(budget.WorstRatio <= requirement.BudgetRatio))
        {
            string sentence = $"error {Ppm(budget.WorstRatio)} of {Ppm(requirement.BudgetRatio)} allowed";
            misses.Add(new Miss(Limit.Error, sentence, budget.WorstRatio / requirement.BudgetRatio));
        }

        if (budget is not null && drive is null)
        {
            misses.Add(new Miss(Limit.Drive, "has no steady state at a corner", 100));
        }
        else if (drive is not null && drive.Value > ratedWatts)
        {
            string sentence = $"drive level {Watts(drive.Value)} of {Watts(ratedWatts.Value)} rated, at {drive.Corner}";
            misses.Add(new Miss(Limit.Drive, sentence, drive.Value / ratedWatts.Value));
        }

        if (requirement.StartUpTimeSeconds is { } wanted && !(startUpTime?.Value <= wanted))
        {
            string sentence = startUpTime is null
                ? "start-up time is not defined where it does not build up"
                : $"starts in {Seconds(startUpTime.Value)} of {Seconds(wanted)} allowed, at {startUpTime.Corner}";
            misses.Add(new Miss(Limit.StartUpTime, sentence, startUpTime is null ? 100 : startUpTime.Value / wanted));
        }

        return misses.ToImmutable();
    }

    private static double Shortfall(double wanted, double value) => value > wanted / 100 ? Math.Max(1.0001, wanted / value) : 100;

    private static string Ppm(double ratio) => Text($"{ratio * 1e6:0.#} ppm");

    private static string Watts(double watts) => ValueText.Format(watts, Dimension.Power);

    private static string Seconds(double seconds) => ValueText.Format(seconds, Dimension.Time);

    private static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
