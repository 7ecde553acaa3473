using System.Numerics;
using PartPick.Physics.Bias;
using PartPick.Physics.Circuits;
using PartPick.Physics.Network;
using PartPick.Physics.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// The periodic state of a follower with the transistor of Ebers and Moll, by shooting: the charges at the beginning of the
/// period are sought with which it ends as it began.
/// </summary>
internal sealed class FollowerPeriod : ForcedState
{
    private const int Unknowns = FollowerPass.Unknowns;
    private const int LogAmps = FollowerPass.LogAmps;
    private const int Width = JunctionStep.Width;
    private const int Voltages = JunctionStep.Voltages;
    private const int MatrixWidth = 16;
    private const int MostPasses = 60;
    private const int MostMeshes = 6;
    private const double LargestLogStep = 0.7;
    private readonly FollowerCircuit _circuit;
    private readonly FollowerNetwork _network;
    private readonly FollowerBias _bias;
    private readonly FollowerElements _elements;
    private readonly FollowerPass _pass;
    private readonly double _shift;
    private readonly double _supply;
    private readonly double _meshTolerance;
    private readonly double[] _unknowns = new double[Unknowns];
    private readonly double[] _matrix = new double[Unknowns * MatrixWidth];
    private PeriodMesh _mesh;
    private readonly double[] _mismatch = new double[Unknowns];
    private double[] _keptVolts = [];
    private double[] _keptSlopes = [];
    private double[] _volts = [];
    private double[] _currents = [];
    private double[] _slopes = [];
    private FollowerPorts _ports;
    private double[] _tangent = new double[Unknowns];
    private (PeriodMesh Mesh, double[] Volts, double[] Unknowns, double Peak)? _remembered;

    public FollowerPeriod(FollowerCircuit circuit, FollowerBias bias, double meshTolerance)
    {
        _circuit = circuit;
        _bias = bias;
        _meshTolerance = meshTolerance;
        _network = new FollowerNetwork(circuit);
        _elements = new FollowerElements(circuit, bias);
        _shift = Math.Log(bias.SaturationAmps / bias.EmitterAmps);
        _supply = circuit.SupplyVolts / bias.ThermalVolts;
        double unit = bias.ThermalVolts / bias.EmitterAmps;
        _pass = new FollowerPass(_elements, 1 + 1 / circuit.Transistor.Beta)
        {
            PerOhm = 1 / unit,
            Shifts = (_shift, _shift - _supply),
            Sources = Given
                ? (0, 1, 1)
                : (_supply * unit / circuit.BaseTopOhms, 0, unit / circuit.LoadOhms),
        };
        _mesh = PeriodMesh.Uniform(4);
        Size();
    }

    private bool Given => _circuit.EmitterCurrentAmps is not null;

    private double Unit => _bias.ThermalVolts / _bias.EmitterAmps;

    public int Steps => _mesh.Count;
    public static int Passes, MaxInner;

    public double MeshTolerance => _meshTolerance;

    /// <inheritdoc/>
    public override double LinearPeakAmps =>
        0.2 * _bias.ThermalVolts / Complex.Abs(_network.At(new Complex(0, Radians)).ControlPerCurrent(_bias.TransconductanceSiemens));

    /// <inheritdoc/>
    public override void SetFrequency(double radians)
    {
        Radians = radians;
        _ports = _network.Ports(new Complex(0, radians));
        _pass.SetFrequency(radians, _ports);
    }

    /// <inheritdoc/>
    public override void StartLinear(double peakAmps)
    {
        PeakAmps = peakAmps;
        _mesh = PeriodMesh.Uniform(4);
        Size();
        double collector = _bias.TransconductanceSiemens * _bias.ThermalVolts / _bias.EmitterAmps;
        double baseAmps = collector / _circuit.Transistor.Beta;
        double vB = _bias.BaseVolts / _bias.ThermalVolts;
        double vI = vB - baseAmps * _circuit.Transistor.BaseSpreadingOhms / Unit;
        double u = Math.Log(collector);
        double vE = vI - (u - _shift);
        Complex control = peakAmps * _network.At(new Complex(0, Radians)).ControlPerCurrent(_bias.TransconductanceSiemens) / _bias.ThermalVolts;
        for (int step = 0; step < _mesh.Count; step++)
        {
            Complex[] turns = PeriodMesh.TurnsOf(_mesh.Levels[step]);
            int at = _mesh.TurnIndex(step);
            for (int k = 0; k < 3; k++)
            {
                _volts[step * Voltages + k] = u + (control * turns[at + k]).Real;
                _volts[step * Voltages + 3 + k] = vI - _supply + _shift;
            }
        }

        _elements.Charges(Radians, vB, vI, vE, collector, _unknowns.AsSpan(0, 3));
        PutSources(vB, vE, baseAmps);
    }

