using System.Numerics;
using PartPick.Physics.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// The forced state of a gate as a harmonic balance solved by Newton's method. The derived classes hold the devices.
/// </summary>
internal abstract class AmplitudeBalance : ForcedState
{
    private const int MostSteps = 60;
    private const int MostHalvings = 11;
    private const double LargestLogStep = 0.7;
    private const double RoundingFloor = 1e-9;
    private const double KeepRatio = 0.15;
    private DenseSolver _solver = new();
    private bool _borrowed;
    private double[] _residual = [];
    private double[] _step = [];
    private double[] _gradient = [];
    private double[] _byLog = [];
    private double[] _trial = [];
    private double[] _remembered = [];

    /// <summary>The unknowns of the balance: the state itself, kept between calls as the next starting point.</summary>
    public double[] State { get; protected set; } = [];

    /// <summary>Number of unknowns.</summary>
    protected int Count => State.Length;

    /// <inheritdoc/>
    public override void SetFrequency(double radians)
    {
        Radians = radians;
        PrepareHarmonics(radians);
    }

    /// <summary>
    /// Takes a frequency in rad/s, an amplitude in amperes and a state of the same kind and fineness, and borrows the factors
    /// with which that state was solved: between circuits that differ little they serve as well.
    /// </summary>
    public void TakeState(double radians, double peakAmps, ReadOnlySpan<double> state, DenseSolver? factors)
    {
        SetFrequency(radians);
        PeakAmps = peakAmps;
        state.CopyTo(State);
        if (factors is not null)
        {
            _solver = factors;
            _borrowed = true;
        }
    }

    /// <summary>Gives the factors of the last solution away to be borrowed; this balance makes its own again when it needs some.</summary>
    protected DenseSolver LendFactors()
    {
        _borrowed = true;
        return _solver;
    }

    /// <inheritdoc/>
    public override void Remember()
    {
        if (_remembered.Length < Count)
        {
            _remembered = new double[Count];
        }

        State.CopyTo(_remembered, 0);
    }

    /// <inheritdoc/>
    public override void Recall() => _remembered.AsSpan(0, Count).CopyTo(State);

    /// <inheritdoc/>
    public override bool SolveAt(double peakAmps)
    {
        PeakAmps = peakAmps;
        return Newton(null, FineTolerance);
    }

    /// <inheritdoc/>
    public override bool StepTowardsRunning(double resistanceOhms)
    {
        int n = Count;
        Size(n + 1);
        Residual(State, PeakAmps, _residual.AsSpan(0, n));
        Impedance = ImpedanceOf(State, PeakAmps, _gradient.AsSpan(0, n), out double byLog);
        _gradient[n] = byLog / resistanceOhms;
        _residual[n] = Impedance.Real / resistanceOhms + 1;
        if ((!_solver.IsFactored || _solver.Order != n + 1) && !Factor(n, n + 1, resistanceOhms))
        {
            return false;
        }

        for (int row = 0; row <= n; row++)
        {
            _step[row] = -_residual[row];
        }

        if (!_solver.Solve(_step.AsSpan(0, n + 1)))
        {
            return false;
        }

        for (int row = 0; row < n; row++)
        {
            State[row] += _step[row];
        }

        PeakAmps *= Math.Exp(_step[n]);
        Impedance = ImpedanceOf(State, PeakAmps, _gradient.AsSpan(0, n), out _);
        return double.IsFinite(Impedance.Imaginary);
    }

    /// <inheritdoc/>
    public override bool SolveRunning(double resistanceOhms, double tolerance = FineTolerance) => Newton(resistanceOhms, tolerance);

    /// <inheritdoc/>
    public override bool IsCoarserThan(RunningState near) => Count < near.Unknowns;

    /// <summary>Computes what depends on the frequency alone.</summary>
    protected abstract void PrepareHarmonics(double radians);

    /// <summary>The residual at a state; returns its size relative to its scale.</summary>
    protected abstract double Residual(ReadOnlySpan<double> state, double peakAmps, Span<double> residual);

    /// <summary>The residual's Jacobian, in rows of <paramref name="stride"/>, and its derivative by ln I.</summary>
    protected abstract void Linearise(ReadOnlySpan<double> state, double peakAmps, Span<double> matrix, int stride, Span<double> byLogAmps);

    /// <summary>Zc for a state, and the gradient of its real part by the state and by ln I.</summary>
    protected abstract Complex ImpedanceOf(ReadOnlySpan<double> state, double peakAmps, Span<double> gradient, out double byLogAmps);

