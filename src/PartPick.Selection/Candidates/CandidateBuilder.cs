using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>Analyses one choice of parts in full: every figure from nothing, whatever was computed before.</summary>
/// <param name="requirement">What is needed.</param>
/// <param name="market">What can be bought.</param>
public sealed class CandidateBuilder(Requirement requirement, Market market)
{
    /// <summary>The candidate; null where its amplifier is not specified over the supply range.</summary>
    public Candidate? Build(CandidateParts choice)
    {
        ArgumentNullException.ThrowIfNull(choice);
        return Build(choice, SupportParts.For(choice.Circuit, choice.Crystal.FrequencyHz, market));
    }

    /// <summary>The candidate with support parts that are given; null where its amplifier is not specified over the supply range.</summary>
    /// <param name="choice">The parts that a ranking varies.</param>
    /// <param name="support">The parts that the circuit needs besides.</param>
    public Candidate? Build(CandidateParts choice, SupportParts support)
    {
        ArgumentNullException.ThrowIfNull(choice);
        ArgumentNullException.ThrowIfNull(support);
        if (CandidateStudy.Of(requirement, choice, support) is not { } study)
        {
            return null;
        }

        (ValueAnalysis analysis, CornerAnalysis corners) = (study.Analysis, study.Corners);
        ErrorBudget? budget = BudgetBuilder.Build(
            choice, requirement, study.Model, CrystalSpread.Of(choice.Crystal, requirement), analysis);
        AtCorner? drive = budget is null ? null : corners.Drive(analysis);
        AtCorner? time = budget is null ? null : corners.StartUpTime(analysis);
        decimal cost = BillOfParts.UnitCost(choice, support, market);
        ImmutableArray<Miss> misses = Judge.Misses(
            requirement,
            market,
            BillOfParts.FirstShortage(choice, support, market),
            cost,
            corners.Starts,
            corners.Margin,
            budget,
            drive,
            choice.Crystal.DriveLevelWatts,
            time);
        var candidate = new Candidate
        {
            Id = CandidateId.Of(choice),
            Choice = choice,
            Parts = BillOfParts.List(choice, support),
            Nominal = analysis.Circuit,
            Result = analysis.Result!,
            Budget = budget,
            Margin = corners.Margin,
            Drive = drive,
            StartUpTime = time,
            RatedDriveWatts = choice.Crystal.DriveLevelWatts,
            Cost = cost,
            Currency = market.Currency,
            Misses = misses,
            Warnings = [],
        };
        return candidate with { Warnings = CircuitWarnings.Of(candidate.Describe(requirement.OutputHz), candidate.Result) };
    }

    /// <summary>
    /// Whether a choice builds up at every corner with the required margin: the figures of the whole candidate without its steady
    /// state. Null where its amplifier is not specified over the supply range.
    /// </summary>
    /// <param name="choice">The parts that a ranking varies.</param>
    /// <param name="support">The parts that the circuit needs besides.</param>
    internal bool? StartsWithMargin(CandidateParts choice, SupportParts support)
    {
        if (CandidateStudy.TemplateOf(requirement, choice, support, CrystalModel.From(choice.Crystal)) is not { } template)
        {
            return null;
        }

        CornerAnalysis corners = CandidateStudy.CornersOf(requirement, choice, template);
        return corners.Margin.Value >= requirement.Margin && corners.Starts;
    }
}