    private void PutSources(double vB, double vE, double baseAmps)
    {
        _unknowns[3] = Given ? FollowerElements.EmitterSiemens(_circuit) * Unit * vE - 1 : vE;
        _unknowns[4] = Given ? FollowerElements.BaseSiemens(_circuit) * Unit * vB + baseAmps : 0;
        Array.Clear(_tangent);
    }

    /// <inheritdoc/>
    public override void Remember() => _remembered = (_mesh, [.. _volts], [.. _unknowns], PeakAmps);

    /// <inheritdoc/>
    public override void Recall()
    {
        (_mesh, double[] volts, double[] unknowns, PeakAmps) = _remembered!.Value;
        Size();
        volts.CopyTo(_volts, 0);
        unknowns.CopyTo(_unknowns, 0);
        Array.Clear(_tangent);
    }

    /// <inheritdoc/>
    public override bool SolveAt(double peakAmps)
    {
        double log = Math.Log(peakAmps / PeakAmps);
        if (log != 0 && _tangent[LogAmps] != 0)
        {
            Span<double> change = stackalloc double[Unknowns];
            for (int k = 0; k < Unknowns; k++)
            {
                change[k] = _tangent[k] * log;
            }

            Advance(change, 1, PeakAmps);
        }

        PeakAmps = peakAmps;
        return Solve(null, 1e-5);
    }

    /// <inheritdoc/>
    public override bool SolveRunning(double resistanceOhms, double tolerance = FineTolerance) => Solve(resistanceOhms, Math.Sqrt(tolerance));

    private bool Solve(double? resistance, double tolerance)
    {
        for (int round = 0; round < MostMeshes; round++)
        {
            if (!Newton(resistance, tolerance))
            {
                return false;
            }

            if (!Adapt())
            {
                return true;
            }
        }

        return Newton(resistance, tolerance);
    }

    public static int Damped;
    private bool Newton(double? resistance, double tolerance)
    {
        Span<double> change = stackalloc double[Unknowns];
        Span<double> start = stackalloc double[Unknowns];
        Span<double> inverse = stackalloc double[Unknowns * Unknowns];
        Span<double> weights = stackalloc double[Unknowns];
        double startPeak = PeakAmps;
        double before = double.PositiveInfinity;
        double fraction = 1;
        for (int pass = 0; pass < MostPasses; pass++)
        {
            Passes++;
            _pass.Run(_mesh, _unknowns, PeakAmps / _bias.EmitterAmps, _volts, _currents, _slopes);
            bool solved = double.IsFinite(_pass.Left) && Linearise(resistance);
            if (pass > 0)
            {
                double now = double.PositiveInfinity;
                if (solved)
                {
                    now = 0;
                    for (int row = 0; row < Unknowns; row++)
                    {
                        double sum = 0;
                        for (int k = 0; k < Unknowns; k++)
                        {
                            sum += inverse[row * Unknowns + k] * _mismatch[k];
                        }

                        now = Math.Max(now, Math.Abs(sum) * weights[row]);
                    }
                }

                if (Trace) Console.WriteLine($"      before {before:E2} now {now:E2} fraction {fraction}");
                if (!(now < (1 - fraction / 4) * before) && now > 1e-3)
                {
                    Damped++;
                    fraction /= 2;
                    if (fraction < 1e-3)
                    {
                        return false;
                    }

                    (_volts, _keptVolts) = (_keptVolts, _volts);
                    (_slopes, _keptSlopes) = (_keptSlopes, _slopes);
                    start.CopyTo(_unknowns);
                    Advance(change, fraction, startPeak);
                    continue;
                }
            }
            else if (!solved)
            {
                return false;
            }

            for (int k = 0; k < Unknowns; k++)
            {
                change[k] = _matrix[k * MatrixWidth + Unknowns];
                _tangent[k] = _matrix[k * MatrixWidth + Unknowns + 1];
                for (int column = 0; column < Unknowns; column++)
                {
                    inverse[k * Unknowns + column] = _matrix[k * MatrixWidth + Unknowns + 2 + column];
                }
            }

            Weigh(weights);
            before = 0;
            for (int k = 0; k < Unknowns; k++)
            {
                before = Math.Max(before, weights[k] * Math.Abs(change[k]));
            }

            if (Trace) Console.WriteLine($"   {_mesh.Count} tol {_meshTolerance:E1} pass {pass} left {_pass.Left:E2} largest {before:E2} Z {_pass.Impedance} peak {PeakAmps}");
            if (_pass.Left < Math.Max(tolerance, 1e-5) && before < tolerance)
            {
                Advance(change, 1, PeakAmps);
                Finish(change);
                return true;
            }

            _unknowns.CopyTo(start);
            startPeak = PeakAmps;
            fraction = Math.Min(Math.Min(1, 2 * fraction), LargestLogStep / Math.Max(LargestLogStep, Math.Abs(change[LogAmps])));
            Advance(change, fraction, startPeak);
        }

        return false;
    }
    public static bool Trace;

