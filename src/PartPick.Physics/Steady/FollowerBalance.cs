using System.Numerics;
using PartPick.Physics.Bias;
using PartPick.Physics.Circuits;
using PartPick.Physics.Network;
using PartPick.Physics.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// Harmonic balance of the follower with the transistor of Ebers and Moll. The state is the base–emitter voltage at N points
/// of a period; where the collector junction conducts, its voltage too; where the mean emitter current is given, the mean
/// base–emitter voltage that gives it.
/// </summary>
internal sealed class FollowerBalance : AmplitudeBalance
{
    private const double HighestExponent = 200;
    private readonly FollowerCircuit _circuit;
    private readonly FollowerNetwork _network;
    private readonly FollowerBias _bias;
    private readonly bool _reverse;
    private readonly int _points;
    private readonly FullWave _wave;
    private readonly double[] _junctionForward;
    private readonly double[] _junctionReverse;
    private readonly double[] _internalForward;
    private readonly double[] _internalReverse;
    private readonly double[] _junctionDrive;
    private readonly double[] _internalDrive;
    private readonly double[] _forward;
    private readonly double[] _backward;
    private double _junctionOffset;
    private double _internalOffset;
    private FollowerPorts _ports;

    /// <param name="circuit">The circuit.</param>
    /// <param name="bias">Its DC operating point.</param>
    /// <param name="reverse">Whether the collector junction's current is part of the balance.</param>
    /// <param name="points">Points per period, even.</param>
    public FollowerBalance(FollowerCircuit circuit, FollowerBias bias, bool reverse, int points)
    {
        _circuit = circuit;
        _network = new FollowerNetwork(circuit);
        _bias = bias;
        _reverse = reverse;
        _points = points;
        _wave = FullWave.Of(points);
        _junctionForward = new double[2 * points - 1];
        _junctionReverse = new double[2 * points - 1];
        _internalForward = new double[2 * points - 1];
        _internalReverse = new double[2 * points - 1];
        _junctionDrive = new double[points];
        _internalDrive = new double[points];
        _forward = new double[points];
        _backward = new double[points];
        State = new double[(reverse ? 2 : 1) * points + (GivenCurrent ? 1 : 0)];
    }

    /// <inheritdoc/>
    public override double LinearPeakAmps =>
        0.2 * _bias.ThermalVolts / Complex.Abs(_network.At(new Complex(0, Radians)).ControlPerCurrent(_bias.TransconductanceSiemens));

    /// <inheritdoc/>
    public override bool LimitedBySupply => LargestCollectorJunctionVolts() > 0.4;

    /// <summary>True where the collector junction's current can no longer be left out.</summary>
    public bool NeedsReverse => !_reverse && LargestCollectorJunctionVolts() > 0.25;

    /// <summary>Points per period.</summary>
    public int Points => _points;

    /// <summary>Whether the collector junction is part of the balance.</summary>
    public bool Reverse => _reverse;

    private bool GivenCurrent => _circuit.EmitterCurrentAmps is not null;

    /// <summary>The same circuit with twice the points, or with the collector junction's current, from this state.</summary>
    public FollowerBalance Refined(bool reverse, int points)
    {
        var finer = new FollowerBalance(_circuit, _bias, reverse, points) { PeakAmps = PeakAmps };
        Resample(State.AsSpan(0, _points), finer.State.AsSpan(0, points));
        if (reverse)
        {
            Span<double> target = finer.State.AsSpan(points, points);
            Resample(InternalVolts(State, PeakAmps), target);
            for (int j = 0; j < points; j++)
            {
                // A starting point beyond the junction's clamp would overflow; Newton finds the rest.
                target[j] = Math.Min(target[j], _circuit.SupplyVolts + 0.6);
            }
        }

        if (GivenCurrent)
        {
            finer.State[^1] = State[^1];
        }

        finer.SetFrequency(Radians);
        return finer;
    }

