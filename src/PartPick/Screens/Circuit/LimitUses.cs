using System.Collections.Immutable;
using System.Globalization;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Holds a candidate against the limits of a requirement.</summary>
public static class LimitUses
{
    /// <summary>The limits in the order of the screen: error, margin, drive, start-up time, cost.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="requirement">The requirement.</param>
    public static ImmutableArray<LimitUse> Of(Candidate candidate, Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        ArgumentNullException.ThrowIfNull(requirement);
        return
        [
            Error(candidate, requirement), Margin(candidate, requirement), Drive(candidate),
            StartUp(candidate, requirement), Cost(candidate, requirement),
        ];
    }

    /// <summary>The limit that is nearest, or most broken; null where there is none.</summary>
    /// <param name="uses">The limits.</param>
    public static LimitUse? Nearest(ImmutableArray<LimitUse> uses) =>
        uses.Where(use => use.Used is not null).MaxBy(use => use.Used);

    private static LimitUse Error(Candidate candidate, Requirement requirement)
    {
        if (candidate.Budget is not { } budget)
        {
            return Without(LimitName.Error, "error", "it does not run");
        }

        BudgetTerm? largest = budget.Terms.IsDefaultOrEmpty ? null : budget.Largest;
        string most = largest is null || Math.Abs(budget.CentreRatio) > largest.Ratio ? "its centre" : largest.Term;
        (string value, string limit) = Figures.OfLimit(budget.WorstRatio, requirement.BudgetRatio, Dimension.Relative);
        return new LimitUse
        {
            Name = LimitName.Error, Word = "error", Figure = value, Against = "of " + limit,
            Because = "most: " + most, Used = budget.WorstRatio / requirement.BudgetRatio,
        };
    }

    private static LimitUse Margin(Candidate candidate, Requirement requirement) => new()
    {
        Name = LimitName.Margin,
        Word = "margin",
        Figure = Figures.Three(candidate.Margin.Value),
        Against = "wanted " + ValueText.Format(requirement.Margin, Dimension.Number),
        Because = "least at " + candidate.Margin.Corner,
        Used = candidate.Margin.Value > 0 ? requirement.Margin / candidate.Margin.Value : double.PositiveInfinity,
    };

    private static LimitUse Drive(Candidate candidate)
    {
        if (candidate.Drive is not { } drive)
        {
            return Without(LimitName.Drive, "drive", "a corner does not run");
        }

        if (candidate.RatedDriveWatts is not { } rated)
        {
            return Unlimited(
                LimitName.Drive, "drive", ValueText.Format(drive.Value, Dimension.Power), "not rated", "most at " + drive.Corner);
        }

        (string value, string limit) = Figures.OfLimit(drive.Value, rated, Dimension.Power);
        return new LimitUse
        {
            Name = LimitName.Drive, Word = "drive", Figure = value, Against = "of " + limit,
            Because = "most at " + drive.Corner, Used = drive.Value / rated,
        };
    }

    private static LimitUse StartUp(Candidate candidate, Requirement requirement)
    {
        if (candidate.StartUpTime is not { } time)
        {
            return Without(LimitName.StartUp, "start-up", "a corner does not build up");
        }

        if (requirement.StartUpTimeSeconds is not { } longest)
        {
            return Unlimited(
                LimitName.StartUp, "start-up", ValueText.Format(time.Value, Dimension.Time), "no limit", "longest at " + time.Corner);
        }

        (string value, string limit) = Figures.OfLimit(time.Value, longest, Dimension.Time);
        return new LimitUse
        {
            Name = LimitName.StartUp, Word = "start-up", Figure = value, Against = "of " + limit,
            Because = "longest at " + time.Corner, Used = time.Value / longest,
        };
    }

    private static LimitUse Cost(Candidate candidate, Requirement requirement)
    {
        string boards = FormattableString.Invariant($"each, for {requirement.Builds} boards");
        if (requirement.CostLimit is not { } limit || limit == 0)
        {
            return Unlimited(LimitName.Cost, "cost", Figures.Money(candidate.Cost) + " " + candidate.Currency, "no limit", boards);
        }

        return new LimitUse
        {
            Name = LimitName.Cost, Word = "cost", Figure = Figures.Money(candidate.Cost),
            Against = $"of {Figures.Money(limit)} {candidate.Currency}", Because = boards,
            Used = (double)(candidate.Cost / limit),
        };
    }

    private static LimitUse Without(LimitName name, string word, string why) => new()
    {
        Name = name, Word = word, Figure = "-", Against = "", Because = why, Used = null,
    };

    // The unit goes with the words, so that the numbers of all limits stand in one column.
    private static LimitUse Unlimited(LimitName name, string word, string value, string unlimited, string because) => new()
    {
        Name = name, Word = word, Figure = Figures.Three(double.Parse(value.Split(' ')[0], CultureInfo.InvariantCulture)),
        Against = string.Join(' ', value.Split(' ').Skip(1)), Unlimited = unlimited, Because = because, Used = null,
    };
}