    private void Weigh(Span<double> weights)
    {
        weights.Clear();
        for (int k = 0; k < _mesh.Count * Voltages; k++)
        {
            for (int column = 0; column < Unknowns; column++)
            {
                weights[column] = Math.Max(weights[column], Math.Abs(_slopes[k * Width + column]));
            }
        }
    }

    private void Advance(ReadOnlySpan<double> change, double fraction, double startPeak)
    {
        Span<double> part = stackalloc double[Unknowns];
        for (int k = 0; k < Unknowns; k++)
        {
            part[k] = fraction * change[k];
        }

        for (int k = 0; k < Unknowns - 1; k++)
        {
            _unknowns[k] += part[k];
        }

        PeakAmps = startPeak * Math.Exp(part[LogAmps]);
        (_volts, _keptVolts) = (_keptVolts, _volts);
        (_slopes, _keptSlopes) = (_keptSlopes, _slopes);
        for (int k = 0; k < _mesh.Count * Voltages; k++)
        {
            ReadOnlySpan<double> row = _keptSlopes.AsSpan(k * Width, Unknowns);
            double shift = row[0] * part[0] + row[1] * part[1] + row[2] * part[2] + row[3] * part[3] + row[4] * part[4] + row[5] * part[5];
            _volts[k] = JunctionStep.Limit(_keptVolts[k], shift);
        }
    }

    private void Finish(ReadOnlySpan<double> change)
    {
        double real = 0, imaginary = 0, slope = 0;
        for (int k = 0; k < Unknowns; k++)
        {
            real += _pass.ResistanceSlopes[k] * change[k];
            imaginary += _pass.ReactanceSlopes[k] * change[k];
            slope += _pass.ResistanceSlopes[k] * _tangent[k];
        }

        Impedance = _pass.Impedance + new Complex(real, imaginary);
        ResistanceSlope = slope;
    }

    // The equations: the period ends as it began; the mean currents; the amplitude.
    private bool Linearise(double? resistance)
    {
        Span<double> matrix = _matrix;
        matrix.Clear();
        for (int row = 0; row < 3; row++)
        {
            Span<double> line = matrix.Slice(row * MatrixWidth, MatrixWidth);
            _pass.EndRows.Slice(row * Width, Unknowns).CopyTo(line);
            line[row] -= 1;
            line[Unknowns] = _unknowns[row] - _pass.End[row];
        }

        Span<double> first = matrix.Slice(3 * MatrixWidth, MatrixWidth);
        _pass.MeanEmitterSlopes.AsSpan(0, Unknowns).CopyTo(first);
        if (Given)
        {
            first[Unknowns] = 1 - _pass.MeanEmitter;
        }
        else
        {
            double siemens = Unit / _circuit.EmitterOhms;
            first[3] -= siemens;
            first[Unknowns] = siemens * _unknowns[3] - _pass.MeanEmitter;
        }

        Span<double> second = matrix.Slice(4 * MatrixWidth, MatrixWidth);
        if (Given)
        {
            _pass.MeanReverseSlopes.AsSpan(0, Unknowns).CopyTo(second);
            second[Unknowns] = _shift - _supply / 2 - _pass.MeanReverse;
        }
        else
        {
            second[4] = 1;
        }

        Span<double> third = matrix.Slice(5 * MatrixWidth, MatrixWidth);
        if (resistance is { } ohms)
        {
            for (int k = 0; k < Unknowns; k++)
            {
                third[k] = _pass.ResistanceSlopes[k] / ohms;
            }

            third[Unknowns] = -1 - _pass.Impedance.Real / ohms;
        }
        else
        {
            third[LogAmps] = 1;
            third[Unknowns + 1] = 1;
        }

        for (int row = 0; row < Unknowns; row++)
        {
            _mismatch[row] = matrix[row * MatrixWidth + Unknowns];
            matrix[row * MatrixWidth + Unknowns + 2 + row] = 1;
        }

        return GaussJordan.Reduce(matrix, Unknowns, MatrixWidth / 4);
    }

