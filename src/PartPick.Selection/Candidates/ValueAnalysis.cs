using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection;

/// <summary>
/// The figures of a circuit that depend on nominal values alone: the steady state, its sensitivities, the amplifier's and
/// supply's share of the frequency. Each is computed when first asked for and kept; parts of one value and several tolerances
/// share them.
/// </summary>
public sealed class ValueAnalysis
{
    private const double Step = 0.02;
    private readonly CircuitTemplate _template;
    private readonly CircuitValues _values;
    private readonly OperatingPoint _nominal;
    private readonly RunningState? _state;
    private RunningFigures? _steady;
    private readonly RunningFigures?[] _overAmplifier;
    private readonly bool[] _isFound;
    private (double Ratio, double Watts, OperatingPoint? Farthest)? _amplifier;
    private (double C1, double C2, double Across)? _slopes;
    private (double C1, double C2, double Across)? _firstOrderSlopes;

    /// <summary>Analyses the values from nothing.</summary>
    /// <param name="template">Circuit, crystal and amplifier.</param>
    /// <param name="requirement">What is needed.</param>
    /// <param name="values">Nominal values.</param>
    public ValueAnalysis(CircuitTemplate template, Requirement requirement, CircuitValues values)
        : this(template, requirement, values, null)
    {
    }

    /// <summary>Analyses the values from an estimate's running state: cheaper, and the same figures.</summary>
    /// <param name="template">Circuit, crystal and amplifier.</param>
    /// <param name="requirement">What is needed.</param>
    /// <param name="values">Nominal values.</param>
    /// <param name="near">The running state; null to start from nothing.</param>
    /// <param name="fineness">How finely it is resolved from there.</param>
    public ValueAnalysis(
        CircuitTemplate template,
        Requirement requirement,
        CircuitValues values,
        RunningState? near,
        Fineness fineness = Fineness.OneFiner)
    {
        ArgumentNullException.ThrowIfNull(template);
        _template = template;
        _values = values;
        _overAmplifier = new RunningFigures?[template.AmplifierCorners.Length];
        _isFound = new bool[template.AmplifierCorners.Length];
        _nominal = OperatingPoint.Nominal(requirement);
        Circuit = template.At(values, _nominal);
        if (near is null)
        {
            Result = OscillatorAnalysis.Analyse(Circuit, out _state);
            _steady = Result.Steady?.Figures;
            Base = Follow(Circuit);
        }
        else
        {
            Base = OscillatorAnalysis.FindSteadyState(Circuit, near, fineness, out _state);
        }
    }

    /// <summary>The nominal circuit.</summary>
    public OscillatorCircuit Circuit { get; }

    /// <summary>The nominal circuit's figures; null where only the steady state was sought.</summary>
    public OscillatorResult? Result { get; }

    /// <summary>The nominal steady state; null where there is none.</summary>
    public RunningFigures? Steady => _steady ??= _state is null
        ? null
        : OscillatorAnalysis.FindSteadyState(Circuit, _state, Fineness.Converged, out _);

    /// <summary>
    /// The nominal steady state at the fineness of the corners: differences are taken between states of one fineness, so that
    /// what the fineness leaves cancels. Its frequency is within a few tenths of a ppm of <see cref="Steady"/>.
    /// </summary>
    public RunningFigures? Base { get; }

    /// <summary>Largest relative |f(corner) − f| over amplifier, supply and ambient; infinite where a corner has no steady state.</summary>
    public double AmplifierRatio => (_amplifier ??= FindOverAmplifier()).Ratio;

    /// <summary>The corner of amplifier, supply and ambient whose frequency is farthest off; null where none was found.</summary>
    public OperatingPoint? AmplifierFarthest => (_amplifier ??= FindOverAmplifier()).Farthest;

    /// <summary>
    /// The same over the first and the last of these corners alone, which lie furthest apart: no more than over all, and found with
    /// a fraction of the work.
    /// </summary>
    internal double LeastAmplifierRatio => Math.Max(ShiftAt(0), ShiftAt(_overAmplifier.Length - 1));

