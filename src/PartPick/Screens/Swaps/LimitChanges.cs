using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Says at each limit how its figure has changed against the ranked circuit, and whether that is better.</summary>
internal static class LimitChanges
{
    /// <summary>The limits with their changes.</summary>
    /// <param name="uses">The limits of the changed circuit.</param>
    /// <param name="from">The ranked circuit.</param>
    /// <param name="to">The changed circuit.</param>
    /// <param name="requirement">What is needed of both.</param>
    public static ImmutableArray<LimitUse> Mark(
        ImmutableArray<LimitUse> uses, Candidate from, Candidate to, Requirement requirement)
    {
        CandidateChange change = CandidateChange.Between(from, to, requirement);

        // Another crystal may be rated for another level: what counts is the part of it that is used.
        double? share = to.Drive?.Value / to.RatedDriveWatts - from.Drive?.Value / from.RatedDriveWatts;
        return [.. uses.Select(use => use with { Change = Words(use.Name) })];

        string Words(LimitName name) => name switch
        {
            LimitName.Error => Moved(change.ErrorRatio, requirement.BudgetRatio, Dimension.Relative, to.Budget is null),
            LimitName.Margin => Say(change.Margin, Signed.Of(change.Margin), higher: true),
            LimitName.Drive => Moved(change.DriveWatts, to.RatedDriveWatts, Dimension.Power, to.Drive is null, share),
            LimitName.StartUp => Moved(change.StartUpSeconds, requirement.StartUpTimeSeconds, Dimension.Time, to.StartUpTime is null),
            _ => change.Cost is { } cost ? Say((double)cost, Signed.Of(cost)) : "",
        };
    }

    // In the unit of the limit, where there is one.
    private static string Moved(
        double? change, double? limit, Dimension dimension, bool gone, double? share = null) => change is not { } moved
        ? gone ? "none now" : "new"
        : Say(share ?? moved, Signed.Of(moved, limit is { } one
            ? Figures.OfLimit(Math.Abs(moved), one, dimension).Value
            : ValueText.Format(Math.Abs(moved), dimension)));

    private static string Say(double change, string signed, bool higher = false) =>
        signed == "0" ? "as ranked" : signed + (change > 0 == higher ? " better" : " worse");
}
