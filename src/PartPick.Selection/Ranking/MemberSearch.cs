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

    /// <summary>Looks into every estimate of the family's first look.</summary>
    public void Run(IReadOnlyList<Estimate> estimates)
    {
        var prospects = new List<(double Score, Prospect Prospect)>();
        decimal scale = _run.Leaders.Cheapest ?? _run.Floor;
        foreach (Estimate estimate in estimates)
        {
            if (Prospective(estimate) is { } prospect)
            {
                prospects.Add((prospect.Pairs.Min(pair => Score.Of(_requirement, pair.ErrorRatio, pair.Margin, pair.Cost, scale)), prospect));
            }
        }

        foreach ((_, Prospect prospect) in prospects
            .OrderBy(entry => entry.Score)
            .ThenBy(entry => entry.Prospect.Estimate.Option)
            .ThenBy(entry => entry.Prospect.Estimate.C1)
            .ThenBy(entry => entry.Prospect.Estimate.C2))
        {
            _run.Cancellation.ThrowIfCancellationRequested();
            prospect.Pairs.RemoveAll(pair => !_run.MayEnter(_member, pair.ErrorRatio, pair.Margin, pair.Cost));
            if (prospect.Pairs.Count > 0)
            {
                new ProspectAnalysis(_run, _family, _member, prospect, _misses).Run();
            }

            _run.Report();
        }
    }

    /// <summary>A shift of the frequency that an assumed motional capacitance at least makes, as a ratio.</summary>
    public static double AssumedShift(FamilyMember member, double frequencyHz)
    {
        if (!member.Model.MotionalAssumed)
        {
            return 0;
        }

        double shift = Math.Abs(frequencyHz / member.Crystal.FrequencyHz - 1);
        double slack = FamilyScan.EstimateError(member.Model.Crystal, frequencyHz);
        return 0.9 * CrystalModel.MotionalUncertainty * Math.Max(0, shift - slack);
    }

    // What a combination could reach at best: an error, a margin and a cost that the full analysis can only worsen. Null where
    // even that breaks a limit, or can no longer change the answer.
    private Prospect? Prospective(Estimate estimate)
    {
        Crystal crystal = _member.Model.Crystal;
        CapacitorValue c1 = _run.Space.Capacitors[estimate.C1];
        CapacitorValue c2 = _run.Space.Capacitors[estimate.C2];
        double frequency = crystal.FrequencyAtLoadHz(estimate.LoadFarads);
        double slack = FamilyScan.EstimateError(crystal, frequency);
        double centre = Math.Max(0, Math.Abs(frequency / _member.TargetHz - 1) - slack);
        CircuitValues values = _family.Options[estimate.Option].With(c1.Farads, c2.Farads);
        LeastTerms terms = LeastTerms.OfValues(_requirement.Board, _family.IsGate, crystal, values, estimate.LoadFarads);
        double common = _member.TermsRatio + centre + AssumedShift(_member, frequency) + estimate.LeastAmplifierRatio;
        double error = common + terms.Ratio(_run.Prices.LeastSpread(estimate.C1), _run.Prices.LeastSpread(estimate.C2));
        double margin = _requirement.AllowDisturbance ? double.PositiveInfinity : estimate.Margin * MarginSlack;
        decimal option = _member.BaseCost + _family.OptionCosts[estimate.Option];
        decimal cost = option + _run.Prices.CheapestPair(estimate.C1, estimate.C2);
        if (_misses.Breaks(estimate, error, cost) || !_run.MayEnter(_member, error, margin, cost))
        {
            return null;
        }

        List<CapacitorPair> pairs = Pairs(estimate, common, margin, option, terms);
        return pairs.Count > 0 ? new Prospect(estimate, pairs) : null;
    }

    private List<CapacitorPair> Pairs(Estimate estimate, double commonRatio, double margin, decimal optionCost, in LeastTerms terms)
    {
        var pairs = new List<CapacitorPair>();
        foreach (Contender first in _run.Space.Capacitors[estimate.C1].Contenders)
        {
            foreach (Contender second in _run.Space.Capacitors[estimate.C2].Contenders)
            {
                var pair = new CapacitorPair
                {
                    C1 = first,
                    C2 = second,
                    Cost = optionCost + Prices.Pair(first, second),
                    ErrorRatio = commonRatio + terms.Ratio(first.Spread(_reach), second.Spread(_reach)),
                    Margin = margin,
                };
                if (!_misses.Breaks(estimate, pair) && _run.MayEnter(_member, pair.ErrorRatio, margin, pair.Cost))
                {
                    pairs.Add(pair);
                }
            }
        }

        return pairs;
    }
}