    /// <summary>The drive level in watts at one of these corners; infinite where there is no steady state.</summary>
    /// <param name="corner">Place of the corner in <see cref="CircuitTemplate.AmplifierCorners"/>.</param>
    internal double AmplifierDriveWattsAt(int corner) => OverAmplifier(corner)?.DriveWatts ?? double.PositiveInfinity;

    /// <summary>Highest drive level in watts over amplifier, supply and ambient, at nominal capacitances.</summary>
    public double AmplifierDriveWatts => (_amplifier ??= FindOverAmplifier()).Watts;

    /// <summary>∂f/f by C1 (and the stray beside it), C2 (and the stray beside it) and the stray across, per farad.</summary>
    public (double C1, double C2, double Across) SlopesPerFarad => _slopes ??= Slopes();

    /// <summary>
    /// The same slopes from one Newton step each, many times cheaper and within a few per cent; not a number where not found.
    /// </summary>
    public (double C1, double C2, double Across) FirstOrderSlopesPerFarad => _firstOrderSlopes ??= _state is null
        ? (double.NaN, double.NaN, double.NaN)
        : FirstOrderSlopes.PerFarad(Circuit, _state, BaseHz());

    /// <summary>The steady state at a corner; null where there is none.</summary>
    public RunningFigures? SteadyAt(OperatingPoint point, double c1Tolerance, double c2Tolerance) =>
        Follow(_template.At(_values, point, c1Tolerance, c2Tolerance));

    private RunningFigures? Follow(OscillatorCircuit circuit) =>
        _state is null ? null : OscillatorAnalysis.FindSteadyState(circuit, _state, Fineness.Same, out _);

    private double BaseHz() => Base?.FrequencyHz ?? double.NaN;

    private (double Ratio, double Watts, OperatingPoint? Farthest) FindOverAmplifier()
    {
        double most = 0;
        double watts = 0;
        OperatingPoint? farthest = null;
        for (int corner = 0; corner < _overAmplifier.Length; corner++)
        {
            double shift = ShiftAt(corner);
            farthest = double.IsFinite(shift) && shift > most ? _template.AmplifierCorners[corner] : farthest;
            most = Math.Max(most, shift);
            watts = Math.Max(watts, AmplifierDriveWattsAt(corner));
        }

        return (most, watts, farthest);
    }

    private double ShiftAt(int corner)
    {
        double shift = OverAmplifier(corner) is { } state ? Math.Abs(state.FrequencyHz / BaseHz() - 1) : double.NaN;
        return double.IsNaN(shift) ? double.PositiveInfinity : shift;
    }

    private RunningFigures? OverAmplifier(int corner)
    {
        if (!_isFound[corner])
        {
            _overAmplifier[corner] = Follow(_template.At(_values, _template.AmplifierCorners[corner]));
            _isFound[corner] = true;
        }

        return _overAmplifier[corner];
    }

    private (double C1, double C2, double Across) Slopes()
    {
        double across = Circuit.Crystal.ShuntFarads + Circuit.Strays.AcrossFarads + 1e-12;
        return (
            Slope(Step * _values.C1Farads, d => Circuit with { C1Farads = _values.C1Farads + d }),
            Slope(Step * _values.C2Farads, d => Circuit with { C2Farads = _values.C2Farads + d }),
            Slope(Step * across, d => Circuit with { Strays = Circuit.Strays with { AcrossFarads = Circuit.Strays.AcrossFarads + d } }));
    }

    private double Slope(double step, Func<double, OscillatorCircuit> shifted)
    {
        RunningFigures? above = Follow(shifted(step));
        RunningFigures? below = Follow(shifted(-step));
        return above is null || below is null
            ? double.NaN
            : (above.FrequencyHz - below.FrequencyHz) / (2 * step * BaseHz());
    }
}
