using PartPick.Catalog;
using PartPick.Physics;

namespace PartPick.Selection.Search;

/// <summary>
/// The second look, at one group: its combinations of values in order of what they could reach, each analysed only as far as
/// it takes to see that it breaks a limit or can enter neither the front nor the list.
/// </summary>
internal sealed class MemberSearch
{
    private const double MarginSlack = 1.01;
    private const double SlopeShare = 0.6;
    private const double BaseSlack = 1e-6;
    private const double BaseDriveSlack = 0.01;
    private readonly SearchRun _run;
    private readonly CircuitFamily _family;
    private readonly FamilyMember _member;
    private readonly double _budget;

    public MemberSearch(SearchRun run, CircuitFamily family, FamilyMember member)
    {
        _run = run;
        _family = family;
        _member = member;
        _budget = run.Space.Requirement.BudgetRatio;
    }

    /// <summary>Looks into every estimate of the family's first look.</summary>
    public void Run(IReadOnlyList<Estimate> estimates)
    {
        var prospects = new List<Prospect>();
        foreach (Estimate estimate in estimates)
        {
            if (Prospective(estimate) is { } prospect)
            {
                prospects.Add(prospect);
            }
        }

        decimal scale = _run.Leaders.Cheapest ?? _run.Floor;
        foreach (Prospect prospect in prospects
            .OrderBy(p => Score.Of(_run.Space.Requirement, p.ErrorRatio, p.Margin, p.Cost, scale))
            .ThenBy(p => p.Estimate.Option).ThenBy(p => p.Estimate.C1).ThenBy(p => p.Estimate.C2))
        {
            _run.Cancellation.ThrowIfCancellationRequested();
            if (_run.MayEnter(_member, prospect.ErrorRatio, prospect.Margin, prospect.Cost))
            {
                Analyse(prospect);
            }

            _run.Report();
        }
    }

    /// <summary>Share of an estimated drive level by which it may be too high.</summary>
    private const double DriveSlack = 0.05;

    private double Weight(Estimate estimate) =>
        (double)_run.Space.Capacitors[estimate.C1].Parts.Length * _run.Space.Capacitors[estimate.C2].Parts.Length;

    // What a combination could reach at best: an error, a margin and a cost that the full analysis can only worsen. Null where
    // even that breaks a limit, or can no longer change the answer.
    private Prospect? Prospective(Estimate estimate)
    {
        Crystal crystal = _member.Model.Crystal;
        double frequency = crystal.FrequencyAtLoadHz(estimate.LoadFarads);
        double slack = FamilyScan.EstimateError(crystal, frequency);
        double centre = Math.Max(0, Math.Abs(frequency / _member.TargetHz - 1) - slack);
        double error = _member.TermsRatio + centre + AssumedShift(frequency) + CapacitorTerms(estimate, estimate.LoadFarads);
        double margin = _run.Space.Requirement.AllowDisturbance ? double.PositiveInfinity : estimate.Margin * MarginSlack;
        AmplifierOption option = _family.Options[estimate.Option];
        decimal cost = _member.BaseCost + _run.Prices.Option(_family, option) + _run.Prices.CheapestPair(estimate.C1, estimate.C2);
        var prospect = new Prospect(estimate, error, margin, cost);
        if (Breaks(prospect) || !_run.MayEnter(_member, error, margin, cost))
        {
            return null;
        }

        CircuitValues values = option.With(_run.Space.Capacitors[estimate.C1].Farads, _run.Space.Capacitors[estimate.C2].Farads);
        prospect = prospect with { ErrorRatio = error + estimate.LeastAmplifierRatio(_family.Members[0].Template, values) };
        return Breaks(prospect) || !_run.MayEnter(_member, prospect.ErrorRatio, margin, cost) ? null : prospect;
    }

    private bool Breaks(Prospect prospect)
    {
        Limit? limit = prospect.ErrorRatio > _budget ? Limit.Error
            : prospect.Estimate.Steady.DriveWatts * (1 - DriveSlack) > _member.Crystal.DriveLevelWatts ? Limit.Drive
            : prospect.Cost > _run.Space.Requirement.CostLimit ? Limit.Cost
            : null;
        if (limit is { } broken)
        {
            Miss(prospect.Estimate, prospect, broken, Weight(prospect.Estimate));
        }

        return limit is not null;
    }

    private double AssumedShift(double frequencyHz)
    {
        if (!_member.Model.MotionalAssumed)
        {
            return 0;
        }

        double shift = Math.Abs(frequencyHz / _member.Crystal.FrequencyHz - 1);
        double slack = FamilyScan.EstimateError(_member.Model.Crystal, frequencyHz);
        return 0.9 * CrystalModel.MotionalUncertainty * Math.Max(0, shift - slack);
    }

    // The slopes of the load by C1, C2 and the strays are those of two capacitors in series beside a third, within a factor
    // that the device does not undercut.
    private double CapacitorTerms(Estimate estimate, double load)
    {
        CapacitorValue c1 = _run.Space.Capacitors[estimate.C1];
        CapacitorValue c2 = _run.Space.Capacitors[estimate.C2];
        Board board = _run.Space.Requirement.Board;
        bool gate = _family.Kind != CircuitKind.Follower;
        double first = c1.Farads + (gate ? board.Strays.InputFarads : 0);
        double second = c2.Farads + board.Strays.OutputFarads;
        double firstShare = second / (first + second) * (second / (first + second));
        double secondShare = first / (first + second) * (first / (first + second));
        double farads = firstShare * c1.Farads * _run.Prices.LeastSpread(estimate.C1)
            + secondShare * c2.Farads * _run.Prices.LeastSpread(estimate.C2)
            + board.UncertaintyRatio * (
                (gate ? firstShare * board.Strays.InputFarads : 0)
                + secondShare * board.Strays.OutputFarads
                + board.Strays.AcrossFarads);
        return SlopeShare * Math.Abs(_member.Model.Crystal.TrimSensitivityPerFarad(load)) * farads;
    }

