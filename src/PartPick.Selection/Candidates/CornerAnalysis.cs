using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection;

/// <summary>The worst of margin, drive level and start-up time over the corners, for capacitors of given tolerances.</summary>
public sealed class CornerAnalysis
{
    // Between the crystal's frequency and that of the natural mode the margin changes by less than a hundredth.
    private const double MarginReserve = 1.03;
    private const double ClearOfOne = 1.1;
    private readonly CircuitTemplate _template;
    private readonly CircuitValues _values;
    private readonly Requirement _requirement;
    private readonly double _c1Tolerance;
    private readonly double _c2Tolerance;
    private (AtCorner Margin, bool BuildsUp)? _start;
    private readonly Dictionary<OperatingPoint, RunningFigures?> _running = [];
    private (AtCorner? Drive, AtCorner? Time)? _worst;

    /// <param name="template">Circuit, crystal and amplifier.</param>
    /// <param name="requirement">What is needed.</param>
    /// <param name="values">Nominal values.</param>
    /// <param name="c1Tolerance">Tolerance of C1 as a ratio.</param>
    /// <param name="c2Tolerance">Tolerance of C2 as a ratio.</param>
    public CornerAnalysis(CircuitTemplate template, Requirement requirement, CircuitValues values, double c1Tolerance, double c2Tolerance)
    {
        ArgumentNullException.ThrowIfNull(template);
        ArgumentNullException.ThrowIfNull(requirement);
        _template = template;
        _values = values;
        _requirement = requirement;
        _c1Tolerance = c1Tolerance;
        _c2Tolerance = c2Tolerance;
    }

    /// <summary>
    /// Least margin: the start-up margin, or, where a disturbance is allowed and a corner needs one, the running margin there.
    /// </summary>
    public AtCorner Margin => (_start ??= FindStart()).Margin;

    /// <summary>Whether it builds up, or may be kicked into running, at every corner.</summary>
    public bool Starts => (_start ??= FindStart()).BuildsUp;

    /// <summary>The corners of a candidate that is analysed already; null where its amplifier is not specified over the supply range.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="requirement">What is needed.</param>
    public static CornerAnalysis? Of(Candidate candidate, Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        CandidateParts choice = candidate.Choice;
        double feedback = candidate.Nominal is GateCircuit gate ? gate.FeedbackOhms : double.PositiveInfinity;
        return CircuitTemplate.Create(
            requirement, choice.Circuit, CrystalModel.From(choice.Crystal), choice.Amplifier, feedback) is { } template
            ? new CornerAnalysis(
                template, requirement, CircuitValues.Of(choice), BudgetBuilder.Tolerance(choice.C1), BudgetBuilder.Tolerance(choice.C2))
            : null;
    }

    /// <summary>
    /// The margin at any operating point within the required ranges, and whether it builds up there or may be kicked into running;
    /// the least over the corners is <see cref="Margin"/>.
    /// </summary>
    /// <param name="point">The operating point.</param>
    public (double Margin, bool Starts) MarginAt(OperatingPoint point)
    {
        OscillatorCircuit circuit = _template.At(_values, point, _c1Tolerance, _c2Tolerance);
        StartFigures figures = OscillatorAnalysis.FindStartFigures(circuit);
        if (figures.GrowthRatePerSecond > 0)
        {
            return (figures.Margin, true);
        }

        if (!_requirement.AllowDisturbance)
        {
            return (figures.Margin, false);
        }

        OscillatorResult result = OscillatorAnalysis.Analyse(circuit);
        bool kicked = result.Start == StartKind.NeedsDisturbance;
        return (kicked ? result.RunningMargin : figures.Margin, kicked);
    }

    /// <summary>Highest drive level in watts; null where a corner has no steady state.</summary>
    public AtCorner? Drive(ValueAnalysis analysis) => (_worst ??= FindRunning(analysis)).Drive;

    /// <summary>Longest start-up time in seconds; null where a corner does not build up or has no steady state.</summary>
    public AtCorner? StartUpTime(ValueAnalysis analysis) => (_worst ??= FindRunning(analysis)).Time;

