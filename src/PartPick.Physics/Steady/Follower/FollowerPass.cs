using System.Numerics;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using PartPick.Physics.Network;

namespace PartPick.Physics.Steady;

/// <summary>
/// Goes once through the period, step by step from the charges at its beginning, and carries along how everything depends on
/// the unknowns: the three charges, two constant sources, the logarithm of the motional current.
/// </summary>
internal sealed class FollowerPass
{
    /// <summary>Number of unknowns.</summary>
    public const int Unknowns = 6;

    /// <summary>The unknown that is the logarithm of the motional current.</summary>
    public const int LogAmps = 5;

    private const int Width = JunctionStep.Width;
    private const int Stages = Radau.Stages;
    private readonly FollowerElements _elements;
    private readonly double[]?[] _maps = new double[]?[PeriodMesh.FinestLevel + 1];
    private readonly bool[] _mapped = new bool[PeriodMesh.FinestLevel + 1];
    private readonly JunctionStep _step = new();
    private readonly double[] _offsets = new double[6];
    private readonly double[] _right = new double[6 * Width];
    private readonly double[] _rows = new double[3 * Width];
    private readonly double[] _nextRows = new double[3 * Width];
    private double _radians;
    private FollowerPorts _ports;

    public FollowerPass(FollowerElements elements, double emitterPerForward)
    {
        _elements = elements;
        _perForward = emitterPerForward;
    }

    private readonly double _perForward;

    /// <summary>Constant current into B and its part by the second source; emitter current by the first source.</summary>
    public (double Feed, double BasePerSource, double EmitterPerSource) Sources { get; init; }

    /// <summary>What is added to vBE and to vI, so that they are logarithms of currents.</summary>
    public (double Junction, double Inner) Shifts { get; init; }

    /// <summary>Volts per ampere in units of the pass.</summary>
    public required double PerOhm { get; init; }

    /// <summary>Charges at the end.</summary>
    public double[] End { get; } = new double[3];

    /// <summary>Derivatives of the charges at the end, in rows of <see cref="JunctionStep.Width"/>.</summary>
    public ReadOnlySpan<double> EndRows => _rows;

    /// <summary>Mean emitter current and its derivatives.</summary>
    public double MeanEmitter { get; private set; }

    public double[] MeanEmitterSlopes { get; } = new double[Width];

    /// <summary>Mean base current.</summary>
    public double MeanBase { get; private set; }

    /// <summary>Mean of w and its derivatives.</summary>
    public double MeanReverse { get; private set; }

    public double[] MeanReverseSlopes { get; } = new double[Width];

    /// <summary>Zc and its derivatives.</summary>
    public Complex Impedance { get; private set; }

    public double[] ResistanceSlopes { get; } = new double[Width];

    public double[] ReactanceSlopes { get; } = new double[Width];

    /// <summary>Largest correction that a step's Newton method made last.</summary>
    public double Left { get; private set; }

    /// <summary>Sets the frequency in rad/s and the ports at it.</summary>
    public void SetFrequency(double radians, in FollowerPorts ports)
    {
        _radians = radians;
        _ports = ports;
        Array.Clear(_mapped);
    }