    /// <inheritdoc/>
    public override RunningState Keep() =>
        new(typeof(FollowerBalance), _points, _reverse, GivenCurrent, Radians, PeakAmps, [.. State], LendFactors());

    /// <inheritdoc/>
    public override void StartLinear(double peakAmps)
    {
        PeakAmps = peakAmps;
        double mean = _bias.ThermalVolts * Math.Log(_bias.TransconductanceSiemens * _bias.ThermalVolts / _bias.SaturationAmps);
        Complex control = peakAmps * _network.At(new Complex(0, Radians)).ControlPerCurrent(_bias.TransconductanceSiemens);
        for (int j = 0; j < _points; j++)
        {
            State[j] = mean + (control * _wave.Point(j)).Real;
        }

        if (GivenCurrent)
        {
            State[^1] = mean;
        }

        if (_reverse)
        {
            double[] volts = InternalVolts(State, peakAmps);
            volts.CopyTo(State, _points);
        }
    }

    /// <inheritdoc/>
    public override double OutputSwingVolts()
    {
        const int Fine = 1024;
        ComputeCurrents(State);
        Complex[] phasors = new Complex[_wave.Harmonics];
        for (int h = 1; h < phasors.Length; h++)
        {
            FollowerPorts ports = _network.Ports(new Complex(0, h * Radians));
            phasors[h] = ports.EmitterPerForward * _wave.Phasor(_forward, h);
            if (_reverse)
            {
                phasors[h] += ports.EmitterPerReverse * _wave.Phasor(_backward, h);
            }
        }

        phasors[1] += _ports.Emitter * PeakAmps;
        FullWave fine = FullWave.Of(Fine);
        double highest = double.NegativeInfinity;
        double lowest = double.PositiveInfinity;
        for (int j = 0; j < Fine; j++)
        {
            double volts = 0;
            for (int h = 1; h < phasors.Length; h++)
            {
                volts += (phasors[h] * fine.Point(h * j % Fine)).Real;
            }

            highest = Math.Max(highest, volts);
            lowest = Math.Min(lowest, volts);
        }

        return highest - lowest;
    }

    /// <inheritdoc/>
    protected override void PrepareHarmonics(double radians)
    {
        int count = _wave.Harmonics;
        var junctionForward = new Complex[count];
        var junctionReverse = new Complex[count];
        var internalForward = new Complex[count];
        var internalReverse = new Complex[count];
        for (int h = 0; h < count; h++)
        {
            if (h == 0 && GivenCurrent)
            {
                // The mean emitter current is held: no resistor answers to it, and half the supply stands at the base.
                _junctionOffset = 0;
                _internalOffset = _circuit.SupplyVolts / 2;
                continue;
            }

            FollowerPorts ports = _network.Ports(new Complex(0, h * radians));
            junctionForward[h] = ports.JunctionPerForward;
            junctionReverse[h] = ports.JunctionPerReverse;
            internalForward[h] = ports.InternalPerForward;
            internalReverse[h] = ports.InternalPerReverse;
            if (h == 0)
            {
                double feed = _circuit.SupplyVolts / _circuit.BaseTopOhms;
                _junctionOffset = ports.Junction.Real * feed;
                _internalOffset = ports.Internal.Real * feed;
            }

            if (h == 1)
            {
                _ports = ports;
            }
        }

        _wave.Kernel(junctionForward, _junctionForward);
        _wave.Kernel(internalForward, _internalForward);
        if (_reverse)
        {
            _wave.Kernel(junctionReverse, _junctionReverse);
            _wave.Kernel(internalReverse, _internalReverse);
        }

        for (int j = 0; j < _points; j++)
        {
            _junctionDrive[j] = (_ports.Junction * _wave.Point(j)).Real;
            _internalDrive[j] = (_ports.Internal * _wave.Point(j)).Real;
        }
    }

