using System.Numerics;
using PartPick.Physics.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// The periodic state of a circuit whose motional branch is replaced by a sine current of given amplitude, with all
/// harmonics: a harmonic balance solved by Newton's method. The derived classes hold the devices.
/// </summary>
internal abstract class AmplitudeBalance
{
    private const int MostSteps = 40;
    private const double LargestLogStep = 0.7;
    private double[] _work = [];
    private double[] _trial = [];

    /// <summary>Peak motional current in amperes at which the state was last solved.</summary>
    public double PeakAmps { get; protected set; }

    /// <summary>Zc(I) = V₁/I in ohms of the last solved state.</summary>
    public Complex Impedance { get; private set; }

    /// <summary>d Re Zc / d ln I in ohms at the last state solved for a given amplitude or running.</summary>
    public double ResistanceSlope { get; private set; }

    /// <summary>The unknowns of the balance: the state itself, kept between calls as the next starting point.</summary>
    public double[] State { get; protected set; } = [];

    /// <summary>Angular frequency in rad/s.</summary>
    public double Radians { get; private set; }

    /// <summary>Number of unknowns.</summary>
    protected int Count => State.Length;

    /// <summary>Sets the frequency of the crystal's current; the state stays as the next starting point.</summary>
    public void SetFrequency(double radians)
    {
        Radians = radians;
        PrepareHarmonics(radians);
    }

    /// <summary>Takes frequency, amplitude and state of another balance of the same kind and fineness.</summary>
    public void TakeState(AmplitudeBalance other)
    {
        SetFrequency(other.Radians);
        PeakAmps = other.PeakAmps;
        other.State.CopyTo(State, 0);
    }

    /// <summary>Puts the state of small signals at an amplitude as the starting point.</summary>
    public abstract void StartLinear(double peakAmps);

    /// <summary>Largest amplitude in amperes at which the circuit still acts as linear, about.</summary>
    public abstract double LinearPeakAmps { get; }

    /// <summary>
    /// Puts a fully limited state as the starting point of a search from large amplitudes down, and returns its amplitude in
    /// amperes; null where the search goes up from small signals.
    /// </summary>
    public virtual double? StartSaturated(double resistanceOhms) => null;

    /// <summary>Solves the periodic state at a given peak current, from the last state.</summary>
    public bool SolveAt(double peakAmps)
    {
        PeakAmps = peakAmps;
        return Newton(null);
    }

    /// <summary>Solves state and amplitude together for Re Zc(I) = −Rm, from the last state.</summary>
    public bool SolveRunning(double resistanceOhms) => Newton(resistanceOhms);

    /// <summary>Output swing in volts peak to peak of the last solved state.</summary>
    public abstract double OutputSwingVolts();

    /// <summary>True where the supply limits the last solved state (collector junction conducting).</summary>
    public virtual bool LimitedBySupply => false;

    /// <summary>Computes what depends on the frequency alone.</summary>
    protected abstract void PrepareHarmonics(double radians);

    /// <summary>
    /// Fills the residual's negative (column n), the Jacobian (columns 0 … n−1) and the derivative of the residual by
    /// ln I, negated (column n + 1), in rows of <paramref name="stride"/>. Returns the residual's size relative to its scale.
    /// </summary>
    protected abstract double Linearise(ReadOnlySpan<double> state, double peakAmps, Span<double> matrix, int stride);

    /// <summary>The residual's size alone, relative to its scale.</summary>
    protected abstract double ResidualSize(ReadOnlySpan<double> state, double peakAmps);

    /// <summary>Zc for a state, and the gradient of its real part by the state and by ln I.</summary>
    protected abstract Complex ImpedanceOf(ReadOnlySpan<double> state, double peakAmps, Span<double> gradient, out double byLogAmps);

    /// <summary>Largest step that Newton may take at once, as a fraction of the full one.</summary>
    protected virtual double StepLimit(ReadOnlySpan<double> step) => 1;

    private bool Newton(double? resistanceOhms)
    {
        int n = Count;
        int stride = n + 4;
        if (_work.Length < (n + 1) * stride)
        {
            _work = new double[(n + 1) * stride];
        }

        if (_trial.Length != n)
        {
            _trial = new double[n];
        }

        Span<double> matrix = _work;
        double size = double.PositiveInfinity;
        for (int step = 0; step < MostSteps; step++)
        {
            size = Linearise(State, PeakAmps, matrix, stride);
            if (!double.IsFinite(size))
            {
                return false;
            }

            Span<double> border = matrix.Slice(n * stride, stride);
            Complex impedance = ImpedanceOf(State, PeakAmps, border[..n], out double byLog);
            if (resistanceOhms is { } resistance)
            {
                double mismatch = impedance.Real + resistance;
                for (int row = 0; row < n; row++)
                {
                    Span<double> line = matrix.Slice(row * stride, stride);
                    (line[n], line[n + 1]) = (-line[n + 1], line[n]);
                }

                border[n] = byLog;
                border[n + 1] = -mismatch;
                if (!DenseSolver.Solve(matrix, n + 1, 1, stride))
                {
                    return false;
                }

                bool done = size < 1e-9 && Math.Abs(mismatch) < 1e-9 * resistance;
                double logStep = matrix[n * stride + n + 1];
                double limit = ApplyStep(matrix, n + 1, stride, size, logStep);
                if (limit == 0)
                {
                    return false;
                }

                if (done && limit == 1)
                {
                    return FinishAt();
                }
            }
            else
            {
                if (!DenseSolver.Solve(matrix, n, 2, stride))
                {
                    return false;
                }

                double slope = byLog;
                for (int row = 0; row < n; row++)
                {
                    slope += border[row] * matrix[row * stride + n + 1];
                }

                bool done = size < 1e-9;
                double limit = ApplyStep(matrix, n, stride, size, 0);
                if (limit == 0)
                {
                    return false;
                }

                if (done && limit == 1)
                {
                    ResistanceSlope = slope;
                    Impedance = ImpedanceOf(State, PeakAmps, border[..n], out _);
                    return true;
                }
            }
        }

        return false;
    }

    // The amplitude of a running state is known; one more solution at that amplitude gives the slope there.
    private bool FinishAt() => Newton(null);

    private double ApplyStep(ReadOnlySpan<double> matrix, int column, int stride, double size, double logStep)
    {
        int n = Count;
        for (int row = 0; row < n; row++)
        {
            _trial[row] = matrix[row * stride + column];
        }

        double fraction = Math.Min(StepLimit(_trial), LargestLogStep / Math.Max(LargestLogStep, Math.Abs(logStep)));
        double peak = PeakAmps;
        for (int halving = 0; halving < 12; halving++)
        {
            for (int row = 0; row < n; row++)
            {
                _trial[row] = State[row] + fraction * matrix[row * stride + column];
            }

            double trialPeak = peak * Math.Exp(fraction * logStep);
            if (size < 1e-6 || ResidualSize(_trial, trialPeak) < size * 1.5 || halving == 11)
            {
                (State, _trial) = (_trial, State);
                PeakAmps = trialPeak;
                return fraction;
            }

            fraction /= 2;
        }

        return 0;
    }
}