    public void Run(PeriodMesh mesh, ReadOnlySpan<double> unknowns, double amps, Span<double> volts, Span<double> currents, Span<double> slopes)
    {
        unknowns[..3].CopyTo(End);
        Array.Clear(_rows);
        for (int k = 0; k < 3; k++)
        {
            _rows[k * Width + k] = 1;
        }

        Clear();
        double baseAmps = Sources.Feed + Sources.BasePerSource * unknowns[4];
        double emitterAmps = Sources.EmitterPerSource * unknowns[3];
        for (int step = 0; step < mesh.Count; step++)
        {
            int level = mesh.Levels[step];
            ReadOnlySpan<double> map = MapOf(level);
            ReadOnlySpan<Complex> turns = PeriodMesh.TurnsOf(level).AsSpan(mesh.TurnIndex(step), Stages);
            Prepare(map, turns, amps, baseAmps, emitterAmps);
            Span<double> stepVolts = volts.Slice(step * JunctionStep.Voltages, JunctionStep.Voltages);
            Span<double> stepCurrents = currents.Slice(step * JunctionStep.Voltages, JunctionStep.Voltages);
            Span<double> stepSlopes = slopes.Slice(step * JunctionStep.Voltages * Width, JunctionStep.Voltages * Width);
            _step.Solve(map, _offsets, _right, stepVolts, stepCurrents, stepSlopes);
            Left = Math.Max(Left, _step.Left);
            if (!double.IsFinite(Left))
            {
                return;
            }

            Advance(map, stepCurrents, stepSlopes, baseAmps, emitterAmps);
            Note(2 * Math.PI / (1 << level), turns, amps, stepVolts, stepCurrents, stepSlopes);
        }

        Complex rest = Impedance;
        Impedance += _ports.Own;
        ResistanceSlopes[LogAmps] -= rest.Real;
        ReactanceSlopes[LogAmps] -= rest.Imaginary;
    }

    private void Clear()
    {
        Left = 0;
        MeanEmitter = MeanBase = MeanReverse = 0;
        Impedance = Complex.Zero;
        Array.Clear(MeanEmitterSlopes);
        Array.Clear(MeanReverseSlopes);
        Array.Clear(ResistanceSlopes);
        Array.Clear(ReactanceSlopes);
    }

    private ReadOnlySpan<double> MapOf(int level)
    {
        double[] map = _maps[level] ??= new double[FollowerElements.MapRows * FollowerElements.MapWidth];
        if (!_mapped[level])
        {
            _elements.Step(_radians, 2 * Math.PI / (1 << level), map);
            _mapped[level] = true;
        }

        return map;
    }

    // The voltages of a step without currents in the junctions, and their derivatives.
    private void Prepare(ReadOnlySpan<double> map, ReadOnlySpan<Complex> turns, double amps, double baseAmps, double emitterAmps)
    {
        ReadOnlySpan<Vector256<double>> rows = MemoryMarshal.Cast<double, Vector256<double>>(_rows);
        Span<Vector256<double>> rights = MemoryMarshal.Cast<double, Vector256<double>>(_right.AsSpan());
        double scale = amps * PerOhm;
        Complex junction = _ports.Junction * scale;
        Complex inner = _ports.Internal * scale;
        for (int k = 0; k < 6; k++)
        {
            ReadOnlySpan<double> line = map.Slice(k * FollowerElements.MapWidth, FollowerElements.MapWidth);
            bool forward = k < Stages;
            Complex turn = turns[forward ? k : k - Stages];
            Complex port = forward ? junction : inner;
            double drive = port.Real * turn.Real - port.Imaginary * turn.Imaginary;
            _offsets[k] = (forward ? Shifts.Junction : Shifts.Inner) + drive
                + line[0] * End[0] + line[1] * End[1] + line[2] * End[2]
                + line[FollowerElements.BaseColumn] * baseAmps + line[FollowerElements.EmitterColumn] * emitterAmps;
            var first = Vector256.Create(line[0]);
            var second = Vector256.Create(line[1]);
            var third = Vector256.Create(line[2]);
            rights[2 * k] = first * rows[0] + second * rows[2] + third * rows[4]
                + Vector256.Create(0, 0, 0, line[FollowerElements.EmitterColumn] * Sources.EmitterPerSource);
            rights[2 * k + 1] = first * rows[1] + second * rows[3] + third * rows[5]
                + Vector256.Create(line[FollowerElements.BaseColumn] * Sources.BasePerSource, drive, 0, 0);
        }
    }

