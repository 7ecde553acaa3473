using System.Numerics;
using PartPick.Physics.Devices;
using PartPick.Physics.Network;
using PartPick.Physics.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// Harmonic balance of a gate with a one-stage inverter. The inverter is odd about mid-supply and its input draws no
/// current, so the state is the device's output current at M points of half a period, with odd harmonics below M.
/// </summary>
internal sealed class OneStageBalance : AmplitudeBalance
{
    private readonly GateNetwork _network;
    private readonly SquareLaw _law;
    private readonly HalfWave _wave;
    private readonly double[] _inputKernel;
    private readonly double[] _outputKernel;
    private readonly double[] _inputDrive;
    private readonly double[] _outputDrive;
    private readonly double[] _input;
    private readonly double[] _output;
    private GatePorts _ports;
    private Complex _delay;

    public OneStageBalance(GateNetwork network, SquareLaw law, int points)
    {
        _network = network;
        _law = law;
        _wave = HalfWave.Of(points);
        _inputKernel = new double[2 * points - 1];
        _outputKernel = new double[2 * points - 1];
        _inputDrive = new double[points];
        _outputDrive = new double[points];
        _input = new double[points];
        _output = new double[points];
        State = new double[points];
    }

    /// <inheritdoc/>
    public override double LinearPeakAmps
    {
        get
        {
            Complex source = LinearSource();
            double input = Complex.Abs(_delay * (_ports.Input + _ports.InputPerSource * source));
            double output = Complex.Abs(_ports.Output + _ports.OutputPerSource * source);
            return 0.1 * _law.OverdriveVolts / Math.Max(input, output);
        }
    }

    /// <summary>The same circuit with twice the points, starting from this state.</summary>
    public OneStageBalance Refined()
    {
        var finer = new OneStageBalance(_network, _law, 2 * Count) { PeakAmps = PeakAmps };
        _wave.Interpolate(State, finer.State);
        finer.SetFrequency(Radians);
        return finer;
    }

    /// <inheritdoc/>
    public override RunningState Keep() =>
        new(typeof(OneStageBalance), Count, Radians, PeakAmps, [.. State], LendFactors());

    /// <inheritdoc/>
    public override void StartLinear(double peakAmps)
    {
        PeakAmps = peakAmps;
        Complex source = LinearSource() * peakAmps;
        for (int j = 0; j < Count; j++)
        {
            State[j] = (source * _wave.Point(j)).Real;
        }
    }

    /// <inheritdoc/>
    public override (double Low, double High) OutputRangeVolts()
    {
        ComputeVoltages(State, PeakAmps);
        double largest = HalfWave.LargestMagnitude(_output);
        return (-largest, largest);
    }

    /// <inheritdoc/>
    protected override void PrepareHarmonics(double radians)
    {
        var inputs = new Complex[_wave.Harmonics];
        var outputs = new Complex[_wave.Harmonics];
        for (int h = 0; h < inputs.Length; h++)
        {
            var s = new Complex(0, radians * (2 * h + 1));
            GatePorts ports = _network.Ports(s);
            Complex delay = _network.Delay(s);
            inputs[h] = delay * ports.InputPerSource;
            outputs[h] = ports.OutputPerSource;
            if (h == 0)
            {
                _ports = ports;
                _delay = delay;
            }
        }

        _wave.Kernel(inputs, _inputKernel);
        _wave.Kernel(outputs, _outputKernel);
        for (int j = 0; j < Count; j++)
        {
            _inputDrive[j] = (_delay * _ports.Input * _wave.Point(j)).Real;
            _outputDrive[j] = (_ports.Output * _wave.Point(j)).Real;
        }
    }

    /// <inheritdoc/>
    protected override double Residual(ReadOnlySpan<double> state, double peakAmps, Span<double> residual)
    {
        ComputeVoltages(state, peakAmps);
        double worst = 0;
        double largest = 1e-300;
        for (int j = 0; j < state.Length; j++)
        {
            residual[j] = state[j] - _law.Current(_input[j], _output[j], out _, out _);
            worst = Math.Max(worst, Math.Abs(residual[j]));
            largest = Math.Max(largest, Math.Abs(state[j]));
        }

        return worst / largest;
    }

    /// <inheritdoc/>
    protected override void Linearise(ReadOnlySpan<double> state, double peakAmps, Span<double> matrix, int stride, Span<double> byLogAmps)
    {
        int n = state.Length;
        ComputeVoltages(state, peakAmps);
        for (int j = 0; j < n; j++)
        {
            _law.Current(_input[j], _output[j], out double byInput, out double byOutput);
            Span<double> row = matrix.Slice(j * stride, n);
            Rows.Combine(row, _inputKernel.AsSpan(n - 1 - j, n), -byInput, _outputKernel.AsSpan(n - 1 - j, n), -byOutput);
            row[j] += 1;
            byLogAmps[j] = -peakAmps * (byInput * _inputDrive[j] + byOutput * _outputDrive[j]);
        }
    }

    /// <inheritdoc/>
    protected override Complex ImpedanceOf(ReadOnlySpan<double> state, double peakAmps, Span<double> gradient, out double byLogAmps)
    {
        Complex weight = _ports.Output / peakAmps;
        Complex sum = Complex.Zero;
        double scale = 2.0 / state.Length;
        for (int j = 0; j < state.Length; j++)
        {
            Complex term = weight * Complex.Conjugate(_wave.Point(j)) * scale;
            gradient[j] = term.Real;
            sum += term * state[j];
        }

        byLogAmps = -sum.Real;
        return _ports.Own + sum;
    }

    private Complex LinearSource()
    {
        _law.Current(0, 0, out double byInput, out double byOutput);
        return (byInput * _delay * _ports.Input + byOutput * _ports.Output)
            / (1 - byInput * _delay * _ports.InputPerSource - byOutput * _ports.OutputPerSource);
    }

    private void ComputeVoltages(ReadOnlySpan<double> state, double peakAmps)
    {
        int n = state.Length;
        for (int j = 0; j < n; j++)
        {
            Rows.Dots(
                _inputKernel.AsSpan(n - 1 - j, n), _outputKernel.AsSpan(n - 1 - j, n), state, out double input, out double output);
            _input[j] = peakAmps * _inputDrive[j] + input;
            _output[j] = peakAmps * _outputDrive[j] + output;
        }
    }
}
