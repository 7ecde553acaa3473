using System.Collections.Immutable;
using PartPick.Selection.Search;

namespace PartPick.Selection.Tests.Ranking;

/// <summary>
/// All combinations of one circuit with the same values: crystals of one model and capacitors of two values, which differ in
/// tolerance and price alone. What depends on values alone is analysed once, from nothing, and only where it is asked for.
/// </summary>
internal sealed class SameValues(
    Requirement requirement,
    Market market,
    CircuitFamily family,
    ImmutableArray<FamilyMember> members,
    int option,
    CapacitorValue c1,
    CapacitorValue c2)
{
    private readonly Dictionary<(double C1, double C2), CornerAnalysis> _corners = [];
    private CircuitTemplate? _template;
    private ValueAnalysis? _analysis;

    /// <summary>Number of combinations.</summary>
    public int Count => members.Length * c1.Contenders.Length * c2.Contenders.Length;

    /// <summary>The fit ones.</summary>
    public IEnumerable<TriedChoice> Fit() =>
        from member in members
        from first in c1.Contenders
        from second in c2.Contenders
        let choice = SearchRun.Choice(family, member, option, first.Part, second.Part)
        let tried = Try(member, choice)
        where tried is not null
        select tried;

    private TriedChoice? Try(FamilyMember member, CandidateParts choice)
    {
        decimal cost = BillOfParts.UnitCost(choice, family.Support, market);
        if (cost > requirement.CostLimit || BillOfParts.FirstShortage(choice, family.Support, market) is not null)
        {
            return null;
        }

        _template ??= CandidateStudy.TemplateOf(requirement, choice, family.Support, member.Model);
        if (_template is null)
        {
            return null;
        }

        CornerAnalysis corners = Corners(choice, _template);
        if (!corners.Starts || !(corners.Margin.Value >= requirement.Margin))
        {
            return null;
        }

        _analysis ??= new ValueAnalysis(_template, requirement, CircuitValues.Of(choice));
        ErrorBudget? budget = BudgetBuilder.Build(
            choice, requirement, member.Model, CrystalSpread.Of(choice.Crystal, requirement), _analysis);
        if (budget is null || !(budget.WorstRatio <= requirement.BudgetRatio))
        {
            return null;
        }

        ImmutableArray<Miss> misses = Judge.Misses(
            requirement, market, null, cost, corners.Starts, corners.Margin, budget, corners.Drive(_analysis),
            choice.Crystal.DriveLevelWatts, corners.StartUpTime(_analysis));
        return misses.IsEmpty ? new TriedChoice(choice, CandidateId.Of(choice), budget.WorstRatio, corners.Margin.Value, cost) : null;
    }

    private CornerAnalysis Corners(CandidateParts choice, CircuitTemplate template)
    {
        (double, double) key = (BudgetBuilder.Tolerance(choice.C1), BudgetBuilder.Tolerance(choice.C2));
        if (!_corners.TryGetValue(key, out CornerAnalysis? corners))
        {
            corners = CandidateStudy.CornersOf(requirement, choice, template);
            _corners.Add(key, corners);
        }

        return corners;
    }
}
