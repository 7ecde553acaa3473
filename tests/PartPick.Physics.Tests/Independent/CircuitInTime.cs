namespace PartPick.Physics.Tests.Independent;

/// <summary>
/// A nonlinear circuit for integration in time: at node voltages v it gives the currents f leaving each node, the
/// charges q held at each node, and both Jacobians. The crystal's motional branch is not part of it.
/// </summary>
internal abstract class CircuitInTime(int nodes, int crystalPlus, int crystalMinus)
{
    private readonly double[] _capacitance = new double[nodes * nodes];
    private readonly double[] _conductance = new double[nodes * nodes];

    public int Nodes { get; } = nodes;

    public int CrystalPlus { get; } = crystalPlus;

    public int CrystalMinus { get; } = crystalMinus;

    /// <summary>Node whose voltage acts after a delay; −1 for none.</summary>
    public virtual int DelayedNode => -1;

    public virtual double DelaySeconds => 0;

    /// <summary>Node whose swing is the output's.</summary>
    public abstract int OutputNode { get; }

    /// <summary>Voltages at rest.</summary>
    public abstract double[] Rest { get; }

    /// <summary>Longest time constant of the bias in seconds, for the time to let pass before a measurement.</summary>
    public abstract double SlowestSeconds { get; }

    /// <summary>Largest change of a voltage to accept in one Newton step, in volts.</summary>
    public abstract double StepLimitVolts { get; }

    /// <summary>Voltage watched for its largest value in the cycle.</summary>
    public virtual double Watched(double[] v) => double.NegativeInfinity;

    /// <param name="v">Node voltages.</param>
    /// <param name="delayed">Voltage of the delayed node, τ earlier.</param>
    /// <param name="weight">Its derivative by the delayed node's present voltage.</param>
    /// <param name="state">Receives f, q and their Jacobians.</param>
    public void Evaluate(double[] v, double delayed, double weight, NodalState state)
    {
        state.Start(v, _conductance, _capacitance);
        Device(v, delayed, weight, state);
    }

    protected abstract void Device(double[] v, double delayed, double weight, NodalState state);

    protected void Capacitor(int a, int b, double farads) => Stamp(_capacitance, a, b, Math.Max(0, farads));

    protected void Resistor(int a, int b, double ohms) => Stamp(_conductance, a, b, double.IsFinite(ohms) ? 1 / ohms : 0);

    private void Stamp(double[] matrix, int a, int b, double value)
    {
        foreach ((int row, int column, double sign) in (ReadOnlySpan<(int, int, double)>)[(a, a, 1), (b, b, 1), (a, b, -1), (b, a, -1)])
        {
            if (row >= 0 && column >= 0)
            {
                matrix[row * Nodes + column] += sign * value;
            }
        }
    }
}

/// <summary>Currents, charges and Jacobians of a circuit at one set of voltages.</summary>
internal sealed class NodalState(int nodes)
{
    public double[] Current { get; } = new double[nodes];

    public double[] Charge { get; } = new double[nodes];

    public double[] CurrentSlope { get; } = new double[nodes * nodes];

    public double[] ChargeSlope { get; } = new double[nodes * nodes];

    /// <summary>Begins with resistors and capacitors alone.</summary>
    public void Start(double[] v, double[] conductance, double[] capacitance)
    {
        for (int row = 0; row < v.Length; row++)
        {
            double current = 0, charge = 0;
            for (int column = 0; column < v.Length; column++)
            {
                int at = row * v.Length + column;
                current += conductance[at] * v[column];
                charge += capacitance[at] * v[column];
                CurrentSlope[at] = conductance[at];
                ChargeSlope[at] = capacitance[at];
            }

            Current[row] = current;
            Charge[row] = charge;
        }
    }

    /// <summary>A current from one node to another and its derivative by the voltage between two nodes.</summary>
    public void AddCurrent(int from, int to, int plus, int minus, double amps, double slope) =>
        Add(Current, CurrentSlope, from, to, plus, minus, amps, slope);

    /// <summary>A charge on one node, its opposite on another, and its derivative.</summary>
    public void AddCharge(int from, int to, int plus, int minus, double coulombs, double slope) =>
        Add(Charge, ChargeSlope, from, to, plus, minus, coulombs, slope);

    private static void Add(double[] values, double[] slopes, int from, int to, int plus, int minus, double value, double slope)
    {
        if (from >= 0)
        {
            values[from] += value;
            Slope(slopes, values.Length, from, plus, minus, slope);
        }

        if (to >= 0)
        {
            values[to] -= value;
            Slope(slopes, values.Length, to, plus, minus, -slope);
        }
    }

    private static void Slope(double[] slopes, int nodes, int row, int plus, int minus, double slope)
    {
        if (plus >= 0)
        {
            slopes[row * nodes + plus] += slope;
        }

        if (minus >= 0)
        {
            slopes[row * nodes + minus] -= slope;
        }
    }
}
