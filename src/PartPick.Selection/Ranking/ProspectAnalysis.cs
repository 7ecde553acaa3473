using PartPick.Catalog;
using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection.Search;

/// <summary>
/// The full analysis of one prospect, the cheapest figures first: after each it leaves out the choices of parts that break a limit
/// or can enter neither the front nor the list.
/// </summary>
internal sealed class ProspectAnalysis
{
    // By how much the steady state at the fineness of the corners may differ from the converged one.
    private const double BaseSlack = 1e-6;
    private const double RoughSlack = 1.5e-6;
    private const double BaseDriveSlack = 0.01;
    private const double FirstOrderShare = 0.93;

    // By how much the highest drive level over all corners may differ from that over those at nominal capacitances.
    /// <summary>Least share of the former over the latter.</summary>
    public const double LeastCornerDrive = 0.85;
    private const double MostCornerDrive = 1.7;
    private const double LikelyCornerDrive = 1.2;
    private readonly SearchRun _run;
    private readonly CircuitFamily _family;
    private readonly FamilyMember _member;
    private readonly Spot _spot;
    private readonly List<CapacitorPair> _pairs;
    private readonly Misses _misses;
    private readonly Requirement _requirement;
    private readonly CircuitValues _values;
    private readonly double _reach;
    private readonly bool _isBuffered;
    private readonly Dictionary<(double, double), CornerAnalysis> _corners = [];
    private LeastTerms? _first;

    public ProspectAnalysis(SearchRun run, CircuitFamily family, FamilyMember member, Prospect prospect, Misses misses)
    {
        _run = run;
        _family = family;
        _member = member;
        _spot = prospect.Spot;
        _pairs = prospect.Pairs;
        _misses = misses;
        _requirement = run.Space.Requirement;
        _reach = BudgetBuilder.TemperatureReach(_requirement);
        _isBuffered = family.Amplifier is AmplifierPart { IsBuffered: true };
        _values = family.Options[_spot.Option].With(
            run.Space.Capacitors[_spot.C1].Farads, run.Space.Capacitors[_spot.C2].Farads);
    }

    /// <summary>Analyses, and adds what is fit to the run.</summary>
    public void Run(EstimateGrid grid)
    {
        if (grid.At(_spot.Option, _spot.C1, _spot.C2) is not { } estimate)
        {
            Reject(Limit.Error);
            return;
        }

        bool trusted = EstimateQuality.Trusts(estimate.HarmonicShare);
        if (trusted && estimate.DriveWatts * (1 - _member.Quality.DriveShare) > _member.Crystal.DriveLevelWatts)
        {
            Reject(Limit.Drive);
            return;
        }

        // With a disturbance allowed a margin may take a full analysis at every corner, so it comes last.
        LoadRange load = LoadRange.Of(estimate);
        LeastTerms terms = LeastTerms.OfLoad(
            _requirement.Board, _family.IsGate, _member.Model.Crystal, _values, _spot.Slopes, load.Highest);
        double least = MemberSearch.LeastRatio(_member, load) + _spot.AmplifierRatio;
        if (!Left(pair => MayReach(pair, least + terms.Ratio(pair.C1.Spread(_reach), pair.C2.Spread(_reach))))
            || (trusted && !Left(pair => MayReachFirst(pair, least, grid)))
            || (!_requirement.AllowDisturbance && !Left(Margins))
            || !Left(Stock)
            || !MayReachOverAmplifier(least - _spot.AmplifierRatio, grid))
        {
            return;
        }

        if (Rough(estimate, grid) is not { } start)
        {
            return;
        }

        _run.Tally.CountAnalysed();
        var analysis = new ValueAnalysis(_member.Template, _requirement, _values, start.State, start.Fineness);
        if (_isBuffered && start.State is not null && IsLost(analysis))
        {
            analysis = new ValueAnalysis(_member.Template, _requirement, _values);
        }

        if (analysis.Base is not { } nominal)
        {
            Reject(Limit.Error);
        }
        else if (nominal.DriveWatts * (1 - BaseDriveSlack) > _member.Crystal.DriveLevelWatts)
        {
            Reject(Limit.Drive);
        }
        else if (Left(pair => MayRunHardest(pair, analysis))
            && MayReach(nominal, analysis)
            && (_family.IsGate ? Left(pair => Budget(pair, nominal, analysis, BaseSlack)) : MayReachSteady(analysis))
            && Left(pair => Budget(pair, analysis.Steady, analysis, 0))
            && Left(Margins))
        {
            _pairs.RemoveAll(pair => !Runs(pair, analysis));
            Add();
        }
    }

