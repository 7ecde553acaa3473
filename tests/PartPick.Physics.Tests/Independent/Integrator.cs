namespace PartPick.Physics.Tests.Independent;

/// <summary>
/// Integrates a circuit and its crystal by the trapezoidal rule with a fixed step and Newton's method at each step. The rule
/// turns a frequency ω into (2/h) tan(ωh/2); the step that charges and the motional branch see is stretched so that the
/// fundamental comes out exact, which leaves only the harmonics an error of order h².
/// </summary>
internal sealed class Integrator
{
    private readonly CircuitInTime _circuit;
    private readonly Crystal _crystal;
    private readonly double[] _past;
    private readonly double[] _residual;
    private readonly double[] _jacobian;
    private readonly double[] _guess;
    private readonly double[] _history = new double[8192];
    private NodalState _old;
    private NodalState _new;
    private long _steps;

    public Integrator(CircuitInTime circuit, Crystal crystal, double stepSeconds)
    {
        _circuit = circuit;
        _crystal = crystal;
        Step = stepSeconds;
        int n = circuit.Nodes;
        Voltages = circuit.Rest;
        _past = (double[])Voltages.Clone();
        _guess = new double[n];
        _residual = new double[n];
        _jacobian = new double[n * n];
        _old = new NodalState(n);
        _new = new NodalState(n);
        double input = circuit.DelayedNode >= 0 ? Voltages[circuit.DelayedNode] : 0;
        Array.Fill(_history, input);
        circuit.Evaluate(Voltages, input, 0, _old);
        MotionalVolts = CrystalVolts(Voltages);
        TuneTo(crystal.SeriesHz);
    }

    public double Step { get; }

    /// <summary>Time step as the capacitances see it.</summary>
    public double StretchedStep { get; private set; }

    public double[] Voltages { get; private set; }

    /// <summary>Motional current in amperes, from the crystal's first terminal to its second.</summary>
    public double Current { get; set; }

    /// <summary>Voltage over the motional capacitance.</summary>
    public double MotionalVolts { get; private set; }

    /// <summary>Stretches the step so that this frequency comes out exact.</summary>
    public void TuneTo(double frequencyHz)
    {
        double omega = 2 * Math.PI * frequencyHz;
        StretchedStep = 2 / omega * Math.Tan(omega * Step / 2);
    }

    public void Advance()
    {
        int n = _circuit.Nodes;
        double h = StretchedStep, inductance = _crystal.InductanceHenries, resistance = _crystal.ResistanceOhms;
        double half = h / (2 * _crystal.MotionalFarads);
        double branch = 1 / (2 * inductance / h + resistance + half);
        double drive = CrystalVolts(Voltages) - 2 * MotionalVolts + Current * (2 * inductance / h - resistance - half);
        (double settled, double weight) = Delayed();
        for (int k = 0; k < n; k++)
        {
            _guess[k] = 2 * Voltages[k] - _past[k];
        }

        double current = 0;
        for (int pass = 0; ; pass++)
        {
            double delayed = settled + (_circuit.DelayedNode >= 0 ? weight * _guess[_circuit.DelayedNode] : 0);
            _circuit.Evaluate(_guess, delayed, weight, _new);
            current = branch * (CrystalVolts(_guess) + drive);
            for (int k = 0; k < n; k++)
            {
                _residual[k] = -(2 / h * (_new.Charge[k] - _old.Charge[k]) + _new.Current[k] + _old.Current[k]);
            }

            for (int k = 0; k < n * n; k++)
            {
                _jacobian[k] = 2 / h * _new.ChargeSlope[k] + _new.CurrentSlope[k];
            }

            StampCrystal(current + Current, branch);
            Dense.Solve(_jacobian, _residual, n);
            double largest = 0;
            foreach (double step in _residual)
            {
                largest = Math.Max(largest, Math.Abs(step));
            }

            double scale = Math.Min(1, _circuit.StepLimitVolts / largest);
            for (int k = 0; k < n; k++)
            {
                _guess[k] += scale * _residual[k];
            }

            if (largest < 1e-10)
            {
                break;
            }

            if (pass > 100)
            {
                throw new InvalidOperationException("Newton's method did not settle within a time step.");
            }
        }

        Finish(branch * (CrystalVolts(_guess) + drive), settled, weight, half);
    }

    private void Finish(double current, double settled, double weight, double half)
    {
        Array.Copy(Voltages, _past, Voltages.Length);
        Array.Copy(_guess, Voltages, Voltages.Length);
        double delayed = settled + (_circuit.DelayedNode >= 0 ? weight * Voltages[_circuit.DelayedNode] : 0);
        _circuit.Evaluate(Voltages, delayed, weight, _new);
        (_old, _new) = (_new, _old);
        MotionalVolts += half * (current + Current);
        Current = current;
        _steps++;
        if (_circuit.DelayedNode >= 0)
        {
            _history[_steps % _history.Length] = Voltages[_circuit.DelayedNode];
        }
    }

    /// <summary>Delayed input at the new instant: a settled part, and the weight of the voltage still unknown.</summary>
    private (double Settled, double Weight) Delayed()
    {
        double back = _circuit.DelaySeconds / Step;
        int whole = (int)back;
        double part = back - whole;
        return whole == 0
            ? (part * At(0), 1 - part)
            : ((1 - part) * At(whole - 1) + part * At(whole), 0);

        // Samples back from the last one known.
        double At(int samples) => _history[(_steps - samples + _history.Length) % _history.Length];
    }

    private void StampCrystal(double currents, double branch)
    {
        int n = _circuit.Nodes, p = _circuit.CrystalPlus, m = _circuit.CrystalMinus;
        _residual[p] -= currents;
        _jacobian[p * n + p] += branch;
        if (m >= 0)
        {
            _residual[m] += currents;
            _jacobian[m * n + m] += branch;
            _jacobian[p * n + m] -= branch;
            _jacobian[m * n + p] -= branch;
        }
    }

    private double CrystalVolts(double[] v) =>
        v[_circuit.CrystalPlus] - (_circuit.CrystalMinus >= 0 ? v[_circuit.CrystalMinus] : 0);
}
