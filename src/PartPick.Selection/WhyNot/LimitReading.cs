using System.Collections.Immutable;
using System.Globalization;

namespace PartPick.Selection;

/// <summary>How a candidate stands to one limit.</summary>
/// <param name="Limit">The limit.</param>
/// <param name="Wanted">What is wanted, with its unit; "any" where the requirement does not care.</param>
/// <param name="Reached">What the candidate reaches; "none" where the figure does not exist.</param>
/// <param name="Distance">How far it is from the limit, in words.</param>
/// <param name="At">The corner at which it is reached; empty where there is none.</param>
/// <param name="IsBroken">Whether it breaks the limit.</param>
public sealed record LimitReading(Limit Limit, string Wanted, string Reached, string Distance, string At, bool IsBroken)
{
    /// <summary>The readings of a candidate against a requirement: error, margin, drive level, start-up time, cost.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="requirement">The requirement.</param>
    public static ImmutableArray<LimitReading> Of(Candidate candidate, Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        ArgumentNullException.ThrowIfNull(requirement);
        return
        [
            Error(candidate.Budget, requirement.BudgetRatio), Margin(candidate, requirement.Margin), Drive(candidate),
            Time(candidate.StartUpTime, requirement.StartUpTimeSeconds), Cost(candidate, requirement.CostLimit),
        ];
    }

    private static LimitReading Error(ErrorBudget? budget, double limit)
    {
        string wanted = Ppm(limit);
        return budget is null
            ? new LimitReading(Limit.Error, wanted, "none", "has no steady state", "", true)
            : new LimitReading(
                Limit.Error, wanted, Ppm(budget.WorstRatio), Room(limit - budget.WorstRatio, Ppm), "", !(budget.WorstRatio <= limit));
    }

    private static LimitReading Margin(Candidate candidate, double wanted)
    {
        (double value, string corner) = (candidate.Margin.Value, candidate.Margin.Corner);
        bool starts = candidate.Misses.All(miss => miss.Limit != Limit.Start);
        string distance = !starts ? "does not build up from noise"
            : value >= wanted ? $"{Two(value - wanted)} more"
            : $"{Two(wanted - value)} short";
        return new LimitReading(Limit.Margin, Say.Number(wanted), Two(value), distance, corner, !(value >= wanted) || !starts);
    }

    private static LimitReading Drive(Candidate candidate)
    {
        string wanted = candidate.RatedDriveWatts is { } stated ? Say.Watts(stated) : "any";
        if (candidate.Drive is not { } drive)
        {
            return new LimitReading(Limit.Drive, wanted, "none", "a corner does not run", "", true);
        }

        return candidate.RatedDriveWatts is { } rated
            ? new LimitReading(
                Limit.Drive, wanted, Say.Watts(drive.Value), Room(rated - drive.Value, Say.Watts), drive.Corner, drive.Value > rated)
            : new LimitReading(Limit.Drive, wanted, Say.Watts(drive.Value), "not rated", drive.Corner, false);
    }

    private static LimitReading Time(AtCorner? time, double? limit)
    {
        string wanted = limit is { } stated ? Say.Seconds(stated) : "any";
        if (time is null)
        {
            return new LimitReading(Limit.StartUpTime, wanted, "none", "a corner does not build up", "", limit is not null);
        }

        return limit is { } longest
            ? new LimitReading(
                Limit.StartUpTime, wanted, Say.Seconds(time.Value), Room(longest - time.Value, Say.Seconds), time.Corner,
                time.Value > longest)
            : new LimitReading(Limit.StartUpTime, wanted, Say.Seconds(time.Value), "no limit", time.Corner, false);
    }

    private static LimitReading Cost(Candidate candidate, decimal? limit)
    {
        string reached = Money(candidate.Cost);
        return limit is { } most
            ? new LimitReading(
                Limit.Cost, Money(most), reached,
                candidate.Cost > most ? Money(candidate.Cost - most) + " beyond" : Money(most - candidate.Cost) + " left", "",
                candidate.Cost > most)
            : new LimitReading(Limit.Cost, "any", reached, "no limit", "", false);

        string Money(decimal amount) => Say.Money(amount) + " " + candidate.Currency;
    }

    private static string Room(double left, Func<double, string> say) => left < 0 ? say(-left) + " beyond" : say(left) + " left";

    private static string Ppm(double ratio) => Say.Number(ratio * 1e6) + " ppm";

    private static string Two(double value) => value.ToString("0.0#", CultureInfo.InvariantCulture);
}