    /// <summary>
    /// Whether it runs at every corner with no more than a drive level, looked at from the corner that likely drives most; ends at
    /// the first that does not.
    /// </summary>
    /// <param name="analysis">The figures of the nominal values.</param>
    /// <param name="ratedWatts">Highest rated drive level in watts; null where none is stated.</param>
    /// <param name="mostOverNominal">
    /// Largest drive level at a corner over that at the same one with nominal capacitances; corners that this settles are not looked
    /// at. Infinite to look at all.
    /// </param>
    internal bool RunsWithin(ValueAnalysis analysis, double? ratedWatts, double mostOverNominal)
    {
        for (int corner = _template.Corners.Length - 1; corner >= 0; corner--)
        {
            // Each corner of the amplifier stands twice, with capacitances low and high.
            bool settled = mostOverNominal * analysis.AmplifierDriveWattsAt(corner / 2) <= (ratedWatts ?? double.MaxValue);
            if (!settled && !(At(analysis, _template.Corners[corner]) is { } steady && !(steady.DriveWatts > ratedWatts)))
            {
                return false;
            }
        }

        return true;
    }

    /// <summary>The circuit at a corner.</summary>
    /// <param name="point">The corner.</param>
    public OscillatorCircuit CircuitAt(OperatingPoint point) => _template.At(_values, point, _c1Tolerance, _c2Tolerance);

    /// <summary>The steady state at a corner, as the worst of drive level and start-up time take it; null where there is none.</summary>
    /// <param name="analysis">The figures of the nominal values.</param>
    /// <param name="point">The corner.</param>
    public RunningFigures? RunningAt(ValueAnalysis analysis, OperatingPoint point)
    {
        ArgumentNullException.ThrowIfNull(analysis);
        return At(analysis, point);
    }

    /// <summary>Whether it runs at the last corner, which likely drives most, with no more than a drive level.</summary>
    /// <param name="analysis">The figures of the nominal values.</param>
    /// <param name="ratedWatts">Highest rated drive level in watts.</param>
    internal bool HardestRunsWithin(ValueAnalysis analysis, double ratedWatts) =>
        At(analysis, _template.Corners[^1]) is { } steady && steady.DriveWatts <= ratedWatts;

    private RunningFigures? At(ValueAnalysis analysis, OperatingPoint point)
    {
        if (!_running.TryGetValue(point, out RunningFigures? figures))
        {
            figures = analysis.SteadyAt(point, _c1Tolerance, _c2Tolerance);
            _running.Add(point, figures);
        }

        return figures;
    }

    // Without a disturbance: the margin at the crystal's frequency costs little and is near that of the natural mode: only corners where it may be the least,
    // or where it is not clear of one, are looked at in full.
    private (AtCorner Margin, bool BuildsUp) FindStart()
    {
        double least = double.PositiveInfinity;
        OperatingPoint where = _template.Corners[0];
        bool starts = true;
        double hertz = _template.Crystal.Crystal.NominalHz;
        double[] near = [.. _template.Corners.Select(point => OscillatorAnalysis.FindMarginAt(CircuitAt(point), hertz))];
        double looked = _requirement.AllowDisturbance ? double.PositiveInfinity : Math.Max(near.Min() * MarginReserve, ClearOfOne);
        for (int corner = 0; corner < near.Length; corner++)
        {
            if (near[corner] > looked)
            {
                continue;
            }

            OperatingPoint point = _template.Corners[corner];
            (double margin, bool startsHere) = MarginAt(point);
            starts &= startsHere;
            if (margin < least)
            {
                (least, where) = (margin, point);
            }
        }

        return (new AtCorner(least, where.Describe(_template.Kind), where), starts);
    }

    private (AtCorner? Drive, AtCorner? Time) FindRunning(ValueAnalysis analysis)
    {
        double mostDrive = double.NegativeInfinity;
        double longest = double.NegativeInfinity;
        OperatingPoint driven = _template.Corners[0];
        OperatingPoint slow = driven;
        foreach (OperatingPoint point in _template.Corners)
        {
            if (At(analysis, point) is not { } steady)
            {
                return (null, null);
            }

            if (steady.DriveWatts > mostDrive)
            {
                (mostDrive, driven) = (steady.DriveWatts, point);
            }

            OscillatorCircuit circuit = _template.At(_values, point, _c1Tolerance, _c2Tolerance);
            double growth = OscillatorAnalysis.FindStartFigures(circuit).GrowthRatePerSecond;
            double time = growth > 0
                ? OscillatorAnalysis.StartUpTimeSeconds(circuit, growth, steady.CurrentRmsAmps)
                : double.PositiveInfinity;
            if (time > longest)
            {
                (longest, slow) = (time, point);
            }
        }

        return (
            new AtCorner(mostDrive, driven.Describe(_template.Kind), driven),
            double.IsFinite(longest) ? new AtCorner(longest, slow.Describe(_template.Kind), slow) : null);
    }
}