    private void Advance(ReadOnlySpan<double> map, ReadOnlySpan<double> currents, ReadOnlySpan<double> slopes, double baseAmps, double emitterAmps)
    {
        ReadOnlySpan<Vector256<double>> rows = MemoryMarshal.Cast<double, Vector256<double>>(_rows);
        Span<Vector256<double>> next = MemoryMarshal.Cast<double, Vector256<double>>(_nextRows.AsSpan());
        ReadOnlySpan<Vector256<double>> lines = MemoryMarshal.Cast<double, Vector256<double>>(slopes);
        double q0 = End[0], q1 = End[1], q2 = End[2];
        for (int row = 0; row < 3; row++)
        {
            ReadOnlySpan<double> line = map.Slice((6 + row) * FollowerElements.MapWidth, FollowerElements.MapWidth);
            double charge = line[0] * q0 + line[1] * q1 + line[2] * q2
                + line[FollowerElements.BaseColumn] * baseAmps + line[FollowerElements.EmitterColumn] * emitterAmps;
            var first = Vector256.Create(line[0]);
            var second = Vector256.Create(line[1]);
            var third = Vector256.Create(line[2]);
            Vector256<double> low = first * rows[0] + second * rows[2] + third * rows[4]
                + Vector256.Create(0, 0, 0, line[FollowerElements.EmitterColumn] * Sources.EmitterPerSource);
            Vector256<double> high = first * rows[1] + second * rows[3] + third * rows[5]
                + Vector256.Create(line[FollowerElements.BaseColumn] * Sources.BasePerSource, 0, 0, 0);
            for (int k = 0; k < 6; k++)
            {
                double term = line[FollowerElements.ForwardColumn + k] * currents[k];
                if (term != 0)
                {
                    charge += term;
                    var share = Vector256.Create(term);
                    low += share * lines[2 * k];
                    high += share * lines[2 * k + 1];
                }
            }

            End[row] = charge;
            next[2 * row] = low;
            next[2 * row + 1] = high;
        }

        _nextRows.CopyTo(_rows, 0);
    }

    // Adds the step to the integrals over the period.
    private void Note(
        double length, ReadOnlySpan<Complex> turns, double amps, ReadOnlySpan<double> volts, ReadOnlySpan<double> currents, ReadOnlySpan<double> slopes)
    {
        ReadOnlySpan<Vector256<double>> lines = MemoryMarshal.Cast<double, Vector256<double>>(slopes);
        Span<Vector256<double>> emitter = MemoryMarshal.Cast<double, Vector256<double>>(MeanEmitterSlopes.AsSpan());
        Span<Vector256<double>> reverse = MemoryMarshal.Cast<double, Vector256<double>>(MeanReverseSlopes.AsSpan());
        Span<Vector256<double>> resistance = MemoryMarshal.Cast<double, Vector256<double>>(ResistanceSlopes.AsSpan());
        Span<Vector256<double>> reactance = MemoryMarshal.Cast<double, Vector256<double>>(ReactanceSlopes.AsSpan());
        for (int k = 0; k < Stages; k++)
        {
            double weight = Radau.Weights[k] * length / (2 * Math.PI);
            double forward = weight * currents[k];
            double backward = weight * currents[Stages + k];
            Complex turn = Complex.Conjugate(turns[k]) * (2 / amps);
            Complex perForward = _ports.OwnPerForward * turn * forward;
            Complex perReverse = _ports.OwnPerReverse * turn * backward;
            MeanEmitter += _perForward * forward - backward;
            MeanBase += (_perForward - 1) * forward + backward;
            MeanReverse += weight * volts[Stages + k];
            Impedance += perForward + perReverse;
            for (int half = 0; half < 2; half++)
            {
                Vector256<double> u = lines[2 * k + half];
                Vector256<double> w = lines[2 * (Stages + k) + half];
                emitter[half] += Vector256.Create(_perForward * forward) * u - Vector256.Create(backward) * w;
                reverse[half] += Vector256.Create(weight) * w;
                resistance[half] += Vector256.Create(perForward.Real) * u + Vector256.Create(perReverse.Real) * w;
                reactance[half] += Vector256.Create(perForward.Imaginary) * u + Vector256.Create(perReverse.Imaginary) * w;
            }
        }
    }
}