    private bool Adapt()
    {
        int count = _mesh.Count;
        Span<int> cuts = count <= 1024 ? stackalloc int[count] : new int[count];
        double total = 0;
        for (int step = 0; step < count; step++)
        {
            double length = 2 * Math.PI / (1 << _mesh.Levels[step]);
            for (int k = 0; k < 3; k++)
            {
                total += length * Radau.Weights[k] * (_currents[step * Voltages + k] + _currents[step * Voltages + 3 + k]);
            }
        }

        bool cutsAny = false;
        for (int step = 0; step < count; step++)
        {
            double length = 2 * Math.PI / (1 << _mesh.Levels[step]);
            int before = (step == 0 ? count - 1 : step - 1) * Voltages;
            double error = (Difference(step * Voltages, before + 2) + Difference(step * Voltages + 3, before + 5)) * length / total;
            cuts[step] = error > _meshTolerance ? Math.Max(1, (int)Math.Ceiling(Math.Log(error / _meshTolerance) / Math.Log(16) - 0.2))
                : error < _meshTolerance / 200 && _mesh.Levels[step] > 4 ? -1
                : 0;
            if (_mesh.Levels[step] + cuts[step] > 11)
            {
                cuts[step] = Math.Max(0, 11 - _mesh.Levels[step]);
            }

            cutsAny |= cuts[step] > 0;
        }

        if (!cutsAny)
        {
            return false;
        }

        ChangeMesh(_mesh.Changed(cuts));
        return true;
    }

    private double Difference(int at, int before) =>
        Math.Abs(Radau.ThirdDifference[0] * _currents[before] + Radau.ThirdDifference[1] * _currents[at]
            + Radau.ThirdDifference[2] * _currents[at + 1] + Radau.ThirdDifference[3] * _currents[at + 2]);

    private void ChangeMesh(PeriodMesh mesh)
    {
        double[] volts = [.. _volts.AsSpan(0, _mesh.Count * Voltages)];
        PeriodMesh old = _mesh;
        _mesh = mesh;
        Size();
        Resample(old, volts, mesh, _volts);
        Array.Clear(_tangent);
    }

    private static void Resample(PeriodMesh old, double[] volts, PeriodMesh mesh, double[] target)
    {
        int from = 0;
        for (int step = 0; step < mesh.Count; step++)
        {
            double length = 1 << (PeriodMesh.FinestLevel - mesh.Levels[step]);
            for (int k = 0; k < 3; k++)
            {
                double place = mesh.Starts[step] + Radau.Nodes[k] * length;
                while (from + 1 < old.Count && place > old.Starts[from + 1])
                {
                    from++;
                }

                while (from > 0 && place <= old.Starts[from])
                {
                    from--;
                }

                double t = (place - old.Starts[from]) / (1 << (PeriodMesh.FinestLevel - old.Levels[from]));
                int at = from * Voltages;
                int before = (from == 0 ? old.Count - 1 : from - 1) * Voltages;
                for (int kind = 0; kind < 6; kind += 3)
                {
                    target[step * Voltages + kind + k] = Radau.Cubic(
                        t, volts[before + kind + 2], volts[at + kind], volts[at + kind + 1], volts[at + kind + 2]);
                }
            }
        }
    }

    private void Size()
    {
        if (_volts.Length < _mesh.Count * Voltages)
        {
            _volts = new double[_mesh.Count * Voltages];
            _keptVolts = new double[_mesh.Count * Voltages];
            _keptSlopes = new double[_mesh.Count * Voltages * Width];
            _currents = new double[_mesh.Count * Voltages];
            _slopes = new double[_mesh.Count * Voltages * Width];
        }
    }