    // An estimate of a buffered inverter may be far off; half of the way to its steady state tells the frequency. Where the full
    // analysis starts from (no state: from nothing), or null where it need not be made.
    private (RunningState? State, Fineness Fineness)? Rough(Estimate estimate, EstimateGrid grid)
    {
        if (!_isBuffered)
        {
            return (estimate.State, Fineness.OneFiner);
        }

        OscillatorCircuit circuit = _member.Template.At(_values, OperatingPoint.Nominal(_requirement));
        RunningFigures? rough =
            OscillatorAnalysis.FindSteadyState(circuit, estimate.State, Fineness.OneFinerRoughly, out RunningState? state);
        if (rough is null || state is null)
        {
            // Hard to solve: which state is found depends on the way to it, and the one that counts is found from nothing.
            return (null, Fineness.OneFiner);
        }

        LeastTerms terms = EstimateQuality.Trusts(estimate.HarmonicShare)
            ? LeastTerms.OfSlopes(
                _requirement.Board, _family.IsGate, _values, grid.FirstOrder(_spot.Option, _spot.C1, _spot.C2), _member.Quality.SlopeShare)
            : default;
        return Left(pair => MayReach(pair, rough, terms, _spot.AmplifierRatio, RoughSlack)) ? (state, Fineness.Same) : null;
    }

    // Whether a state was not found from where the analysis started: it may be found from nothing, which is what counts.
    private bool IsLost(ValueAnalysis analysis)
    {
        if (analysis.Base is not { } nominal)
        {
            return true;
        }

        LeastTerms terms = FirstOrderTerms(analysis, default);
        return Left(pair => MayReach(pair, nominal, terms, 0, BaseSlack)) && double.IsInfinity(analysis.AmplifierRatio);
    }

    // With slopes of the first order, from the estimate's state.
    private bool MayReachFirst(CapacitorPair pair, double least, EstimateGrid grid)
    {
        _first ??= LeastTerms.OfSlopes(
            _requirement.Board, _family.IsGate, _values, grid.FirstOrder(_spot.Option, _spot.C1, _spot.C2), _member.Quality.SlopeShare);
        double terms = _first.Value.Ratio(pair.C1.Spread(_reach), pair.C2.Spread(_reach));
        return !double.IsFinite(terms) || MayReach(pair, least + terms);
    }

    // With the amplifier's shift at the corners furthest apart, and the drive level there, as estimated.
    private bool MayReachOverAmplifier(double least, EstimateGrid grid)
    {
        if (!_family.IsGate || _isBuffered)
        {
            return true;
        }

        (double ratio, double watts) = grid.LeastOverAmplifier(_spot.Option, _spot.C1, _spot.C2);
        if (watts > _member.Crystal.DriveLevelWatts)
        {
            Reject(Limit.Drive);
            return false;
        }

        return Left(pair => MayReachFirst(pair, least + ratio, grid));
    }

    // Ever more of the error budget, from what costs least to find.
    private bool MayReach(RunningFigures nominal, ValueAnalysis analysis)
    {
        LeastTerms terms = LeastTerms.OfLoad(
            _requirement.Board, _family.IsGate, _member.Model.Crystal, _values, _spot.Slopes, nominal.LoadFarads);
        if (!Left(pair => MayReach(pair, nominal, terms, 0, BaseSlack)))
        {
            return false;
        }

        terms = FirstOrderTerms(analysis, terms);
        return Left(pair => MayReach(pair, nominal, terms, 0, BaseSlack))
            && (!_family.IsGate || Left(pair => MayReach(pair, nominal, terms, analysis.LeastAmplifierRatio, BaseSlack)));
    }

    // A follower's converged state costs little more than another one at the same fineness.
    private bool MayReachSteady(ValueAnalysis analysis)
    {
        if (analysis.Steady is not { } steady)
        {
            Reject(Limit.Error);
            return false;
        }

        LeastTerms terms = FirstOrderTerms(analysis, default);
        return Left(pair => MayReach(pair, steady, terms, 0, 0))
            && Left(pair => MayReach(pair, steady, terms, analysis.LeastAmplifierRatio, 0));
    }

    private LeastTerms FirstOrderTerms(ValueAnalysis analysis, in LeastTerms otherwise)
    {
        (double C1, double C2, double Across) slopes = analysis.FirstOrderSlopesPerFarad;
        return double.IsFinite(slopes.C1 + slopes.C2 + slopes.Across)
            ? LeastTerms.OfSlopes(_requirement.Board, _family.IsGate, _values, slopes, FirstOrderShare)
            : otherwise;
    }

    private bool Left(Predicate<CapacitorPair> stays)
    {
        _pairs.RemoveAll(pair => !stays(pair));
        return _pairs.Count > 0;
    }