    /// <inheritdoc/>
    protected override double Residual(ReadOnlySpan<double> state, double peakAmps, Span<double> residual)
    {
        ComputeCurrents(state);
        double worst = 0;
        for (int j = 0; j < _points; j++)
        {
            residual[j] = state[j] - JunctionVolts(state, peakAmps, j);
            worst = Math.Max(worst, Math.Abs(residual[j]));
            if (_reverse)
            {
                residual[_points + j] = state[_points + j] - InternalVolts(peakAmps, j);
                worst = Math.Max(worst, Math.Abs(residual[_points + j]));
            }
        }

        worst /= _bias.ThermalVolts;
        if (GivenCurrent)
        {
            residual[state.Length - 1] = -HeldMismatch();
            worst = Math.Max(worst, Math.Abs(residual[state.Length - 1]));
        }

        return worst;
    }

    /// <inheritdoc/>
    protected override void Linearise(ReadOnlySpan<double> state, double peakAmps, Span<double> matrix, int stride, Span<double> byLogAmps)
    {
        int total = state.Length;
        ComputeCurrents(state);
        byLogAmps.Clear();
        for (int j = 0; j < _points; j++)
        {
            Span<double> row = matrix.Slice(j * stride, total);
            FillRow(row, j, _junctionForward, _junctionReverse);
            row[j] += 1;
            byLogAmps[j] = -peakAmps * _junctionDrive[j];
            if (GivenCurrent)
            {
                row[total - 1] = -1;
            }

            if (_reverse)
            {
                Span<double> second = matrix.Slice((_points + j) * stride, total);
                FillRow(second, j, _internalForward, _internalReverse);
                second[_points + j] += 1;
                byLogAmps[_points + j] = -peakAmps * _internalDrive[j];
                if (GivenCurrent)
                {
                    second[total - 1] = 0;
                }
            }
        }

        if (GivenCurrent)
        {
            FillHeldCurrent(matrix.Slice((total - 1) * stride, total));
        }
    }

    /// <inheritdoc/>
    protected override Complex ImpedanceOf(ReadOnlySpan<double> state, double peakAmps, Span<double> gradient, out double byLogAmps)
    {
        ComputeCurrents(state);
        gradient.Clear();
        double scale = 2.0 / (_points * peakAmps);
        Complex sum = Complex.Zero;
        for (int j = 0; j < _points; j++)
        {
            Complex turn = Complex.Conjugate(_wave.Point(j)) * scale;
            Complex forward = _ports.OwnPerForward * turn;
            sum += forward * _forward[j];
            gradient[j] = forward.Real * _forward[j] / _bias.ThermalVolts;
            if (_reverse)
            {
                Complex backward = _ports.OwnPerReverse * turn;
                sum += backward * _backward[j];
                gradient[_points + j] = backward.Real * _backward[j] / _bias.ThermalVolts;
            }
        }

        byLogAmps = -sum.Real;
        return _ports.Own + sum;
    }

    /// <inheritdoc/>
    protected override double StepLimit(ReadOnlySpan<double> step)
    {
        double highest = double.NegativeInfinity;
        for (int j = 0; j < _points; j++)
        {
            highest = Math.Max(highest, State[j]);
        }

        double limit = 1;
        double ceiling = highest + 2 * _bias.ThermalVolts;
        double collectorCeiling = _circuit.SupplyVolts + 0.9;
        for (int j = 0; j < _points; j++)
        {
            if (State[j] + step[j] > ceiling)
            {
                limit = Math.Min(limit, (ceiling - State[j]) / step[j]);
            }

            if (_reverse && State[_points + j] + step[_points + j] > collectorCeiling && step[_points + j] > 0)
            {
                limit = Math.Min(limit, Math.Max(0.05, (collectorCeiling - State[_points + j]) / step[_points + j]));
            }
        }

        return limit;
    }