    /// <summary>The same circuit with every step halved, from this state.</summary>
    public FollowerPeriod Refined()
    {
        var finer = new FollowerPeriod(_circuit, _bias, _meshTolerance / 16) { PeakAmps = PeakAmps };
        finer.SetFrequency(Radians);
        finer._mesh = _mesh;
        finer._volts = [.. _volts];
        finer._keptVolts = new double[_volts.Length];
        finer._keptSlopes = new double[_volts.Length * Width];
        finer._currents = new double[_volts.Length];
        finer._slopes = new double[_volts.Length * Width];
        finer.ChangeMesh(_mesh.Halved());
        _unknowns.CopyTo(finer._unknowns, 0);
        return finer;
    }

    public override RunningState Keep()
    {
        int count = _mesh.Count * Voltages;
        double[] kept = new double[3 + count];
        _volts.AsSpan(0, count).CopyTo(kept.AsSpan(3));
        double amps = PeakAmps / _bias.EmitterAmps;
        double u = _volts[count - 4] - _shift;
        double vI = _volts[count - 1] - _shift + _supply;
        double driveI = (_ports.Internal * (amps / Unit)).Real;
        double driveU = (_ports.Junction * (amps / Unit)).Real;
        double driveB = (_ports.Own * (amps / Unit)).Real;
        double vB = _elements.BaseVolts(Radians, _unknowns, vI - driveI, vI - driveI - (u - driveU)) + driveB;
        kept[0] = (vB - _bias.BaseVolts / _bias.ThermalVolts) * _bias.ThermalVolts;
        kept[1] = (vB - vI) * _bias.ThermalVolts;
        kept[2] = u + _shift;
        return new(typeof(FollowerPeriod), _mesh.Count, Given, Radians, PeakAmps, kept, null, _mesh);
    }

    public void TakeState(RunningState state)
    {
        _mesh = state.Mesh!;
        Size();
        SetFrequency(state.Radians);
        PeakAmps = state.PeakAmps;
        state.State[3..].CopyTo(_volts);
        double meanU = 0, meanW = 0, meanBase = 0;
        for (int step = 0; step < _mesh.Count; step++)
        {
            double length = 1.0 / (1 << _mesh.Levels[step]);
            for (int k = 0; k < 3; k++)
            {
                double weight = Radau.Weights[k] * length;
                double u = _volts[step * Voltages + k], w = _volts[step * Voltages + 3 + k];
                meanU += weight * u;
                meanW += weight * w;
                meanBase += weight * (Math.Exp(Math.Min(u, 20)) / _circuit.Transistor.Beta + Math.Exp(Math.Min(w, 20)));
            }
        }

        double amps = PeakAmps / _bias.EmitterAmps;
        double vB = (_bias.BaseVolts + state.State[0]) / _bias.ThermalVolts;
        double vI = vB - state.State[1] / _bias.ThermalVolts;
        double vE = vI - (state.State[2] - _shift);
        double driveI = (_ports.Internal * (amps / Unit)).Real;
        double driveU = (_ports.Junction * (amps / Unit)).Real;
        double driveB = (_ports.Own * (amps / Unit)).Real;
        _elements.Charges(Radians, vB - driveB, vI - driveI, vE - driveI + driveU, Math.Exp(Math.Min(20, state.State[2])), _unknowns.AsSpan(0, 3));
        double meanI = meanW - _shift + _supply;
        PutSources(meanI + meanBase * _circuit.Transistor.BaseSpreadingOhms / Unit, meanI - (meanU - _shift), meanBase);
    }

    public override bool LimitedBySupply => Extremes(3, _volts).High - _shift > 0.4 / _bias.ThermalVolts;

    public override double OutputSwingVolts()
    {
        double[] emitter = new double[_mesh.Count * Voltages];
        for (int k = 0; k < emitter.Length; k++)
        {
            emitter[k] = k % Voltages < 3 ? _volts[k + 3] - _volts[k] : 0;
        }

        (double low, double high) = Extremes(0, emitter);
        return (high - low) * _bias.ThermalVolts;
    }

    private (double Low, double High) Extremes(int kind, double[] volts)
    {
        double low = double.PositiveInfinity, high = double.NegativeInfinity;
        for (int step = 0; step < _mesh.Count; step++)
        {
            int at = step * Voltages + kind;
            double before = volts[(step == 0 ? _mesh.Count - 1 : step - 1) * Voltages + kind + 2];
            for (int part = 1; part <= 8; part++)
            {
                double v = Radau.Cubic(part / 8.0, before, volts[at], volts[at + 1], volts[at + 2]);
                low = Math.Min(low, v);
                high = Math.Max(high, v);
            }
        }

        return (low, high);
    }
}