    private bool Stock(CapacitorPair pair) => Holds(
        pair, BillOfParts.FirstShortage(_misses.Choice(_spot, pair), _family.Support, _run.Space.Market) is null, Limit.Stock);

    private bool Margins(CapacitorPair pair)
    {
        CornerAnalysis corners = Corners(pair);
        pair.Margin = corners.Margin.Value;
        return Holds(pair, corners.Starts, Limit.Start)
            && Holds(pair, pair.Margin >= _requirement.Margin, Limit.Margin)
            && MayEnter(pair);
    }

    private bool MayReach(CapacitorPair pair, RunningFigures nominal, in LeastTerms terms, double amplifierRatio, double slack)
    {
        double least = _member.TermsRatio
            + Math.Max(0, Math.Abs(nominal.FrequencyHz / _member.TargetHz - 1) - slack)
            + MemberSearch.AssumedShift(_member, nominal.FrequencyHz, 0)
            + terms.Ratio(pair.C1.Spread(_reach), pair.C2.Spread(_reach))
            + amplifierRatio;
        return MayReach(pair, least);
    }

    private bool MayReach(CapacitorPair pair, double leastRatio)
    {
        pair.ErrorRatio = Math.Max(pair.ErrorRatio, leastRatio);
        return WithinBudget(pair) && MayEnter(pair);
    }

    private bool Budget(CapacitorPair pair, RunningFigures? steady, ValueAnalysis analysis, double slack)
    {
        if (steady is null)
        {
            return Holds(pair, false, Limit.Error);
        }

        CandidateParts choice = _misses.Choice(_spot, pair);
        pair.ErrorRatio = BudgetBuilder.Build(choice, _requirement, _member.Model, _member.Terms, analysis, steady).WorstRatio - slack;
        return WithinBudget(pair) && MayEnter(pair);
    }

    private bool WithinBudget(CapacitorPair pair) => Holds(pair, pair.ErrorRatio <= _requirement.BudgetRatio, Limit.Error);

    // The corner that likely drives most, before anything that costs more: in a small crystal it often settles the matter.
    private bool MayRunHardest(CapacitorPair pair, ValueAnalysis analysis)
    {
        if (!_family.IsGate || _member.Crystal.DriveLevelWatts is not { } rated)
        {
            return true;
        }

        double watts = analysis.AmplifierDriveWattsAt(_member.Template.AmplifierCorners.Length - 1);
        return Holds(
            pair,
            watts * LeastCornerDrive <= rated && (watts * LikelyCornerDrive <= rated || Corners(pair).HardestRunsWithin(analysis, rated)),
            Limit.Drive);
    }

    private bool Runs(CapacitorPair pair, ValueAnalysis analysis)
    {
        CornerAnalysis corners = Corners(pair);
        double? rated = _member.Crystal.DriveLevelWatts;
        if (analysis.AmplifierDriveWatts * LeastCornerDrive > rated)
        {
            return Holds(pair, false, Limit.Drive);
        }

        // A buffered inverter may build up and yet find no steady state at a corner; the others always do.
        double most = _isBuffered ? double.PositiveInfinity : MostCornerDrive;
        return Holds(pair, corners.RunsWithin(analysis, rated, most), Limit.Drive)
            && Holds(
                pair,
                _requirement.StartUpTimeSeconds is not { } wanted || corners.StartUpTime(analysis)?.Value <= wanted,
                Limit.StartUpTime);
    }

    private CornerAnalysis Corners(CapacitorPair pair)
    {
        (double, double) tolerances = (pair.C1.Tolerance, pair.C2.Tolerance);
        if (!_corners.TryGetValue(tolerances, out CornerAnalysis? corners))
        {
            corners = new CornerAnalysis(_member.Template, _requirement, _values, pair.C1.Tolerance, pair.C2.Tolerance);
            _corners.Add(tolerances, corners);
        }

        return corners;
    }

    private void Add()
    {
        foreach (CapacitorPair pair in _pairs)
        {
            _run.Add(_member, new FitPoint(pair.ErrorRatio, pair.Margin, pair.Cost, _misses.Choice(_spot, pair)));
        }
    }

    private bool MayEnter(CapacitorPair pair) => _run.MayEnter(_member, pair.ErrorRatio, pair.Margin, pair.Cost);

    private bool Holds(CapacitorPair pair, bool holds, Limit limit)
    {
        if (!holds)
        {
            _misses.Reject(_spot, pair, limit);
        }

        return holds;
    }

    private void Reject(Limit limit)
    {
        foreach (CapacitorPair pair in _pairs)
        {
            _misses.Reject(_spot, pair, limit);
        }
    }
}