    /// <summary>Largest step that Newton may take at once, as a fraction of the full one.</summary>
    protected virtual double StepLimit(ReadOnlySpan<double> step) => 1;

    // Newton's method that keeps its factors while they still shrink the residual well. With a resistance the amplitude is
    // one more unknown and Re Zc + Rm one more equation.
    private bool Newton(double? resistanceOhms, double tolerance)
    {
        int n = Count;
        int order = resistanceOhms is null ? n : n + 1;
        Size(n + 1);
        double before = double.PositiveInfinity;
        bool factored = _solver.IsFactored && _solver.Order == order;
        bool fresh = false;
        double size = Residual(State, PeakAmps, _residual.AsSpan(0, n));
        for (int step = 0; step < MostSteps; step++)
        {
            double mismatch = 0;
            if (resistanceOhms is { } resistance)
            {
                Impedance = ImpedanceOf(State, PeakAmps, _gradient.AsSpan(0, n), out double byLog);
                _gradient[n] = byLog / resistance;
                mismatch = Impedance.Real / resistance + 1;
                _residual[n] = mismatch;
            }

            double total = Math.Max(size, Math.Abs(mismatch));
            if (!double.IsFinite(total))
            {
                return false;
            }

            // A strong device at small signals is the difference of large currents: what rounding leaves of it is enough.
            bool rounding = fresh && total < RoundingFloor && total > before / 2;
            if (total < tolerance || rounding)
            {
                return resistanceOhms is not null || Finish(n);
            }

            fresh = !factored || total > KeepRatio * before;
            if (fresh)
            {
                if (!Factor(n, order, resistanceOhms))
                {
                    return false;
                }

                factored = true;
            }

            before = total;
            for (int row = 0; row < order; row++)
            {
                _step[row] = -_residual[row];
            }

            if (!_solver.Solve(_step.AsSpan(0, order)))
            {
                return false;
            }

            size = TakeStep(n, order == n ? 0 : _step[n], size);
        }

        return false;
    }

    // The slope of the solved state along the amplitude, with factors of that very state.
    private bool Finish(int n)
    {
        if (!Factor(n, n, null))
        {
            return false;
        }

        Impedance = ImpedanceOf(State, PeakAmps, _gradient.AsSpan(0, n), out double slope);
        for (int row = 0; row < n; row++)
        {
            _step[row] = -_byLog[row];
        }

        if (!_solver.Solve(_step.AsSpan(0, n)))
        {
            return false;
        }

        for (int row = 0; row < n; row++)
        {
            slope += _gradient[row] * _step[row];
        }

        ResistanceSlope = slope;
        return true;
    }

    private bool Factor(int n, int order, double? resistanceOhms)
    {
        if (_borrowed)
        {
            _solver = new DenseSolver();
            _borrowed = false;
        }

        Span<double> matrix = _solver.Matrix(order, out int stride);
        Linearise(State, PeakAmps, matrix, stride, _byLog.AsSpan(0, n));
        if (resistanceOhms is { } resistance)
        {
            Span<double> border = matrix.Slice(n * stride, order);
            for (int k = 0; k < n; k++)
            {
                matrix[k * stride + n] = _byLog[k];
                border[k] = _gradient[k] / resistance;
            }

            border[n] = _gradient[n];
        }

        return _solver.Factor();
    }

    // The full step, or less of it where the state's own limit or a growing residual asks for less; returns the residual's size.
    private double TakeStep(int n, double logStep, double size)
    {
        double fraction = Math.Min(StepLimit(_step.AsSpan(0, n)), LargestLogStep / Math.Max(LargestLogStep, Math.Abs(logStep)));
        double peak = PeakAmps;
        for (int halving = 0; ; halving++)
        {
            for (int row = 0; row < n; row++)
            {
                _trial[row] = State[row] + fraction * _step[row];
            }

            double trialPeak = peak * Math.Exp(fraction * logStep);
            double trialSize = Residual(_trial, trialPeak, _residual.AsSpan(0, n));
            if (size < 1e-6 || trialSize < size * 1.5 || halving == MostHalvings)
            {
                (State, _trial) = (_trial, State);
                PeakAmps = trialPeak;
                return trialSize;
            }

            fraction /= 2;
        }
    }

    private void Size(int order)
    {
        if (_residual.Length < order)
        {
            _residual = new double[order];
            _step = new double[order];
            _gradient = new double[order];
            _byLog = new double[order];
            _trial = new double[order - 1];
        }
    }
}
