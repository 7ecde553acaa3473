using System.Numerics;
using MathNet.Numerics.IntegralTransforms;
using PartPick.Physics.Network;

namespace PartPick.Physics.Steady;

/// <summary>
/// Harmonic balance of a gate with a buffered inverter: a source −(VDD/2) tanh(2a·vA/VDD) behind Ron. Its output is nearly
/// a square wave, but its input is nearly a sine; so the state holds the odd harmonics of the input, and the Fourier
/// integrals of the tanh are taken with points gathered round the zero crossing, the flat rest in closed form.
/// </summary>
internal sealed class BufferedBalance : AmplitudeBalance
{
    private readonly GateNetwork _network;
    private readonly double _gain;
    private readonly double _halfVolts;
    private readonly double _outputOhms;
    private readonly SaturatedSine _shape;
    private readonly Complex[] _loops;
    private GatePorts _ports;
    private Complex _delay;

    /// <param name="network">The passive part, with 1/Ron at the inverter's output.</param>
    /// <param name="gain">Voltage gain a of the chain.</param>
    /// <param name="outputOhms">Ron in ohms.</param>
    /// <param name="supplyVolts">VDD in volts.</param>
    /// <param name="harmonics">Number of odd harmonics.</param>
    public BufferedBalance(GateNetwork network, double gain, double outputOhms, double supplyVolts, int harmonics)
    {
        _network = network;
        _gain = gain;
        _halfVolts = supplyVolts / 2;
        _outputOhms = outputOhms;
        _shape = new SaturatedSine(harmonics, gain / _halfVolts);
        _loops = new Complex[harmonics];
        State = new double[2 * harmonics];
    }

    /// <inheritdoc/>
    public override double LinearPeakAmps
    {
        get
        {
            Complex perAmp = _delay * _ports.Input / (1 + _gain / _outputOhms * _delay * _ports.InputPerSource);
            return 0.2 * _halfVolts / _gain / Complex.Abs(perAmp);
        }
    }

    /// <inheritdoc/>
    public override double HarmonicShare => Count < 4 ? 0 : Math.Sqrt(
        (State[2] * State[2] + State[3] * State[3]) / (State[0] * State[0] + State[1] * State[1]));

    private double SourceAmps => -_halfVolts / _outputOhms;

    /// <summary>The same circuit with twice the harmonics, starting from this state.</summary>
    public BufferedBalance Refined()
    {
        var finer = new BufferedBalance(_network, _gain, _outputOhms, 2 * _halfVolts, Count) { PeakAmps = PeakAmps };
        State.CopyTo(finer.State, 0);
        finer.SetFrequency(Radians);
        return finer;
    }

    /// <inheritdoc/>
    public override RunningState Keep() =>
        new(typeof(BufferedBalance), Count / 2, Radians, PeakAmps, [.. State], LendFactors());

    /// <inheritdoc/>
    public override void StartLinear(double peakAmps)
    {
        PeakAmps = peakAmps;
        Array.Clear(State);
        Complex input = peakAmps * _delay * _ports.Input / (1 + _gain / _outputOhms * _delay * _ports.InputPerSource);
        State[0] = input.Real;
        State[1] = input.Imaginary;
    }

    /// <inheritdoc/>
    public override double? StartSaturated(double resistanceOhms)
    {
        // First harmonics only: the output is a square wave in phase with the input.
        const double SquareWave = 4 / Math.PI;
        Complex drive = _delay * _ports.Input;
        double peak = 0;
        Complex phase = drive / Complex.Abs(drive);
        for (int step = 0; step < 8; step++)
        {
            double active = -(_ports.Output * SourceAmps * SquareWave * phase).Real / (resistanceOhms + _ports.Own.Real);
            peak = Math.Max(active, 0.3 * SquareWave * Complex.Abs(_loops[0] / drive));
            Complex input = peak * drive + _loops[0] * SquareWave * phase;
            phase = input / Complex.Abs(input);
        }

        PeakAmps = 3 * peak;
        double angle = drive.Phase;
        for (int h = 0; h < _loops.Length; h++)
        {
            int n = 2 * h + 1;
            double size = SquareWave / n * (h % 2 == 0 ? 1 : -1);
            Complex input = _loops[h] * Complex.FromPolarCoordinates(size, n * angle);
            State[2 * h] = input.Real + (h == 0 ? PeakAmps * drive.Real : 0);
            State[2 * h + 1] = input.Imaginary + (h == 0 ? PeakAmps * drive.Imaginary : 0);
        }

        return PeakAmps;
    }