    private void FillRow(Span<double> row, int j, double[] forwardKernel, double[] reverseKernel)
    {
        ReadOnlySpan<double> forward = forwardKernel.AsSpan(_points - 1 - j, _points);
        double inverse = -1 / _bias.ThermalVolts;
        for (int k = 0; k < _points; k++)
        {
            row[k] = forward[k] * _forward[k] * inverse;
        }

        if (_reverse)
        {
            ReadOnlySpan<double> backward = reverseKernel.AsSpan(_points - 1 - j, _points);
            for (int k = 0; k < _points; k++)
            {
                row[_points + k] = backward[k] * _backward[k] * inverse;
            }
        }
    }

    private void FillHeldCurrent(Span<double> row)
    {
        double emitter = _bias.EmitterAmps * _points;
        double share = 1 + 1 / _circuit.Transistor.Beta;
        row.Clear();
        for (int k = 0; k < _points; k++)
        {
            row[k] = share * _forward[k] / (_bias.ThermalVolts * emitter);
            if (_reverse)
            {
                row[_points + k] = -_backward[k] / (_bias.ThermalVolts * emitter);
            }
        }

    }

    private double HeldMismatch()
    {
        double share = 1 + 1 / _circuit.Transistor.Beta;
        double sum = 0;
        for (int k = 0; k < _points; k++)
        {
            sum += share * _forward[k] - (_reverse ? _backward[k] : 0);
        }

        return 1 - sum / (_bias.EmitterAmps * _points);
    }

    private void ComputeCurrents(ReadOnlySpan<double> state)
    {
        double inverse = 1 / _bias.ThermalVolts;
        for (int k = 0; k < _points; k++)
        {
            _forward[k] = _bias.SaturationAmps * Math.Exp(Math.Min(HighestExponent, state[k] * inverse));
            if (_reverse)
            {
                double exponent = (state[_points + k] - _circuit.SupplyVolts) * inverse;
                _backward[k] = _bias.SaturationAmps * Math.Exp(Math.Min(HighestExponent, exponent));
            }
        }
    }

    private double JunctionVolts(ReadOnlySpan<double> state, double peakAmps, int j)
    {
        double volts = _junctionOffset + peakAmps * _junctionDrive[j] + Rows.Dot(_junctionForward.AsSpan(_points - 1 - j, _points), _forward);
        if (_reverse)
        {
            volts += Rows.Dot(_junctionReverse.AsSpan(_points - 1 - j, _points), _backward);
        }

        return GivenCurrent ? volts + state[^1] : volts;
    }

    private double InternalVolts(double peakAmps, int j)
    {
        double volts = _internalOffset + peakAmps * _internalDrive[j] + Rows.Dot(_internalForward.AsSpan(_points - 1 - j, _points), _forward);
        return _reverse ? volts + Rows.Dot(_internalReverse.AsSpan(_points - 1 - j, _points), _backward) : volts;
    }

    private double[] InternalVolts(ReadOnlySpan<double> state, double peakAmps)
    {
        if (_reverse && state[_points] != 0)
        {
            return state.Slice(_points, _points).ToArray();
        }

        ComputeCurrents(state);
        var volts = new double[_points];
        for (int j = 0; j < _points; j++)
        {
            volts[j] = _internalOffset + peakAmps * _internalDrive[j] + Rows.Dot(_internalForward.AsSpan(_points - 1 - j, _points), _forward);
        }

        return volts;
    }

    private double LargestCollectorJunctionVolts()
    {
        double[] volts = InternalVolts(State, PeakAmps);
        double largest = double.NegativeInfinity;
        foreach (double volt in volts)
        {
            largest = Math.Max(largest, volt - _circuit.SupplyVolts);
        }

        return largest;
    }

    private void Resample(ReadOnlySpan<double> samples, Span<double> target)
    {
        if (samples.Length == target.Length)
        {
            samples.CopyTo(target);
        }
        else
        {
            _wave.Interpolate(samples, target);
        }
    }
}
