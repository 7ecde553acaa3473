using System.Collections.Immutable;

namespace PartPick.Selection.Search;

/// <summary>A requirement with some of its limits let out, and the rated drive levels with them.</summary>
/// <param name="Requirement">The requirement.</param>
/// <param name="RatingFactor">By what the rated drive levels are multiplied.</param>
internal sealed record LetOut(Requirement Requirement, double RatingFactor = 1)
{
    private const double WidestRatio = 0.01;
    private const double WideRatio = 2e-3;

    /// <summary>The limits that a number states, in the order in which they are tried.</summary>
    public static ImmutableArray<Limit> Limits { get; } =
        [Limit.Error, Limit.Margin, Limit.Cost, Limit.StartUpTime, Limit.Drive];

    /// <summary>A budget as wide as the widest that may be wanted, or nearly so.</summary>
    public static double WideBudget(Requirement requirement) =>
        Math.Max(requirement.BudgetRatio, Math.Min(WidestRatio, Math.Max(WideRatio, 10 * requirement.BudgetRatio)));

    /// <summary>Whether there is anything to let out.</summary>
    public static bool IsSet(Requirement requirement, Limit limit) => limit switch
    {
        Limit.Cost => requirement.CostLimit is not null,
        Limit.StartUpTime => requirement.StartUpTimeSeconds is not null,
        Limit.Margin => requirement.Margin > 1,
        _ => true,
    };

    /// <summary>This with a limit let out as far as it goes.</summary>
    public LetOut Without(Limit limit) => limit switch
    {
        Limit.Error => this with { Requirement = Requirement with { BudgetRatio = WideBudget(Requirement) } },
        Limit.Margin => this with { Requirement = Requirement with { Margin = Math.Min(1, Requirement.Margin) } },
        Limit.Cost => this with { Requirement = Requirement with { CostLimit = null } },
        Limit.StartUpTime => this with { Requirement = Requirement with { StartUpTimeSeconds = null } },
        Limit.Drive => this with { RatingFactor = double.PositiveInfinity },
        _ => this,
    };

    /// <summary>This with several limits let out as far as they go.</summary>
    public LetOut Without(IEnumerable<Limit> limits) => limits.Aggregate(this, (one, limit) => one.Without(limit));

    /// <summary>
    /// This with weights that find what breaks the wanted limits least: each limit's used share counts alike, whatever was let out.
    /// </summary>
    /// <param name="wanted">The requirement as it stands.</param>
    /// <param name="limits">Those that count.</param>
    public LetOut Weighing(Requirement wanted, IReadOnlyCollection<Limit> limits) => this with
    {
        Requirement = Requirement with
        {
            Weights = new Weights(
                limits.Contains(Limit.Error) ? Requirement.BudgetRatio / wanted.BudgetRatio : 0,
                limits.Contains(Limit.Margin) ? wanted.Margin / Requirement.Margin : 0,
                limits.Contains(Limit.Cost) ? 1 : 0),
        },
    };
}