    /// <inheritdoc/>
    public override (double Low, double High) OutputRangeVolts()
    {
        const int Points = 4096;
        const int Highest = Points / 2 - 1;
        var spectrum = new Complex[Points];
        Take(State);
        for (int n = 1; n <= Highest; n += 2)
        {
            GatePorts ports = _network.Ports(new Complex(0, n * Radians));
            Complex phasor = ports.OutputPerSource * SourceAmps * _shape.Harmonic(n);
            if (n == 1)
            {
                phasor += ports.Output * PeakAmps;
            }

            // Lanczos' factor keeps the cut-off series from overshooting at the edges.
            double angle = Math.PI * n / (Highest + 1);
            spectrum[n] = phasor * (Math.Sin(angle) / angle);
        }

        Fourier.Inverse(spectrum, FourierOptions.NoScaling);
        double largest = 0;
        foreach (Complex sample in spectrum)
        {
            largest = Math.Max(largest, Math.Abs(sample.Real));
        }

        return (-largest, largest);
    }

    /// <inheritdoc/>
    protected override void PrepareHarmonics(double radians)
    {
        for (int h = 0; h < _loops.Length; h++)
        {
            var s = new Complex(0, radians * (2 * h + 1));
            GatePorts ports = _network.Ports(s);
            Complex delay = _network.Delay(s);
            _loops[h] = delay * ports.InputPerSource * SourceAmps;
            if (h == 0)
            {
                _ports = ports;
                _delay = delay;
            }
        }
    }

    /// <inheritdoc/>
    protected override double Residual(ReadOnlySpan<double> state, double peakAmps, Span<double> residual)
    {
        Take(state);
        double worst = 0;
        for (int h = 0; h < state.Length / 2; h++)
        {
            Complex difference = new Complex(state[2 * h], state[2 * h + 1]) - _loops[h] * _shape.Harmonic(2 * h + 1);
            if (h == 0)
            {
                difference -= peakAmps * _delay * _ports.Input;
            }

            residual[2 * h] = difference.Real;
            residual[2 * h + 1] = difference.Imaginary;
            worst = Math.Max(worst, Complex.Abs(difference));
        }

        return worst / (peakAmps * Complex.Abs(_ports.Input));
    }

    /// <inheritdoc/>
    protected override void Linearise(ReadOnlySpan<double> state, double peakAmps, Span<double> matrix, int stride, Span<double> byLogAmps)
    {
        int n = state.Length;
        Take(state);
        Complex drive = peakAmps * _delay * _ports.Input;
        byLogAmps.Clear();
        byLogAmps[0] = -drive.Real;
        byLogAmps[1] = -drive.Imaginary;
        for (int row = 0; row < n / 2; row++)
        {
            Span<double> real = matrix.Slice(2 * row * stride, n);
            Span<double> imaginary = matrix.Slice((2 * row + 1) * stride, n);
            for (int column = 0; column < n / 2; column++)
            {
                _shape.Derivative(2 * row + 1, 2 * column + 1, out Complex byReal, out Complex byImaginary);
                byReal *= _loops[row];
                byImaginary *= _loops[row];
                real[2 * column] = -byReal.Real;
                real[2 * column + 1] = -byImaginary.Real;
                imaginary[2 * column] = -byReal.Imaginary;
                imaginary[2 * column + 1] = -byImaginary.Imaginary;
            }

            real[2 * row] += 1;
            imaginary[2 * row + 1] += 1;
        }
    }

    /// <inheritdoc/>
    protected override Complex ImpedanceOf(ReadOnlySpan<double> state, double peakAmps, Span<double> gradient, out double byLogAmps)
    {
        Take(state);
        Complex weight = _ports.Output * SourceAmps / peakAmps;
        for (int h = 0; h < state.Length / 2; h++)
        {
            _shape.Derivative(1, 2 * h + 1, out Complex byReal, out Complex byImaginary);
            gradient[2 * h] = (weight * byReal).Real;
            gradient[2 * h + 1] = (weight * byImaginary).Real;
        }

        Complex sum = weight * _shape.Harmonic(1);
        byLogAmps = -sum.Real;
        return _ports.Own + sum;
    }

    private void Take(ReadOnlySpan<double> state)
    {
        bool same = true;
        for (int h = 0; h < state.Length / 2; h++)
        {
            var input = new Complex(state[2 * h], state[2 * h + 1]);
            same &= input == _shape.Input[h];
            _shape.Input[h] = input;
        }

        if (!same)
        {
            _shape.Prepare();
        }
    }
}
