using PartPick.Physics;

namespace PartPick.Selection.Search;

/// <summary>
/// The second look, at one group: which combinations of values and parts could still change the answer, in order of what they
/// could reach.
/// </summary>
internal sealed class MemberSearch
{
    /// <summary>By how much a margin at nominal capacitances may be too low, as a factor.</summary>
    public const double MarginSlack = 1.01;

    private readonly SearchRun _run;
    private readonly CircuitFamily _family;
    private readonly FamilyMember _member;
    private readonly Requirement _requirement;
    private readonly double _reach;
    private readonly Misses _misses;

    public MemberSearch(SearchRun run, CircuitFamily family, FamilyMember member)
    {
        _run = run;
        _family = family;
        _member = member;
        _requirement = run.Space.Requirement;
        _reach = BudgetBuilder.TemperatureReach(_requirement);
        _misses = new Misses(run, family, member);
    }

    /// <summary>Looks into what the family's first look left.</summary>
    public void Run(IReadOnlyList<Spot> spots, EstimateGrid grid)
    {
        var prospects = new List<(double Score, Prospect Prospect)>();
        decimal scale = _run.Leaders.Cheapest ?? _run.Floor;
        foreach (Spot spot in spots)
        {
            if (Prospective(spot) is { } prospect)
            {
                double score = prospect.Pairs.Min(pair => Score.Of(_requirement, pair.ErrorRatio, pair.Margin, pair.Cost, scale));
                prospects.Add((score, prospect));
            }
        }

        foreach ((_, Prospect prospect) in prospects
            .OrderBy(entry => entry.Score)
            .ThenBy(entry => entry.Prospect.Spot.Option)
            .ThenBy(entry => entry.Prospect.Spot.C1)
            .ThenBy(entry => entry.Prospect.Spot.C2))
        {
            _run.Cancellation.ThrowIfCancellationRequested();
            prospect.Pairs.RemoveAll(pair => !_run.MayEnter(_member, pair.ErrorRatio, pair.Margin, pair.Cost));
            if (prospect.Pairs.Count > 0)
            {
                new ProspectAnalysis(_run, _family, _member, prospect, _misses).Run(grid);
            }

            _run.Report();
        }
    }

    /// <summary>What crystal and load at least make of the error, as a ratio.</summary>
    public static double LeastRatio(FamilyMember member, in LoadRange load)
    {
        Crystal crystal = member.Model.Crystal;
        double slowest = crystal.FrequencyAtLoadHz(load.Highest);
        double fastest = crystal.FrequencyAtLoadHz(load.Lowest);
        double nearest = Math.Clamp(member.Crystal.FrequencyHz, slowest, fastest);
        return member.TermsRatio + FamilyScan.LeastCentre(member, load) + AssumedShift(member, nearest, load.HarmonicShare);
    }

    /// <summary>A shift of the frequency that an assumed motional capacitance at least makes, as a ratio.</summary>
    public static double AssumedShift(FamilyMember member, double frequencyHz, double harmonicShare)
    {
        if (!member.Model.MotionalAssumed)
        {
            return 0;
        }

        double shift = Math.Abs(frequencyHz / member.Crystal.FrequencyHz - 1);
        double slack = member.Quality.ErrorRatio(member.Model.Crystal, frequencyHz, harmonicShare);
        return 0.9 * CrystalModel.MotionalUncertainty * Math.Max(0, shift - slack);
    }

    // What a combination could reach at best: an error, a margin and a cost that the full analysis can only worsen. Null where
    // even that breaks a limit, or can no longer change the answer.
    private Prospect? Prospective(Spot spot)
    {
        double margin = spot.Margin * MarginSlack;
        LeastTerms terms = LeastTerms.OfLoad(
            _requirement.Board, _family.IsGate, _member.Model.Crystal, Values(spot), spot.Slopes, spot.Load.Highest);
        double common = LeastRatio(_member, spot.Load) + spot.AmplifierRatio;
        double error = common + terms.Ratio(_run.Prices.LeastSpread(spot.C1), _run.Prices.LeastSpread(spot.C2));
        decimal option = _member.BaseCost + _family.OptionCosts[spot.Option];
        decimal cost = option + _run.Prices.CheapestPair(spot.C1, spot.C2);
        if (_misses.Breaks(spot, error, cost) || !_run.MayEnter(_member, error, margin, cost))
        {
            return null;
        }

        List<CapacitorPair> pairs = Pairs(spot, common, margin, option, terms);
        return pairs.Count > 0 ? new Prospect(spot, pairs) : null;
    }

    private CircuitValues Values(Spot spot) =>
        _family.Options[spot.Option].With(_run.Space.Capacitors[spot.C1].Farads, _run.Space.Capacitors[spot.C2].Farads);

    private List<CapacitorPair> Pairs(Spot spot, double commonRatio, double margin, decimal optionCost, in LeastTerms terms)
    {
        var pairs = new List<CapacitorPair>();
        foreach (Contender first in _run.Space.Capacitors[spot.C1].Contenders)
        {
            foreach (Contender second in _run.Space.Capacitors[spot.C2].Contenders)
            {
                var pair = new CapacitorPair
                {
                    C1 = first,
                    C2 = second,
                    Cost = optionCost + Prices.Pair(first, second),
                    ErrorRatio = commonRatio + terms.Ratio(first.Spread(_reach), second.Spread(_reach)),
                    Margin = margin,
                };
                if (!_misses.Breaks(spot, pair) && _run.MayEnter(_member, pair.ErrorRatio, margin, pair.Cost))
                {
                    pairs.Add(pair);
                }
            }
        }

        return pairs;
    }
}