    private void Analyse(Prospect prospect)
    {
        Estimate estimate = prospect.Estimate;
        double weight = Weight(estimate);
        CapacitorValue c1 = _run.Space.Capacitors[estimate.C1];
        CapacitorValue c2 = _run.Space.Capacitors[estimate.C2];
        CircuitValues values = _family.Options[estimate.Option].With(c1.Farads, c2.Farads);
        _run.Tally.CountAnalysed();
        var analysis = new ValueAnalysis(_member.Template, _run.Space.Requirement, values, estimate.State);
        if (analysis.Base is not { } nominal)
        {
            _run.Tally.Reject(Limit.Error, weight);
            return;
        }

        double centre = Math.Max(0, Math.Abs(nominal.FrequencyHz / _member.TargetHz - 1) - BaseSlack);
        double others = _member.TermsRatio + AssumedShift(nominal.FrequencyHz) + CapacitorTerms(estimate, nominal.LoadFarads);
        if (nominal.DriveWatts * (1 - BaseDriveSlack) > _member.Crystal.DriveLevelWatts)
        {
            Miss(estimate, prospect, Limit.Drive, weight);
            return;
        }

        if (!Goes(Math.Max(prospect.ErrorRatio, centre + others)))
        {
            return;
        }

        if (Goes(centre + others + analysis.AmplifierRatio) && analysis.Steady is not null)
        {
            Complete(prospect, analysis, values, c1, c2);
        }

        bool Goes(double error)
        {
            if (error <= _budget)
            {
                return _run.MayEnter(_member, error, prospect.Margin, prospect.Cost);
            }

            Miss(estimate, prospect with { ErrorRatio = error }, Limit.Error, weight);
            return false;
        }
    }

    private void Complete(Prospect prospect, ValueAnalysis analysis, CircuitValues values, CapacitorValue c1, CapacitorValue c2)
    {
        var corners = new Dictionary<(double, double), CornerAnalysis>();
        foreach (CapacitorPart first in c1.Parts)
        {
            foreach (CapacitorPart second in c2.Parts)
            {
                Complete(prospect, analysis, values, Choice(prospect.Estimate, first, second), corners);
            }
        }
    }

    private void Complete(
        Prospect prospect,
        ValueAnalysis analysis,
        CircuitValues values,
        CandidateParts choice,
        Dictionary<(double, double), CornerAnalysis> known)
    {
        Requirement requirement = _run.Space.Requirement;
        decimal cost = _member.BaseCost + _run.Prices.Option(_family, _family.Options[prospect.Estimate.Option])
            + _run.Prices.Pair(choice.C1, choice.C2);
        ErrorBudget budget = BudgetBuilder.Build(choice, requirement, _member.Model, _member.Terms, analysis)!;
        double error = budget.WorstRatio;
        if (Breaks(!(error <= _budget), Limit.Error)
            || Breaks(cost > requirement.CostLimit, Limit.Cost)
            || Breaks(BillOfParts.FirstShortage(choice, _family.Support, _run.Space.Market) is not null, Limit.Stock)
            || !_run.MayEnter(_member, error, prospect.Margin, cost))
        {
            return;
        }

        (double, double) tolerances = (BudgetBuilder.Tolerance(choice.C1), BudgetBuilder.Tolerance(choice.C2));
        if (!known.TryGetValue(tolerances, out CornerAnalysis? corners))
        {
            corners = new CornerAnalysis(_member.Template, requirement, values, tolerances.Item1, tolerances.Item2);
            known.Add(tolerances, corners);
        }

        double margin = corners.Margin.Value;
        if (Breaks(!corners.Starts, Limit.Start)
            || Breaks(!(margin >= requirement.Margin), Limit.Margin)
            || !_run.MayEnter(_member, error, margin, cost))
        {
            return;
        }

        AtCorner? drive = corners.Drive(analysis);
        if (Breaks(drive is null || drive.Value > choice.Crystal.DriveLevelWatts, Limit.Drive)
            || Breaks(requirement.StartUpTimeSeconds is { } wanted && !(corners.StartUpTime(analysis)?.Value <= wanted), Limit.StartUpTime))
        {
            return;
        }

        _run.Add(_member, new FitPoint(error, margin, cost, choice));

        bool Breaks(bool broken, Limit limit)
        {
            if (broken)
            {
                _run.Tally.Reject(limit, 1);
                _run.NearMisses.Offer(_member, 1.01, () => choice);
            }

            return broken;
        }
    }

    private void Miss(Estimate estimate, Prospect prospect, Limit limit, double weight)
    {
        _run.Tally.Reject(limit, weight);
        double penalty = Math.Max(1, prospect.ErrorRatio / _budget)
            * Math.Max(1, estimate.Steady.DriveWatts / _member.Crystal.DriveLevelWatts ?? 1)
            * Math.Max(1, (double)(prospect.Cost / _run.Space.Requirement.CostLimit ?? 1));
        _run.NearMisses.Offer(_member, penalty, () => Choice(
            estimate,
            _run.Prices.Tightest(estimate.C1),
            _run.Prices.Tightest(estimate.C2)));
    }

    private CandidateParts Choice(Estimate estimate, CapacitorPart c1, CapacitorPart c2) => SearchRun.Choice(_family, _member, estimate.Option, c1, c2);

    private sealed record Prospect(Estimate Estimate, double ErrorRatio, double Margin, decimal Cost);
}

